import { describe, expect, it } from 'vitest';
import { parseInput } from './parse-input.ts';
import { runCalculation } from './run.ts';

/** A W14×90 under an axial force, with and without loads that cancel each other. */
function ratioOf(secondOrder: string, loads: readonly object[], more: object = {}): number | null {
  const parsed = parseInput({
    ...{ format: 1, standard: 'aisc360-22', design: 'LRFD', units: 'si' },
    analysis: { method: 'direct', secondOrder, includesMemberEffect: true, sway: 'none' },
    members: [
      {
        ...{ mark: 'A', section: 'W14X90', material: 'A992', length: '6 m', ends: 'held' },
        ...{ Lcx: '6 m', Lcy: '6 m', Lcz: '6 m', Lb: '6 m', Cb: 'auto', endMomentSign: 'bending' },
        combinations: [
          {
            ...{ name: 'one', P: '500 kN', loads, ...more },
            ...{ MxA: '0 kN m', MxB: '0 kN m', MyA: '0 kN m', MyB: '0 kN m' },
          },
        ],
      },
    ],
  });
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  return runCalculation(parsed.input).summary.ratio;
}

const uniform = (w: string) => ({ kind: 'uniform', bends: 'x', height: 'centre', w });
const point = (W: string) => ({ kind: 'point', bends: 'x', height: 'centre', at: '2 m', W });

// Statics: loads of which the sum is zero at every place bend nothing.
describe.each(['amplified', 'exact'])('loads that cancel each other, %s', (secondOrder) => {
  it.each([
    ['uniform', [uniform('62 kN/m'), uniform('-62 kN/m')]],
    ['point', [point('0.1 kN'), point('0.2 kN'), point('-0.3 kN')]],
  ])('%s: the utilisation is that of the axial force', (_, loads) => {
    const alone = ratioOf(secondOrder, []);
    expect(alone).toBeGreaterThan(0.05);
    expect(ratioOf(secondOrder, loads)).toBe(alone);
  });
});

describe('an analysis that gives a largest moment beside loads that cancel', () => {
  it('uses the given one', () => {
    const given = { MxMax: '100 kN m' };
    const loads = [uniform('62 kN/m'), uniform('-62 kN/m')];
    const ratio = ratioOf('from-analysis', loads, given);
    expect(ratio).toBeGreaterThan(ratioOf('from-analysis', []) ?? Number.POSITIVE_INFINITY);
  });
});
