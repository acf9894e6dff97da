import { describe, expect, it } from 'vitest';
import { linesOf } from '../run-input.ts';
import { expectValue, runOne } from './one-member.ts';

/*
 * By hand, W14×99, 14 ft (strengths of Design Examples v16.0, H.1B, worked without rounding):
 * φPn = 1127.17515, φMnx = 642.163378, φMny = 311.372817 kip ft; moments of 250 and 80 kip ft from
 * the analysis: 250/642.163378 + 80/311.372817 = 0.389309 + 0.256927 = 0.646235759.
 */
const member = {
  section: 'W14X99',
  length: '14 ft',
  Lcx: '14 ft',
  Lcy: '14 ft',
  Lcz: '14 ft',
  Lb: '14 ft',
};
const analysis = { secondOrder: 'from-analysis', includesMemberEffect: true };
const run = (forces: Record<string, unknown>) => runOne({ analysis, member, forces });
const both = { MxMax: '250 kip ft', MyMax: '80 kip ft' };
const equation = (m: ReturnType<typeof run>) =>
  linesOf(m).get('c1:H1/ratio')?.clause?.equation ?? null;

describe('both sides of Pr/Pc = 0.2', () => {
  it('225 kip: 0.1996 < 0.2, H1-1b: 0.1996/2 + 0.646236 = 0.746043', () => {
    const m = run({ P: '225 kip', ...both });
    expect(equation(m)).toBe('H1-1b');
    expectValue(m, 'c1:H1/PrPc', '', 0.19961405292264878);
    expectValue(m, 'c1:H1/ratio', '', 0.7460427852082561);
  });
  it('226 kip: 0.2005 ≥ 0.2, H1-1a: 0.2005 + 8/9·0.646236 = 0.774933', () => {
    const m = run({ P: '226 kip', ...both });
    expect(equation(m)).toBe('H1-1a');
    expectValue(m, 'c1:H1/PrPc', '', 0.2005012264911939);
    expectValue(m, 'c1:H1/ratio', '', 0.7749330120440219);
  });
});

describe('one axis, or no axial force', () => {
  it('major only, H1-1b: 0.099807 + 0.389309', () =>
    expectValue(run({ P: '225 kip', MxMax: '250 kip ft' }), 'c1:H1/ratio', '', 0.489116051995136));
  it('minor only, H1-1b: 0.099807 + 0.256927', () =>
    expectValue(run({ P: '225 kip', MyMax: '80 kip ft' }), 'c1:H1/ratio', '', 0.35673375967444443));
  it('major only, H1-1a: 0.354869 + 8/9·0.389309', () =>
    expectValue(run({ P: '400 kip', MxMax: '250 kip ft' }), 'c1:H1/ratio', '', 0.7009218945592082));
  it('minor only, H1-1a: 0.354869 + 8/9·0.256927', () =>
    expectValue(run({ P: '400 kip', MyMax: '80 kip ft' }), 'c1:H1/ratio', '', 0.5832487458297045));
  it('no axial force: 0.389309 + 0.256927, and Chapter E is not applied', () => {
    const m = run({ P: '0 kip', ...both });
    expectValue(m, 'c1:H1/ratio', '', 0.6462357587469316);
    expect(linesOf(m).has('c1:H1/axial')).toBe(false);
    expect(linesOf(m).has('E1/Pc')).toBe(false);
  });
});

/*
 * H1-1b halves the axial term, so that a separate check of compression can be the largest: with
 * P = 225 kip and Mx = 1 kip ft: 0.099807 + 0.001557 = 0.101364 against 0.199614 for compression.
 */
describe('the separate checks', () => {
  it('the largest utilisation governs', () => {
    const m = run({ P: '225 kip', MxMax: '1 kip ft' });
    expectValue(m, 'c1:H1/ratio', '', 0.0998070264613 + 1 / 642.163378, 1e-8);
    expect(m.summary.governing).toMatchObject({
      address: 'c1:H1/axial',
      clause: { clause: 'E1' },
      combination: 'c1',
    });
    expect(m.summary.ratio).toBeCloseTo(0.19961405292264878, 12);
    expect(m.summary.ratioText).toBe('0.200');
  });
  it('minor-axis flexure above its strength is NOT OK, named', () => {
    // 320/311.372817 = 1.027707; with 1 kip of axial force H1-1b gives 0.000444 + 1.027707.
    const m = run({ P: '0 kip', MyMax: '320 kip ft' });
    expect(m.summary.verdict).toBe('NOT OK');
    expect(m.summary.ratio).toBeCloseTo(1.0277069, 6);
    expect(m.summary.governing?.address).toBe('c1:H1/y');
  });
});

/*
 * A limit met exactly: W10×33, φMny = 0.9·50·14.0/12 = 52.5 kip ft, whatever the units of the engine.
 */
describe('a strength used to the full', () => {
  it('is OK at 1', () => {
    const m = runOne({
      analysis,
      member: { section: 'W10X33', length: '14 ft' },
      forces: { P: '0 kip', MyMax: '52.5 kip ft' },
    });
    expect(m.summary).toMatchObject({ verdict: 'OK', ratio: 1, ratioText: '1.000' });
  });
  it('is NOT OK just above, and prints so', () => {
    const m = runOne({
      analysis,
      member: { section: 'W10X33', length: '14 ft' },
      forces: { P: '0 kip', MyMax: '52.501 kip ft' },
    });
    // 52.501/52.5 = 1.0000190
    expect(m.summary).toMatchObject({ verdict: 'NOT OK', ratioText: '1.00002' });
  });
});
