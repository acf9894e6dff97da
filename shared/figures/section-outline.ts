import type { NamedDrawn, SectionDrawing } from './drawing.ts';
import type { Point, Scene, Shape } from './scene.ts';
import { label, PENS, path } from './shapes.ts';

const WIDTH = 236;
const HEIGHT = 210;
const BOX = 128;
const LEFT = 18;
const TOP = 28;

/** A W shape to scale from its depth, flange width and thicknesses; fillets are not drawn. */
export function sectionOutline(section: SectionDrawing): Scene {
  const { depth, flangeWidth, webThickness, flangeThickness } = section;
  const perMm = BOX / Math.max(depth.value, flangeWidth.value);
  const [d, bf, tw, tf] = [depth, flangeWidth, webThickness, flangeThickness].map(
    (q) => q.value * perMm,
  ) as [number, number, number, number];
  const x = LEFT + BOX / 2;
  const y = TOP + (BOX - d) / 2;
  const right: Point[] = [
    [x + bf / 2, y],
    [x + bf / 2, y + tf],
    [x + tw / 2, y + tf],
    [x + tw / 2, y + d - tf],
    [x + bf / 2, y + d - tf],
    [x + bf / 2, y + d],
  ];
  const left = right.map(([px, py]): Point => [2 * x - px, py]).reverse();
  const text = (q: NamedDrawn): string => `${q.symbol} ${q.text}`;
  const shapes: Shape[] = [
    label(section.section, [x, 13], { anchor: 'middle', weight: 600, within: 2 * x }),
    { kind: 'area', points: [...right, ...left], fill: 'zinc1', stroke: PENS.outline },
    ...axes(x, y + d / 2, BOX / 2 + 10),
    ...measure([x + BOX / 2 + 22, y], [x + BOX / 2 + 22, y + d]),
    label(text(depth), [x + BOX / 2 + 30, y + d / 2 - 8], { within: WIDTH - x - BOX / 2 - 30 }),
    ...measure([x - bf / 2, TOP + BOX + 16], [x + bf / 2, TOP + BOX + 16]),
    label(text(flangeWidth), [x, TOP + BOX + 32], { anchor: 'middle' }),
    label(`${text(flangeThickness)} · ${text(webThickness)}`, [x, TOP + BOX + 48], {
      anchor: 'middle',
      within: 2 * x,
    }),
  ];
  const description = `Outline of ${section.section} to scale: ${[depth, flangeWidth, flangeThickness, webThickness].map(text).join(', ')}. Fillets are not drawn.`;
  return { width: WIDTH, height: HEIGHT, shapes, description };
}

function axes(x: number, y: number, reach: number): Shape[] {
  const line = (from: Point, to: Point): Shape => path([from, to], PENS.axis);
  return [
    line([x - reach, y], [x + reach, y]),
    line([x, y - reach], [x, y + reach]),
    label('x', [x + reach + 2, y + 4], { ink: 'zinc7' }),
    label('y', [x + 4, y - reach + 6], { ink: 'zinc7' }),
  ];
}

/** A dimension line with a tick across each end. */
function measure(from: Point, to: Point): Shape[] {
  const upright = from[0] === to[0];
  const tick = ([x, y]: Point): Shape =>
    path(
      upright
        ? [
            [x - 4, y],
            [x + 4, y],
          ]
        : [
            [x, y - 4],
            [x, y + 4],
          ],
      PENS.rule,
    );
  return [path([from, to], PENS.rule), tick(from), tick(to)];
}
