/** Below this kL the closed form equals the straight line to double precision. */
const STRAIGHT = 1e-7;

const STEPS = 96;

export interface Sample {
  /** Distance from end A as a part of the length. */
  readonly part: number;
  readonly moment: number;
}

/**
 * Second-order moments along a pin-ended member with end moments, for drawing only:
 * M(z) = [MA sin k(L − z) + MB sin kz] / sin kL (Timoshenko and Gere, Theory of Elastic Stability,
 * 2nd ed., 1961, chapter 1). Null where kL is not between 0 and π: no stable solution exists.
 */
export function secondOrderSamples(endA: number, endB: number, kL: number): Sample[] | null {
  if (!(kL >= 0 && kL < Math.PI)) return null;
  return parts().map((part) => ({ part, moment: momentAt(endA, endB, kL, part) }));
}

export const firstOrderSamples = (endA: number, endB: number): Sample[] => [
  { part: 0, moment: endA },
  { part: 1, moment: endB },
];

function momentAt(endA: number, endB: number, kL: number, part: number): number {
  if (kL < STRAIGHT) return endA + (endB - endA) * part;
  return (endA * Math.sin(kL * (1 - part)) + endB * Math.sin(kL * part)) / Math.sin(kL);
}

const parts = (): number[] => Array.from({ length: STEPS + 1 }, (_, i) => i / STEPS);
