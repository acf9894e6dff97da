import { describe, expect, it } from 'vitest';
import { expectValue, outcomeAt, runOne } from './by-hand/one-member.ts';
import { firstMember, recordOf } from './run-input.ts';

/*
 * By hand (with Python's floats, each step below). W18×50 (Manual Table 1-1: A = 14.7, Ix = 800,
 * Sx = 88.9, Zx = 101, rx = 7.38, ry = 1.65, J = 1.24, rts = 1.98, ho = 17.4; h/tw = 45.2), A992,
 * L = 40 ft = 480 in. Held at 10 ft (top flange), 20 ft (laterally and against twist) and 31 ft
 * (bottom flange). P = 60 kip; MA = 60, MB = −140 kip ft; 16 kip at 14 ft = 168 in.
 *
 * Compression: the two flange restraints lie at different flanges and leave the twist free: they are
 * left out. Lcx/rx = 480/7.38 = 65.0407, Lcy/ry = 240/1.65 = 145.4545, Lcz = Lcy: E4 does not apply.
 *   Fe = π²·29 000/145.4545² = 13.52829760, Fy/Fe = 3.69596 > 2.25: Fn = 0.877·Fe = 11.86431699 ksi
 *   web: 45.2 ≤ 1.49·√(29 000/11.864) = 73.67: whole. φPn = 0.9·11.86431699·14.7 = 156.9649138 kip
 *   Pr/Pc = 0.3822510302
 * Flexure: Mp = 50·101 = 5050, Lp = 1.76·1.65·√580 = 69.93758, 0.7·Fy·Sx = 3111.5 kip in,
 *   q = 1.24/(88.9·17.4), Lr = 1.95·1.98·(29 000/35)·√(q + √(q² + 6.76·(35/29 000)²)) = 203.34717
 *   F2-2 with Cb = 1: Lb = 120: 4322.571041; 132: 4148.205764; 108: 4496.936318 kip in
 * Stability: αPr/Pns = 60/691 < 0.5, τb = 1, EI* = 0.8·29 000·800 = 18 560 000 kip in²
 *   Pe1 = π²·18 560 000/480² = 795.0514656, share 0.07546681264, Cm = 1 (load): B1 = 1.081626937
 */
const base = {
  section: 'W18X50',
  length: '40 ft',
  Cb: 'auto',
  endMomentSign: 'bending',
};
const point = { kind: 'point', bends: 'x', W: '16 kip', at: '14 ft', height: 'centre' };
const restraints = (middle: readonly string[]) => [
  { at: '10 ft', holds: ['top'] },
  { at: '20 ft', holds: middle },
  { at: '31 ft', holds: ['bottom'] },
];
const forces = { P: '60 kip', MxA: '60 kip ft', MxB: '-140 kip ft', loads: [point] };

/*
 * First order: VA = −200/40 + 16·26/40 = 5.4 kip. M(0) = 720, M(120) = 1368, M(168) = 1627.2,
 * M(240) = 864, M(372) = −535.2, M(480) = −1680 kip in. At 10 ft the top flange is compressed, at
 * 31 ft the bottom one: both restraints end a segment. Mr = B1·1680 = 1817.133255 in every segment.
 *   1: quarters 882, 1044, 1206, largest 1368: Cb = 17 100/(3420 + 2646 + 4176 + 3618) = 1.233766
 *   2: quarters 1530, 1500, 1182, largest 1627.2: Cb = 20 340/18 204 = 1.117337
 *   3: quarters 514.2, 164.4, −185.4, largest 864: Cb = 10 800/4916.4 = 2.196729
 *   4: quarters −821.4, −1107.6, −1393.8, largest 1680: Cb = 21 000/15 276 = 1.374705
 *   Only Cb·4322.57 = 4829.768 of segment 2 stays below Mp: φMn = 4346.791, else 4545 kip in
 *   H1-1a: 0.38225103 + 8/9·1817.133255/4346.791116 = 0.7538422838; the others 0.7376370720
 */
describe('three restraints, a point load and end moments, amplified', () => {
  const m = runOne({
    member: { ...base, restraints: restraints(['centre', 'twist']) },
    forces,
  });
  it('buckling lengths leave out what holds one flange in turn', () => {
    expectValue(m, 'E2/Lcx', 'in', 480);
    expectValue(m, 'E2/Lcy', 'in', 240);
    expectValue(m, 'E2/Lcz', 'in', 240);
    expectValue(m, 'E3/Fe', 'ksi', 13.528297595086933);
    expectValue(m, 'E1/Pc', 'kip', 156.9649137894911);
  });
  it('moments at the restraints decide which flange is compressed', () => {
    expectValue(m, 'c1:F1/r1/M', 'kip in', 1368);
    expectValue(m, 'c1:F1/r3/M', 'kip in', -535.2);
    expect(outcomeAt(m, 'c1:F1/r1/holds')).toContain('a segment ends');
    expect(outcomeAt(m, 'c1:F1/r3/holds')).toContain('a segment ends');
  });
  it('the bay is the member: one B1 on its largest moment', () => {
    expectValue(m, 'c1:App8/x/Pe1', 'kip', 795.0514656433095);
    expectValue(m, 'c1:App8/x/B1/trial', '', 1.0816269374383038);
    expectValue(m, 'c1:App8/x/Mr', 'kip in', 1817.1332548963505);
  });
  const segments = [
    { Lb: 120, quarters: [882, 1044, 1206], largest: 1368, Mn: 5050, ratio: 0.7376370719757088 },
    {
      ...{ Lb: 120, quarters: [1530, 1500, 1182], largest: 1627.2 },
      ...{ Mn: 4829.767906860927, ratio: 0.7538422837713518 },
    },
    {
      ...{ Lb: 132, quarters: [514.2, 164.4, -185.4], largest: 864 },
      ...{ Mn: 5050, ratio: 0.7376370719757088 },
    },
    {
      ...{ Lb: 108, quarters: [-821.4, -1107.6, -1393.8], largest: 1680 },
      ...{ Mn: 5050, ratio: 0.7376370719757088 },
    },
  ];
  segments.forEach(({ Lb, quarters, largest, Mn, ratio }, i) => {
    const at = `c1:s${i + 1}`;
    const sizes = quarters.map(Math.abs) as [number, number, number];
    it(`segment ${i + 1}`, () => {
      expectValue(m, `${at}/F2/Lb`, 'in', Lb);
      expectValue(m, `${at}/F1/Mmax/1`, 'kip in', largest);
      ['A', 'B', 'C'].forEach((name, k) => {
        expectValue(m, `${at}/F1/${name}/M`, 'kip in', quarters[k] as number);
      });
      const below = 2.5 * largest + 3 * sizes[0] + 4 * sizes[1] + 3 * sizes[2];
      expectValue(m, `${at}/F1/Cb`, '', (12.5 * largest) / below);
      expectValue(m, `${at}/F2/Mn`, 'kip in', Mn);
      expectValue(m, `${at}/H1/ratio`, '', ratio);
    });
  });
  it('segment 2 governs', () => {
    expectValue(m, 'c1:H1/segments/ratio', '', 0.7538422837713518);
    expect(m.summary.verdict).toBe('OK');
    expect(m.summary.governing?.address).toBe('c1:s2/H1/check');
  });
});

/*
 * Exact: M'' + k²M = 0 left and right of the load, k² = 60/18 560 000, kL = 0.8630339427;
 *   left MA·cos kz + a·sin kz, right MB·cos k(L − z) + b·sin k(L − z), continuous at 168 in with the
 *   slope falling by 16 there: M(168) = 1699.957026, M(120) = 1431.992015, M(240) = 928.795494,
 *   M(372) = −515.875200 kip in. The largest of each segment enters its check.
 *   1: 902.456371, 1082.287697, 1258.970889: Cb = 1.243617527, Mn = Mp
 *   2: 1600.847795, 1573.061962, 1252.750714: Cb = 1.112366334, Mn = 4808.282503
 *   3: 569.360863, 207.922400, −154.247833: Cb = 2.180474040, Mn = Mp
 *   4: −810.458900, −1103.132982, −1393.207842: Cb = 1.379443337, Mn = Mp
 */
describe('the same with exact moments', () => {
  const m = runOne({
    analysis: { secondOrder: 'exact' },
    member: { ...base, restraints: restraints(['centre', 'twist']) },
    forces,
  });
  it('moments along the member', () => {
    expectValue(m, 'c1:theory/x/kL', 'rad', 0.8630339426736915);
    expectValue(m, 'c1:theory/x/M1', 'kip in', 1699.957026137439);
    expectValue(m, 'c1:F1/r1/M', 'kip in', 1431.9920153378898);
    expectValue(m, 'c1:F1/r3/M', 'kip in', -515.8752004982316);
  });
  for (const [id, Mr, Cb, Mn, ratio] of [
    ['s1', 1431.9920153378898, 1.243617527033074, 5050, 0.6623130305023514],
    ['s2', 1699.957026137439, 1.1123663342187085, 4808.282503416917, 0.7314339039445035],
    ['s3', 928.795493952056, 2.180474039563776, 5050, 0.5639003139374652],
    ['s4', 1680, 1.3794433371389438, 5050, 0.7108172201441283],
  ] as const)
    it(`segment ${id}`, () => {
      expectValue(m, `c1:${id}/H1/Mx/1`, 'kip in', Mr);
      expectValue(m, `c1:${id}/F1/Cb`, '', Cb);
      expectValue(m, `c1:${id}/F2/Mn`, 'kip in', Mn);
      expectValue(m, `c1:${id}/H1/ratio`, '', ratio);
    });
  it('segment 2 governs', () => {
    expect(m.summary.governing?.address).toBe('c1:s2/H1/check');
    expectValue(m, 'c1:H1/segments/ratio', '', 0.7314339039445035);
  });
});

/*
 * The restraint at 20 ft holds the plane of bending as well, with −80 kip ft over it: two bays of
 * 240 in. Pe1 = 3180.205863, share 0.01886670316.
 *   Bay 1 (60, −80, load): VA = −7 + 16·72/240 = −2.2 kip; M(120) = 456, M(168) = 350.4,
 *   M(240) = −960: B1 = 1.019229500, Mr = 978.4603204. Bay 2 (−80, −140): single curvature,
 *   Cm = 0.6 + 0.4·80/140 = 0.828571, B1 = max(1; 0.844504) = 1, Mr = 1680; M(372) = −1356.
 *   1: 654, 588, 522, largest 720: Cb = 9000/7680 = 1.171875, 5065.51 > Mp
 *   2: 390, 132, −414, largest 960: Cb = 12 000/5340 = 2.247191, Mp
 *   3: −1059, −1158, −1257, largest 1356: Cb = 16 950/14 970 = 1.132265, Mn = 4696.866246
 *   4: −1437, −1518, −1599, largest 1680: Cb = 21 000/19 380 = 1.083591, Mn = 4872.841212
 * Lcx = 240 in; Lcy governs as before.
 */
describe('two bays and four segments', () => {
  const m = runOne({
    member: { ...base, restraints: restraints(['in-plane', 'centre', 'twist']) },
    forces: { ...forces, supports: [{ at: '20 ft', Mx: '-80 kip ft' }] },
  });
  it('a bay has its own multiplier and required moment', () => {
    expectValue(m, 'E2/Lcx', 'in', 240);
    expectValue(m, 'c1:bay1/App8/x/Pe1', 'kip', 3180.205862573238);
    expectValue(m, 'c1:bay1/App8/x/B1/trial', '', 1.0192295004376788);
    expectValue(m, 'c1:bay1/App8/x/Mr', 'kip in', 978.4603204201717);
    expectValue(m, 'c1:bay2/App8/x/Cm', '', 0.6 + (0.4 * 80) / 140);
    expectValue(m, 'c1:bay2/App8/x/B1/trial', '', 0.8445044432197909);
    expectValue(m, 'c1:bay2/App8/x/Mr', 'kip in', 1680);
  });
  for (const [id, Cb, Mn, ratio] of [
    ['s1', 9000 / 7680, 5050, 0.573613517989413],
    ['s2', 12000 / 5340, 5050, 0.573613517989413],
    ['s3', 16950 / 14970, 4696.866245841919, 0.7355204597243485],
    ['s4', 21000 / 19380, 4872.841211698483, 0.7227626921100639],
  ] as const)
    it(`segment ${id} takes the moment of its bay and its own diagram`, () => {
      expectValue(m, `c1:${id}/F1/Cb`, '', Cb);
      expectValue(m, `c1:${id}/F2/Mn`, 'kip in', Mn);
      expectValue(m, `c1:${id}/H1/ratio`, '', ratio);
    });
  it('segment 3 governs', () => expect(m.summary.governing?.address).toBe('c1:s3/H1/check'));
});

/*
 * Girts at one flange, SI and ASD. W12×26 (W310×38.7; Manual Table 1-1 times 25.4 mm: A = 4935.474,
 * d = 309.88, Ix = 84 911 211, Sx = 547 327.9, Zx = 609 598.8, rx = 131.318, Iy = 7 200 804,
 * ry = 38.354, J = 124 869.4, rts = 44.45, ho = 299.72; h/tw = 47.2), A992: Fy = 345 MPa,
 * E = 200 000, G = 77 200. L = 6 m, girts at 2 and 4 m hold the top flange; P = 120 kN, w = ±5 kN/m.
 *
 * Compression: they hold it at ya = d/2 = 154.94 mm off the shear centre and leave the twist free:
 *   ro² = rx² + ry² + ya² = 206.6926² mm², over Lcz = 6 m
 *   Fe = (π²·E·Iy·(ho²/4 + ya²)/Lcz² + G·J)/(A·ro²) = 132.7248940 MPa; Fex = 945.53, Fey = 725.92 (2 m)
 *   Fy/Fe = 2.5994 > 2.25: Fn = 0.877·Fe = 116.3997320; web 47.2 ≤ 61.76: whole
 *   Pn = 574.4878509, Pn/1.67 = 344.0047011 kN, Pr/Pc = 0.3488324421
 * Flexure: Mp = 210.3115794 kN m, Lp = 1625.282, Lr = 4535.189 mm, 0.7·Fy·Sx = 132.1796969 kN m
 * Stability: αPr/Pns < 0.5; EI* = 0.8·E·Ix, Pe1 = 3724.622489 kN, 1.6·120/Pe1 = 0.05154884839,
 *   B1 = 1.054350557, wL²/8 = 22.5, Mr = 23.72288753 kN m (exact: w/k²·(sec kL/2 − 1) = 23.75745317)
 * Pressure compresses the held flange (M = 20 kN m at the girts): three segments of 2 m.
 *   outer: 6.875, 12.5, 16.875, largest 20: Cb = 250/171.25, Mn = Mp, Mn/1.67 = 125.9350775
 *   middle: 21.875, 22.5, 21.875, largest 22.5: Cb = 281.25/277.5, Mn = 202.9563788 kN m
 *   H1-1a: 0.34883244 + 8/9·23.72288753/121.5307658 = 0.5223441534
 * Suction compresses the free flange: one segment of 6 m > Lr.
 *   Cb = 12.5·22.5/(2.5·22.5 + 6·16.875 + 4·22.5) = 1.136363636, Fcr (F2-4) = 177.6263693 MPa
 *   Mn = Fcr·Sx = 97.21987436, Mn/1.67 = 58.21549363 kN m
 *   H1-1a: 0.34883244 + 8/9·23.72288753/58.21549363 = 0.7110557924
 */
describe('girts at one flange, pressure and suction', () => {
  const load = (w: string) => [{ kind: 'uniform', bends: 'x', w, height: 'centre' }];
  const m = firstMember(
    recordOf({
      ...{ format: 1, standard: 'aisc360-22', design: 'ASD', units: 'si' },
      analysis: { method: 'direct', secondOrder: 'amplified', sway: 'none' },
      members: [
        {
          ...{ mark: 'girts', section: 'W12X26', material: 'A992', length: '6 m', ends: 'held' },
          Cb: 'auto',
          restraints: [
            { at: '2 m', holds: ['top'] },
            { at: '4 m', holds: ['top'] },
          ],
          combinations: [
            { name: 'pressure', P: '120 kN', loads: load('5 kN/m') },
            { name: 'suction', P: '120 kN', loads: load('-5 kN/m') },
          ],
        },
      ],
    }),
  );
  it('the column twists about its girts', () => {
    expectValue(m, 'E4/ya', 'mm', 154.94);
    expectValue(m, 'E4/ro', 'mm', 206.69264631331225);
    expectValue(m, 'E2/Lcy', 'mm', 2000);
    expectValue(m, 'E2/Lcz', 'mm', 6000);
    expectValue(m, 'E3/Fe', 'MPa', 132.72489395662475);
    expectValue(m, 'E1/Pc', 'kN', 344.0047011333953);
  });
  it('pressure: the girts end segments', () => {
    expect(outcomeAt(m, 'c1:F1/r1/holds')).toContain('a segment ends');
    expectValue(m, 'c1:App8/x/Mr', 'kN m', 23.722887532817236);
    expectValue(m, 'c1:theory/x/Mmax', 'kN m', 23.757453168544146);
    expectValue(m, 'c1:s1/F1/Cb', '', 250 / 171.25);
    expectValue(m, 'c1:s2/F1/Cb', '', 281.25 / 277.5);
    expectValue(m, 'c1:s2/F2/Mn', 'kN m', 202.95637881442397);
    for (const id of ['s1', 's3']) expectValue(m, `c1:${id}/H1/ratio`, '', 0.5162759500358007);
    expectValue(m, 'c1:s2/H1/ratio', '', 0.5223441534132326);
    expect(m.combinations[0]?.summary.governing?.address).toBe('c1:s2/H1/check');
  });
  it('suction: they hold the flange in tension and end none', () => {
    for (const id of ['r1', 'r2'])
      expect(outcomeAt(m, `c2:F1/${id}/holds`)).toContain('no segment ends');
    expectValue(m, 'c2:F1/Cb', '', 12.5 / 11);
    expectValue(m, 'c2:F2/LTB/Fcr', 'MPa', 177.62636927332994);
    expectValue(m, 'c2:F2/Mn', 'kN m', 97.21987435774767);
    expectValue(m, 'c2:H1/ratio', '', 0.7110557924146057);
  });
  it('suction governs', () => {
    expect(m.summary.verdict).toBe('OK');
    expect(m.summary.governing?.address).toBe('c2:H1/check');
  });
});
