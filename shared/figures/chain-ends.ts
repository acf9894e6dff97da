import type { Drawn } from './drawing.ts';

/** Distances from end A of where pieces begin and end, mm: one more than there are pieces. */
export function chainEnds(pieces: readonly Drawn[]): number[] {
  const ends = [0];
  for (const piece of pieces) ends.push((ends.at(-1) ?? 0) + piece.value);
  return ends;
}
