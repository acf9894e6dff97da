import fc from 'fast-check';
import { test } from 'vitest';
import { seriesFunction } from '#shared/expr/series-functions.ts';
import { assertProperty } from './assert-property.ts';

/* Φₙ is summed for small x and closed for large: both sides meet, and every x keeps the recurrence. */
const order = fc.nat(5);
const relation = (n: number, x: number) => {
  const [low, high] = [seriesFunction(n, x), seriesFunction(n + 2, x)];
  const factorial = [1, 1, 2, 6, 24, 120][n] as number;
  // Φₙ + x Φₙ₊₂ = 1/n!, from the series term by term.
  const scale = Math.max(Math.abs(low), Math.abs(x * high), 1 / factorial);
  return Math.abs(low + x * high - 1 / factorial) / scale;
};
const fault = (text: string, input: unknown) => [{ text, input }];

test('every Φ keeps its recurrence', () => {
  const values = fc.record({ n: order, x: fc.double({ min: -90, max: 90, noNaN: true }) });
  assertProperty(values, { seed: 71, runs: 2000 }, ({ n, x }) =>
    relation(n, x) < 1e-12 ? [] : fault(`Φ${n}(${x}) is off by ${relation(n, x)}`, { n, x }),
  );
});

test('no Φ jumps, wherever its form changes', () => {
  const values = fc.record({ n: order, x: fc.double({ min: -12, max: 12, noNaN: true }) });
  const STEP = 1e-9;
  const slope = (n: number, x: number) =>
    Math.abs(seriesFunction(n, x) - seriesFunction(n, x + STEP));
  const faults = ({ n, x }: { n: number; x: number }) =>
    slope(n, x) < 3 * STEP ? [] : fault(`Φ${n} jumps by ${slope(n, x)} at ${x}`, { n, x });
  assertProperty(values, { seed: 72, runs: 2000 }, faults);
  const at = fc.record({ n: order, x: fc.constantFrom(-10 - STEP / 2, 10 - STEP / 2, -STEP / 2) });
  assertProperty(at, { seed: 73, runs: 50 }, faults);
});
