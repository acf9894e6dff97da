import type { Point, Shape } from './scene.ts';
import { textWidth } from './shapes.ts';

export type Label = Extract<Shape, { kind: 'text' }>;

/** What a label must keep clear of. */
export interface Box {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Share of the generous estimate of a text's width that it takes. */
export const REAL = 0.9;

export function boxOf({ at: [x, y], text, size, anchor }: Label): Box {
  const width = REAL * textWidth(text, size);
  const left = x - { start: 0, middle: width / 2, end: width }[anchor];
  return { left: left - 2, right: left + width + 2, top: y - 0.8 * size, bottom: y + 0.25 * size };
}

/** Length of the pieces that a curve is cut in to be kept clear of. */
const PIECE = 4;

/** A curve to keep clear of. */
export const curveBoxes = (points: readonly Point[]): Box[] =>
  points.slice(1).flatMap(([x1, y1], i) => {
    const [x0, y0] = points[i] as Point;
    const count = Math.max(1, Math.ceil(Math.hypot(x1 - x0, y1 - y0) / PIECE));
    return Array.from({ length: count + 1 }, (_, n): Box => {
      const [x, y] = [x0 + ((x1 - x0) * n) / count, y0 + ((y1 - y0) * n) / count];
      return { left: x - 1, right: x + 1, top: y - 1, bottom: y + 1 };
    });
  });

const overlap = (a: Box, b: Box): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

const isFree = (box: Box, taken: readonly Box[]): boolean =>
  !taken.some((other) => overlap(box, other));

/** Labels in the order of their weight, each at the first of its places that is free; else none. */
export function placeLabels(
  wanted: readonly (readonly Label[])[],
  taken: readonly Box[] = [],
): Label[] {
  const boxes = [...taken];
  return wanted.flatMap((places) => {
    const free = places.find((place) => isFree(boxOf(place), boxes));
    if (free) boxes.push(boxOf(free));
    return free ?? [];
  });
}
