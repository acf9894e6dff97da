import { type Crossing, plainKey } from './crossings.ts';
import type { Run } from './results.ts';

/** The checks that a jump moves: of the axial force, of either moment, of shear. */
export type Part = 'axial' | 'x' | 'y' | 'shear';

/** A step where one rule takes over from another. */
export interface Jump {
  readonly name: string;
  /** Plain keys of the decisions that may change. */
  readonly at: readonly string[];
  readonly parts: readonly Part[];
  /** Whether strengths jump, or required moments and forces. */
  readonly of: 'capacity' | 'demand';
  /** The largest step: a share of the larger value. */
  readonly size: (c: Crossing) => number;
  /** The step has this size, and not merely no more. */
  readonly exact?: true;
}

const linesOf = (c: Crossing, key: string) =>
  [c.before, c.after].flatMap((r) =>
    [...r.lines].flatMap(([address, line]) => (plainKey(address) === key ? [line] : [])),
  );
const values = (c: Crossing, key: string): readonly number[] =>
  linesOf(c, key).flatMap((line) => ('value' in line ? [line.value] : []));
const one = (c: Crossing, key: string): number => {
  const [value] = values(c, key);
  if (value === undefined) throw new Error(`no line ${key}`);
  return value;
};
const has = (r: Run, key: string): boolean => [...r.lines.keys()].some((a) => plainKey(a) === key);
const either = (c: Crossing, key: string): boolean => has(c.before, key) || has(c.after, key);
/** Whether a choice has such an outcome on one side. */
const says = (c: Crossing, key: string, word: RegExp): boolean =>
  linesOf(c, key).some((line) => line.kind === 'choice' && word.test(line.outcome));

/** E3-2 at Fy/Fe = 2.25 is 0.658^2.25 Fy, E3-3 there 0.877/2.25 Fy. */
export const E3_STEP = 1 - 0.877 / 2.25 / 0.658 ** 2.25;
/** E7-3 at λr√(Fy/Fn) with row (b) of Table E7.1, walls of HSS; with rows (a), (c) it is above 1. */
export const E7_STEP = 1 - 1.38 * (1 - 0.2 * 1.38);
/**
 * F2-4 (F4-5) at Lr of F2-6 (F4-8) over 0.7Fy (FL), with X = J c/(Sx ho): for X = 0 it is
 * (π/(1.95·√2.6))² = 0.99829, grows with X to 0.99954 and stays below 1.
 */
const LR_STEP = 1 - (Math.PI / (1.95 * Math.sqrt(2.6))) ** 2;
/** F7-4 and F7-5 at λr over the full width. */
const HSS_WIDTH = (1.92 / 1.4) * (1 - 0.38 / 1.4);
const BOX_WIDTH = (1.92 / 1.49) * (1 - 0.34 / 1.49);
/** Tables round S and I to three digits each; Se is from I. */
const TABLE = 0.005;

const AXES = ['x', 'y'] as const;

/** The steps of ANSI/AISC 360-22 itself, with the sizes that its equations give. */
export const JUMPS: readonly Jump[] = [
  {
    name: 'E3: E3-3 begins below the end of E3-2 at Fy/Fe = 2.25',
    ...{ at: ['E3/branch'], parts: ['axial'], of: 'capacity', exact: true },
    size: () => E3_STEP,
  },
  {
    name: 'E4: torsion of rolled shapes counts from Lcz > Lcy on, with the stress it has there',
    ...{ at: ['E4/applies'], parts: ['axial'], of: 'capacity' },
    size: (c) => 1 - Math.min(...values(c, 'E3/Fe')) / Math.max(...values(c, 'E3/Fe')),
  },
  {
    name: 'E7: E7-3 begins below the full width in walls of HSS',
    at: ['E7/flange/effective', 'E7/web/effective', 'E7/wall/effective'],
    ...{ parts: ['axial'], of: 'capacity' },
    size: (c) => (has(c.before, 'B4/wall/lambdar') ? E7_STEP : 0),
  },
  ...['F2', 'F4'].map((number): Jump => {
    const key = `${number}/LTB/range`;
    return {
      name: `${number}: elastic lateral-torsional buckling begins below 0.7Fy at Lr`,
      ...{ at: [key], parts: ['x'], of: 'capacity' },
      size: (c) => (says(c, key, /inelastic/) && says(c, key, /is elastic/) ? LR_STEP : 0),
    };
  }),
  {
    name: 'F3: a rolled slender flange begins with 0.9kc Fy where F3-1 ends with 0.7Fy',
    ...{ at: ['B4/x/flange/class'], parts: ['x'], of: 'capacity', exact: true },
    size: (c) =>
      either(c, 'F3/kc') && says(c, 'B4/x/flange/class', /slender/)
        ? Math.abs(1 - (0.9 * one(c, 'F3/kc')) / 0.7)
        : 0,
  },
  {
    name: 'F3, F4, F5: a built-up slender flange begins with 0.9/0.95² of FL (row 11)',
    ...{ at: ['B4/x/flange/class'], parts: ['x'], of: 'capacity', exact: true },
    size: (c) =>
      either(c, 'B4/x/kc') && says(c, 'B4/x/flange/class', /slender/) ? 1 - 0.9 / 0.95 ** 2 : 0,
  },
  ...AXES.map(
    (axis): Jump => ({
      name: `F7: be begins below the full width of a slender flange, axis ${axis}`,
      ...{ at: [`B4/${axis}/flange/class`], parts: [axis], of: 'capacity' },
      // The flange is less than the whole section.
      size: (c) => {
        if (!either(c, `F7/${axis}/FLB/be`)) return 0;
        if (!says(c, `B4/${axis}/flange/class`, /noncompact/)) return 0;
        if (!either(c, 'B4/wall/lambdar')) return 1 - BOX_WIDTH;
        return 1 - HSS_WIDTH + (typeof c.before.member.section === 'string' ? TABLE : 0);
      },
    }),
  ),
  ...AXES.flatMap((axis): readonly Jump[] => {
    const key = `B4/${axis}/wall/class`;
    const jump = { at: [key], parts: [axis], of: 'capacity', exact: true } as const;
    return [
      {
        ...{ name: `F8: F8-3 begins below the end of F8-2 at λr, axis ${axis}`, ...jump },
        size: (c) => (says(c, key, /slender/) ? 1 - 0.33 / 0.31 / (1 + 0.021 / 0.31) : 0),
      },
      {
        name: `F8: F8-2 is 1.3Fy S at λp, below Fy Z of a wall with Z above 1.3S, axis ${axis}`,
        ...jump,
        size: (c) =>
          says(c, key, /slender/)
            ? 0
            : Math.max(0, 1 - one(c, `F8/${axis}/LB/Mn`) / one(c, `F8/${axis}/Mp`)),
      },
    ];
  }),
  {
    name: 'F2, F4, F5: lateral-torsional buckling has other radii and no J beyond a limit of the web',
    ...{ at: ['B4/x/web/class'], parts: ['x'], of: 'capacity' },
    size: (c) => {
      const clauses = ['F2', 'F4', 'F5'].filter((clause) => either(c, `${clause}/LTB/range`));
      return clauses.length > 1 && clauses.some((f) => either(c, `${f}/LTB/Mn`)) ? 0.5 : 0;
    },
  },
  {
    name: 'F4: up to Iyc/Iy = 0.23 the plastification factor is 1 and J counts as zero',
    ...{ at: ['F4/web/case'], parts: ['x'], of: 'capacity' },
    size: (c) => (says(c, 'F4/web/case', /J counts as zero/) ? 0.5 : 0),
  },
  {
    name: 'G2: factors 1.00 and 1.50 of a stocky rolled web, 0.90 and 1.67 of others',
    ...{ at: ['G2/x/case'], parts: ['shear'], of: 'capacity', exact: true },
    size: (c) => (c.before.member.design === 'LRFD' ? 0.1 : 1 - 1.5 / 1.67),
  },
  {
    name: 'G2: kv is 5 + 5/9 by G2-5 at a/h = 3, and 5.34 beyond',
    ...{ at: ['G2/x/panel'], parts: ['shear'], of: 'capacity', exact: true },
    size: () => 1 - Math.sqrt(5.34 / (5 + 5 / 9)),
  },
  ...[['G4/x/branch', 'G4/y/branch'], ['G6/y/branch']].map(
    (at): Jump => ({
      name: `${at[0]?.slice(0, 2)}: at 1.37√(kv E/Fy) G2-11 is 1.51/1.37², G2-10 1.10/1.37`,
      ...{ at, parts: ['shear'], of: 'capacity', exact: true },
      size: (c) =>
        at.some((key) => says(c, key, / elastically/)) ? 1 - 1.1 / 1.37 / (1.51 / 1.37 ** 2) : 0,
    }),
  ),
  {
    name: 'App. 8: Cm is that of A-8-4 where a bay has no load, 1 where it has one',
    ...{ at: ['App8/x/Cm'], parts: ['x'], of: 'demand', size: () => 1 },
  },
];

/** Rules whose two sides differ as they have to. */
export const RULES: readonly Jump[] = [
  {
    name: 'both flanges are checked as soon as moments compress both',
    ...{ at: ['F4/side'], parts: ['x'], of: 'capacity', size: () => 1 },
  },
  {
    name: 'a restraint at a flange ends a segment where that flange is compressed',
    ...{ at: ['F1/r/holds'], parts: ['x'], of: 'capacity', size: () => 1 },
  },
  {
    name: 'tension and compression have strengths of their own',
    ...{ at: ['given/sense'], parts: ['axial'], of: 'capacity', size: () => 1 },
  },
  {
    name: 'a point load over a held point is carried there and shears no bay',
    at: ['given/x/load/at', 'theory/x/first/M', 'App8/x/Cm'],
    ...{ parts: ['shear'], of: 'demand', size: () => 1 },
  },
  {
    name: 'a net section larger than the gross one has no rupture strength, and fails',
    ...{ at: ['D3/net'], parts: ['axial'], of: 'capacity', size: () => 1 },
  },
];
