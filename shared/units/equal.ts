/** Share of the larger of two values below which their difference is rounding. */
const ROUNDING = 5e-13;

/**
 * Whether two values are the same number. Two that are given in one unit with up to 12 digits differ
 * by more than this, or not at all; what differs by less does so by conversion and computation. No
 * given number is rounded for it. Differences settle at zero, and comparisons and checks are decided,
 * by this one rule; what it tells apart is told apart by 14 printed digits.
 */
export const areEqual = (a: number, b: number): boolean =>
  a === b || isRounding(a - b, Math.max(Math.abs(a), Math.abs(b)));

/** Whether what is left of terms, of which the largest has that size, is their rounding. */
export const isRounding = (left: number, largest: number): boolean =>
  Math.abs(left) <= ROUNDING * largest;
