import { describe, it } from 'vitest';
import { expectValue, runOne } from './one-member.ts';

/*
 * W18×50 (Ix = 800 in⁴, AISC Shapes Database v15.0) of L = 20 ft under w = 2 kip/ft, a pin at A and a
 * spring at B. By slope and deflection (any textbook of structural analysis)
 *   MB = −(wL²/8)·k/(k + 3EI/L), so that with k = 3(0.8EI)/L
 *   direct analysis, 0.8EI of ANSI/AISC 360-22 C2.3(a) with τb = 1 by (b) without compression:
 *     MB = −wL²/16 = −2·20²/16 = −50 kip ft; VA = 20 − 50/20 = 17.5 kip; Mmax = 17.5²/(2·2) = 76.5625
 *   effective length method, EI whole (App. 7.2.2):
 *     MB = −100·0.8/1.8 = −400/9 kip ft.
 * k = 3·0.8·29000·800/(20·12) = 232 000 kip in/rad = 19 333.3333 kip ft/rad.
 */
const beam = (method: string, P: string) =>
  runOne({
    analysis: { method, secondOrder: 'exact' },
    member: {
      ...{ section: 'W18X50', length: '20 ft', ends: 'springs', endMomentSign: 'bending' },
      springs: { xA: '0 kip ft/rad', xB: '19333.3333333333 kip ft/rad' },
      ...{ Lcx: '20 ft', Lcy: '20 ft', Lcz: '20 ft', Lb: '20 ft' },
    },
    forces: {
      ...{ P, MxA: '0 kip ft', MxB: '0 kip ft', MyA: '0 kip ft', MyB: '0 kip ft' },
      loads: [{ kind: 'uniform', bends: 'x', height: 'centre', w: '2 kip/ft' }],
    },
  });

describe('a beam with an end spring', () => {
  // A tiny compression must not move the moments.
  it.each(['0 kip', '0.000001 kip'])('has the stiffness of the direct analysis, P = %s', (P) => {
    const m = beam('direct', P);
    expectValue(m, 'c1:theory/x/springs/MB', 'kip ft', -50);
    expectValue(m, 'c1:theory/x/first/Mmax', 'kip ft', 76.5625);
  });

  it('has its whole stiffness by the effective length method', () => {
    const m = beam('effective-length', '0 kip');
    expectValue(m, 'c1:theory/x/springs/MB', 'kip ft', -400 / 9);
  });
});
