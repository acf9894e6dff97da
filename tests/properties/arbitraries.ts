import fc from 'fast-check';
import { designationsOf, type Family, findShape } from '#shared/sections/table.ts';
import type { Load, Member, Section } from './member.ts';

/** A number between two, with six digits at most, that shrinks towards the first. */
export const number = (from: number, to: number): fc.Arbitrary<number> =>
  fc
    .integer({ min: 0, max: 10_000 })
    .map((n) => Number((from + ((to - from) * n) / 10_000).toPrecision(6)));

const six = (value: number): number => Number(value.toPrecision(6));

export type Kind =
  | 'stout'
  | 'slender'
  | 'rolled'
  | 'channel'
  | 'hss'
  | 'pipe'
  | 'i'
  | 'mono-i'
  | 'box'
  | 'tube'
  | 'round';

const tabulated = (...families: readonly Family[]): fc.Arbitrary<Section> =>
  fc.constantFrom(...families.flatMap(designationsOf));

/** Sections of one kind from stocky to slender, within the proportions of real ones. */
export const SECTIONS: Readonly<Record<Kind, fc.Arbitrary<Section>>> = {
  rolled: tabulated('W', 'M', 'S', 'HP'),
  /** Wide and shallow, so that they twist at a lower stress than they buckle at the same length. */
  stout: fc.constantFrom('W14X90', 'W14X132', 'W12X65', 'HP14X89', 'W8X31'),
  channel: tabulated('C', 'MC'),
  hss: tabulated('HSS'),
  pipe: tabulated('round HSS', 'pipe'),
  i: fc
    .record({ d: number(300, 900), b: number(0.35, 0.9), w: number(20, 170), f: number(4, 22) })
    .map(({ d, b, w, f }) => {
      const bf = six(b * d);
      return { shape: 'i', d, bf, tf: six(bf / 2 / f), tw: six(d / w) };
    }),
  /** A plate girder with a slender web. */
  slender: fc
    .record({ d: number(500, 1200), b: number(0.25, 0.5), w: number(125, 190), f: number(5, 14) })
    .map(({ d, b, w, f }) => {
      const bf = six(b * d);
      return { shape: 'i', d, bf, tf: six(bf / 2 / f), tw: six(d / w) };
    }),
  'mono-i': fc
    .record({
      ...{ d: number(300, 900), w: number(20, 150) },
      ...{ top: number(0.3, 0.7), bottom: number(0.3, 0.7), f: number(5, 18), g: number(0.7, 1.4) },
    })
    .map(({ d, w, top, bottom, f, g }) => {
      const tfTop = six((top * d) / 2 / f);
      return {
        ...{ shape: 'mono-i', d, tw: six(d / w), bfTop: six(top * d), tfTop },
        ...{ bfBottom: six(bottom * d), tfBottom: six(tfTop * g) },
      };
    }),
  box: fc
    .record({ d: number(300, 900), b: number(0.5, 0.95), w: number(20, 130), f: number(15, 60) })
    .map(
      ({ d, b, w, f }): Section => ({
        ...{ shape: 'box', B: six(b * d), d },
        ...{ tf: six((b * d) / f), tw: six(d / w) },
      }),
    )
    .filter((box) => roughly(box).Iy < 0.95 * roughly(box).Ix),
  tube: fc
    .record({ Ht: number(80, 450), b: number(0.45, 0.95), s: number(9, 55) })
    .map(({ Ht, b, s }) => ({ shape: 'tube', B: six(b * Ht), Ht, t: six((b * Ht) / s) })),
  round: fc
    .record({ D: number(80, 600), s: number(12, 220) })
    .map(({ D, s }) => ({ shape: 'round', D, t: six(D / s) })),
};
export const KINDS = Object.keys(SECTIONS) as readonly Kind[];

export interface Rough {
  readonly A: number;
  readonly Ix: number;
  readonly Iy: number;
  readonly Zx: number;
  readonly Zy: number;
}

const plates = (d: number, b: number, flanges: number, webs: number): Rough => ({
  A: flanges + webs,
  Ix: (flanges * d ** 2) / 4 + (webs * d ** 2) / 12,
  Iy: (flanges * b ** 2) / 12 + (webs * b ** 2) / 40,
  Zx: (flanges * d) / 2 + (webs * d) / 4,
  Zy: (flanges * b) / 4 + (webs * b) / 40,
});

/** About how strong and stiff a section is: for choosing lengths and forces, not for comparing. */
export function roughly(section: Section): Rough {
  if (typeof section === 'string') {
    const shape = findShape(section);
    if (!shape) throw new Error(section);
    const value = (...names: string[]): number =>
      names.map((name) => Reflect.get(shape.properties, name)).find((p) => p).value;
    return {
      ...{ A: value('A'), Ix: value('Ix', 'I'), Iy: value('Iy', 'I') },
      ...{ Zx: value('Zx', 'Z'), Zy: value('Zy', 'Z') },
    };
  }
  switch (section.shape) {
    case 'i':
      return plates(
        ...[section.d, section.bf, 2 * section.bf * section.tf, section.d * section.tw],
      );
    case 'mono-i': {
      const { d, tw, bfTop, tfTop, bfBottom, tfBottom } = section;
      const flanges = bfTop * tfTop + bfBottom * tfBottom;
      return plates(d, Math.min(bfTop, bfBottom), flanges, d * tw);
    }
    case 'box':
      return closed(section.d, section.B, section.tf, section.tw);
    case 'tube':
      return closed(section.Ht, section.B, section.t, section.t);
    case 'round': {
      const { D, t } = section;
      const A = Math.PI * D * t;
      return { A, Ix: (A * D ** 2) / 8, Iy: (A * D ** 2) / 8, Zx: (A * D) / 3, Zy: (A * D) / 3 };
    }
  }
}
function closed(d: number, b: number, tf: number, tw: number): Rough {
  const round = plates(d, b, 2 * b * tf, 2 * d * tw);
  return {
    ...round,
    Iy: (d * tw * b ** 2) / 2 + (b ** 3 * tf) / 6,
    Zy: d * tw * b + (b * b * tf) / 2,
  };
}

/** Sizes of forces and lengths of a section: squash load, plastic moments, radius. */
export function scaleOf(section: Section, Fy: number) {
  const { A, Iy, Ix, Zx, Zy } = roughly(section);
  return { Py: Fy * A, Mx: Fy * Zx, My: Fy * Zy, r: Math.sqrt(Iy / A), rx: Math.sqrt(Ix / A) };
}

/** A plain member: held at its ends, lengths those of the member, no forces. */
export function plain(section: Section, more: Partial<Member> = {}): Member {
  const L = more.L ?? six(70 * scaleOf(section, 345).r);
  return {
    ...{ design: 'LRFD', method: 'direct', secondOrder: 'amplified', includesMemberEffect: false },
    ...{ provisions: [], section, Fy: 345, L, lengths: { Lcx: L, Lcy: L, Lcz: L, Lb: L }, Cb: 1 },
    ...{ P: 0, MxA: 0, MxB: 0, MyA: 0, MyB: 0, loads: [], supports: [] },
    ...more,
  };
}

/** Forces of a member as shares of what its section bears. */
export function loaded(
  m: Member,
  share: {
    readonly p?: number;
    readonly mx?: readonly [number, number];
    readonly my?: readonly [number, number];
  },
): Member {
  const { Py, Mx, My } = scaleOf(m.section, m.Fy);
  const { p = 0, mx = [0, 0], my = [0, 0] } = share;
  const [MxA, MxB] = mx.map((s) => six(s * Mx)) as [number, number];
  const [MyA, MyB] = my.map((s) => six(s * My)) as [number, number];
  return { ...m, P: six(p * Py), MxA, MxB, MyA, MyB };
}

const HOLDS = [
  ['in-plane', 'centre', 'twist'],
  ['centre', 'twist'],
  ['top', 'bottom'],
  ['top'],
  ['bottom'],
  ['top', 'twist'],
  ['in-plane'],
  ['centre'],
] as const;

const sign = fc.constantFrom(1, -1);

type LoadOf = (L: number, M: number) => Load;

/** A load that bends an axis to some share of its plastic moment. */
const load = (places: fc.Arbitrary<number>): fc.Arbitrary<LoadOf> =>
  fc
    .record({
      ...{ kind: fc.constantFrom('point', 'uniform', 'linear', 'part'), share: number(0.02, 0.5) },
      ...{ at: places, to: number(0.05, 0.95), height: fc.constantFrom('centre', 'bottom', 'top') },
      ...{ sign, other: number(-1, 1) },
    })
    .map(({ kind, share, at, to, height, sign: s, other }) => (L: number, M: number): Load => {
      const common = { bends: 'x', height } as const;
      const w = six((s * share * 8 * M) / L ** 2);
      const [from, end] = [Math.min(at, to), Math.max(at, to)].map((z) => six(z * L)) as [
        number,
        number,
      ];
      const reach = end - from > 0.01 * L ? { from, to: end } : {};
      if (kind === 'point')
        return { ...common, kind, W: six((s * share * 4 * M) / L), at: six(at * L) };
      if (kind === 'uniform') return { ...common, kind, w };
      if (kind === 'part') return { ...common, kind: 'uniform', w, ...reach };
      return { ...common, kind, wFrom: w, wTo: six(other * w), ...reach };
    });

export interface Choices {
  readonly kinds?: readonly Kind[];
  readonly loads?: boolean;
  readonly restraints?: boolean;
  readonly tension?: boolean;
  readonly minor?: boolean;
}

/** Any member within the scope of some of the clauses: lengths stated or from restraints. */
export function members(q: Choices = {}): fc.Arbitrary<Member> {
  const { kinds = KINDS, loads = true, restraints = true, tension = true, minor = true } = q;
  const share = number(-0.5, 0.5);
  return fc
    .record({
      section: fc.constantFrom(...kinds).chain((kind) => SECTIONS[kind]),
      ...{ Fy: number(235, 480), slender: number(15, 140), p: number(tension ? -0.3 : 0, 0.4) },
      ...{ A: share, B: share, a: share, b: share, bends: fc.constantFrom('x', 'y', 'xy') },
      lengths: fc.record({ Lcx: number(0.6, 1.5), Lcy: number(0.4, 1.5), Lcz: number(0.4, 1.5) }),
      ...{
        Lb: fc.oneof(fc.constant(1), number(0, 1.5)),
        Cb: fc.oneof(fc.constant('auto' as const), number(1, 2)),
      },
      design: fc.constantFrom('LRFD' as const, 'ASD' as const),
      method: fc.constantFrom(...(['direct', 'effective-length', 'first-order'] as const)),
      secondOrder: fc.constantFrom(...(['amplified', 'exact', 'from-analysis'] as const)),
      includesMemberEffect: fc.boolean(),
      provisions: fc.subarray(['H1.3', 'H2', 'H1.2-Cb', 'C2.3-taub']),
      loads: loads ? fc.array(load(number(0, 1)), { maxLength: 3 }) : fc.constant<LoadOf[]>([]),
      restraints: restraints
        ? fc.option(
            fc.array(
              fc.record({
                ...{ gap: number(0.1, 1), holds: fc.constantFrom(...HOLDS) },
                ...{ Mx: share, My: share },
              }),
              { maxLength: 3 },
            ),
            { nil: null, freq: 1 },
          )
        : fc.constant(null),
    })
    .map((g): Member => {
      const { section, Fy } = g;
      const { Mx, My, r } = scaleOf(section, Fy);
      const L = six(g.slender * r);
      const major = g.bends.includes('x');
      const second = minor && g.bends.includes('y');
      const alpha = g.design === 'ASD' ? 1.6 : 1;
      const gaps = (g.restraints ?? []).map(({ gap }) => gap);
      const upTo = (end: number) => gaps.slice(0, end).reduce((sum, gap) => sum + gap, 0);
      const total = upTo(gaps.length) + 0.5;
      const places = gaps.map((_, i) => six((upTo(i + 1) / total) * L));
      const held = g.restraints?.map(({ holds }, i) => ({ at: places[i] as number, holds }));
      const supports = (g.restraints ?? []).flatMap(({ holds, Mx: x, My: y }, i) => {
        const names: readonly string[] = holds;
        const inPlane = names.includes('in-plane');
        const lateral = ['top', 'bottom', 'centre'].some((name) => names.includes(name));
        if (!inPlane && !lateral) return [];
        return {
          at: places[i] as number,
          ...(inPlane && { Mx: six(major ? (x * Mx) / alpha : 0) }),
          ...(lateral && { My: six(second ? (y * My) / alpha : 0) }),
        };
      });
      const m = plain(section, {
        ...{ design: g.design, method: g.method, secondOrder: g.secondOrder, Fy, L, Cb: g.Cb },
        ...{ includesMemberEffect: g.includesMemberEffect, provisions: g.provisions, supports },
        loads: major ? g.loads.map((one) => one(L, Mx / alpha)) : [],
      });
      const forces = loaded(m, {
        p: g.p / alpha,
        mx: major ? [g.A / alpha, g.B / alpha] : [0, 0],
        my: second ? [g.a / alpha, g.b / alpha] : [0, 0],
      });
      if (held) {
        const { lengths: _, ...rest } = forces;
        return { ...rest, restraints: held };
      }
      const { Lcx, Lcy, Lcz } = g.lengths;
      return {
        ...forces,
        lengths: {
          ...{ Lcx: six(Math.max(1, Lcx) * L), Lcy: six((second ? Math.max(1, Lcy) : Lcy) * L) },
          ...{ Lcz: six(Lcz * L), Lb: six(g.Lb * L) },
        },
      };
    });
}
