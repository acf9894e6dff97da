import { describe, expect, it } from 'vitest';
import { linesOf } from '../run-input.ts';
import { expectValue, runOne } from './one-member.ts';

/*
 * By hand, F1-1 over a straight first-order diagram. The three textbook values are those of the
 * Commentary to F1: uniform 1.0, one end without moment 1.67, reverse and equal 2.27.
 *   MA = 100, MB = 100: quarter points 100, 100, 100: 12.5/(2.5 + 3 + 4 + 3) = 1
 *   MA = 100, MB = 0: 75, 50, 25: 1250/(250 + 225 + 200 + 75) = 1.6666667
 *   MA = 100, MB = −100: 50, 0, −50: 1250/(250 + 150 + 0 + 150) = 2.2727273
 *   MA = 100, MB = −50: 62.5, 25, −12.5: 1250/(250 + 187.5 + 100 + 37.5) = 2.1739130
 */
const member = {
  section: 'W8X31',
  length: '30 ft',
  Lcx: '30 ft',
  Lcy: '30 ft',
  Lcz: '30 ft',
  Lb: '30 ft',
  Cb: 'auto',
  endMomentSign: 'bending',
};
const analysis = { method: 'effective-length' };

describe('Cb "auto", first order', () => {
  for (const [A, B, Cb] of [
    [100, 100, 1],
    [100, 0, 5 / 3],
    [0, 100, 5 / 3],
    [100, -100, 25 / 11],
    [100, -50, 50 / 23],
    [-50, 100, 50 / 23],
  ] as const)
    it(`MA = ${A}, MB = ${B}: ${Cb.toFixed(4)}`, () => {
      const forces = { MxA: `${A} kip ft`, MxB: `${B} kip ft` };
      const free = runOne({ analysis, member, forces: { P: '0 kip', ...forces } });
      expectValue(free, 'c1:F1/Cb', '', Cb, 1e-12);
      // Amplified moments: the first-order diagram decides with axial force as well.
      const pressed = runOne({ analysis, member, forces: { P: '20 kip', ...forces } });
      expectValue(pressed, 'c1:F1/Cb', '', Cb, 1e-12);
    });
});

/*
 * Second order (W8×31, 30 ft, P = 170 kip, effective length method, MA = 100, MB = −50 kip ft):
 * M(z) = [MA sin k(L − z) + MB sin kz]/sin kL at kL = 2.62803787:
 * 125.305138 at L/4, 98.4387908 at L/2, 30.5869097 at 3L/4 kip ft, largest 125.311656:
 * Cb = 12.5·125.311656/(2.5·125.311656 + 3·125.305138 + 4·98.4387908 + 3·30.5869097) = 1.33343132
 * Elastic buckling at Lb = 360 in: Fcr = Cb·27.85016 = 37.13628 ksi, Mn = 37.13628·27.5 = 1021.248 kip in,
 * φMn = 76.59357 kip ft; with the first-order 2.1739: above 0.7Fy·Sx, capped by flange local buckling 1518.567.
 */
describe('Cb "auto", second order', () => {
  const forces = { P: '170 kip', MxA: '100 kip ft', MxB: '-50 kip ft' };
  it('exact: from the second-order diagram', () => {
    const m = runOne({ analysis: { ...analysis, secondOrder: 'exact' }, member, forces });
    expectValue(m, 'c1:F1/MA', 'kip ft', 125.305138238);
    expectValue(m, 'c1:F1/MB', 'kip ft', 98.4387908183);
    expectValue(m, 'c1:F1/MC', 'kip ft', 30.5869097195);
    expectValue(m, 'c1:F1/Cb', '', 1.333431321009966);
    expectValue(m, 'c1:F1/x/Mc', 'kip ft', 76.59357, 1e-6);
  });
  it('swapped ends: quarter points the other way round, the same factor', () => {
    const m = runOne({
      analysis: { ...analysis, secondOrder: 'exact' },
      member,
      forces: { P: '170 kip', MxA: '-50 kip ft', MxB: '100 kip ft' },
    });
    expectValue(m, 'c1:F1/MA', 'kip ft', 30.5869097195);
    expectValue(m, 'c1:F1/MC', 'kip ft', 125.305138238);
    expectValue(m, 'c1:F1/Cb', '', 1.333431321009966);
  });
  it('amplified: first order used, the lower second-order value beside it with a caution', () => {
    const m = runOne({ analysis, member, forces });
    expectValue(m, 'c1:F1/Cb', '', 50 / 23, 1e-12);
    expectValue(m, 'c1:F1/second/Cb', '', 1.333431321009966);
    expectValue(m, 'c1:F1/x/Mc', 'kip ft', 113.8925, 1e-6);
    expect(linesOf(m).get('c1:F1/lower')).toMatchObject({
      kind: 'notice',
      severity: 'caution',
      code: 'second-order-cb-lower',
    });
  });
  it('is 1 where the unbraced segment is not the member, or the diagram is not known', () => {
    expectValue(
      runOne({ analysis, member: { ...member, Lb: '10 ft' }, forces }),
      'c1:F1/Cb',
      '',
      1,
    );
    expectValue(
      runOne({
        analysis: { ...analysis, secondOrder: 'from-analysis', includesMemberEffect: true },
        member,
        forces: { ...forces, MxMax: '125 kip ft' },
      }),
      'c1:F1/Cb',
      '',
      1,
    );
  });
});
