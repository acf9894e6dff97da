import fc from 'fast-check';
import {
  type Kind,
  loaded,
  members,
  number,
  plain,
  roughly,
  SECTIONS,
  scaleOf,
} from './arbitraries.ts';
import type { Load, Member, Section } from './member.ts';

/** Two members that differ in numbers only: the one moves into the other along a straight line. */
export type Path = readonly [Member, Member];
export type Paths = fc.Arbitrary<Path>;

const of = (...kinds: readonly Kind[]) => fc.constantFrom(...kinds).chain((kind) => SECTIONS[kind]);
const design = fc.constantFrom('LRFD' as const, 'ASD' as const);
const Fy = number(235, 480);

/** Both ends of a path, at 0 and at 1. */
const path = (at: (share: number) => Member): Path => [at(0), at(1)];
const along = (from: number, to: number, share: number): number => from + (to - from) * share;

/** Lengths that are all those of the member; 0 is a member held continuously. */
const held = (slenderness: number, r: number) => {
  const L = Math.max(5, slenderness) * r;
  return { L, lengths: { Lcx: L, Lcy: L, Lcz: L, Lb: slenderness === 0 ? 0 : L } };
};

/** Forces that the section of one member bears, for another whose section moves. */
const FORCES = { p: 0.05, mx: [0.1, -0.04], my: [0.05, -0.03] } as const;
const forces = (like: Section, steel: number, shares: Parameters<typeof loaded>[1] = FORCES) => {
  const { P, MxA, MxB, MyA, MyB } = loaded(plain(like, { Fy: steel }), shares);
  return { P, MxA, MxB, MyA, MyB };
};

/** Longer and longer columns, their lengths about the three axes in any proportion. */
const columns: Paths = fc
  .record({
    section: of('rolled', 'channel', 'hss', 'pipe', 'i', 'mono-i', 'box', 'tube', 'round'),
    ...{ y: number(0.5, 1.3), z: number(0.5, 1.5), design, Fy },
  })
  .map(({ section, y, z, ...basis }) =>
    path((share) => {
      const L = along(8, 180, share) * scaleOf(section, basis.Fy).r;
      const lengths = { Lcx: L, Lcy: y * L, Lcz: z * L, Lb: L };
      return {
        ...plain(section, { ...basis, L, lengths }),
        ...forces(section, basis.Fy, { p: 0.02 }),
      };
    }),
  );

/** The torsional length of a column grows beyond its lateral one. */
const torsion: Paths = fc
  .record({ section: of('rolled', 'stout'), slenderness: number(8, 60), design })
  .map(({ section, slenderness, ...basis }) =>
    path((share) => {
      const L = slenderness * scaleOf(section, 345).r;
      const lengths = { Lcx: L, Lcy: L, Lcz: along(0.7, 1.6, share) * L, Lb: L };
      return { ...plain(section, { ...basis, L, lengths }), ...forces(section, 345, { p: 0.05 }) };
    }),
  );

/** Longer and longer unbraced lengths. */
const beams: Paths = fc
  .record({
    section: of('rolled', 'channel', 'hss', 'i', 'mono-i', 'box', 'tube'),
    ...{ Cb: fc.oneof(fc.constant(1), number(1, 1.6)), design },
  })
  .map(({ section, ...basis }) => {
    const name = typeof section === 'string' ? section.slice(0, 3) : section.shape;
    const longest = ['HSS', 'box', 'tube'].includes(name) ? 4000 : 400;
    return path((share) => ({
      ...plain(section, { ...basis, ...held(along(10, longest, share), scaleOf(section, 345).r) }),
      ...forces(section, 345, { mx: [0.2, 0.2], my: [0.1, 0] }),
    }));
  });

/** Thinner and thinner flanges or webs of a doubly symmetric I-shape of plates. */
const plates: Paths = fc
  .record({
    ...{
      d: number(400, 900),
      b: number(0.4, 0.8),
      w: number(25, 170),
      slenderness: number(0, 140),
    },
    ...{ move: fc.constantFrom('tf', 'tw'), design, Fy },
  })
  .map(({ d, b, w, slenderness, move, ...basis }) => {
    const bf = b * d;
    const like = { shape: 'i', d, bf, tf: bf / 12, tw: d / 40 } as const;
    return path((share) => {
      const [flange, web] = move === 'tf' ? [along(4, 30, share), w] : [8, along(25, 185, share)];
      const section = { shape: 'i', d, bf, tf: bf / 2 / flange, tw: d / web } as const;
      const more = { ...basis, ...held(slenderness, scaleOf(like, basis.Fy).r) };
      return { ...plain(section, more), ...forces(like, basis.Fy) };
    });
  });

/** One flange of a singly symmetric shape grows beyond the other. */
const unequal: Paths = fc
  .record({
    ...{
      d: number(400, 800),
      web: number(30, 150),
      flange: number(5, 16),
      bottom: number(0.3, 0.6),
    },
    ...{ slenderness: number(0, 120), sense: fc.constantFrom(1, -1), design, Fy },
  })
  .map(({ d, web, flange, bottom, slenderness, sense, ...basis }) => {
    const bfBottom = bottom * d;
    const tf = bfBottom / 2 / flange;
    const M = sense * 0.05 * basis.Fy * bfBottom * tf * d;
    return path((share) => {
      const sizes = { bfTop: along(0.3, 2.4, share) * bfBottom, tfTop: tf, bfBottom, tfBottom: tf };
      const section = { shape: 'mono-i', d, tw: d / web, ...sizes } as const;
      const more = { ...basis, ...held(slenderness, 0.25 * bfBottom) };
      return { ...plain(section, more), MxA: M, MxB: 0.9 * M, P: 0.02 * basis.Fy * bfBottom * tf };
    });
  });

/** Thinner and thinner plates of a box. */
const boxes: Paths = fc
  .record({
    ...{
      d: number(400, 900),
      b: number(0.5, 0.8),
      other: number(18, 90),
      move: fc.constantFrom('tf', 'tw'),
    },
    ...{ slenderness: number(10, 300), design, Fy },
  })
  .map(({ d, b, other, slenderness, move, ...basis }) => {
    const like = { shape: 'box', B: b * d, d, tf: (b * d) / 30, tw: d / 40 } as const;
    return path((share) => {
      const [flange, web] =
        move === 'tf' ? [along(15, 80, share), other] : [other / 1.5, along(25, 185, share)];
      const section = { shape: 'box', B: b * d, d, tf: (b * d) / flange, tw: d / web } as const;
      const more = { ...basis, ...held(slenderness, scaleOf(like, basis.Fy).r) };
      return { ...plain(section, more), ...forces(like, basis.Fy) };
    });
  })
  .filter((ends) => ends.every(({ section }) => roughly(section).Iy < 0.9 * roughly(section).Ix));

/** Thinner and thinner tubes, square, rectangular and round. */
const tubes: Paths = fc
  .record({
    ...{ D: number(150, 450), b: number(0.5, 0.9), slenderness: number(10, 300), design, Fy },
    shape: fc.constantFrom('square', 'rectangular', 'round'),
  })
  .map(({ D, b, slenderness, shape, ...basis }) => {
    const B = shape === 'rectangular' ? b * D : D;
    return path((share) => {
      const section: Section =
        shape === 'round'
          ? { shape: 'round', D, t: D / along(12, 440, share) }
          : { shape: 'tube', B, Ht: D, t: B / along(12, 72, share) };
      const more = { ...basis, ...held(slenderness, 0.35 * B) };
      return { ...plain(section, more), ...forces({ shape: 'round', D: B, t: B / 40 }, basis.Fy) };
    });
  });

/** Stronger and stronger steel: the limits of Table B4.1 and of Chapter G pass by every element. */
const steels: Paths = fc
  .record({ section: of('rolled', 'channel', 'hss', 'pipe'), slenderness: number(0, 90), design })
  .map(({ section, slenderness, ...basis }) =>
    path((share) => ({
      ...plain(section, {
        ...basis,
        Fy: along(180, 8000, share),
        ...held(slenderness, scaleOf(section, 345).r),
      }),
      ...forces(section, 345),
    })),
  );

/** Stronger and stronger steel of shapes whose flanges get slender before their webs do. */
const flanges: Paths = fc.record({ section: SECTIONS.stout, design }).map(({ section, ...basis }) =>
  path((share) => ({
    ...plain(section, {
      ...basis,
      Fy: along(600, 8000, share),
      ...held(0, scaleOf(section, 345).r),
    }),
    ...forces(section, 345, { mx: [0.1, -0.04], my: [0.05, -0.03] }),
  })),
);

/** Wider and wider panels between the stiffeners of a slender web. */
const stiffened: Paths = fc
  .record({ d: number(500, 900), web: number(90, 150), design })
  .map(({ d, web, ...basis }) => {
    const section = { shape: 'i', d, bf: 0.5 * d, tf: d / 25, tw: d / web } as const;
    return path((share) => ({
      ...plain(section, { ...basis, stiffeners: along(1, 4, share) * d }),
      ...forces(section, 345),
    }));
  });

/** From tension through no force to beyond the critical loads. */
const axial: Paths = fc
  .record({ m: members(), from: number(-1.2, 0), to: number(0.1, 1.1) })
  .map(({ m, from, to }) => {
    const { Py } = scaleOf(m.section, m.Fy);
    return path((share) => ({ ...m, P: along(from, to, share) * Py }));
  });

/** The moments of both ends from any to any others, through reverse curvature. */
const moments: Paths = fc
  .record({
    m: members({ minor: false }),
    ...{ A: number(-0.4, 0.4), B: number(-0.4, 0.4), C: number(-0.4, 0.4), D: number(-0.4, 0.4) },
  })
  .map(({ m, A, B, C, D }) => {
    const { Mx } = scaleOf(m.section, m.Fy);
    return path((share) => ({ ...m, MxA: along(A, C, share) * Mx, MxB: along(B, D, share) * Mx }));
  });

/** Compression over a long bay: the largest moment leaves the end. */
const crests: Paths = fc
  .record({ section: of('rolled', 'hss', 'i'), psi: number(-0.9, 0.9), x: fc.boolean(), design })
  .map(({ section, psi, x, ...basis }) => {
    const { rx, r } = scaleOf(section, 345);
    const M = [0.2, 0.2 * psi] as const;
    return path((share) => ({
      ...plain(section, { ...basis, secondOrder: 'exact', ...held(90, x ? rx : r) }),
      ...forces(section, 345, { p: along(0.005, 0.25, share), ...(x ? { mx: M } : { my: M }) }),
    }));
  });

/** Stocky members close to yielding: the stiffness of the direct analysis falls. */
const squashed: Paths = fc
  .record({
    ...{
      section: of('rolled', 'hss', 'pipe', 'i'),
      slenderness: number(12, 35),
      psi: number(-1, 1),
    },
    ...{ secondOrder: fc.constantFrom('exact' as const, 'amplified' as const), design },
  })
  .map(({ section, slenderness, psi, ...basis }) => {
    const alpha = basis.design === 'ASD' ? 1.6 : 1;
    return path((share) => ({
      ...plain(section, { ...basis, ...held(slenderness, scaleOf(section, 345).r) }),
      ...forces(section, 345, {
        p: along(0.4, 0.6, share) / alpha,
        mx: [0.1, 0.1 * psi],
        my: [0.05, 0.05],
      }),
    }));
  });

/** A load moves from one place to another, over restraints and the points between. */
const places: Paths = fc
  .record({
    m: members({ kinds: ['rolled', 'hss', 'mono-i', 'i'], minor: false }),
    ...{ kind: fc.constantFrom('point', 'uniform'), from: number(0, 1), to: number(0, 1) },
    ...{ share: number(0.05, 0.3), p: number(-0.1, 0.2) },
  })
  .map(({ m, kind, from, to, share, p }) => {
    const { Mx, Py } = scaleOf(m.section, m.Fy);
    const load = (at: number): Load =>
      kind === 'point'
        ? { kind, bends: 'x', height: 'centre', W: (4 * share * Mx) / m.L, at: at * m.L }
        : {
            ...{ kind: 'uniform', bends: 'x', height: 'centre', w: (16 * share * Mx) / m.L ** 2 },
            ...{ from: 0.8 * at * m.L, to: (0.8 * at + 0.2) * m.L },
          };
    return path((t) => ({ ...m, P: p * Py, loads: [...m.loads, load(along(from, to, t))] }));
  });

/** A restraint moves along the member, and over the place of a load. */
const restraints: Paths = fc
  .record({
    section: of('rolled', 'i', 'mono-i'),
    ...{ at: number(0.2, 0.8), share: number(0.05, 0.3), p: number(0, 0.3), A: number(-0.3, 0.3) },
    holds: fc.constantFrom(['top'], ['bottom'], ['top', 'bottom'], ['in-plane', 'centre', 'twist']),
    ...{ secondOrder: fc.constantFrom('exact' as const, 'amplified' as const), design },
  })
  .map(({ section, at, share, p, A, holds, ...basis }) => {
    const { rx, Mx } = scaleOf(section, 345);
    return path((t) => {
      const { lengths: _, ...m } = plain(section, { ...basis, Cb: 'auto', L: 110 * rx });
      const place = along(0.1, 0.9, t) * m.L;
      const W = (4 * share * Mx) / m.L;
      return {
        ...{
          ...m,
          ...forces(section, 345, { p, mx: [A, -0.2] }),
          restraints: [{ at: place, holds }],
        },
        supports: [{ at: place, Mx: -0.05 * Mx, My: 0 }],
        loads: [{ kind: 'point', bends: 'x', height: 'centre', W, at: at * m.L }],
      };
    });
  });

/** A restraint that ends segments moves past the crest of the moments under a uniform load. */
const passed: Paths = fc
  .record({
    ...{
      section: of('rolled', 'i'),
      share: number(0.1, 0.4),
      p: number(0.02, 0.2),
      A: number(-0.2, 0.2),
    },
    ...{ secondOrder: fc.constantFrom('exact' as const, 'amplified' as const), design },
  })
  .map(({ section, share, p, A, ...basis }) => {
    const { rx, Mx } = scaleOf(section, 345);
    return path((t) => {
      const { lengths: _, ...m } = plain(section, { ...basis, Cb: 'auto', L: 90 * rx });
      const w = (8 * share * Mx) / m.L ** 2;
      return {
        ...{ ...m, ...forces(section, 345, { p, mx: [A, 0.05] }) },
        restraints: [{ at: along(0.3, 0.7, t) * m.L, holds: ['top', 'bottom'] }],
        supports: [{ at: along(0.3, 0.7, t) * m.L, My: 0 }],
        loads: [{ kind: 'uniform', bends: 'x', height: 'centre', w }],
      };
    });
  });

/** A load that varies along the member turns its sign. */
const varying: Paths = fc
  .record({
    m: members({ loads: false, minor: false }),
    share: number(0.1, 0.5),
    from: number(-1, 1),
  })
  .map(({ m, share, from }) => {
    const w = (share * 8 * scaleOf(m.section, m.Fy).Mx) / m.L ** 2;
    return path((t) => ({
      ...m,
      loads: [
        { kind: 'linear', bends: 'x', height: 'centre', wFrom: from * w, wTo: along(-1, 1, t) * w },
      ],
    }));
  });

/** A story under more and more load. */
const stories: Paths = fc
  .record({
    section: of('rolled', 'hss'),
    p: number(0.02, 0.2),
    drift: number(0.001, 0.006),
    design,
  })
  .map(({ section, p, drift, ...basis }) =>
    path((t) => {
      const m = { ...plain(section, { ...basis, ...held(60, scaleOf(section, 345).r) }) };
      const { Py, Mx } = scaleOf(section, 345);
      const Pstory = along(2, 60, t) * Py;
      const sway = { MA: 0.1 * Mx, MB: -0.08 * Mx, Pstory, Pmf: Py, H: 0.1 * Py, height: 4000 };
      return {
        ...m,
        ...forces(section, 345, { p, mx: [0.05, 0.02] }),
        sway: { ...sway, drift: drift * 4000 },
      };
    }),
  );

/** The minor-axis moment of a rolled member checked by H1.3 grows. */
const singleAxis: Paths = fc
  .record({ section: SECTIONS.rolled, slenderness: number(20, 90), p: number(0.02, 0.3), design })
  .map(({ section, slenderness, p, ...basis }) =>
    path((t) => ({
      ...plain(section, {
        ...basis,
        provisions: ['H1.3'],
        ...held(slenderness, scaleOf(section, 345).r),
      }),
      ...forces(section, 345, { p, mx: [0.2, 0.1], my: [along(0.01, 0.1, t), 0] }),
    })),
  );

/** What the structure's analysis says: its drift, and the joints of a column. */
const analysed: Paths = fc
  .record({
    ...{ section: SECTIONS.rolled, GB: fc.constantFrom(0, 1), p: number(0.02, 0.2), design },
    method: fc.constantFrom('direct' as const, 'effective-length' as const, 'first-order' as const),
    sidesway: fc.constantFrom('inhibited', 'uninhibited'),
  })
  .map(({ section, GB, p, sidesway, ...basis }) =>
    path((t) => {
      const { lengths, ...m } = plain(section, { ...basis, driftRatio: along(1, 2, t) });
      const { Lcx: _, ...rest } = { Lcx: 0, ...lengths };
      const charts = { sidesway, GA: along(0, 2, t), GB };
      return { ...m, ...forces(section, 345, { p, mx: [0.1, 0] }), charts, lengths: rest };
    }),
  );

/** Springs at the ends under more and more compression. */
const sprung: Paths = fc
  .record({ section: of('rolled', 'hss'), k: number(0.1, 20), design })
  .map(({ section, k, ...basis }) => {
    const { rx, Mx, Py } = scaleOf(section, 345);
    const m = plain(section, { ...basis, secondOrder: 'exact', ...held(120, rx) });
    const spring = (k * 200_000 * roughly(section).Ix) / m.L;
    return path((t) => ({
      ...{ ...m, springs: { xA: spring, xB: spring }, P: along(-0.1, 0.9, t) * Py },
      loads: [{ kind: 'uniform', bends: 'x', height: 'centre', w: (0.4 * Mx) / m.L ** 2 }],
    }));
  });

/** Ties with more and more net area, longer and longer. */
const ties: Paths = fc
  .record({ section: of('rolled', 'channel', 'hss', 'pipe'), U: number(0.7, 1), design })
  .map(({ section, U, ...basis }) =>
    path((t) => ({
      ...plain(section, { ...basis, ...held(along(100, 400, t), scaleOf(section, 345).r) }),
      ...{
        ...forces(section, 345, { p: -0.1 }),
        net: { An: along(0.6, 1.2, t) * roughly(section).A, U },
      },
    })),
  );

export const PATHS = {
  ...{ columns, torsion, beams, plates, unequal, boxes, tubes, steels, stiffened, axial, moments },
  ...{
    crests,
    flanges,
    squashed,
    passed,
    places,
    restraints,
    varying,
    stories,
    singleAxis,
    analysed,
    sprung,
    ties,
  },
} satisfies Readonly<Record<string, Paths>>;
