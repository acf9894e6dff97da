import { describe, expect, it } from 'vitest';
import { expectValue, outcomeAt, runOne } from './by-hand/one-member.ts';

/*
 * By hand (with Python's floats). Three plates, A572 Gr. 50: top 12 × 3/4, bottom 8 × 3/4, web
 * 16 1/2 × 1/2 in (d = 18), L = 24 ft = 288 in, P = 80 kip, MA = 200, MB = −150 kip ft.
 *   A = 23.25, yt = 183.375/23.25 = 7.887096774, Ix = 1274.938004, Iy = 108 + 32 + 0.171875 = 140.171875
 *   ho = 17.25, J = (12·0.75³ + 8·0.75³ + 16.5·0.5³)/3 = 3.5, Cw = ho²·108·32/140 = 7345.542857
 *   shear centre ho·32/140 = 3.942857 below the top flange's middle: yo = 7.512097 − 3.942857 = 3.569240
 *   rx = 7.405136, ry = 2.455381, Fex = 189.2252, Fey = 20.80418434 ksi
 *   ro² = yo² + (Ix + Iy)/A = 8.579301404², H = 0.8269197307
 *   Fez = (π²·29 000·Cw/288² + 11 200·3.5)/(A·ro²) = 37.71839636
 *   E4-3: Fe = 17.97275546, Fy/Fe = 2.78 > 2.25: Fn = 0.877·Fe, φPn = 329.8220792 kip
 *   Plates: 8 ≤ 0.64·√(kc·580) = 12.86, web 33 ≤ 35.88: nonslender
 *   Plastic axis 6 in below the top (half of A): Zx = 158.90625, Mp = 7945.3125 kip in
 *   Sx top 161.6485813, bottom 126.0704246
 * Top flange compressed: hc = 14.274194, aw = 0.793010753, rt = 12/√(12·(1 + aw/6)) = 3.255630416
 *   Lp = 1.1·rt·√580 = 86.24656, Sxb/Sxt = 0.78 ≥ 0.7: FL = 35, Lr (F4-8) = 358.11056, Rpc·Myc = Mp
 *   F4-2 with Cb: above Mp. φMn = 0.9·7945.3125 = 7150.78125 kip in; tension flange: Rpt·Myt = Mp too
 * Bottom flange compressed: Iyc/Iy = 32/140.171875 = 0.2283 ≤ 0.23: Rpc = 1, J = 0
 *   hc = 18.725806, aw = 1.560483871, rt = 2.057312162, Lp = 54.50130, Lr = 1.95·rt·(E/35)·√(√6.76·35/E) < 288
 *   F4-5: Fcr = Cb·π²·29 000/(288/rt)² = 32.45642197 ksi, Mn = Fcr·126.0704246 = 4091.794900
 * Cb, whole member: quarters 1350, 300, −750, largest 2400: 30 000/13 500 = 2.222222222
 * Reverse curvature compresses both flanges: the lower strength stands for both, 3682.615410 kip in.
 *   Pe1 = 0.8·π²·E·Ix/288² = 3519.587947, Cm = 0.3, B1 = 1, Mr = 2400
 *   H1-1a: 80/329.8220792 + 8/9·2400/3682.615410 = 0.2425550 + 0.5792984 = 0.8218534490
 */
describe('a singly symmetric built-up I in reverse curvature', () => {
  const m = runOne({
    member: {
      section: {
        ...{ shape: 'mono-i', d: '18 in', tw: '0.5 in' },
        ...{ bfTop: '12 in', tfTop: '0.75 in', bfBottom: '8 in', tfBottom: '0.75 in' },
      },
      ...{ material: 'A572 Gr. 50', length: '24 ft', restraints: [], Cb: 'auto' },
      endMomentSign: 'bending',
    },
    forces: { P: '80 kip', MxA: '200 kip ft', MxB: '-150 kip ft' },
  });
  it('section', () => {
    expectValue(m, 'section/A', 'in²', 23.25);
    expectValue(m, 'section/Ix', 'in⁴', 1274.938004032258);
    expectValue(m, 'section/Iy', 'in⁴', 140.171875);
    expectValue(m, 'section/J', 'in⁴', 3.5);
    expectValue(m, 'section/Cw', 'in⁶', 7345.542857142857);
    expectValue(m, 'section/yo', 'in', 3.569239631336405);
    expectValue(m, 'section/Zx', 'in³', 158.90625);
  });
  it('compression by flexural-torsional buckling', () => {
    expectValue(m, 'E4/H', '', 0.8269197307683931);
    expectValue(m, 'E4/z/Fe', 'ksi', 37.7183963587626);
    expectValue(m, 'E3/Fe', 'ksi', 17.97275545556925);
    expectValue(m, 'E1/Pc', 'kip', 329.8220792351288);
  });
  it('both flanges are compressed, each with its own strength', () => {
    expect(outcomeAt(m, 'c1:F4/side/1')).toContain('both are checked');
    expectValue(m, 'top/F4/Lp', 'in', 86.2465594365472);
    expectValue(m, 'top/F4/Lr', 'in', 358.11056424353774);
    expectValue(m, 'c1:F1/Cb', '', 30000 / 13500);
    expectValue(m, 'c1:top/F1/x/Mc', 'kip in', 7150.78125);
    expectValue(m, 'bottom/F13/IycIy', '', 32 / 140.171875);
    expectValue(m, 'bottom/F4/rt', 'in', 2.0573121623451636);
    expectValue(m, 'c1:bottom/F4/LTB/Fcr', 'ksi', 32.45642197194086);
    expectValue(m, 'c1:bottom/F1/x/Mc', 'kip in', 3682.6154103013932);
    expectValue(m, 'c1:F1/x/Mc', 'kip in', 3682.6154103013932);
  });
  it('interaction', () => {
    expectValue(m, 'c1:App8/x/Mr', 'kip in', 2400);
    expectValue(m, 'c1:H1/ratio', '', 0.8218534490234601);
    expect(m.summary.governing?.address).toBe('c1:H1/check');
    expect(m.summary.verdict).toBe('OK');
  });
});

/*
 * HSS12×8×3/8 (Manual Table 1-11: A = 13.2, Ix = 262, Sx = 43.7, Zx = 53.0, Iy = 140, Sy = 35.1,
 * Zy = 40.1, ry = 3.27, J = 293, t = 0.349, b/t = 19.9, h/t = 31.4), A500 Gr. C, L = 20 ft = 240 in,
 * P = 150 kip, 1.2 kip/ft bending the major axis, 6 kip at 8 ft = 96 in the minor one.
 *   Fe = π²·29 000/(240/3.27)² = 53.13378636, Fn = 33.72226858, φPn = 400.6205507, Pr/Pc = 0.3744191348
 *   x: 19.9 ≤ 1.12·√580 = 26.97: compact; Lp = 0.13·29 000·3.27·√(293·13.2)/2650 = 289.31 > 240: φMn = 2385
 *   y: the 12 in walls are the flanges: 26.97 < 31.4 ≤ 1.40·√580 = 33.72:
 *     Mn = 2005 − (2005 − 50·35.1)·(31.4 − 26.97317)/(33.71646 − 26.97317) = 1840.880327, φMn = 1656.792294
 *   EI* = 0.8·E·I: Pex = 1041.517420, Pey = 556.5360260 kip
 * Amplified, Cm = 1: B1x = 1.168252461 · 0.1·240²/8 = 841.1417720; B1y = 1.368970990 · 6·96·144/240 = 473.1163742
 *   H1-1a: 0.3744191 + 8/9·(841.1417720/2385 + 473.1163742/1656.792294) = 0.9417450532
 * Exact: kx·L = 1.192236005: 0.1/kx²·(1/cos(kx·L/2) − 1) = 844.6060949
 *   ky·L = 1.630980847: 6/ky·sin(96·ky)·sin(144·ky)/sin(ky·L) = 445.5327439 kip in, at the load
 *   (both sides of it are shorter than a quarter wave)
 */
describe('a rectangular HSS with load in both planes', () => {
  const given = {
    member: {
      ...{ section: 'HSS12X8X3/8', material: 'A500 Gr. C', length: '20 ft' },
      ...{ restraints: [], Cb: 'auto' },
    },
    forces: {
      P: '150 kip',
      loads: [
        { kind: 'uniform', bends: 'x', w: '1.2 kip/ft', height: 'centre' },
        { kind: 'point', bends: 'y', W: '6 kip', at: '8 ft' },
      ],
    },
  };
  const Mny = 2005 - (250 * (31.4 - 1.12 * Math.sqrt(580))) / (0.28 * Math.sqrt(580));
  const use = (Mx: number, My: number) =>
    0.3744191348471744 + (8 / 9) * (Mx / 2385 + My / (0.9 * Mny));
  it('strengths', () => {
    const m = runOne(given);
    expectValue(m, 'E1/Pc', 'kip', 400.6205507131068);
    expectValue(m, 'F7/x/Lp', 'in', 289.31037265949413);
    expectValue(m, 'c1:F1/x/Mc', 'kip in', 2385);
    expectValue(m, 'F1/y/Mc', 'kip in', 0.9 * Mny);
  });
  it('amplified', () => {
    const m = runOne(given);
    expectValue(m, 'c1:App8/x/B1/trial', '', 1.168252461069378);
    expectValue(m, 'c1:App8/x/Mr', 'kip in', 841.1417719699522);
    expectValue(m, 'c1:App8/y/B1/trial', '', 1.3689709900847307);
    expectValue(m, 'c1:App8/y/Mr', 'kip in', 473.11637417328296);
    expectValue(m, 'c1:H1/ratio', '', use(841.1417719699522, 473.11637417328296));
    expect(m.summary.governing?.address).toBe('c1:H1/check');
    expect(m.summary.verdict).toBe('OK');
  });
  it('exact', () => {
    const m = runOne({ ...given, analysis: { secondOrder: 'exact' } });
    expectValue(m, 'c1:theory/x/Mmax', 'kip in', 844.6060948877978);
    expectValue(m, 'c1:theory/y/Mmax', 'kip in', 445.5327438587996);
    expectValue(m, 'c1:H1/ratio', '', use(844.6060948877978, 445.5327438587996));
  });
});

/*
 * W8×31, A992, L = 25 ft = 300 in, 100 kip of tension, 0.9 kip/ft at the shear centre, net section
 * An = 7.5 in², U = 0.85.
 *   D2: 0.9·50·9.13 = 410.85; 0.75·65·0.85·7.5 = 310.78125 kip governs; Pr/Pc = 0.3217697335
 *   M = 0.075·300²/8 = 843.75 kip in. Lb = 300 > Lr = 297.4095.
 *   Cb = 12.5/(2.5 + 3·0.75 + 4 + 3·0.75) = 1.136363636, Pey = π²·29 000·37.1/300² = 117.9856375
 *   H1.2: Cb·√(1 + 100/Pey) = 1.544602367, Fcr = 53.45145106 ksi, Mn = 27.5·Fcr = 1469.914904 kip in
 *   (flange 9.19 > 9.152: F3-1 gives 1518.567, more)
 *   0.3217697 + 8/9·843.75/(0.9·1469.914904) = 0.8886959760
 * Without the increase Mn = 1469.914904/1.359250083 = 1081.416085: 1.0923642758, not enough.
 */
describe('a tension member with moment', () => {
  const run = (provisions: readonly string[]) =>
    runOne({
      analysis: { provisions },
      member: {
        ...{ section: 'W8X31', length: '25 ft', restraints: [], Cb: 'auto' },
        netSection: { An: '7.5 in²', U: 0.85 },
      },
      forces: {
        P: '-100 kip',
        loads: [{ kind: 'uniform', bends: 'x', w: '0.9 kip/ft', height: 'centre' }],
      },
    });
  it('Cb increased by the tension', () => {
    const m = run(['H1.2-Cb']);
    expectValue(m, 'D2/Pc', 'kip', 310.78125);
    expectValue(m, 'c1:F1/Cb', '', 12.5 / 11);
    expectValue(m, 'c1:H1.2/Pey', 'kip', 117.9856375014671);
    expectValue(m, 'c1:H1.2/Cb', '', 1.544602367366393);
    expectValue(m, 'c1:F2/LTB/Fcr', 'ksi', 53.45145106226524);
    expectValue(m, 'c1:F2/Mn', 'kip in', 1469.9149042122942);
    expectValue(m, 'c1:H1/ratio', '', 0.888695975961993);
    expect(m.summary.verdict).toBe('OK');
    expect(m.summary.governing?.clause.clause).toBe('H1.2');
  });
  it('not increased unless the basis chooses it', () => {
    const m = run([]);
    expectValue(m, 'c1:F2/Mn', 'kip in', 1081.4160854510499);
    expectValue(m, 'c1:H1/ratio', '', 1.0923642757690841);
    expect(m.summary.verdict).toBe('NOT OK');
  });
});

/*
 * A column of a story that sways. W12×79, A992, L = 15 ft = 180 in, held at both stories; direct
 * analysis, so Lc = L. P = 250 kip with 25 kip from lateral translation; MA = 40, MB = −30 kip ft
 * without it, 120 and −100 kip ft from it. Story: 2400 kip, 1800 kip of them on moment frames,
 * H = 60 kip drifts 0.4 in over 180 in.
 *   A-8-8: RM = 1 − 0.15·1800/2400 = 0.8875; A-8-7: Pe,story = 0.8875·60·180/0.4 = 23 962.5 kip
 *   A-8-6: B2 = 1/(1 − 2400/23 962.5) = 1.111304348; A-8-2: Pr = 250 + 25·B2 = 277.7826087 kip
 *   Pe1 = 0.8·π²·29 000·662/180² = 4678.436180, Cm = 0.6 − 0.4·30/40 = 0.3, B1 = 1 (0.318937)
 *   A-8-1: Mr = 480 + 1440·B2 = 2080.278261 kip in
 *   Fe = π²·29 000/(180/3.05)² = 82.17740288, Fn = 38.75889697, φPn = 809.2857688 kip
 *   Lp = 129.27856, Lr = 478.51375, Cb = 1 (two diagrams): Mn = 5629.755139, φMn = 5066.779625 kip in
 *   H1-1a: 0.3432441536 + 8/9·2080.278261/5066.779625 = 0.7081971155
 * ASD with every load over 1.6 has the same α·P: B2 = 1.111304348, Pr = 173.6141304, Mr = 1300.173913;
 *   173.6141304·1.67/899.2064097 + 8/9·1300.173913·1.67/5629.755139 = 0.6652626654
 */
describe('a column that sways', () => {
  const run = (design: 'LRFD' | 'ASD', by: number) => {
    const of = (value: number, unit: string) => `${value / by} ${unit}`;
    return runOne({
      design,
      analysis: { sway: 'B2' },
      member: {
        ...{ section: 'W12X79', length: '15 ft', restraints: [], Cb: 'auto' },
        endMomentSign: 'bending',
      },
      forces: {
        ...{ P: of(250, 'kip'), MxA: of(40, 'kip ft'), MxB: of(-30, 'kip ft') },
        sway: {
          P: of(25, 'kip'),
          x: {
            ...{ MA: of(120, 'kip ft'), MB: of(-100, 'kip ft') },
            ...{ Pstory: of(2400, 'kip'), Pmf: of(1800, 'kip') },
            ...{ H: of(60, 'kip'), height: '15 ft', drift: of(0.4, 'in') },
          },
        },
      },
    });
  };
  it('LRFD', () => {
    const m = run('LRFD', 1);
    expectValue(m, 'c1:App8/x/RM', '', 0.8875);
    expectValue(m, 'c1:App8/x/Pestory', 'kip', 23962.5);
    expectValue(m, 'c1:App8/x/B2/trial', '', 1.111304347826087);
    expectValue(m, 'c1:App8/Pr', 'kip', 277.7826086956522);
    expectValue(m, 'c1:App8/x/B1/trial', '', 0.3189369104514644);
    expectValue(m, 'c1:App8/x/Mr', 'kip in', 2080.278260869565);
    expectValue(m, 'E1/Pc', 'kip', 809.2857687666477);
    expectValue(m, 'c1:F1/x/Mc', 'kip in', 5066.779625108222);
    expectValue(m, 'c1:H1/ratio', '', 0.7081971155490621);
    expect(m.summary.governing?.address).toBe('c1:H1/check');
    expect(m.summary.verdict).toBe('OK');
  });
  it('ASD', () => {
    const m = run('ASD', 1.6);
    expectValue(m, 'c1:App8/x/B2/trial', '', 1.111304347826087);
    expectValue(m, 'c1:App8/Pr', 'kip', 277.7826086956522 / 1.6);
    expectValue(m, 'c1:App8/x/Mr', 'kip in', 2080.278260869565 / 1.6);
    expectValue(m, 'c1:H1/ratio', '', 0.6652626654189001);
  });
});
