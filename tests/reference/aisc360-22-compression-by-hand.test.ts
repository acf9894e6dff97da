import { describe, expect, it } from 'vitest';
import { closeLines } from '#shared/calc/closure.ts';
import { closureProblems } from '#shared/calc/closure-problems.ts';
import { createRecorder } from '#shared/calc/recorder.ts';
import { axisStrength } from '#shared/members/compression.ts';
import type { SectionQuantities, SteelQuantities } from '#shared/members/section-quantities.ts';
import { unsymmetricStress } from '#shared/standards/aisc360-22/e4-flexural-torsional.ts';
import { publishedEffectiveWidth } from '#shared/standards/aisc360-22/e7-constants.ts';
import { methodConstant } from '#shared/standards/aisc360-22/parameters.ts';
import { UNIT_SETS } from '#shared/units/unit-set.ts';
import {
  type Computed,
  compressionOf,
  givenText,
  sectionOf,
  type Texts,
} from './compression-of.ts';

/*
 * Chapter E worked by hand from the inputs, in kip and in, without rounding on the way; the working
 * stands beside each. Properties of table shapes: AISC Shapes Database v15.0.
 */
const near = (value: number, byHand: number): void =>
  expect(Math.abs(value / byHand - 1), `${value}, by hand ${byHand}`).toBeLessThan(1e-6);

/** Every line reproduces from what it prints, in both unit sets. */
const expectClosed = (c: Computed): void => {
  for (const set of [UNIT_SETS.us, UNIT_SETS.si]) {
    const placed = c.lines.map((line) => ({ address: line.key, combination: null, line }));
    const closed = closeLines(placed, set);
    const printed = placed.map((p, i) => ({ ...p, line: closed[i] ?? p.line }));
    expect(closureProblems(printed, set)).toEqual([]);
  }
};

/** Values by hand at their lines; all lines of the case close. */
const expectValues = (
  c: Computed,
  values: Readonly<Record<string, readonly [byHand: number, unit?: string]>>,
): void => {
  expectClosed(c);
  for (const [key, [byHand, unit]] of Object.entries(values)) near(c.at(key, unit), byHand);
};

const square = (length: string) => ({ Lcx: length, Lcy: length, Lcz: length });
const equationOf = (c: Computed, key: string) =>
  c.lines.find((l) => l.key === key)?.clause?.equation;

const CHANNEL = {
  Fy: '50 ksi',
  section: {
    ...{ kind: 'channel', A: '4.48 in²', Ix: '67.3 in⁴', Iy: '2.27 in⁴' },
    ...{ rx: '3.88 in', ry: '0.711 in', J: '0.209 in⁴', Cw: '45.5 in⁶' },
    ...{ ro: '4.19 in', H: '0.884', bf: '2.6 in', tf: '0.436 in', tw: '0.24 in' },
    ...{ lambdaf: '5.96', lambdaw: '35.3' },
  },
  lengths: square('6 ft'),
};

describe('C10X15.3, Lc = 6 ft: E4(b) with x as the axis of symmetry', () => {
  /*
   * Fex = π²·29000/(72/3.88)² = 831.1821, Fey = π²·29000/(72/0.711)² = 27.91078;
   * Fez = (π²·29000·45.5/72² + 11200·0.209)/(4.48·4.19²) = 61.70197;
   * E4-3 as printed, with Fex: (831.1821 + 61.70197)/(2·0.884)
   * ·(1 − √(1 − 4·831.1821·61.70197·0.884/892.8841²)) = 61.13888.
   */
  it('the minor axis governs: Pn = 0.658^(50/27.91078)·50·4.48', () => {
    const c = compressionOf(CHANNEL);
    expectValues(c, {
      'E3/x/Fe': [831.1821378, 'ksi'],
      'E4/z/Fe': [61.70196877, 'ksi'],
      'E4/Fe': [61.13887878, 'ksi'],
      'E3/Fe': [27.91077861, 'ksi'],
      'E3/Pn': [105.8312129, 'kip'],
    });
    expect(c.strength).toMatchObject({ torsional: false, slender: false });
  });
  it('flexural-torsional buckling governs with Lcy = 1 ft: Pn = 0.658^(50/61.13888)·50·4.48', () => {
    const c = compressionOf({ ...CHANNEL, lengths: { ...CHANNEL.lengths, Lcy: '1 ft' } });
    expectValues(c, { 'E3/Fn': [35.50694293, 'ksi'], 'E3/Pn': [159.0711043, 'kip'] });
    expect(c.strength?.torsional).toBe(true);
    expect(equationOf(c, 'E3/Pn')).toBe('E4-1');
  });
  it('slender web and flanges of full width, Fy = 300 ksi, Lc = 1 ft', () => {
    /*
     * λr = 0.56·√(29000/300) = 5.505876 and 1.49·√(29000/300) = 14.64956; Fn = 264.7579;
     * h = 35.3·0.24 = 8.472, he = 4.392082, be = 2.581562 of 2.6;
     * Ae = 4.48 − (8.472 − 4.392082)·0.24 − 2·(2.6 − 2.581562)·0.436 = 3.484742.
     * At Fn = Fy: he = 4.155108, be = 2.495070, Ae = 3.352447, Pns = 300·3.352447.
     */
    const c = compressionOf({ ...CHANNEL, Fy: '300 ksi', lengths: square('1 ft') });
    expectValues(c, {
      'E3/Fn': [264.7578713, 'ksi'],
      'E7/web/width': [4.392082086, 'in'],
      'E7/flange/width': [2.581561801, 'in'],
      'E7/Ae': [3.484741592, 'in²'],
      'E7/Pn': [922.6127657, 'kip'],
      'C2/Pns': [1005.734077, 'kip'],
    });
  });
  it('a restraint offset from the shear centre is outside the scope', () => {
    const c = compressionOf({ ...CHANNEL, offset: { axis: 'y', distance: '5 in' } });
    expect(c.strength).toBeNull();
    expect(c.codes).toContain('offset-bracing-by-analysis');
  });
});

describe('singly symmetric I-shape: flanges 16 × 3/8 and 12 × 3/8, web 1/4 × 14, Lc = 10 ft', () => {
  /*
   * A = 14; centroid 8.145089 above the underside; Ix = 591.419, Iy = 182.018, J = Σbt³/3 =
   * 0.565104, ho = 14.375, Cw = ho² I1 I2/(I1 + I2) = 7847.80 with I1 = 128, I2 = 54;
   * shear centre ho I1/(I1 + I2) = 10.11 above the lower flange: yo = 2.1523.
   * ro = √(2.1523² + 773.437/14) = 7.738081, H = 1 − 2.1523²/7.738081² = 0.922636;
   * Fey = π²·29000/(120/3.60573)² = 258.4173, Fez = (π²·29000·7847.8/120² + 11200·0.565104)
   * /(14·7.738081²) = 193.6253, E4-3 as printed 168.9454, Fn = 0.658^(50/168.9454)·50 = 44.17467.
   * kc = 4/√56 = 0.534522, λr = 0.64·√(0.534522·580) = 11.26878 < 16 and 21.33, web 35.88 < 56.
   */
  const common = {
    ...{ kind: 'mono-i', made: 'built-up', A: '14 in²', Ix: '591.419 in⁴', Iy: '182.018 in⁴' },
    ...{ rx: '6.49955 in', ry: '3.60573 in', J: '0.565104 in⁴', Cw: '7847.8 in⁶' },
    ...{ yo: '2.1523 in', h: '14 in', tw: '0.25 in' },
  };
  const run = (lambdaw: string, lambdaBottom: string) =>
    compressionOf({ Fy: '50 ksi', section: {}, lengths: square('10 ft') }, 'LRFD', (r) => {
      const flange = (name: string, texts: Texts) => {
        const part = r.within(name);
        const of = (key: string, symbol: string) => ({
          ...givenText(part, key, texts[key] as string),
          symbol,
        });
        return { b: of('bf', 'bf'), t: of('tf', 'tf'), lambda: of('lambdaf', 'lambdaf') };
      };
      const top = flange('top', { bf: '16 in', tf: '0.375 in', lambdaf: '21.3333333333333' });
      const bottom = flange('bottom', { bf: '12 in', tf: '0.375 in', lambdaf: lambdaBottom });
      const section = sectionOf(r, { ...common, lambdaw });
      return { ...section, top, bottom } as unknown as SectionQuantities;
    });
  it('E4(b) with y as the axis of symmetry; web and both flanges partly effective', () => {
    /*
     * he = 10.49302 of 14, be = 5.464727 of 8 and 5.053390 of 6:
     * Ae = 14 − (14 − 10.49302)·0.25 − 2·(8 − 5.464727)·0.375 − 2·(6 − 5.053390)·0.375 = 10.51184;
     * at Fn = Fy: 9.976302, 5.206193, 4.842780, Ae = 10.03080, Pns = 501.5402.
     */
    const c = run('56', '16');
    expectValues(c, {
      'E4/ro': [7.738080853, 'in'],
      'E4/H': [0.92263597],
      'E4/z/Fe': [193.6253369, 'ksi'],
      'E4/Fe': [168.945367, 'ksi'],
      'B4/compression/kc': [0.534522484],
      'B4/flange/lambdar': [11.26878154],
      'B4/web/lambdar': [35.88395184],
      'E7/web/width': [10.49302293, 'in'],
      'E7/top-flange/width': [5.464726639, 'in'],
      'E7/bottom-flange/width': [5.053390239, 'in'],
      'E7/Ae': [10.51184339, 'in²'],
      'E7/Pn': [464.3571894, 'kip'],
      'C2/Pns': [501.5402495, 'kip'],
    });
    expect(c.strength).toMatchObject({ torsional: true, slender: true });
    expect(equationOf(c, 'B4/web/class')).toBe('Table B4.1a, 8');
    expect(equationOf(c, 'B4/top-flange/class')).toBe('Table B4.1a, 2');
  });
  it('both flanges with a stocky web, and one flange alone', () => {
    // h/tw = 30: kc = 4/√30 = 0.730297, λr = 13.17176; be = 6.143982 of 8 and 5.581990 of 6.
    const both = run('30', '16');
    expectValues(both, { 'B4/flange/lambdar': [13.17175526], 'E7/Ae': [12.29447936, 'in²'] });
    // 14 − 2·(8 − 6.143982)·0.375, the lower flange at 6 < 13.17.
    expectValues(run('30', '6'), { 'E7/Ae': [12.60798687, 'in²'] });
  });
});

describe('HSS and boxes with slender walls', () => {
  it('HSS12X12X3/16, Lc = 12 ft: four equal walls, the same about x and y', () => {
    /*
     * λr = 1.40·√580 = 33.71646, b = 66·0.174 = 11.484, Fel = (1.38·33.71646/66)²·50 = 24.84988;
     * Fe = π²·29000/(144/4.82)² = 320.6763, Fn = 46.84117, be = 7.146045,
     * Ae = 8.15 − 4·(11.484 − 7.146045)·0.174 = 5.130784; at Fn = Fy Pns = 249.8732.
     */
    const section = {
      ...{ kind: 'rect-hss', square: 'yes', A: '8.15 in²', Ix: '189 in⁴', Iy: '189 in⁴' },
      ...{ rx: '4.82 in', ry: '4.82 in', J: '290 in⁴', t: '0.174 in' },
      ...{ lambdab: '66.0', lambdah: '66.0' },
    };
    const c = compressionOf({ Fy: '50 ksi', section, lengths: square('12 ft') });
    expectValues(c, {
      'E3/x/Fe': [320.676279, 'ksi'],
      'E3/y/Fe': [320.676279, 'ksi'],
      'E7/wall/Fel': [24.8498843, 'ksi'],
      'E7/wall/width': [7.146045499, 'in'],
      'E7/Ae': [5.130783668, 'in²'],
      'E7/Pn': [240.3318899, 'kip'],
      'C2/Pns': [249.873165, 'kip'],
    });
    expect(c.codes).toContain('closed-shape');
  });
  it('HSS12X6X3/16, Lc = 8 ft: 31.5 is nonslender, 66 slender, so two walls lose width', () => {
    // Fn = 45.15046, he = 7.255588, Ae = 6.06 − 2·(11.484 − 7.255588)·0.174; Pns = 224.1866.
    const section = {
      ...{ kind: 'rect-hss', A: '6.06 in²', Ix: '116 in⁴', Iy: '40 in⁴', rx: '4.38 in' },
      ...{ ry: '2.57 in', J: '94.6 in⁴', t: '0.174 in', lambdab: '31.5', lambdah: '66.0' },
    };
    const c = compressionOf({ Fy: '50 ksi', section, lengths: square('8 ft') });
    expectValues(c, {
      'E7/Ae': [4.58851267, 'in²'],
      'E7/Pn': [207.1734545, 'kip'],
      'C2/Pns': [224.1865825, 'kip'],
    });
    expect(c.outcome('B4/flange/class')).toBe('the flange wall is nonslender');
  });
  it('box of plates, clear 16 × 20, 3/8 and 5/16: rows 8 and (a), Lc = 15 ft', () => {
    /*
     * A = 2·16.625·0.375 + 2·20·0.3125 = 24.96875; λr = 1.49·√580 = 35.88395 < 42.67 and 64;
     * Fe = π²·29000/(180/7)² = 432.8614, Fn = 47.64016; be = 14.39025, he = 13.01106;
     * Ae = 24.96875 − 2·(20 − 13.01106)·0.3125 − 2·(16 − 14.39025)·0.375 = 19.39335; Pns = 951.7609.
     */
    const section = {
      ...{ kind: 'box', A: '24.96875 in²', Ix: '1800 in⁴', Iy: '1220 in⁴', rx: '8.5 in' },
      ...{ ry: '7 in', J: '2000 in⁴', b: '16 in', h: '20 in', tf: '0.375 in', tw: '0.3125 in' },
      ...{ lambdab: '42.6666666666667', lambdah: '64' },
    };
    const c = compressionOf({ Fy: '50 ksi', section, lengths: square('15 ft') });
    expectValues(c, {
      'B4/plate/lambdar': [35.88395184],
      'E7/flange/width': [14.3902518, 'in'],
      'E7/web/width': [13.01106023, 'in'],
      'E7/Ae': [19.3933515, 'in²'],
      'E7/Pn': [923.9023431, 'kip'],
      'C2/Pns': [951.7608545, 'kip'],
    });
    expect(equationOf(c, 'B4/web/class')).toBe('Table B4.1a, 8');
  });
  it('a restraint offset by 8 in: twist about it without warping (E4(f))', () => {
    // HSS12X10X3/8, Lcz = 20 ft: (π²·29000·234·8²/240² + 11200·421)/(14.6·(4.61² + 4.01² + 8²)).
    const section = {
      ...{ kind: 'rect-hss', A: '14.6 in²', Ix: '310 in⁴', Iy: '234 in⁴', rx: '4.61 in' },
      ...{ ry: '4.01 in', J: '421 in⁴', t: '0.349 in', lambdab: '25.7', lambdah: '31.4' },
    };
    const at = (axis: 'x' | 'y') =>
      compressionOf({
        ...{ Fy: '50 ksi', section, lengths: square('20 ft') },
        offset: { axis, distance: '8 in' },
      });
    expectValues(at('y'), { 'E4/Fe': [3237.430416, 'ksi'] });
    // 310 in place of 234.
    expectValues(at('x'), { 'E4/Fe': [3253.767272, 'ksi'] });
  });
});

describe('round wall, OD 20, 1/4 thick, Fy 50 ksi (E7.2)', () => {
  const run = (lambdad: string) =>
    compressionOf({
      Fy: '50 ksi',
      section: {
        ...{ kind: 'round', A: '15.512 in²', Ix: '756 in⁴', Iy: '756 in⁴', J: '1512 in⁴' },
        ...{ rx: '6.9833 in', ry: '6.9833 in', t: '0.25 in', lambdad },
      },
      lengths: square('20 ft'),
    });
  it('D/t = 80: Ae = (0.038·29000/(50·80) + 2/3)·15.512 = 14.61489', () => {
    // Fe = π²·29000/(240/6.9833)² = 242.3241, Fn = 45.86312, Pn = 670.2844; Pns = 50·14.61489.
    expectValues(run('80'), {
      'B4/wall/lambdar': [63.8],
      'E7/wall/limit': [261],
      'E7/Ae': [14.61488933, 'in²'],
      'E7/Pn': [670.2844388, 'kip'],
      'C2/Pns': [730.7444667, 'kip'],
    });
  });
  it('just above 0.11 E/Fy E7-7 gives 1.2 % more than Ag, and Ag counts', () => {
    // 0.038/0.11 + 2/3 = 1.0121.
    const c = run('63.81');
    expect(c.at('E7/wall/Ae', 'in²') / 15.512).toBeCloseTo(1.012, 3);
    near(c.at('E7/Ae', 'in²'), 15.512);
    expect(run('63.8').strength?.slender).toBe(false);
  });
  it('at 0.45 E/Fy the rules end; below it they hold', () => {
    expect(run('260.9').strength).not.toBeNull();
    expect(run('261').strength).toBeNull();
    expect(run('261').codes).toContain('round-wall-beyond-rules');
  });
});

describe('W12X79 with a lateral restraint offset from the shear centre (E4(d), E4(e))', () => {
  const section = {
    ...{ kind: 'i', made: 'rolled', A: '23.2 in²', Ix: '662 in⁴', Iy: '216 in⁴', rx: '5.34 in' },
    ...{ ry: '3.05 in', J: '3.84 in⁴', Cw: '7330 in⁶', ho: '11.7 in', bf: '12.1 in' },
    ...{ tf: '0.735 in', tw: '0.47 in', lambdaf: '8.22', lambdaw: '20.7' },
  };
  const lengths = { Lcx: '30 ft', Lcy: '10 ft', Lcz: '30 ft' };
  const run = (axis: 'x' | 'y', distance: string, Lcz = '30 ft') =>
    compressionOf({
      ...{ Fy: '50 ksi', section, lengths: { ...lengths, Lcz } },
      offset: { axis, distance },
    });
  it('without offset it is E4-2 with Cw = Iy ho²/4', () => {
    // (π²·29000·(216·11.7²/4)/360² + 11200·3.84)/(23.2·(5.34² + 3.05²)).
    expectValues(run('y', '0 in'), { 'E4/Fe': [67.62542419, 'ksi'] });
  });
  it('at the flange, 6.2 in: lower than E4-2 (67.42 ksi), and it governs', () => {
    /*
     * (π²·29000·216/360²·(11.7²/4 + 6.2²) + 11200·3.84)/(23.2·(5.34² + 3.05² + 6.2²)) = 43.90164;
     * Fex = 62.97603, Fey = 184.8992; Fn = 0.658^(50/43.90164)·50 = 31.04172.
     */
    const c = run('y', '6.2 in');
    expectValues(c, {
      'E4/ro': [8.732588391, 'in'],
      'E4/Fe': [43.90164289, 'ksi'],
      'E3/Fe': [43.90164289, 'ksi'],
      'E3/y/Fe': [184.8991565, 'ksi'],
      'E3/Pn': [720.1678424, 'kip'],
    });
    expect(c.strength?.torsional).toBe(true);
    expectValues(run('y', '-6.2 in'), { 'E4/Fe': [43.90164289, 'ksi'] });
  });
  it('of the major axis, 6.05 in: Iy (ho²/4 + Ix/Iy xa²)', () =>
    expectValues(run('x', '6.05 in'), { 'E4/Fe': [65.35920794, 'ksi'] }));
  it('counts whatever the torsional length', () =>
    expect(run('y', '6.2 in', '10 ft').at('E4/Fe', 'ksi')).toBeGreaterThan(0));
});

describe('E4-4, a shape without an axis of symmetry', () => {
  const root = (xo: string) => {
    const r = createRecorder('');
    const stress = (name: string, text: string) => givenText(r, name, text);
    return unsymmetricStress(r, {
      ...{ Fex: stress('Fex', '100 ksi'), Fey: stress('Fey', '40 ksi') },
      ...{ Fez: stress('Fez', '60 ksi'), xo: stress('xo', xo), yo: stress('yo', '2 in') },
      ro: stress('ro', '4 in'),
    }).value;
  };
  const KSI = 4448.2216152605 / 25.4 ** 2;
  it('Fex = 100, Fey = 40, Fez = 60, xo = 1.5, yo = 2, ro = 4: the least of three roots', () => {
    /*
     * Multiplied out: 0.609375 F³ − 169.375 F² + 12400 F − 240000 = 0, whose roots by the
     * eigenvalues of its companion matrix are 31.05905421, 72.86748499 and 174.0221787.
     */
    near(root('1.5 in') / KSI, 31.05905421);
  });
  it('with xo = 0 is E4-3: (100/(2·0.75))·(1 − √(1 − 4·40·60·0.75/100²))', () => {
    near(root('0 in') / KSI, 31.38998252);
  });
});

describe('flexural buckling about one axis alone, for H1.3', () => {
  const run = (design: 'LRFD' | 'ASD') => {
    const r = createRecorder('');
    const of = (name: string, text: string) => givenText(r, name, text);
    const steel = { E: of('E', '29000 ksi'), Fy: of('Fy', '50 ksi') } as SteelQuantities;
    const radii = { A: of('A', '23.2 in²'), rx: of('rx', '5.34 in'), ry: of('ry', '3.05 in') };
    const constant = methodConstant(r, 'compression', design);
    const section = radii as unknown as SectionQuantities;
    return axisStrength(r, 'H1.3/y', design, steel, section, 'y', of('Lcy', '10 ft'), constant);
  };
  it('W12X79, Lcy = 10 ft: 0.658^(50/184.8992)·50·23.2 = 1035.865 kip', () => {
    const KIP = 4448.2216152605;
    const lrfd = run('LRFD');
    near(lrfd.value / KIP, 932.2782826);
    near(run('ASD').value / KIP, 1035.864758 / 1.67);
    expect(lrfd).toMatchObject({ ref: 'H1.3/y/E1/Pc', symbol: 'Pcy' });
  });
});

describe('what the standard itself jumps by', () => {
  const squareTube = (lambdab: string) => ({
    ...{ kind: 'rect-hss', square: 'yes', A: '10 in²', Ix: '100 in⁴', Iy: '100 in⁴' },
    ...{ rx: '4 in', ry: '4 in', J: '150 in⁴', t: '0.2 in', lambdab, lambdah: lambdab },
  });
  const stress = (radius: string) =>
    compressionOf({
      Fy: '50 ksi',
      section: { ...squareTube('20'), ry: radius, rx: radius },
      lengths: square('20 ft'),
    });
  it('E3-2 over E3-3 at Fy/Fe = 2.25: 0.658^2.25·2.25/0.877 = 1.00044', () => {
    // r = Lc·√(Fy/2.25/E)/π = 240·√(50/2.25/29000)/π = 2.1147358 in, on either side.
    const [inelastic, elastic] = [stress('2.114737 in'), stress('2.114734 in')];
    expect(inelastic?.outcome('E3/branch')).toMatch(/E3-2/);
    expect(elastic?.outcome('E3/branch')).toMatch(/E3-3/);
    const ratio = (inelastic?.at('E3/Fn') ?? 0) / (elastic?.at('E3/Fn') ?? 1);
    expect(ratio).toBeCloseTo(1.00044, 4);
  });
  it('E7-3 of HSS walls at its start: (1 − 0.20·1.38)·1.38 = 0.99912', () => {
    // At Fn = Fy the limit is λr = 33.71646 itself; Pns just above it.
    const c = compressionOf({
      Fy: '50 ksi',
      section: squareTube('33.7165'),
      lengths: square('10 ft'),
    });
    expect(c.at('C2/wall/width') / c.at('E7/wall/b')).toBeCloseTo(0.99912, 4);
  });
  it('E7-3 of webs would start 0.11 % above the full width, which counts', () => {
    // (1 − 0.18·1.31)·1.31 = 1.0011.
    const section = {
      ...{ kind: 'box', A: '20 in²', Ix: '800 in⁴', Iy: '800 in⁴', rx: '6 in', ry: '6 in' },
      ...{ J: '900 in⁴', b: '10 in', h: '10.765 in', tf: '0.5 in', tw: '0.3 in' },
      ...{ lambdab: '20', lambdah: '35.884' },
    };
    const c = compressionOf({ Fy: '50 ksi', section, lengths: square('10 ft') });
    expect(c.at('C2/web/be') / c.at('C2/web/width')).toBeCloseTo(1.0011, 4);
    near(c.at('C2/web/width', 'in'), 10.765);
  });
});

it('Table E7.1 is found by its printed rows', () => {
  expect(publishedEffectiveWidth('(b) walls of square and rectangular HSS', 'c1')).toMatchObject({
    published: '0.20',
  });
  expect(publishedEffectiveWidth('(d)', 'c1')).toBeNull();
});
