import type { NamedDrawn, PlateDrawn, SectionDrawing } from './drawing.ts';
import type { Point, Scene, Shape } from './scene.ts';
import { cutTo, label, PENS, path, textWidth } from './shapes.ts';

const WIDTH = 236;
const BOX = 128;
const LEFT = 18;
const TOP = 28;
const MIDDLE: Point = [LEFT + BOX / 2, TOP + BOX / 2];

/** A section to scale from its sizes; the fillets of rolled shapes are not drawn. */
export function sectionOutline(section: SectionDrawing): Scene {
  const { wide, deep, more } = sizesOf(section);
  const perMm = BOX / Math.max(deep.value, wide.value);
  const [w, d] = [wide.value * perMm, deep.value * perMm];
  const [x, y] = MIDDLE;
  const below = (line: number) => TOP + BOX + 32 + 16 * line;
  const words = [text(wide), ...more.map((sizes) => sizes.map(text).join(' · '))];
  const shapes: Shape[] = [
    name(section.section),
    ...bodyOf(section, perMm),
    ...axes(centroidOf(section, perMm), BOX / 2 + 10),
    ...measure([x + BOX / 2 + 22, y - d / 2], [x + BOX / 2 + 22, y + d / 2]),
    label(text(deep), [x + BOX / 2 + 30, y - 8], { within: WIDTH - x - BOX / 2 - 30 }),
    ...measure([x - w / 2, TOP + BOX + 16], [x + w / 2, TOP + BOX + 16]),
    ...words.map((said, line) =>
      label(said, [x, below(line)], { anchor: 'middle', within: 2 * x }),
    ),
  ];
  const sizes = [deep, wide, ...more.flat()].map(text).join(', ');
  const fillets = section.form === 'i' || section.form === 'channel';
  const description = `Outline of ${section.section} to scale: ${sizes}.${fillets ? ' Fillets are not drawn.' : ''}`;
  return { width: WIDTH, height: below(words.length - 1) + 6, shapes, description };
}

/** Over the outline where there is room, else from the left edge; what is longer still is cut. */
const name = (section: string): Shape =>
  textWidth(section) <= 2 * MIDDLE[0]
    ? label(section, [MIDDLE[0], 13], { anchor: 'middle', weight: 600 })
    : label(cutTo(section, WIDTH), [0, 13], { weight: 600, within: WIDTH });

const text = (q: NamedDrawn): string => `${q.symbol} ${q.text}`;

/** The sizes that are measured, and the lines of others. */
function sizesOf(s: SectionDrawing): {
  readonly wide: NamedDrawn;
  readonly deep: NamedDrawn;
  readonly more: readonly (readonly NamedDrawn[])[];
} {
  switch (s.form) {
    case 'i': {
      const { top, bottom, web, depth } = s;
      if (top === bottom) return { wide: top.width, deep: depth, more: [[top.thickness, web]] };
      const [wider, other] = top.width.value > bottom.width.value ? [top, bottom] : [bottom, top];
      return {
        ...{ wide: wider.width, deep: depth },
        more: [
          [other.width, other.thickness],
          [wider.thickness, web],
        ],
      };
    }
    case 'channel':
      return { wide: s.flange.width, deep: s.depth, more: [[s.flange.thickness, s.web]] };
    case 'box': {
      const walls =
        s.web.symbol === s.flange.thickness.symbol ? [s.web] : [s.flange.thickness, s.web];
      return { wide: s.flange.width, deep: s.depth, more: [walls] };
    }
    case 'round':
      return { wide: s.diameter, deep: s.diameter, more: [[s.wall]] };
  }
}

/** The cut area about the middle of the drawing. */
function bodyOf(s: SectionDrawing, perMm: number): Shape[] {
  const [x, y] = MIDDLE;
  const cut = (points: readonly Point[]): Shape => ({
    kind: 'area',
    points,
    fill: 'zinc1',
    stroke: PENS.outline,
  });
  const hole = (points: readonly Point[]): Shape => ({
    kind: 'area',
    points,
    fill: 'paper',
    stroke: PENS.outline,
  });
  const mm = (q: NamedDrawn) => q.value * perMm;
  switch (s.form) {
    case 'i': {
      const [d, tw] = [mm(s.depth), mm(s.web)];
      const right = flangedEdge(x, y - d / 2, d, tw / 2, s.top, s.bottom, (q) => mm(q) / 2, mm);
      return [cut([...right, ...right.map(([px, py]): Point => [2 * x - px, py]).reverse()])];
    }
    case 'channel': {
      const [d, tw, back] = [mm(s.depth), mm(s.web), x - mm(s.flange.width) / 2];
      const right = flangedEdge(back, y - d / 2, d, tw, s.flange, s.flange, mm, mm);
      return [cut([...right, [back, y + d / 2], [back, y - d / 2]])];
    }
    case 'box': {
      const [w, d] = [mm(s.flange.width) / 2, mm(s.depth) / 2];
      const [tw, tf] = [mm(s.web), mm(s.flange.thickness)];
      const radius = s.radius * perMm;
      return [
        cut(roundedRectangle(MIDDLE, w, d, radius)),
        hole(roundedRectangle(MIDDLE, w - tw, d - tf, Math.max(0, radius - tw))),
      ];
    }
    case 'round': {
      const radius = mm(s.diameter) / 2;
      const circle = (r: number, fill: 'zinc1' | 'paper'): Shape => ({
        kind: 'circle',
        center: MIDDLE,
        radius: r,
        fill,
        stroke: PENS.outline,
      });
      return [circle(radius, 'zinc1'), circle(radius - mm(s.wall), 'paper')];
    }
  }
}

/** The right edge of flanges and web from the top down; `reach` is how far a width goes right of `x`. */
function flangedEdge(
  x: number,
  y: number,
  d: number,
  web: number,
  top: PlateDrawn,
  bottom: PlateDrawn,
  reach: (width: NamedDrawn) => number,
  mm: (q: NamedDrawn) => number,
): Point[] {
  const [a, b] = [x + reach(top.width), x + reach(bottom.width)];
  const [ta, tb] = [mm(top.thickness), mm(bottom.thickness)];
  return [
    [a, y],
    [a, y + ta],
    [x + web, y + ta],
    [x + web, y + d - tb],
    [b, y + d - tb],
    [b, y + d],
  ];
}

const STEPS = 8;

/** Half width and half height about a centre, corners in short chords. */
function roundedRectangle([x, y]: Point, w: number, h: number, radius: number): Point[] {
  if (radius === 0)
    return [
      [x + w, y - h],
      [x + w, y + h],
      [x - w, y + h],
      [x - w, y - h],
    ];
  return [
    [1, 1],
    [-1, 1],
    [-1, -1],
    [1, -1],
  ].flatMap(([sx = 1, sy = 1], quarter) =>
    Array.from({ length: STEPS + 1 }, (_, i): Point => {
      const angle = (Math.PI / 2) * (quarter + i / STEPS);
      return [
        x + sx * (w - radius) + radius * Math.cos(angle),
        y + sy * (h - radius) + radius * Math.sin(angle),
      ];
    }),
  );
}

function centroidOf(s: SectionDrawing, perMm: number): Point {
  const [x, y] = MIDDLE;
  if (s.form === 'channel') return [x + (s.centroid - s.flange.width.value / 2) * perMm, y];
  return s.form === 'i' ? [x, y + (s.centroid - s.depth.value / 2) * perMm] : MIDDLE;
}

/** The axes through the centroid; they reach as far from the middle on all sides. */
function axes([x, y]: Point, reach: number): Shape[] {
  const [mx, my] = MIDDLE;
  const line = (from: Point, to: Point): Shape => path([from, to], PENS.axis);
  return [
    line([mx - reach, y], [mx + reach, y]),
    line([x, my - reach], [x, my + reach]),
    label('x', [mx + reach + 2, y + 4], { ink: 'zinc7' }),
    label('y', [x + 4, my - reach + 6], { ink: 'zinc7' }),
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
