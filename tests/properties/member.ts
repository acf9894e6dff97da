import type { DimensionName } from '#shared/units/dimension.ts';

/** Sizes of a section in mm, or a designation. */
export type Section =
  | string
  | { readonly shape: 'i'; d: number; bf: number; tf: number; tw: number }
  | {
      readonly shape: 'mono-i';
      d: number;
      tw: number;
      bfTop: number;
      tfTop: number;
      bfBottom: number;
      tfBottom: number;
    }
  | { readonly shape: 'box'; B: number; d: number; tf: number; tw: number }
  | { readonly shape: 'tube'; B: number; Ht: number; t: number }
  | { readonly shape: 'round'; D: number; t: number };

/** A load between the ends in N and mm. */
export type Load = {
  readonly bends: 'x' | 'y';
  readonly height?: 'top' | 'centre' | 'bottom';
} & (
  | { readonly kind: 'point'; W: number; at: number }
  | { readonly kind: 'uniform'; w: number; from?: number; to?: number }
  | { readonly kind: 'linear'; wFrom: number; wTo: number; from?: number; to?: number }
);

/** Sway of one direction of the story. */
export interface Sway {
  readonly MA: number;
  readonly MB: number;
  readonly Pstory: number;
  readonly H: number;
  readonly height: number;
  readonly drift: number;
  readonly Pmf: number;
}

/** One member under one force set as numbers in N and mm, which a property can move, scale and turn. */
export interface Member {
  readonly design: 'LRFD' | 'ASD';
  readonly method: 'direct' | 'effective-length' | 'first-order';
  readonly secondOrder: 'from-analysis' | 'amplified' | 'exact';
  readonly includesMemberEffect: boolean;
  readonly provisions: readonly string[];
  readonly section: Section;
  /** Yield stress in MPa. */
  readonly Fy: number;
  readonly L: number;
  /** Buckling and unbraced lengths, or what is held between the ends. */
  readonly lengths?: Readonly<Partial<Record<'Lcx' | 'Lcy' | 'Lcz' | 'Lb', number>>>;
  readonly restraints?: readonly { readonly at: number; readonly holds: readonly string[] }[];
  readonly Cb: 'auto' | number;
  readonly stiffeners?: number;
  readonly driftRatio?: number;
  readonly charts?: { readonly sidesway: string; readonly GA: number; readonly GB: number };
  readonly springs?: Readonly<Record<'xA' | 'xB', number>>;
  readonly net?: { readonly An: number; readonly U: number };
  readonly P: number;
  readonly MxA: number;
  readonly MxB: number;
  readonly MyA: number;
  readonly MyB: number;
  readonly MxMax?: number;
  readonly loads: readonly Load[];
  readonly supports: readonly { readonly at: number; Mx?: number; My?: number }[];
  readonly Vx?: number;
  readonly sway?: Sway;
}

/** Writes a value of N and mm as INPUT.json has it. */
export type Write = (value: number, dimension: DimensionName) => string;

const BASE: Partial<Record<DimensionName, string>> = {
  length: 'mm',
  area: 'mm²',
  force: 'N',
  moment: 'N mm',
  stress: 'MPa',
  lineLoad: 'N/mm',
  rotationalStiffness: 'N mm/rad',
};
/** Sizes that no member has are refused: on a path through zero they are zero. */
const SMALLEST = 1e-9;
const inBase: Write = (value, dimension) =>
  `${Math.abs(value) < SMALLEST ? 0 : value} ${BASE[dimension]}`;

const present = <T extends object>(values: T): Partial<T> =>
  Object.fromEntries(Object.entries(values).filter(([, v]) => v !== undefined)) as Partial<T>;

/** INPUT.json of a member; values in N and mm unless they are written otherwise. */
export function inputOf(m: Member, units: 'us' | 'si' = 'si', write: Write = inBase): unknown {
  const mm = (value: number) => write(value, 'length');
  const maybe = (value: number | undefined, dimension: DimensionName) =>
    value === undefined ? undefined : write(value, dimension);
  const moment = (value: number | undefined) => maybe(value, 'moment');
  const lengths = m.lengths && mapped(m.lengths, mm);
  return {
    ...{ format: 1, standard: 'aisc360-22', design: m.design, units, constants: 'us' },
    analysis: present({
      ...{ method: m.method, secondOrder: m.secondOrder, provisions: m.provisions },
      includesMemberEffect: m.includesMemberEffect,
      sway: m.sway ? 'B2' : 'none',
      driftRatio: m.driftRatio,
    }),
    members: [
      present({
        mark: 'M1',
        section: sectionInput(m.section, mm),
        material: {
          ...{ name: 'steel', Fy: write(m.Fy, 'stress'), Fu: write(1.3 * m.Fy, 'stress') },
          source: { kind: 'assumption', basis: 'property test' },
        },
        length: mm(m.L),
        ends: m.springs ? 'springs' : 'held',
        springs: m.springs && mapped(m.springs, (k) => write(k, 'rotationalStiffness')),
        ...lengths,
        restraints: m.restraints?.map(({ at, holds }) => ({ at: mm(at), holds })),
        Cb: m.Cb,
        stiffeners: maybe(m.stiffeners, 'length'),
        charts: m.charts && { x: m.charts },
        netSection: m.net && { An: write(m.net.An, 'area'), U: m.net.U },
        endMomentSign: 'bending',
        combinations: [
          present({
            ...{ name: 'C1', P: write(m.P, 'force') },
            ...{ MxA: moment(m.MxA), MxB: moment(m.MxB), MyA: moment(m.MyA), MyB: moment(m.MyB) },
            MxMax: moment(m.MxMax),
            loads: m.loads.map((load) => loadInput(load, write)),
            supports: m.supports.map(({ at, Mx, My }) =>
              present({ at: mm(at), Mx: moment(Mx), My: moment(My) }),
            ),
            Vx: maybe(m.Vx, 'force'),
            sway: m.sway && { x: swayInput(m.sway, write) },
          }),
        ],
      }),
    ],
  };
}

const mapped = <T>(values: object, to: (value: number) => T): Record<string, T> =>
  Object.fromEntries(Object.entries(values).map(([name, value]) => [name, to(value)]));

const sectionInput = (section: Section, mm: (value: number) => string): unknown => {
  if (typeof section === 'string') return section;
  const { shape, ...sizes } = section;
  const wall = shape === 'tube' || shape === 'round' ? { wall: 'design' } : {};
  return { shape, ...wall, ...mapped(sizes, mm) };
};

const LOAD: Readonly<Record<string, DimensionName>> = {
  ...{ W: 'force', at: 'length', from: 'length', to: 'length' },
  ...{ w: 'lineLoad', wFrom: 'lineLoad', wTo: 'lineLoad' },
};
const loadInput = (load: Load, write: Write): unknown =>
  Object.fromEntries(
    Object.entries(load).map(([name, value]) => [
      name,
      typeof value === 'number' ? write(value, LOAD[name] as DimensionName) : value,
    ]),
  );

const swayInput = (s: Sway, write: Write): unknown => ({
  ...{ MA: write(s.MA, 'moment'), MB: write(s.MB, 'moment') },
  ...{ Pstory: write(s.Pstory, 'force'), Pmf: write(s.Pmf, 'force'), H: write(s.H, 'force') },
  ...{ height: write(s.height, 'length'), drift: write(s.drift, 'length') },
});

/** The member a share `t` of the way from one to the other; both differ in numbers only. */
export function between<T>(a: T, b: T, t: number): T {
  if (typeof a === 'number' && typeof b === 'number') return (a === b ? a : a + (b - a) * t) as T;
  if (typeof a !== 'object' || a === null || typeof b !== 'object' || b === null) {
    if (a !== b) throw new Error(`${a} and ${b} are no ends of a path`);
    return a;
  }
  if (Array.isArray(a) && Array.isArray(b)) return a.map((x, i) => between(x, b[i], t)) as T;
  return Object.fromEntries(
    Object.entries(a).map(([name, x]) => [name, between(x, Reflect.get(b, name), t)]),
  ) as T;
}
