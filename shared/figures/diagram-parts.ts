import type { Sample } from './bay-curve.ts';
import { chainEnds, isSamePlace, SAME_PLACE } from './chain-ends.ts';
import type { MemberDrawing, Plane } from './drawing.ts';
import { valueAt } from './plane-curves.ts';
import { isSupport } from './restraint-marks.ts';
import type { Ink, Point, Shape, Stroke } from './scene.ts';
import { label, PENS, segment } from './shapes.ts';

/** How a diagram lies under the member. */
export interface DiagramFrame {
  readonly along: (mm: number) => number;
  /** Value to y. */
  readonly up: (value: number) => number;
  readonly length: number;
}

export const curvePoints = (samples: readonly Sample[], { along, up }: DiagramFrame): Point[] =>
  samples.map(({ z, value }) => [along(z), up(value)]);

/** The area between a curve and the line of zero. */
export function filled(curve: readonly Point[], base: number, fill: Ink): Shape {
  const [start] = curve;
  const end = curve.at(-1);
  const closing: Point[] =
    start && end
      ? [
          [end[0], base],
          [start[0], base],
        ]
      : [];
  return { kind: 'area', points: [...curve, ...closing], fill };
}

export const baseLine = ({ along, up, length }: DiagramFrame): Shape =>
  segment([along(0), up(0)], [along(length), up(0)], PENS.rule);

/** How far an ordinate passes the line of zero. */
const PAST = 5;

/** Ends of segments as ordinates to the curve; points held in the plane as stands. */
export function heldPlaces(
  drawing: MemberDrawing,
  plane: Plane,
  samples: readonly Sample[],
  { along, up, length }: DiagramFrame,
): Shape[] {
  const segments = drawing.chains.find(({ symbol }) => symbol === 'Lb')?.pieces ?? [];
  const ends = plane === 'major' ? chainEnds(segments).slice(1, -1) : [];
  const supports = drawing.held.filter((held) => isSupport(held, plane));
  const base = up(0);
  return [
    ...ends.map((z) => {
      const ys = [z - SAME_PLACE * length, z + SAME_PLACE * length]
        .map((place) => up(valueAt(samples, place)))
        .concat(samples.filter((s) => isSamePlace(s.z, z, length)).map((s) => up(s.value)));
      const top = Math.min(base - PAST, ...ys);
      return segment([along(z), top], [along(z), Math.max(base + PAST, ...ys)], PENS.hair);
    }),
    ...supports.map((held): Shape => {
      const x = along(held.place.value);
      const points: Point[] = [
        [x, base],
        [x + 4, base + 7],
        [x - 4, base + 7],
      ];
      return { kind: 'area', points, fill: 'paper', stroke: PENS.rule };
    }),
  ];
}

/** An entry of a diagram's key: a short line and what it stands for. */
export const keyEntry = (x: number, text: string, pen: Stroke): Shape[] => [
  segment([x, 9], [x + 26, 9], pen),
  label(text, [x + 32, 13], { ink: 'zinc7' }),
];
