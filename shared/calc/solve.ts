/**
 * Root of `f` between `low` and `high` by bisection to the last bit; null when the ends don't have
 * opposite signs or `f` isn't finite there.
 */
export function solveBracketed(f: (x: number) => number, low: number, high: number): number | null {
  let [a, b] = [low, high];
  const [fa, fb] = [f(a), f(b)];
  if (fa === 0) return a;
  if (fb === 0) return b;
  if (!Number.isFinite(fa) || !Number.isFinite(fb) || fa > 0 === fb > 0) return null;
  const rising = fb > 0;
  for (;;) {
    const middle = a + (b - a) / 2;
    if (middle <= Math.min(a, b) || middle >= Math.max(a, b))
      return Math.abs(f(a)) < Math.abs(f(b)) ? a : b;
    const value = f(middle);
    if (value === 0) return middle;
    if (value > 0 === rising) b = middle;
    else a = middle;
  }
}
