import { describe, expect, it } from 'vitest';
import { createRecorder } from '#shared/calc/recorder.ts';
import {
  availableMajor,
  availableYielding,
  ltbRange,
  majorSection,
} from '#shared/members/major-flexure.ts';
import { methodConstant } from '#shared/standards/aisc360-22/parameters.ts';
import { closureFaults, type FlexureCase, majorOf, minorOf } from './flexure-of.ts';
import { quantity, sectionOf, steelOf, type Texts } from './given-texts.ts';

/*
 * Structural: the strength does not rise with the unbraced length and has no step at the limits of
 * the branches, but for those of the standard itself, by hand:
 *   F2-4 and F4-5 at Lr: 1.95 and 6.76 are rounded: up to 0.15 %.
 *   F3-2 at λr of a rolled flange: 0.9·kc against 0.7; of a built-up one, and F5-9: 0.9/0.95² = 0.9972 against 1: 0.28 %.
 *   F7-4 at λr of an HSS: 1.92·(1 − 0.38/1.40)/1.40 = 0.99918 of the flange; a box 0.99457.
 *   F8-4 at λr: 0.33/0.31 = 1.06452 against 1 + 0.021/0.31 = 1.06774: 0.30 %.
 */
const ROOT = Math.sqrt(29000 / 50);

const rolled: Texts = {
  ...{ kind: 'i', made: 'rolled', bf: '7.5 in', tf: '0.57 in', tw: '0.355 in' },
  ...{ lambdaf: '6.57', lambdaw: '45.2', Sx: '88.9 in³', Zx: '101 in³', Ix: '800 in⁴' },
  ...{ Iy: '40.1 in⁴', Sy: '10.7 in³', Zy: '16.6 in³', ry: '1.65 in', J: '1.24 in⁴' },
  ...{ rts: '1.98 in', ho: '17.4 in' },
};
const builtUp: Texts = { ...rolled, made: 'built-up' };
const channel: Texts = {
  ...{ kind: 'channel', lambdaf: '5.23', lambdaw: '31.8', Sx: '42.0 in³', Zx: '50.8 in³' },
  ...{ Ix: '315 in⁴', Iy: '8.07 in⁴', ry: '0.901 in', J: '1.01 in⁴', Cw: '358 in⁶' },
  ...{ rts: '1.13 in', ho: '14.4 in' },
};
const hss: Texts = {
  ...{ kind: 'rect-hss', square: 'no', A: '5.37 in²', Ht: '10 in', B: '6 in', t: '0.174 in' },
  ...{ lambdab: '31.5', lambdah: '54.5', Ix: '74.6 in⁴', Iy: '34.1 in⁴', Sx: '14.92 in³' },
  ...{ Zx: '18.0 in³', Sy: '11.36666666667 in³', Zy: '12.7 in³', ry: '2.52 in', J: '73.8 in⁴' },
};
const box: Texts = {
  ...{ kind: 'box', square: 'no', b: '20 in', h: '30 in', tf: '0.75 in', tw: '0.5 in' },
  ...{ d: '31.5 in', lambdab: '26.7', lambdah: '60', A: '61.5 in²', Ix: '9698 in⁴' },
  ...{ Iy: '4310 in⁴', Sx: '615.746031746 in³', Zx: '709.3 in³', Sy: '410.5 in³', Zy: '472.9 in³' },
  ...{ ry: '8.372 in', J: '8946 in⁴' },
};
const round: Texts = {
  ...{ kind: 'round', lambdad: '50', Sx: '60 in³', Zx: '78 in³', Sy: '60 in³', Zy: '78 in³' },
};
const Fy = '50 ksi';
const F4 = { ...builtUp, lambdaw: '110', tf: '0.57 in' };
const F5 = { ...builtUp, lambdaw: '160', tf: '0.57 in' };

const KEYS = ['F2/Mn', 'F4/Mn', 'F5/Mn', 'F7/x/Mn', 'F8/x/Mn'];
const MINOR = ['F6/Mn', 'F6/Mp', 'F7/y/Mn', 'F8/y/Mn'];

const strength = (section: Texts, Lb = '0 in'): number => {
  const c: FlexureCase = { Fy, section, Lb };
  const found = majorOf(c);
  const key = KEYS.find(found.has);
  if (!key) throw new Error(`no strength: ${found.codes}`);
  return found.at(key, 'kip in');
};
const minor = (section: Texts): number => {
  const found = minorOf({ Fy, section, Lb: '0 in' });
  const key = MINOR.find(found.has);
  if (!key) throw new Error(`no strength: ${found.codes}`);
  return found.at(key, 'kip in');
};

/** Strength just beyond a limit over the strength just within it. */
const step = (of: (x: number) => number, limit: number): number =>
  of(limit * (1 + 1e-9)) / of(limit * (1 - 1e-9));

describe('along the unbraced length', () => {
  for (const [name, section, key, jump] of [
    ['F2, rolled', rolled, 'F2', 0.0015],
    ['F2, channel', channel, 'F2', 0.0015],
    ['F4', F4, 'F4', 0.0015],
    ['F5', F5, 'F5', 1e-7],
    ['F7, HSS', hss, 'F7/x', 1e-7],
    ['F7, box', box, 'F7/x', 1e-7],
  ] as const) {
    const limits = majorOf({ Fy, section, Lb: '100000 in' });
    const [Lp, Lr] = [limits.at(`${key}/Lp`, 'in'), limits.at(`${key}/Lr`, 'in')];
    const along = (Lb: number) => strength(section, `${Lb} in`);
    it(`${name}: no step at Lp and at Lr`, () => {
      expect(Math.abs(step(along, Lp) - 1)).toBeLessThan(1e-7);
      expect(Math.abs(step(along, Lr) - 1)).toBeLessThan(jump);
    });
    it(`${name}: never rises`, () => {
      const lengths = Array.from({ length: 60 }, (_, i) => (i * Lr) / 20);
      const strengths = lengths.map(along);
      expect(strengths.at(-1)).toBeLessThan(0.6 * (strengths[0] ?? 0));
      strengths.slice(1).forEach((M, i) => {
        expect(M, `${lengths[i + 1]}`).toBeLessThanOrEqual((strengths[i] ?? 0) * 1.0015);
      });
    });
  }
});

describe('along the slenderness of the flange', () => {
  const by = (section: Texts, name: string) => (x: number) =>
    strength({ ...section, [name]: String(x) });
  const wider = (x: number) =>
    strength({ ...box, lambdah: '50', lambdab: String(x), b: `${0.75 * x} in` });
  const kc = 4 / Math.sqrt(45.2);
  for (const [name, of, limit, low, high] of [
    ['F3 at λp', by(rolled, 'lambdaf'), 0.38 * ROOT, 1, 1],
    // 0.9·kc·Fy·Sx against 0.7·Fy·Sx with kc = 4/√45.2.
    ['F3-2 at λr', by(rolled, 'lambdaf'), ROOT, (0.9 * kc) / 0.7, (0.9 * kc) / 0.7],
    [
      'F3-2 at λr of row 11',
      by(builtUp, 'lambdaf'),
      0.95 * Math.sqrt((kc * 29000) / 35),
      0.9972,
      0.9973,
    ],
    ['F4-13 at λp', by(F4, 'lambdaf'), 0.38 * ROOT, 1, 1],
    [
      'F4-14 at λr',
      by(F4, 'lambdaf'),
      0.95 * Math.sqrt(((4 / Math.sqrt(110)) * 29000) / 35),
      0.9972,
      0.9973,
    ],
    ['F5-8 at λp', by(F5, 'lambdaf'), 0.38 * ROOT, 1, 1],
    ['F5-9 at λr', by(F5, 'lambdaf'), 0.95 * Math.sqrt((0.35 * 29000) / 35), 0.9972, 0.9973],
    ['F7-2 at λp', by(hss, 'lambdab'), 1.12 * ROOT, 1, 1],
    ['F7-3 at λr, HSS', by(hss, 'lambdab'), 1.4 * ROOT, 0.999, 0.99999],
    ['F7-3 at λr, box', wider, 1.49 * ROOT, 0.994, 0.9999],
    ['F8-2 at λp', by(round, 'lambdad'), (0.07 * 29000) / 50, 1, 1],
    ['F8-3 at λr', by(round, 'lambdad'), (0.31 * 29000) / 50, 0.99697, 0.99698],
  ] as const)
    it(name, () => {
      const found = step(of, limit);
      expect(found).toBeGreaterThan(low - 1e-6);
      expect(found).toBeLessThan(high + 1e-6);
    });
  it('F6 at λp and λr', () => {
    const of = (x: number) => minor({ ...rolled, lambdaf: String(x) });
    expect(Math.abs(step(of, 0.38 * ROOT) - 1)).toBeLessThan(1e-7);
    expect(Math.abs(step(of, ROOT) - 1)).toBeLessThan(1e-7);
  });
  it('F7 about y at λp of the wall', () => {
    const of = (x: number) => minor({ ...hss, lambdah: String(x) });
    expect(Math.abs(step(of, 1.12 * ROOT) - 1)).toBeLessThan(1e-7);
    expect(step(of, 1.4 * ROOT)).toBeGreaterThan(0.999);
  });
});

describe('along the slenderness of the web', () => {
  const by = (section: Texts, name: string) => (x: number) =>
    strength({ ...section, [name]: String(x) });
  it('F2, F4, F5', () => {
    const of = by(builtUp, 'lambdaw');
    expect(Math.abs(step(of, 3.76 * ROOT) - 1)).toBeLessThan(1e-6);
    expect(Math.abs(step(of, 5.7 * ROOT) - 1)).toBeLessThan(1e-6);
    expect(of(120)).toBeLessThan(of(80));
    expect(of(200)).toBeLessThan(of(120));
  });
  it('F7-6 and F7-7', () => {
    const of = by({ ...box, lambdab: '20' }, 'lambdah');
    expect(Math.abs(step(of, 2.42 * ROOT) - 1)).toBeLessThan(1e-6);
    expect(Math.abs(step(of, 5.7 * ROOT) - 1)).toBeLessThan(1e-6);
    expect(of(150)).toBeLessThan(of(100));
  });
});

describe('outside the scope of Chapter F', () => {
  const codes = (section: Texts, flanges?: FlexureCase['flanges']) =>
    majorOf({ Fy, section, Lb: '0 in', ...(flanges && { flanges }) });
  for (const [name, section, code] of [
    ['a channel with a noncompact flange', { ...channel, lambdaf: '9.2' }, 'channel-not-compact'],
    ['a channel with a noncompact web', { ...channel, lambdaw: '91' }, 'channel-not-compact'],
    ['an HSS with slender webs', { ...hss, lambdah: '138' }, 'webs-slender'],
    [
      'a box with slender webs and flanges',
      { ...box, lambdab: '36', lambdah: '138' },
      'webs-slender',
    ],
    ['a round wall of 0.45E/Fy', { ...round, lambdad: '261' }, 'wall-too-slender'],
    // F13-4: 0.40·29 000/50 = 232.
    ['a web above F13-4', { ...F5, lambdaw: '232.1' }, 'web-proportion'],
    ['a web of ten flange areas', { ...F5, tf: '0.26 in' }, 'web-proportion'],
    ['exchanged axes', { ...box, Iy: '9699 in⁴' }, 'axes-exchanged'],
  ] as const)
    it(name, () => {
      const found = codes(section);
      expect(found.section).toBeNull();
      expect(found.codes).toContain(code);
      expect(found.lines.some((l) => l.key === 'F1/x/Mc')).toBe(false);
    });
  it('exchanged axes, about y', () => {
    const found = minorOf({ Fy, section: { ...box, Iy: '9699 in⁴' }, Lb: '0 in' });
    expect(found.codes).toEqual(['axes-exchanged']);
    expect(found.has('F1/y/Mc')).toBe(false);
  });
  it('a square or round section does not buckle laterally at any length', () => {
    for (const section of [{ ...hss, square: 'yes' }, round]) {
      const found = majorOf({ Fy, section, Lb: '100000 in' });
      expect(found.codes).toEqual(['no-lateral-torsional-buckling']);
      expect(found.lines.some((l) => l.key.endsWith('/LTB/range'))).toBe(false);
      expect(found.has('F1/x/Mc')).toBe(true);
    }
  });
  it('just within them', () => {
    for (const section of [
      { ...round, lambdad: '260.9' },
      { ...F5, lambdaw: '231.9' },
      // The web over the flange: 160·0.355²/(7.5·0.27) = 9.9575.
      { ...F5, tf: '0.27 in' },
    ])
      expect(codes(section).section).not.toBeNull();
  });
  it('a web of 260 without stiffeners, in a mild steel', () => {
    // F13-4 at 36 ksi: 322.
    const found = (lambdaw: string) =>
      majorOf({ Fy: '36 ksi', section: { ...F5, lambdaw, bf: '15 in' }, Lb: '0 in' });
    expect(found('260.1').codes).toContain('web-proportion');
    expect(found('259.9').section).not.toBeNull();
  });
  for (const [Iyf, outside] of [
    ['9.9 in⁴', true],
    ['10.1 in⁴', false],
    ['89.9 in⁴', false],
    ['90.1 in⁴', true],
  ] as const)
    it(`F13-2: a compression flange of ${Iyf} out of 100 in⁴`, () => {
      const flange = {
        ...{ b: '10 in', t: '1 in', lambda: '5', Iyf, S: '300 in³' },
        ...{ hc: '20 in', hp: '18 in' },
      };
      const section = {
        ...{ kind: 'mono-i', made: 'built-up', tw: '0.4 in', h: '20 in', lambdaw: '50' },
        ...{ Ix: '4000 in⁴', Iy: '100 in⁴', Sx: '300 in³', Zx: '350 in³', J: '5 in⁴' },
        ho: '21 in',
      };
      const found = codes(section, { top: flange, bottom: { ...flange, Iyf: '50 in⁴' } });
      expect(found.codes.includes('flange-proportion')).toBe(outside);
      expect(found.section === null).toBe(outside);
    });
  it('a plastic neutral axis in the compression flange leaves row 16 at its bound, a centroid there nothing', () => {
    const flange = {
      ...{ b: '10 in', t: '1 in', lambda: '5', Iyf: '50 in⁴', S: '300 in³' },
      ...{ hc: '20 in', hp: '-0.2 in' },
    };
    const section = {
      ...{ kind: 'mono-i', made: 'built-up', tw: '0.4 in', h: '20 in', lambdaw: '50' },
      ...{ Ix: '4000 in⁴', Iy: '100 in⁴', Sx: '300 in³', Zx: '350 in³', J: '5 in⁴' },
      ho: '21 in',
    };
    const within = codes(section, { top: flange, bottom: flange });
    expect(within.outcome('B4/x/web/class')).toBe('the web is compact');
    const top = { ...flange, hc: '-0.1 in' };
    expect(codes(section, { top, bottom: flange }).codes).toContain('web-not-compressed');
  });
});

describe('segments of one member', () => {
  const member = (longest: string | null) => {
    const r = createRecorder('');
    const m = majorSection(
      r,
      steelOf(r, { E: '29000 ksi', Fy }),
      sectionOf(r, rolled),
      'top',
      longest === null ? null : quantity(r, 'longest', longest),
      methodConstant(r, 'flexure', 'LRFD'),
    );
    if (!m) throw new Error('outside scope');
    return { r, m, keys: () => r.lines.map((l) => l.key) };
  };
  it('Lp and Lr are written as far as the longest segment needs them', () => {
    expect(member(null).keys()).not.toContain('F2/Lp');
    expect(member('0 in').keys()).not.toContain('F2/Lp');
    // Lp = 69.938 in (Design Examples v16.0, F.1-2B).
    expect(member('69.9 in').keys()).toContain('F2/Lp');
    expect(member('69.9 in').keys()).not.toContain('F2/Lr');
    expect(member('70 in').keys()).toContain('F2/Lr');
  });
  it('each has its lines under its part, and its own range', () => {
    const { r, m, keys } = member('300 in');
    const strengths = ['0 in', '60 in', '140 in', '300 in'].map((text, i) => {
      const part = r.within(`s${i + 1}`);
      const range = ltbRange(part, m, quantity(part, 'Lb', text));
      const Cb = range.needsCb ? quantity(part, 'Cb', '1.0') : null;
      return { range, Mc: availableMajor(part, 'LRFD', m, range, Cb).value };
    });
    expect(strengths.map((s) => s.range.range)).toEqual([
      'continuous',
      'yielding',
      'inelastic',
      'elastic',
    ]);
    expect(strengths.map((s) => s.range.needsCb)).toEqual([false, false, true, true]);
    expect(keys()).toContain('s3/F2/Mn');
    expect(keys()).toContain('s4/F1/x/Mc');
    const [first, second, third, fourth] = strengths.map((s) => s.Mc);
    expect(second).toBe(first);
    expect(third).toBeLessThan(second ?? 0);
    expect(fourth).toBeLessThan(third ?? 0);
  });
  it('a missing Cb, and a segment beyond the longest, are errors of the caller', () => {
    const { r, m } = member('69 in');
    expect(() => ltbRange(r, m, quantity(r, 'Lb', '100 in'))).toThrow(/Lr is not written/);
    const other = member('300 in');
    const range = ltbRange(other.r, other.m, quantity(other.r, 'Lb', '300 in'));
    expect(() => availableMajor(other.r, 'LRFD', other.m, range, null)).toThrow(/Cb is missing/);
  });
  it('yielding strength by itself: 0.9·5050 kip in', () => {
    const { r, m } = member('300 in');
    const Mc = availableYielding(r, 'H1/inPlane', 'LRFD', m);
    expect(Mc.value / (0.9 * 5050 * 4448.2216152605 * 25.4)).toBeCloseTo(1, 9);
    expect(Mc.ref).toBe('H1/inPlane/Mc');
  });
});

describe('what is printed reproduces from what is printed', () => {
  const cases: readonly (readonly [string, Texts])[] = [
    ['rolled', rolled],
    ['rolled, slender flange', { ...rolled, lambdaf: '30' }],
    ['built-up', { ...builtUp, lambdaf: '12' }],
    ['channel', channel],
    ['F4', { ...F4, lambdaf: '12' }],
    ['F5', { ...F5, lambdaf: '19' }],
    ['HSS', { ...hss, lambdab: '40' }],
    ['box', { ...box, lambdab: '40' }],
    ['box, slender webs', { ...box, lambdah: '150' }],
    ['round', round],
    ['round, slender', { ...round, lambdad: '190' }],
  ];
  for (const [name, section] of cases)
    it(name, () => {
      const runs = [
        ...['0 in', '70 in', '200 in', '3000 in'].map((Lb) =>
          majorOf({ Fy, section, Lb, Cb: '1.137' }, 'ASD'),
        ),
        minorOf({ Fy, section: { Sy: '10.7 in³', Zy: '16.6 in³', ...section }, Lb: '0 in' }),
      ];
      expect(runs.flatMap(closureFaults)).toEqual([]);
    });
});
