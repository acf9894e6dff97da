import { describe, expect, it } from 'vitest';
import type { Quantity } from '../../calc/quantity.ts';
import { createRecorder, type Recorder } from '../../calc/recorder.ts';
import type { DimensionName } from '../../units/dimension.ts';
import { multiplierB2, requiredAxial, requiredMoment, type StoryStrength } from './app8-b2.ts';
import type { StabilityMethod } from './c2.ts';

const given = (r: Recorder, symbol: string, dimension: DimensionName, value: number): Quantity =>
  r.given(
    `given/${symbol}`,
    symbol,
    dimension,
    { value, text: String(value), source: { kind: 'typed' }, confirmed: false },
    { title: symbol },
  );

const solve = (
  Pstory: number,
  strength: (r: Recorder) => StoryStrength,
  method: StabilityMethod = 'direct',
  alpha = 1,
) => {
  const r = createRecorder('');
  const B2 = multiplierB2(r, 'App8/x', {
    alpha: given(r, 'alpha', 'none', alpha),
    Pstory: given(r, 'Pstory', 'force', Pstory),
    strength: strength(r),
    method,
  });
  return { r, B2, value: typeof B2 === 'string' ? B2 : B2.value };
};
const known = (r: Recorder): StoryStrength => ({ Pestory: given(r, 'Pestory', 'force', 1000) });
const drift =
  (Pmf: number | 'lower bound' | 'braced') =>
  (r: Recorder): StoryStrength => ({
    RM: typeof Pmf === 'number' ? { Pmf: given(r, 'Pmf', 'force', Pmf) } : Pmf,
    H: given(r, 'Hstory', 'force', 20),
    L: given(r, 'Lstory', 'length', 4000),
    DeltaH: given(r, 'DeltaH', 'deflection', 16),
  });
const severities = (r: Recorder): string[] =>
  r.lines.flatMap((l) => (l.kind === 'notice' ? [l.severity] : []));

/*
 * By hand, a story of 4 m that drifts 16 mm under 20 kN: H L/ΔH = 20·4000/16 = 5000.
 *   no moment frames: Pe,story = 5000, B2 at 1000 = 1/(1 − 0.2) = 1.25
 *   RM = 0.85: 4250, B2 = 1/(1 − 1000/4250) = 1.307692308
 *   moment frames carry 400 of 1000: RM = 1 − 0.15·0.4 = 0.94, 4700, B2 = 1/(1 − 1000/4700) = 1.270270270
 *   the same in ASD: 1/(1 − 1.6·1000/4700) = 1.516129032
 */
describe('B2', () => {
  for (const [Pmf, alpha, B2] of [
    ['braced', 1, 1.25],
    ['lower bound', 1, 1.307692308],
    [400, 1, 1.27027027],
    [400, 1.6, 1.516129032],
  ] as const)
    it(`from the drift, ${Pmf}, α = ${alpha}: ${B2}`, () => {
      const { value, r } = solve(1000, drift(Pmf), 'direct', alpha);
      expect(value).toBeCloseTo(B2, 9);
      expect(severities(r)).toEqual([]);
    });
  it('from a given strength of the story', () =>
    expect(solve(200, known).value).toBeCloseTo(1.25, 14));
  it('is 1 under uplift', () => {
    const { B2 } = solve(-100, known);
    expect(B2).toMatchObject({ ref: 'App8/x/B2', value: 1 });
  });
  it('is no number at the critical strength of the story', () => {
    for (const [Pstory, alpha] of [
      [1000, 1],
      [1200, 1],
      [625, 1.6],
    ] as const) {
      const { value, r } = solve(Pstory, known, 'direct', alpha);
      expect(value).toBe('failed');
      expect(severities(r)).toEqual(['failed']);
      expect(r.lines.map((l) => l.key)).not.toContain('App8/x/B2/trial');
    }
  });
  it('is no number where frames carry more than the story', () => {
    const { value, r } = solve(1000, drift(1001));
    expect(value).toBe('failed');
    expect(severities(r)).toEqual(['failed']);
    expect(solve(1000, drift(1000)).value).toBeCloseTo(1 / (1 - 1000 / 4250), 12);
  });
});

// 1/(1 − 333/1000) = 1.49925, 1/(1 − 334/1000) = 1.50150; 1/(1 − 411/1000) = 1.69779, 412: 1.70068.
describe('B2 against the limit of the method', () => {
  for (const [method, Pstory, state, notices] of [
    ['effective-length', 333, 'number', []],
    ['effective-length', 334, 'outside scope', ['outside scope']],
    ['first-order', 333, 'number', []],
    ['first-order', 334, 'outside scope', ['outside scope']],
    ['direct', 411, 'number', []],
    ['direct', 412, 'number', ['caution']],
  ] as const)
    it(`${method}, ${Pstory}: ${state}, ${notices.join()}`, () => {
      const { value, r } = solve(Pstory, known, method);
      expect(typeof value === 'number' ? 'number' : value).toBe(state);
      expect(severities(r)).toEqual(notices);
    });
});

describe('required strengths with sway', () => {
  // 500 + 1.2·(−100) = 380; 100 + 1.2·(−150) = −80, tension.
  for (const [Pnt, Plt, Pr] of [
    [500, -100, 380],
    [100, -150, -80],
  ] as const)
    it(`Pnt = ${Pnt}, Plt = ${Plt}: ${Pr}`, () => {
      const r = createRecorder('');
      const force = (symbol: 'Pnt' | 'Plt', value: number) => given(r, symbol, 'force', value);
      const B2 = given(r, 'B2', 'none', 1.2);
      const found = requiredAxial(r, force('Pnt', Pnt), force('Plt', Plt), B2);
      expect(found).toMatchObject({ ref: 'App8/Pr', value: Pr });
    });
  it('add the sizes of the two moments, whatever their signs: 1.1·50 + 1.2·40 = 103', () => {
    const r = createRecorder('');
    const number = (symbol: 'B1' | 'B2', value: number) => given(r, symbol, 'none', value);
    const found = requiredMoment(
      r,
      'y',
      number('B1', 1.1),
      given(r, 'Mnt', 'moment', 50),
      number('B2', 1.2),
      given(r, 'Mlt', 'moment', -40),
    );
    expect(found.ref).toBe('App8/y/Mr');
    expect(found.value).toBeCloseTo(103, 12);
  });
});
