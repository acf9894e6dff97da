import type { Drawn } from './drawing.ts';

/** Distances from end A of where pieces begin and end, mm: one more than there are pieces. */
export function chainEnds(pieces: readonly Drawn[]): number[] {
  const ends = [0];
  for (const piece of pieces) ends.push((ends.at(-1) ?? 0) + piece.value);
  return ends;
}

/** Share of a member within which two places along it are one. */
export const SAME_PLACE = 1e-6;

export const isSamePlace = (a: number, b: number, length: number): boolean =>
  Math.abs(a - b) <= SAME_PLACE * length;
