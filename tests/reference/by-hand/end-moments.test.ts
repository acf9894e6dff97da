import { describe, expect, it } from 'vitest';
import { inUnit } from '../in-unit.ts';
import { demandOf, expectValue, outcomeAt, runOne } from './one-member.ts';

/*
 * By hand (a second time with Python's floats). W8×31, L = 30 ft = 360 in, A992, P = 170 kip;
 * Ix = 110 in⁴, E = 29 000 ksi. MA = 100, MB = −50 kip ft in the bending sense: reverse curvature,
 * ψ = M1/M2 = −0.5, in the sense of Appendix 8 M1/M2 = +0.5.
 *
 * Effective length method, EI* = 29 000·110 = 3 190 000 kip in²:
 *   Pe1 = π²·3 190 000/360² = 242.932392 kip, αPr/Pe1 = 0.699783172
 *   Cm = 0.6 − 0.4·0.5 = 0.4, B1 = 0.4/(1 − 0.699783172) = 1.33237035, Mr = 133.237035 kip ft
 *   k = √(170/3 190 000) = 0.00730010521 /in, kL = 2.62803787, arccos(−0.5) = 2.09439510 < kL: in the span
 *   Mmax = 100·√(1 + cos kL + 0.25)/sin kL = 125.311656 kip ft
 *   at z = atan2(−0.5 − cos kL, sin kL)/k = 88.6028166 in from the end with 100 kip ft
 * (with the sign lost, ψ = +0.5: B1 = 2.665, Mmax = 296.4 kip ft at 168.0 in).
 *
 * Direct analysis, EI* = 0.8·1.0·29 000·110 = 2 552 000 kip in² (αPr/Pns = 170/456.5 = 0.372 ≤ 0.5):
 *   Pe1 = 194.345914 kip, αPr/Pe1 = 0.874728965, B1 = 0.4/0.125271035 = 3.19307651, Mr = 319.307651 kip ft
 *   kL = 2.93823567, Mmax = 257.576927 kip ft at 143.606466 in.
 */
const member = {
  section: 'W8X31',
  length: '30 ft',
  Lcx: '30 ft',
  Lcy: '30 ft',
  Lcz: '30 ft',
  Lb: '30 ft',
};
const METHODS = {
  'effective-length': {
    EI: 3190000,
    Pe1: 242.93239228,
    share: 0.699783171789,
    B1: 1.3323703484,
    Mr: 133.23703484,
    kL: 2.62803787494,
    Mmax: 125.311656365,
    z: 88.6028166046,
    CmSecant: 0.318247652483,
    CmB1: 0.376206680117,
  },
  direct: {
    EI: 2552000,
    Pe1: 194.345913824,
    share: 0.874728964737,
    B1: 3.19307650934,
    Mr: 319.307650934,
    kL: 2.9382356679,
    Mmax: 257.576926906,
    z: 143.60646562,
    CmSecant: 0.261449293611,
    CmB1: 0.322669282934,
  },
} as const;

const TURNS = [
  { name: 'MA = 100, MB = −50, bending sense', A: 100, B: -50, sign: 'bending', fromA: true },
  { name: 'the ends swapped', A: -50, B: 100, sign: 'bending', fromA: false },
  { name: 'the other way round', A: -100, B: 50, sign: 'bending', fromA: true },
  // Joint sense: equal signs turn both ends the same way around, which is reverse curvature.
  { name: 'MA = 100, MB = 50, joint sense', A: 100, B: 50, sign: 'joint', fromA: true },
  { name: 'MA = −50, MB = −100, joint sense', A: -50, B: -100, sign: 'joint', fromA: false },
] as const;

for (const [method, hand] of Object.entries(METHODS))
  for (const design of ['LRFD', 'ASD'] as const)
    describe(`M1/M2 = +0.5 of Appendix 8, ${method}, ${design}`, () => {
      // ASD: α = 1.6, so that 170/1.6 = 106.25 kip stands for the same αPr.
      const P = design === 'LRFD' ? '170 kip' : '106.25 kip';
      for (const turn of TURNS)
        it(turn.name, () => {
          const m = runOne({
            design,
            analysis: { method },
            member: { ...member, endMomentSign: turn.sign },
            forces: { P, MxA: `${turn.A} kip ft`, MxB: `${turn.B} kip ft` },
          });
          expectValue(m, 'c1:theory/x/psi', '', -0.5);
          expect(outcomeAt(m, 'c1:theory/x/curvature')).toBe('reverse curvature');
          expectValue(m, 'c1:App8/x/M1M2', '', 0.5);
          expectValue(m, 'c1:App8/x/Cm', '', 0.4);
          expectValue(m, 'c1:C2/x/EI', 'kip in²', hand.EI);
          expectValue(m, 'c1:App8/x/Pe1', 'kip', hand.Pe1);
          expectValue(m, 'c1:App8/x/share', '', hand.share);
          expectValue(m, 'c1:App8/x/B1/trial', '', hand.B1);
          expectValue(m, 'c1:App8/x/Mr', 'kip ft', hand.Mr);
          expectValue(m, 'c1:theory/x/kL', 'rad', hand.kL);
          expectValue(m, 'c1:theory/x/Mmax', 'kip ft', hand.Mmax);
          expectValue(m, 'c1:theory/x/zmax', 'in', turn.fromA ? hand.z : 360 - hand.z);
          expectValue(m, 'c1:theory/x/Cmsec', '', hand.CmSecant);
          expectValue(m, 'c1:theory/x/CmB1', '', hand.CmB1);
          // Amplified: the standard's moment is what the check takes.
          expect(inUnit(demandOf(m, 'c1:H1/x'), 'kip ft')).toBeCloseTo(hand.Mr, 6);
        });
    });

/*
 * Minor axis: Iy = 37.1 in⁴, P = 50 kip, MA = 20, MB = −10 kip ft, effective length method:
 *   Pe1 = π²·29 000·37.1/360² = 81.9344705 kip, αPr/Pe1 = 0.610243768, B1 = 0.4/0.389756232 = 1.02628250
 *   kL = 2.45415252, Mmax = 21.7707691 kip ft at 59.5728841 in from A.
 */
describe('minor axis only', () => {
  const m = runOne({
    analysis: { method: 'effective-length' },
    member: { ...member, endMomentSign: 'bending' },
    forces: { P: '50 kip', MyA: '20 kip ft', MyB: '-10 kip ft' },
  });
  it('takes the minor axis everywhere', () => {
    expectValue(m, 'c1:App8/y/Pe1', 'kip', 81.9344704871);
    expectValue(m, 'c1:App8/y/B1/trial', '', 1.0262824996);
    expectValue(m, 'c1:App8/y/Mr', 'kip ft', 20.525649992);
    expectValue(m, 'c1:theory/y/Mmax', 'kip ft', 21.7707691345);
    expectValue(m, 'c1:theory/y/zmax', 'in', 59.5728840606);
  });
  it('has no line of major-axis flexure', () => {
    const keys = [...m.lines, ...(m.combinations[0]?.lines ?? [])].map((l) => l.key);
    expect(keys.filter((k) => /^(theory\/x|App8\/x|F2\/|H1\/x|F1\/x)/.test(k))).toEqual([]);
  });
});
