import { describe, expect, it } from 'vitest';
import type { Quantity } from '../../calc/quantity.ts';
import { createRecorder, type Recorder } from '../../calc/recorder.ts';
import type { DimensionName } from '../../units/dimension.ts';
import { firstOrderBeamLimit, firstOrderLateralLoad, unitKForSmallDrift } from './app7.ts';

const given = (r: Recorder, symbol: string, dimension: DimensionName, value: number): Quantity =>
  r.given(
    `given/${symbol}`,
    symbol,
    dimension,
    { value, text: String(value), source: { kind: 'typed' }, confirmed: false },
    { title: symbol },
  );

/*
 * A-7-3 by hand, Yi = 300, ASD, story of 168 in:
 *   drift 0.5 in: 2.1·1.6·(0.5/168)·300 = 3.0, above 0.0042·300 = 1.26
 *   drift 0.21 in: 2.1·1.6·0.00125·300 = 1.26, equal to the limit
 *   drift 0.1 in: 0.6, so 1.26
 */
describe('the additional lateral load of the first-order method', () => {
  for (const [Delta, Ni] of [
    [0.5, 3],
    [0.21, 1.26],
    [0.1, 1.26],
    [0, 1.26],
  ] as const)
    it(`drift ${Delta}: ${Ni}`, () => {
      const r = createRecorder('');
      const N = firstOrderLateralLoad(r, {
        alpha: given(r, 'alpha', 'none', 1.6),
        Delta: given(r, 'Delta', 'deflection', Delta),
        L: given(r, 'Lstory', 'length', 168),
        Yi: given(r, 'Yi', 'force', 300),
      });
      expect(N.value).toBeCloseTo(Ni, 12);
    });
});

// π²·200 000·1e8/10 000² = 1 973 920.9 N, of which 0.08 are 157 913.67 N; in ASD 98 696.04 N.
describe('the axial force in a beam of a moment frame', () => {
  for (const [alpha, Pr, within] of [
    [1, 157_913, true],
    [1, 157_914, false],
    [1.6, 98_696, true],
    [1.6, 98_697, false],
  ] as const)
    it(`α = ${alpha}, ${Pr} N: ${within}`, () => {
      const r = createRecorder('');
      const beam = {
        E: given(r, 'E', 'stress', 200_000),
        I: given(r, 'I', 'inertia', 1e8),
        L: given(r, 'L', 'length', 10_000),
      };
      const force = given(r, 'Pr', 'force', Pr);
      expect(firstOrderBeamLimit(r, given(r, 'alpha', 'none', alpha), force, beam)).toBe(within);
      const severities = r.lines.flatMap((l) => (l.kind === 'notice' ? [l.severity] : []));
      expect(severities).toEqual(within ? [] : ['outside scope']);
    });
});

describe('the effective length factor of a frame that hardly sways', () => {
  const factor = (ratio: number) => {
    const r = createRecorder('');
    return unitKForSmallDrift(r, 'K/x', given(r, 'ratio', 'none', ratio));
  };
  it('is 1 up to 1.1', () => expect(factor(1.1)).toMatchObject({ ref: 'K/x/K', value: 1 }));
  it('follows from a buckling analysis above', () => expect(factor(1.1001)).toBeNull());
});
