import type { Point, Scene, Shape, Stroke } from '#shared/figures/scene.ts';
import type { BlockOf } from '#shared/report/tree.ts';
import { type BlockContext, row } from '../block-context.ts';
import { arcPath, circlePath } from '../circle-path.ts';
import { type Item, linePath, type Row, type Tag } from '../items.ts';
import type { Segment } from '../math/svg-path.ts';
import { textStyles } from '../paper.ts';
import { plain, setWords, textAt } from './words.ts';

/** A scene's unit is 1/96 in. */
const unit = 72 / 96;
/** Of a figure that shares a page with its caption, points. */
const tallest = 560;

export function measureFigure(block: BlockOf<'figure'>, context: BlockContext): Row[] {
  const { scene } = block;
  const scale = Math.min(unit, context.width / scene.width, tallest / scene.height);
  const tag: Tag = { type: 'Figure', parent: context.sect, alt: scene.description };
  const left = (context.width - scene.width * scale) / 2;
  const height = scene.height * scale;
  const items = sceneItems(scene, scale, left, context);
  const rows = [row(height + 4, [{ tag, items }], { before: 8, keep: true })];
  if (block.caption === '') return rows;
  const place = { x: 0, y: 0, width: context.width };
  const words = setWords(plain(block.caption), textStyles.small, place, context);
  const caption: Tag = { type: 'Caption', parent: context.sect };
  return [...rows, row(words.height + 4, [{ tag: caption, items: words.items }])];
}

function sceneItems(scene: Scene, scale: number, left: number, context: BlockContext): Item[] {
  const at: Place = ([x, y]) => [left + x * scale, y * scale];
  return scene.shapes.map((shape) =>
    shape.kind === 'text'
      ? sceneText(shape, at(shape.at), scale, context)
      : {
          kind: 'path',
          path: outline(shape, at, scale),
          ...('fill' in shape && shape.fill ? { fill: shape.fill } : {}),
          ...(shape.stroke ? { stroke: pen(shape.stroke, scale) } : {}),
        },
  );
}

type Place = (point: Point) => Point;

function outline(shape: Exclude<Shape, { kind: 'text' }>, at: Place, scale: number): Segment[] {
  switch (shape.kind) {
    case 'line':
      return linePath(shape.points.map(at));
    case 'area':
      return [...linePath(shape.points.map(at)), { op: 'close' }];
    case 'circle':
      return circlePath(at(shape.center), shape.radius * scale);
    case 'arc':
      return arcPath(at(shape.center), shape.radius * scale, shape.from, shape.to);
  }
}

const pen = ({ ink, width, dash = [] }: Stroke, scale: number) => ({
  ink,
  width: width * scale,
  dash: dash.map((length) => length * scale),
});

function sceneText(
  shape: Extract<Shape, { kind: 'text' }>,
  [x, y]: Point,
  scale: number,
  context: BlockContext,
): Item {
  const weight = shape.weight === 600 ? 'semibold' : 'regular';
  const face = `ibm-plex-sans-condensed-${weight}` as const;
  const item = textAt(context, shape.text, {
    x,
    y,
    face,
    size: shape.size * scale,
    ink: shape.ink,
  });
  const share = { start: 0, middle: 0.5, end: 1 }[shape.anchor];
  return { ...item, x: x - item.width * share };
}
