import { describe, it } from 'vitest';
import { expectValue, runOne } from './one-member.ts';

/*
 * By hand: five different lengths, so that taking one for another changes a number.
 * W8×31, A992, L = 30 ft, Lcx = 33 ft, Lcy = 15 ft, Lcz = 20 ft, Lb = 10 ft; P = 60 kip,
 * MA = 30, MB = 10 kip ft (ψ = 1/3), direct analysis, amplified.
 *   Lcx/rx = 396/3.47 = 114.121037, Fex = π²·29 000/114.121037² = 21.9768916 ksi
 *   Lcy/ry = 180/2.02 = 89.1089109, Fey = 36.0458685 ksi
 *   Fez = (π²·29 000·530/240² + 11 200·0.536)/(110 + 37.1) = 58.71385 ksi (Lcz > Lcy: E4 applies)
 *   Fe = 21.9769, 50/Fe = 2.2751 > 2.25: Fn = 0.877·Fe = 19.27374, Pn = 175.9692, φPn = 158.3723 kip
 *   Lp = 1.76·2.02·√580 = 85.62055 in, Lr = 297.4095 in, Lb = 120 in:
 *   Mn = 1520 − (1520 − 0.7·50·27.5)·(120 − 85.62055)/(297.4095 − 85.62055) = 1429.502 kip in, φMn = 107.2126 kip ft
 *   Pe1 with L = 360 in: π²·2 552 000/360² = 194.345914 kip, αPr/Pe1 = 0.308727870
 *   Cm = 0.6 + 0.4/3 = 0.733333, B1 = 0.733333/0.691272130 = 1.06084609, Mr = 31.8253826 kip ft
 *   kL = 1.74557210, Mmax = 33.7455924 kip ft at 98.0918264 in from A
 *   Pr/Pc = 0.3788541, H1-1a: 0.3788541 + 8/9·31.8253826/107.2126 = 0.6427151
 */
const given = {
  member: {
    section: 'W8X31',
    length: '30 ft',
    Lcx: '33 ft',
    Lcy: '15 ft',
    Lcz: '20 ft',
    Lb: '10 ft',
    endMomentSign: 'bending',
  },
  forces: { P: '60 kip', MxA: '30 kip ft', MxB: '10 kip ft' },
};

describe('five different lengths', () => {
  const m = runOne(given);
  it('compression takes Lcx, Lcy and Lcz', () => {
    expectValue(m, 'E2/x/slenderness', '', 114.121, 1e-5);
    expectValue(m, 'E2/y/slenderness', '', 89.10891, 1e-6);
    expectValue(m, 'E3/x/Fe', 'ksi', 21.97689, 1e-6);
    expectValue(m, 'E3/y/Fe', 'ksi', 36.04587, 1e-6);
    expectValue(m, 'E4/Fe', 'ksi', 58.71385, 1e-6);
    expectValue(m, 'E1/Pc', 'kip', 158.3723, 1e-6);
  });
  it('lateral-torsional buckling takes Lb', () => {
    expectValue(m, 'F2/LTB/Mn', 'kip in', 1429.502, 1e-6);
    expectValue(m, 'F1/x/Mc', 'kip ft', 107.2126, 1e-6);
  });
  it('the second-order moment takes L', () => {
    expectValue(m, 'c1:App8/x/Pe1', 'kip', 194.345913824);
    expectValue(m, 'c1:App8/x/Mr', 'kip ft', 31.8253825698);
    expectValue(m, 'c1:theory/x/kL', 'rad', 1.74557209636);
    expectValue(m, 'c1:theory/x/Mmax', 'kip ft', 33.7455924444);
    expectValue(m, 'c1:theory/x/zmax', 'in', 98.0918264351);
  });
  it('the interaction', () => expectValue(m, 'c1:H1/ratio', '', 0.6427151330662262));
});

/*
 * The same in ASD: Pa = 60/1.6 = 37.5 kip has the same αPr; strengths over 1.67:
 * Pn/Ω = 105.370786, Mn/Ω = 71.3324193 kip ft; MA = 30/1.6 = 18.75, MB = 6.25 kip ft, Mr = B1·18.75 = 19.8908641
 * 37.5/105.370786 + 8/9·19.8908641/71.3324193 = 0.355886 + 0.247863 = 0.603749
 */
describe('five different lengths, ASD', () => {
  it('takes α = 1.6 in stability and Ω = 1.67 in strength', () => {
    const m = runOne({
      ...given,
      design: 'ASD',
      forces: { P: '37.5 kip', MxA: '18.75 kip ft', MxB: '6.25 kip ft' },
    });
    expectValue(m, 'E1/Pc', 'kip', 105.37078627733072);
    expectValue(m, 'F1/x/Mc', 'kip ft', 71.33241933388679);
    expectValue(m, 'c1:App8/x/share', '', 0.308727869907);
    expectValue(m, 'c1:App8/x/Mr', 'kip ft', 18.75 * 1.06084608566);
    expectValue(
      m,
      'c1:H1/ratio',
      '',
      37.5 / 105.37078627733072 + ((8 / 9) * 18.75 * 1.06084608566) / 71.33241933388679,
    );
  });
});

/*
 * E4 governs where the torsional length exceeds the lateral one: W14×90, Lcx = Lcy = 15 ft, Lcz = 30 ft:
 *   Fez = (π²·29 000·16 000/360² + 11 200·4.06)/(999 + 362) = 59.37371 ksi, below Fey = 120.936 ksi
 *   Fn = 0.658^(50/59.37371)·50 = 35.14744, φPn = 0.9·35.14744·26.5 = 838.2665 kip (E3 alone: 1002 kip)
 */
describe('torsional buckling', () => {
  const lengths = (Lcz: string) => ({
    member: { section: 'W14X90', length: '15 ft', Lcx: '15 ft', Lcy: '15 ft', Lcz },
    forces: { P: '100 kip' },
  });
  it('governs with Lcz = 30 ft', () => {
    const m = runOne(lengths('30 ft'));
    expectValue(m, 'E4/Fe', 'ksi', 59.37371, 1e-6);
    expectValue(m, 'E3/Fe', 'ksi', 59.37371, 1e-6);
    expectValue(m, 'E1/Pc', 'kip', 838.2665, 1e-6);
  });
  it('is not applied with Lcz = Lcy', () =>
    expectValue(runOne(lengths('15 ft')), 'E3/Fe', 'ksi', 120.9362, 1e-6));
});
