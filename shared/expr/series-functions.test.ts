import { describe, expect, it } from 'vitest';
import { seriesFunction } from './series-functions.ts';

const near = (value: number, exact: number) =>
  expect(Math.abs(value / exact - 1), `${value}, exact ${exact}`).toBeLessThan(1e-14);

// Digits of cos 1, sin 1, cosh 1, sinh 1: OEIS A049470, A049469, A073743, A073742.
describe('Φₙ', () => {
  it('is 1/n! at zero', () => {
    expect([0, 1, 2, 3, 4, 5].map((n) => seriesFunction(n, 0))).toEqual(
      [1, 1, 1 / 2, 1 / 6, 1 / 24, 1 / 120].map((v) => expect.closeTo(v, 16)),
    );
  });
  it('has circular closed forms at 1 and hyperbolic ones at −1', () => {
    near(seriesFunction(0, 1), 0.5403023058681398);
    near(seriesFunction(1, 1), 0.8414709848078965);
    near(seriesFunction(2, 1), 1 - 0.5403023058681398);
    near(seriesFunction(3, 1), 1 - 0.8414709848078965);
    near(seriesFunction(4, 1), 0.5403023058681398 - 0.5);
    near(seriesFunction(2, -1), 0.5430806348152438);
    near(seriesFunction(3, -1), 0.17520119364380146);
    near(seriesFunction(4, -1), 0.04308063481524378);
  });
  // Φ₂(π²) = 2/π², Φ₄(π²) = (1/2 − 2/π²)/π²; at (2π)²: Φ₃ = 1/(2π)², Φ₅ = (1/6 − 1/(2π)²)/(2π)².
  it('is known where the sine vanishes, on either side of the change to closed forms', () => {
    const square = Math.PI ** 2;
    near(seriesFunction(2, square), 2 / square);
    near(seriesFunction(4, square), (0.5 - 2 / square) / square);
    near(seriesFunction(3, 4 * square), 1 / (4 * square));
    near(seriesFunction(5, 4 * square), (1 / 6 - 1 / (4 * square)) / (4 * square));
    for (const n of [0, 1, 2, 3, 4, 5])
      for (const x of [10, -10]) near(seriesFunction(n, x), seriesFunction(n, x * (1 + 2 ** -52)));
  });
  it('has no value where its argument has none', () => {
    expect(seriesFunction(3, Number.NaN)).toBeNaN();
  });
});
