import { describe, expect, it } from 'vitest';
import { placedLines } from '#shared/calc/address.ts';
import { closureProblems } from '#shared/calc/closure-problems.ts';
import { UNIT_SETS } from '#shared/units/unit-set.ts';
import { linesOf } from '../run-input.ts';
import { expectValue, runOne } from './one-member.ts';

/*
 * C2.3(b) by hand on the column of Design Examples v16.0, E.4A: W14×82, Ag = 24.0 in², Pns = 50·24.0 = 1200 kip.
 *   LRFD, 600 kip: 600/1200 = 0.5 ≤ 0.5: τb = 1 (the example: τb = 1.00)
 *   LRFD, 601 kip: 0.500833: τb = 4·0.500833·0.499167 = 0.99999722
 *   ASD, 400 kip: 1.6·400/1200 = 0.533333: τb = 4·0.533333·0.466667 = 0.99555556
 *     (the example interpolates 0.994 in Manual Table 4-13)
 *   ASD, 375 kip: exactly 0.5: τb = 1
 * EI*x = 0.8·τb·29 000·881: 20 439 200, 20 348 359.1 kip in².
 */
const member = {
  section: 'W14X82',
  length: '14 ft',
  Lcx: '14 ft',
  Lcy: '14 ft',
  Lcz: '14 ft',
  Lb: '14 ft',
  endMomentSign: 'bending',
};
const run = (design: 'LRFD' | 'ASD', P: string, method = 'direct') =>
  runOne({ design, analysis: { method }, member, forces: { P, MxA: '10 kip ft' } });

describe('τb', () => {
  it('LRFD, 600 kip', () => {
    const m = run('LRFD', '600 kip');
    expectValue(m, 'c1:C2/share', '', 0.5);
    expectValue(m, 'c1:C2/taub', '', 1);
    expect(linesOf(m).get('c1:C2/taub')?.clause?.equation).toBe('C2-2a');
    expectValue(m, 'c1:C2/x/EI', 'kip in²', 20439200);
    expect(closureProblems(placedLines(m), UNIT_SETS.us)).toEqual([]);
  });
  it('LRFD, 601 kip', () =>
    expectValue(run('LRFD', '601 kip'), 'c1:C2/taub', '', 0.9999972222222222));
  it('ASD, 400 kip', () => {
    const m = run('ASD', '400 kip');
    expectValue(m, 'c1:C2/taub', '', 0.9955555555555555);
    expectValue(m, 'c1:C2/x/EI', 'kip in²', 20348359.111111112);
  });
  it('ASD, 375 kip', () => expectValue(run('ASD', '375 kip'), 'c1:C2/taub', '', 1));
  it('effective length: nominal stiffness, no τb', () => {
    const m = run('LRFD', '601 kip', 'effective-length');
    expect(linesOf(m).has('c1:C2/taub')).toBe(false);
    // 29 000·881
    expectValue(m, 'c1:C2/x/EI', 'kip in²', 25549000);
  });
});

/*
 * Pns of a slender web uses Ae at Fn = Fy: W16×31, λr = 1.49·√580 = 35.8841, Fel = (1.31·35.8841/51.6)²·50 = 41.49672,
 * he = 14.19·(1 − 0.18·√(41.49672/50))·√(41.49672/50) = 10.80738, Ae = 9.13 − (14.19 − 10.80738)·0.275 = 8.199779,
 * Pns = 409.9889 kip (50·9.13 = 456.5).
 */
describe('Pns of a slender web', () => {
  it('takes the effective area at the yield stress', () => {
    const m = runOne({
      member: { section: 'W16X31', length: '5 ft', Lcx: '5 ft', Lcy: '5 ft', Lcz: '5 ft' },
      forces: { P: '10 kip' },
    });
    expectValue(m, 'C2/Pns', 'kip', 409.9889, 1e-6);
  });
});

/*
 * Slender flange: W12×65 in a steel of 100 ksi, 5 ft: λr = 0.56·√290 = 9.536456 < 9.92,
 * Fe = 725.1187, Fn = 0.658^(100/725.1187)·100 = 94.39127, limit 9.536456·√(100/94.39127) = 9.815696 < 9.92,
 * Fel = (1.49·9.536456/9.92)²·100 = 205.1744, be = 6·(1 − 0.22·√(Fel/Fn))·√(Fel/Fn) = 5.976771,
 * Ae = 19.1 − 4·(6 − 5.976771)·0.605 = 19.04378, φPn = 0.9·94.39127·19.04378 = 1617.810 kip.
 */
describe('slender flange in compression', () => {
  it('has an effective width on four half flanges', () => {
    const m = runOne({
      member: {
        section: 'W12X65',
        material: {
          name: 'strong',
          Fy: '100 ksi',
          source: { kind: 'assumption', basis: 'a slender flange needs it' },
        },
        length: '5 ft',
        Lcx: '5 ft',
        Lcy: '5 ft',
        Lcz: '5 ft',
      },
      forces: { P: '100 kip' },
    });
    expectValue(m, 'E7/flange/be', 'in', 5.976771, 1e-6);
    expectValue(m, 'E7/Ae', 'in²', 19.04378, 1e-6);
    expectValue(m, 'E1/Pc', 'kip', 1617.81, 1e-6);
  });
});
