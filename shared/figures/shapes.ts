import type { Ink, Point, Shape, Stroke } from './scene.ts';

/** The text sizes and pens of all figures. */
export const TEXT = 11;
/** Names are cut rather than set smaller than this. */
const SMALLEST_NAME = 9;
export const PENS = {
  outline: { ink: 'ink', width: 1 },
  rule: { ink: 'zinc5', width: 0.75 },
  hair: { ink: 'zinc3', width: 0.75 },
  axis: { ink: 'zinc3', width: 0.75, dash: [8, 2, 2, 2] },
  level: { ink: 'ink', width: 0.75, dash: [1, 2] },
  force: { ink: 'oxide', width: 1.5 },
  load: { ink: 'oxide', width: 0.75 },
  mark: { ink: 'ink', width: 1.5 },
  second: { ink: 'oxide', width: 1.75 },
  first: { ink: 'zinc7', width: 1, dash: [4, 3] },
} as const satisfies Record<string, Stroke>;

export const path = (points: readonly Point[], stroke: Stroke): Shape => ({
  kind: 'line',
  points,
  stroke,
});

export const label = (
  text: string,
  at: Point,
  options: {
    anchor?: 'start' | 'middle' | 'end';
    weight?: 400 | 600;
    ink?: Ink;
    /** Width the text must keep to; longer text is set smaller. */
    within?: number;
  } = {},
): Shape => ({
  kind: 'text',
  at,
  text,
  size: options.within === undefined ? TEXT : fittedSize(text, options.within),
  weight: options.weight ?? 400,
  anchor: options.anchor ?? 'start',
  ink: options.ink ?? 'ink',
});

/** Generous estimate of a text's width: the figures know no fonts. */
export const textWidth = (text: string, size = TEXT): number => [...text].length * size * 0.56;

/** A line between two points. */
export const segment = (from: Point, to: Point, stroke: Stroke): Shape => path([from, to], stroke);

/** The same shape in another place. */
export function moved(shape: Shape, across: number, down: number): Shape {
  const at = ([x, y]: Point): Point => [x + across, y + down];
  switch (shape.kind) {
    case 'line':
    case 'area':
      return { ...shape, points: shape.points.map(at) };
    case 'circle':
    case 'arc':
      return { ...shape, center: at(shape.center) };
    case 'text':
      return { ...shape, at: at(shape.at) };
  }
}

const fittedSize = (text: string, within: number): number =>
  Math.max(6, Math.min(TEXT, (TEXT * within) / Math.max(textWidth(text), 1)));

/** A name that is too long for its place, cut so that it needn't be set small. */
export function cutTo(text: string, width: number): string {
  const fits = Math.floor(width / textWidth('n', SMALLEST_NAME));
  return [...text].length <= fits
    ? text
    : `${[...text]
        .slice(0, fits - 1)
        .join('')
        .trimEnd()}…`;
}

/** A filled head at `tip`, pointing along `angle` (radians, clockwise from +x). */
export function arrowHead(tip: Point, angle: number, fill: Ink, size = 8): Shape {
  const wing = (turn: number): Point => [
    tip[0] - size * Math.cos(angle + turn),
    tip[1] - size * Math.sin(angle + turn),
  ];
  return { kind: 'area', points: [tip, wing(0.38), wing(-0.38)], fill };
}

/** A straight arrow; the shaft stops inside the head. */
export function arrow(from: Point, tip: Point, stroke: Stroke, size = 8): Shape[] {
  const angle = Math.atan2(tip[1] - from[1], tip[0] - from[0]);
  const inside = (5 / 8) * size;
  const end: Point = [tip[0] - inside * Math.cos(angle), tip[1] - inside * Math.sin(angle)];
  return [path([from, end], stroke), arrowHead(tip, angle, stroke.ink, size)];
}

/** A curved arrow about `center` from angle `from` to `to`; clockwise where `to` is larger. */
export function turnArrow(
  center: Point,
  radius: number,
  from: number,
  to: number,
  stroke: Stroke,
): Shape[] {
  const way = Math.sign(to - from);
  const tip: Point = [center[0] + radius * Math.cos(to), center[1] + radius * Math.sin(to)];
  const stop = to - (way * 5) / radius;
  const arc: Shape = {
    kind: 'arc',
    center,
    radius,
    from: Math.min(from, stop),
    to: Math.max(from, stop),
    stroke,
  };
  // The head follows the chord of its own length, so it sits on the curve.
  return [arc, arrowHead(tip, to + way * (Math.PI / 2 - 4 / radius), stroke.ink)];
}
