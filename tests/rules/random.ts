/** A seeded source of numbers (mulberry32, T. Ettinger, public domain), so that every run tests the same members. */
export function seededRandom(seed: number) {
  let state = seed >>> 0;
  const next = (): number => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 2 ** 32;
  };
  return {
    next,
    between: (low: number, high: number): number => low + (high - low) * next(),
    /** Even on a logarithmic scale. */
    size: (low: number, high: number): number => low * (high / low) ** next(),
    chance: (p: number): boolean => next() < p,
    pick: <T>(from: readonly T[]): T => from[Math.floor(next() * from.length)] as T,
    whole: (low: number, high: number): number => low + Math.floor(next() * (high - low + 1)),
  };
}
export type Random = ReturnType<typeof seededRandom>;
