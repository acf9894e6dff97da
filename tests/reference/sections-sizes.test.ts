import { describe, expect, it } from 'vitest';
import { closeLines } from '#shared/calc/closure.ts';
import { closureProblems } from '#shared/calc/closure-problems.ts';
import { isValued, type Line } from '#shared/calc/line.ts';
import { createRecorder } from '#shared/calc/recorder.ts';
import { quantityReader } from '#shared/members/given-values.ts';
import type { ResolvedSteel } from '#shared/members/material.ts';
import { findGrade, steelFor } from '#shared/members/material.ts';
import { resolveSection } from '#shared/members/resolve-section.ts';
import { sectionLines } from '#shared/members/section-lines.ts';
import type { SectionSizesInput } from '#shared/sections/sizes.ts';
import { UNIT_SETS } from '#shared/units/unit-set.ts';
import { seededRandom } from '../rules/random.ts';
import { roundsTo } from './printed-digits.ts';

/* Sections by their sizes, from INPUT.json's form to the lines of the sheet. */
const IN: Readonly<Record<string, number>> = {
  none: 1,
  length: 25.4,
  area: 25.4 ** 2,
  modulus: 25.4 ** 3,
  inertia: 25.4 ** 4,
  warping: 25.4 ** 6,
};

const steelNamed = (key: string, product: 'plates' | 'rectangular tubes' | 'round tubes') => {
  const grade = findGrade(key);
  const found = grade && steelFor(grade, product, 10);
  if (!found) throw new Error(key);
  return { kind: 'grade', ...found } as const satisfies ResolvedSteel;
};
const PLATE = steelNamed('A572 Gr. 50', 'plates');

function linesOf(input: SectionSizesInput, steel: ResolvedSteel = PLATE): readonly Line[] {
  const problems: string[] = [];
  const problem = (path: string, message: string) => problems.push(`${path} ${message}`);
  const { section } = resolveSection(input, problem, quantityReader(problem));
  if (!section) throw new Error(problems.join('; '));
  const r = createRecorder('');
  sectionLines(r, section, steel);
  return r.lines;
}

/** Values in inches by key without `section/`. */
const inches = (lines: readonly Line[]): Record<string, number> =>
  Object.fromEntries(
    lines
      .filter(isValued)
      .map((l) => [l.key.replace('section/', ''), l.value / (IN[l.dimension] as number)]),
  );

/** Agreement with a working to seven digits. */
function agrees(lines: readonly Line[], expected: Readonly<Record<string, number>>): void {
  const found = inches(lines);
  for (const [key, value] of Object.entries(expected))
    expect(Math.abs((found[key] as number) / value - 1), `${key}: ${found[key]}`).toBeLessThan(
      1e-6,
    );
}

describe('doubly symmetric I-shape of plates', () => {
  /* AISC Design Examples v16.0 (2023), E.2: PL 1 × 8, web PL 1/4 × 15. */
  it('E.2', () => {
    const found = inches(
      linesOf({ shape: 'i', d: '17 in', bf: '8 in', tf: '1 in', tw: '0.25 in' }),
    );
    const printed = { A: '19.8', Iy: '85.4', ry: '2.08', Ix: '1100', J: '5.41' };
    for (const [key, text] of Object.entries({ ...printed, lambdaf: '4.00', lambdaw: '60.0' }))
      expect(roundsTo(found[key] as number, text), key).toBe(true);
    // The source goes on from its printed Iy = 85.4 in⁴: 85.4 · 16²/4 = 5466, printed as 5470 in⁶.
    expect(Math.abs((found.Cw as number) / 85.4 / 64 - 1)).toBeLessThan(0.001);
    expect(roundsTo((85.4 * 16 ** 2) / 4, '5470')).toBe(true);
  });
  /* The same, E.3: PL 3/8 × 10-1/2, web PL 1/4 × 7-1/4. */
  it('E.3', () => {
    const found = inches(
      linesOf({ shape: 'i', d: '8 in', bf: '10.5 in', tf: '0.375 in', tw: '0.25 in' }),
    );
    const printed = { A: '9.69', Iy: '72.4', ry: '2.73', Ix: '122', Cw: '1050', J: '0.407' };
    for (const [key, text] of Object.entries({ ...printed, lambdaf: '14.0', lambdaw: '29.0' }))
      expect(roundsTo(found[key] as number, text), key).toBe(true);
  });
  /*
   * Moduli of E.2 by hand, as a rectangle less two: Ix = (8·17³ − 7.75·15³)/12 = 1095.6458,
   * Sx = 2 Ix/17 = 128.8995, Zx = (8·17² − 7.75·15²)/4 = 142.0625, Iy = (2·8³ + 15·0.25³)/12
   * = 85.352865, Sy = 2 Iy/8 = 21.338216, Zy = (2·8² + 15·0.25²)/4 = 32.234375,
   * rx = √(1095.6458/19.75) = 7.448204, rts = √(√(85.352865·85.352865·64)/128.8995) = 2.301592.
   */
  it('moduli by hand', () => {
    agrees(linesOf({ shape: 'i', d: '17 in', bf: '8 in', tf: '1 in', tw: '0.25 in' }), {
      ...{ Ix: 1095.6458333, Sx: 128.8995098, Zx: 142.0625, Iy: 85.3528646, Sy: 21.3382161 },
      ...{ Zy: 32.234375, rx: 7.4482043, rts: 2.3015924, ho: 16, h: 15 },
    });
  });
});

/*
 * By hand as three rectangles from the bottom face up: A = Σ w (b − a), ȳ = Σ w (b² − a²)/2 / A,
 * Ix = Σ w ((b − ȳ)³ − (a − ȳ)³)/3, yp where the areas on both sides are equal,
 * Zx = Σ w |∫(y − yp) dy|; Iy = Σ (b − a) w³/12; Zy = Σ (b − a) w²/4; J = Σ b t³/3; with the flanges'
 * It and Ib: Cw = ho²/(1/It + 1/Ib), shear centre ho It/(It + Ib) from the bottom flange's centroid.
 */
describe('singly symmetric I-shape of plates', () => {
  it('plastic neutral axis in the web', () => {
    agrees(
      linesOf({
        ...{ shape: 'mono-i', d: '20 in', tw: '0.5 in' },
        ...{ bfTop: '8 in', tfTop: '1 in', bfBottom: '12 in', tfBottom: '0.75 in' },
      }),
      {
        ...{ A: 26.125, ybot: 9.549641148, Ix: 1804.9638758, Sx: 172.71790606, yp: 8.875 },
        ...{ 'top/S': 172.71790606, 'bottom/S': 189.00855 },
        ...{ Zx: 203.6328125, Iy: 150.8567708, Zy: 44.140625, J: 5.1145833, Cw: 11186.5955 },
        // hc = 2 (20 − 9.549641 − 1), 2 (9.549641 − 0.75); hp = 2 (20 − 1 − 8.875), 2 (8.875 − 0.75).
        ...{ 'top/hc': 18.900717704, 'bottom/hc': 17.599282297, 'top/hp': 20.25 },
        ...{ 'bottom/hp': 16.25, yo: -3.758712, Sy: 25.14279514 },
        ...{ 'top/lambda': 4, 'bottom/lambda': 8, lambdaw: 36.5, 'top/Iy': 42.66666667 },
      },
    );
  });
  const deep = { A: 25.4, Ix: 1061.0339239, Zx: 96.25916667, Iy: 218.7071667, Zy: 56.405 };
  it('in the bottom flange, whose hp is below zero', () => {
    agrees(
      linesOf({
        ...{ shape: 'mono-i', d: '20 in', tw: '0.3 in' },
        ...{ bfTop: '4 in', tfTop: '0.5 in', bfBottom: '12 in', tfBottom: '1.5 in' },
      }),
      {
        ...deep,
        ...{ ybot: 4.318897638, yp: 1.058333333, J: 13.82866667, Cw: 950.9267887 },
        ...{ yo: -3.337190131, 'bottom/hp': -0.8833333333, Sx: 67.6632 },
      },
    );
  });
  it('in the top flange: the same turned over', () => {
    agrees(
      linesOf({
        ...{ shape: 'mono-i', d: '20 in', tw: '0.3 in' },
        ...{ bfTop: '12 in', tfTop: '1.5 in', bfBottom: '4 in', tfBottom: '0.5 in' },
      }),
      {
        ...deep,
        ...{ ytop: 4.318897638, yp: 18.94166667, yo: 3.337190131, 'top/hp': -0.8833333333 },
      },
    );
  });
});

/*
 * By hand as the outside rectangle less the inside one: A = 12·20 − 11·18, Ix = (12·20³ − 11·18³)/12,
 * Iy = (20·12³ − 18·11³)/12, Zx = (12·20² − 11·18²)/4, Zy = (20·12² − 18·11²)/4;
 * J = 4 (11.5·19)²/(2 (11.5/1 + 19/0.5)).
 */
it('box of plates', () => {
  agrees(linesOf({ shape: 'box', B: '12 in', d: '20 in', tf: '1 in', tw: '0.5 in' }), {
    ...{ A: 42, Ix: 2654, Iy: 883.5, Zx: 309, Zy: 175.5, Sx: 265.4, Sy: 147.25 },
    ...{ J: 1928.979798, b: 11, h: 18, lambdab: 11, lambdah: 36 },
  });
});

/*
 * 12 × 10 × 0.349 in, corners 0.698 in outside: outside less inside rounded rectangle, by integration
 * over strips of 10⁻⁵ in (Ix 309.87738, Zx 61.09036, Iy 234.30711, Zy 53.96963), area
 * 120 − 9.302·11.302 − (4 − π)(0.698² − 0.349²) = 14.555131; J = 4 Am² t/p with Am = 9.651·11.651 −
 * (4 − π) 0.5235², p = 2·21.302 − 2 (4 − π) 0.5235: 421.45056. b/t = (10 − 3·0.349)/0.349.
 */
describe('rectangular tube', () => {
  const size = { shape: 'tube', B: '10 in', Ht: '12 in' } as const;
  it('by its design wall', () => {
    agrees(linesOf({ ...size, t: '0.349 in', wall: 'design' }), {
      ...{ A: 14.5551314, Ix: 309.877378, Zx: 61.0903601, Iy: 234.307114, Zy: 53.9696267 },
      ...{ J: 421.45056, lambdab: 25.6532951, lambdah: 31.3839542, Ro: 0.698 },
    });
  });
  it('with the same corners given: flat widths less the radii', () => {
    agrees(linesOf({ ...size, t: '0.349 in', wall: 'design', Ro: '0.698 in' }), {
      // (10 − 2·0.698)/0.349, (12 − 2·0.698)/0.349
      ...{ A: 14.5551314, Ix: 309.877378, lambdab: 24.6532951, lambdah: 30.3839542 },
    });
  });
  it('by its nominal wall: 0.93 of it, for A1085 all of it', () => {
    const nominal = { ...size, t: '0.375 in', wall: 'nominal' } as const;
    const choice = (lines: readonly Line[]) => lines.find((l) => l.kind === 'choice')?.outcome;
    const reduced = linesOf(nominal, steelNamed('A500 Gr. C', 'rectangular tubes'));
    agrees(reduced, { tnom: 0.375, t: 0.34875 });
    expect(choice(reduced)).toBe('the design wall thickness is 0.93 of the nominal one');
    const whole = linesOf(nominal, steelNamed('A1085', 'rectangular tubes'));
    agrees(whole, { tnom: 0.375, t: 0.375 });
    expect(choice(whole)).toBe('the nominal thickness is the design wall thickness');
  });
});

/* π/4 (D² − d²), π/64 (D⁴ − d⁴), (D³ − d³)/6 and √(D² + d²)/4 with d = 8.625 − 2·0.465 = 7.695. */
it('round tube', () => {
  agrees(linesOf({ shape: 'round', D: '8.625 in', t: '0.5 in', wall: 'nominal' }), {
    ...{ A: 11.92045916, Ix: 99.53855338, Zx: 30.99581883, J: 199.0771068, rx: 2.889676128 },
    ...{ t: 0.465, lambdad: 18.5483871 },
  });
});

describe('closure of sections by sizes', () => {
  const random = seededRandom(7);
  const typed = (mm: number) =>
    random.chance(0.5) ? `${Number(mm.toPrecision(3))} mm` : `${(mm / 25.4).toPrecision(4)} in`;
  const between = (a: number, b: number) => random.between(a, b);
  const anySection = (): SectionSizesInput => {
    const d = between(150, 1500);
    const t = () => typed(between(5, 60));
    return random.pick<() => SectionSizesInput>([
      () => ({ shape: 'i', d: typed(d), bf: typed(d * between(0.2, 0.9)), tf: t(), tw: t() }),
      () => ({
        ...{ shape: 'mono-i', d: typed(d), tw: typed(between(5, 30)) },
        ...{ bfTop: typed(d * between(0.2, 0.6)), tfTop: t() },
        ...{ bfBottom: typed(d * between(0.2, 0.6)), tfBottom: t() },
      }),
      () => ({ shape: 'box', d: typed(d), B: typed(d * between(0.5, 0.9)), tf: t(), tw: t() }),
      () => ({
        ...{ shape: 'tube', Ht: typed(d), B: typed(d * between(0.6, 1)) },
        ...{ t: typed(d * between(0.01, 0.1)), wall: random.pick(['design', 'nominal'] as const) },
      }),
      () => ({ shape: 'round', D: typed(d), t: typed(d * between(0.005, 0.2)), wall: 'nominal' }),
    ])();
  };
  it('prints what follows from what is printed, for 120 sections in both unit sets', () => {
    let read = 0;
    for (let i = 0; i < 120; i++) {
      const problem = () => undefined;
      const { section } = resolveSection(anySection(), problem, quantityReader(problem));
      if (!section) continue;
      read++;
      const r = createRecorder('');
      sectionLines(r, section, PLATE);
      for (const set of Object.values(UNIT_SETS)) {
        const placed = r.lines.map((line) => ({ address: line.key, combination: null, line }));
        const closed = closeLines(placed, set).map((line) => ({
          ...{ address: line.key, combination: null, line },
        }));
        expect(closureProblems(closed, set)).toEqual([]);
      }
    }
    expect(read).toBeGreaterThan(80);
  });
});
