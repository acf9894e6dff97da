import { describe, expect, it } from 'vitest';
import type { Quantity } from '../../calc/quantity.ts';
import { createRecorder, type Recorder } from '../../calc/recorder.ts';
import { CmEndMoments, CmTransverse, multiplierB1, multiplierB1Tension } from './app8-b1.ts';

const given = (r: Recorder, symbol: string, dimension: 'force' | 'none', value: number): Quantity =>
  r.given(
    `given/${symbol}`,
    symbol,
    dimension,
    { value, text: String(value), source: { kind: 'typed' }, confirmed: false },
    { title: symbol },
  );

const B1 = (Cm: number, Pr: number, alpha = 1) => {
  const r = createRecorder('');
  const quantity = multiplierB1(r, 'App8/x', {
    alpha: given(r, 'alpha', 'none', alpha),
    Pr: given(r, 'Pr', 'force', Pr),
    Pe1: given(r, 'Pe1', 'force', 1000),
    Cm: given(r, 'Cm', 'none', Cm),
  });
  return { r, quantity };
};

describe('Cm of end moments', () => {
  // A-8-4 by hand, M1/M2 = −ψ: 0.6 − 0.4·(−0.5) = 0.8; reverse curvature 0.6 − 0.4·1 = 0.2.
  for (const [psi, Cm] of [
    [0.5, 0.8],
    [-1, 0.2],
    [1, 1],
  ] as const)
    it(`ψ = ${psi}: ${Cm}`, () => {
      const r = createRecorder('');
      const found = CmEndMoments(r, 'App8/x', given(r, 'psi', 'none', psi));
      expect(found.value).toBeCloseTo(Cm, 15);
      expect(found.ref).toBe('App8/x/Cm');
    });
});

/*
 * Commentary Table C-A-8.1 by hand at αPr = 1.6·150 = 240 of 1000 kN, both ends fixed, uniform load:
 *   Cm = 1 − 0.4·0.24 = 0.904, B1 = 0.904/(1 − 0.24) = 1.189473684
 * one end fixed, load at midspan: Cm = 1 − 0.3·0.24 = 0.928, B1 = 0.928/0.76 = 1.221052632
 * no row chosen: Cm = 1, B1 = 1/0.76 = 1.315789474
 */
describe('Cm with load between the supports', () => {
  for (const [row, Cm, multiplier] of [
    ['fixed-uniform', 0.904, 1.189473684],
    ['fixed-pinned-central', 0.928, 1.221052632],
    [null, 1, 1.315789474],
  ] as const)
    it(`${row ?? 'no row'}: Cm = ${Cm}, B1 = ${multiplier}`, () => {
      const r = createRecorder('');
      const found = CmTransverse(r, 'App8/y', row, given(r, 'rho', 'none', 0.24));
      expect(found.value).toBeCloseTo(Cm, 14);
      expect(B1(found.value, 150, 1.6).quantity.value).toBeCloseTo(multiplier, 9);
      const notes = r.lines.filter((l) => l.kind === 'notice').map((l) => l.key);
      expect(notes).toEqual(row === null ? [] : ['App8/y/Cm/ends']);
    });
  it('names the row of the table on the line', () => {
    const r = createRecorder('');
    CmTransverse(r, 'App8/x', 'simple-uniform', given(r, 'rho', 'none', 0.24));
    expect(r.lines.at(-1)?.title).toMatch(/Table C-A-8.1: both ends simply supported, uniform/);
  });
});

describe('B1', () => {
  it('stands as computed from 1 upwards', () => {
    // 0.5/(1 − 0.5) = 1 exactly.
    const { r, quantity } = B1(0.5, 500);
    expect(quantity.ref).toBe('App8/x/B1/trial');
    expect(r.lines.map((l) => l.key)).not.toContain('App8/x/B1');
  });
  it('is 1 below', () => {
    // 0.499/(1 − 0.5) = 0.998.
    const { quantity } = B1(0.499, 500);
    expect(quantity).toMatchObject({ ref: 'App8/x/B1', value: 1 });
  });
  it('is no number at the critical load', () => {
    expect(() => B1(1, 1000)).toThrow(/critical load/);
    expect(() => B1(1, 625, 1.6)).toThrow(/critical load/);
    expect(B1(1, 624, 1.6).quantity.value).toBeGreaterThan(600);
  });
  it('is 1 in tension', () =>
    expect(multiplierB1Tension(createRecorder(''), 'App8/x')).toMatchObject({
      ref: 'App8/x/B1',
      value: 1,
    }));
});
