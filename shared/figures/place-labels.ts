import type { Shape } from './scene.ts';
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

const overlap = (a: Box, b: Box): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

export const isFree = (box: Box, taken: readonly Box[]): boolean =>
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
