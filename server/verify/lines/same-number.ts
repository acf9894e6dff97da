/** What two numbers may differ by, as a share of the larger one, and be the same number. */
const ROUNDING = 5e-13;

/** Whether two values are equal in a comparison or a check: they differ by rounding only. */
export const sameNumber = (a: number, b: number): boolean =>
  a === b || Math.abs(a - b) <= ROUNDING * Math.max(Math.abs(a), Math.abs(b));
