import { describe, expect, it } from 'vitest';
import { createRecorder } from '#shared/calc/recorder.ts';
import { belowCriticalLoad, multiplierB1 } from '#shared/standards/aisc360-22/app8.ts';
import { casesIn, near, number } from './elastic-theory-cases.ts';
import { type PlaneCase, solvePlane } from './plane.ts';
import { firstMember, linesOf, recordOf, valueAt } from './run-input.ts';

/*
 * Against numbers computed for this project with 40-digit arithmetic as a power-series solution of
 * EI y'''' + P y'' = q (each file says how), through the functions of the books, to 1e-9 relative.
 */
// A member to carry the cases that are given without dimensions.
const EI = 2.5e13;
const L = 5200;
const M2 = 64e6;
const P_E = (Math.PI ** 2 * EI) / L ** 2;

/** The same case with the larger moment at either end, bending to either side. */
const TURNS: readonly { readonly name: string; turn(psi: number): Pick<PlaneCase, 'MA' | 'MB'> }[] =
  [
    { name: 'larger at A', turn: (psi) => ({ MA: M2, MB: psi * M2 }) },
    { name: 'larger at B', turn: (psi) => ({ MA: psi * M2, MB: M2 }) },
    { name: 'larger at A, other side', turn: (psi) => ({ MA: -M2, MB: -psi * M2 }) },
  ];

const withoutAxialForce = (MA: number, MB: number) =>
  recordOf({
    format: 1,
    standard: 'aisc360-22',
    design: 'LRFD',
    units: 'si',
    analysis: { method: 'direct', secondOrder: 'exact', sway: 'none' },
    members: [
      {
        mark: 'no axial force',
        section: 'W14X99',
        material: 'A992',
        length: '5.2 m',
        ends: 'held',
        Lb: '5.2 m',
        Cb: 'auto',
        endMomentSign: 'bending',
        combinations: [{ name: 'M', P: '0 kN', MxA: `${MA / 1e6} kN m`, MxB: `${MB / 1e6} kN m` }],
      },
    ],
  });

describe('largest moment and equivalent moment factors', () => {
  for (const { id, inputs, expected } of casesIn('equivalent-moment'))
    for (const { name, turn } of TURNS)
      it(`${id}, ${name}`, () => {
        const { psi, P_over_Pe: rho } = inputs as { psi: number; P_over_Pe: number };
        const { MA, MB } = turn(psi);
        if (rho === 0) {
          // No axial force: the larger end moment is the largest one, the factors are not defined.
          const member = firstMember(withoutAxialForce(MA, MB));
          const check = linesOf(member).get('c1:H1/x');
          if (check?.kind !== 'check') throw new Error('no check');
          near(valueAt(member, `c1${check.demand}`) / M2, expected.Mmax_over_M2, 'Mmax/M2');
          near(valueAt(member, 'c1:F1/MB') / M2, expected.M_mid_over_M2, 'M(L/2)/M2');
          expect(linesOf(member).has('c1:theory/x/Mmax')).toBe(false);
          return;
        }
        const s = solvePlane({ EI, L, P: rho * P_E, MA, MB });
        near(s.found.kL.value, inputs.kL, 'kL');
        near(s.psi.value, psi === 0 ? 0 : psi, 'psi');
        near(s.found.Mmax.value / M2, expected.Mmax_over_M2, 'Mmax/M2');
        near(s.found.amplification.value, expected.Mmax_over_M2, 'amplification');
        near(s.valueAt('theory/x/Cmsec'), expected.Cm_sec, 'Cm with the secant');
        near(s.found.CmB1.value, expected.Cm_B1, 'Cm with 1/(1 − P/Pe)');
        near(s.quarters.MB4.value / M2, expected.M_mid_over_M2, 'M(L/2)/M2');
        expect(s.found.inSpan).toBe(expected.max_in_span === 'yes');
        if (!s.found.inSpan) {
          expect(s.found.zmax).toBeNull();
          expect(expected.xmax_over_L).toBe(0);
        } else {
          const x = number(expected.xmax_over_L) * L;
          near(s.found.zmax?.value ?? Number.NaN, s.ends.largerEnd === 'A' ? x : L - x, 'z');
          near(s.valueAt('theory/x/z2'), x, 'z from the end with M2');
        }
      });
});

describe('end moments with dimensions', () => {
  const cases = casesIn('end-moments').filter((c) => number(c.inputs.P_N) > 0);
  it('has the cases under compression', () => expect(cases).toHaveLength(6));
  for (const { id, inputs, expected } of cases)
    it(id, () => {
      const { E_MPa, I_mm4, L_mm, P_N, MA_Nmm, MB_Nmm } = inputs;
      const s = solvePlane({
        EI: number(E_MPa) * number(I_mm4),
        L: number(L_mm),
        P: number(P_N),
        MA: number(MA_Nmm),
        MB: number(MB_Nmm),
      });
      near(s.Pr.value / s.Pe1.value, expected.P_over_Pe, 'P/Pe');
      near(s.found.Mmax.value, expected.M_abs_max, 'Mmax');
      near(s.found.zmax?.value ?? Number.NaN, expected.x_M_abs_max, 'z of Mmax');
      // The quarter-point moments enter Cb by their size.
      near(s.quarters.MA4.value, Math.abs(number(expected['M_0.25L'])), 'M(L/4)');
      near(s.quarters.MB4.value, Math.abs(number(expected['M_0.5L'])), 'M(L/2)');
      near(s.quarters.MC4.value, Math.abs(number(expected['M_0.75L'])), 'M(3L/4)');
      // The joint sense of the same moments turns the sign at B.
      const joint = solvePlane({
        EI: number(E_MPa) * number(I_mm4),
        L: number(L_mm),
        P: number(P_N),
        MA: number(MA_Nmm),
        MB: -number(MB_Nmm),
        sense: 'joint',
      });
      near(joint.found.Mmax.value, expected.M_abs_max, 'Mmax, joint sense');
    });
});

describe('thresholds', () => {
  for (const { id, inputs, expected } of casesIn('thresholds'))
    it(id, () => {
      const psi = number(inputs.psi);
      const rho = number(expected.P_over_Pe_threshold);
      const at = (r: number) => solvePlane({ EI, L, P: r * P_E, MA: M2, MB: psi * M2 });
      near(at(rho).valueAt('theory/x/threshold'), expected.kL_threshold, 'arccos psi');
      expect(at(rho * (1 - 1e-9)).found.inSpan).toBe(false);
      expect(at(rho * (1 + 1e-9)).found.inSpan).toBe(true);
    });
});

describe('Cm = 0.6 + 0.4 psi and B1 beside the exact amplification', () => {
  for (const { id, inputs, expected } of casesIn('approximations'))
    for (const rho of [0.2, 0.4, 0.6, 0.8, 0.9])
      it(`${id} at P/Pe = ${rho}`, () => {
        const psi = number(inputs.psi);
        const s = solvePlane({ EI, L, P: rho * P_E, MA: M2, MB: psi * M2 });
        const B1 = multiplierB1(s.r, 'x', {
          alpha: s.alpha,
          Pr: s.Pr,
          Pe1: s.Pe1,
          psi: s.psi,
        });
        near(s.valueAt('App8/x/Cm'), expected.Cm_AISC, 'Cm');
        near(B1.value, expected[`B1_AISC_rho${rho}`], 'B1');
        near(s.found.amplification.value, expected[`B_exact_rho${rho}`], 'exact amplification');
      });
});

describe('at or above the critical load', () => {
  for (const { id, inputs } of casesIn('unstable'))
    it(`${id}: no second-order moment, a failed notice`, () => {
      const r = createRecorder('');
      const given = (name: string, dimension: 'none' | 'force', value: number) =>
        r.given(
          name,
          name,
          dimension,
          { value, text: '', source: { kind: 'typed' }, confirmed: false },
          { title: name },
        );
      const below = belowCriticalLoad(
        r,
        'x',
        given('alpha', 'none', 1),
        given('Pr', 'force', number(inputs.P_over_Pe) * P_E),
        given('Pe1', 'force', P_E),
      );
      expect(below).toBe(false);
      expect(r.lines.at(-1)).toMatchObject({ kind: 'notice', severity: 'failed' });
    });
});
