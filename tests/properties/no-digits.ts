import type { PlacedLine } from '#shared/calc/address.ts';

/** In place of the closure, which fixes printed digits only and takes most of a run's time. */
export const closeLines = (placed: readonly PlacedLine[]) => placed.map(({ line }) => line);
