/** Where the closed form has lost no digit yet and the series still needs few terms. */
const CLOSED_FROM = 10;

/**
 * Φₙ(x) = 1/n! − x/(n + 2)! + x²/(n + 4)! − …, n ≥ 0. With x = (kl)², Φ₀ = cos kl, Φ₁ = sin(kl)/kl,
 * Φ₂ = (1 − cos kl)/(kl)², Φ₃ = (kl − sin kl)/(kl)³; for negative x the same with cosh and sinh. Smooth
 * through x = 0, where the closed forms cancel. Known as the transfer functions of second-order
 * frame theory (H. Rubin) and of celestial mechanics (K. Stumpff, 1947); from memory.
 */
export function seriesFunction(n: number, x: number): number {
  if (!(Math.abs(x) <= CLOSED_FROM)) return closed(n, x);
  let term = 1;
  for (let i = 2; i <= n; i += 1) term /= i;
  let sum = 0;
  for (let j = n; sum + term !== sum; j += 2) {
    sum += term;
    term *= -x / ((j + 1) * (j + 2));
  }
  return sum;
}

/** By Φₙ₊₂ = (1/n! − Φₙ)/x from Φ₀ and Φ₁. */
function closed(n: number, x: number): number {
  const arc = Math.sqrt(Math.abs(x));
  if (n === 0) return x > 0 ? Math.cos(arc) : Math.cosh(arc);
  if (n === 1) return (x > 0 ? Math.sin(arc) : Math.sinh(arc)) / arc;
  let factorial = 1;
  for (let i = 2; i <= n - 2; i += 1) factorial *= i;
  return (1 / factorial - closed(n - 2, x)) / x;
}
