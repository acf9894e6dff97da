import fc from 'fast-check';
import { describe, expect, test, vi } from 'vitest';
import { members, number, scaleOf } from './arbitraries.ts';
import { assertProperty, type Fault } from './assert-property.ts';
import { crossingsBetween, stepBetween } from './crossings.ts';
import { compareSides, SMOOTH } from './jumps-of.ts';
import type { Load, Member } from './member.ts';
import { PATHS, type Path } from './paths.ts';
import { JUMPS } from './standard-jumps.ts';

vi.mock('#shared/calc/closure.ts', () => import('./no-digits.ts'));

/*
 * Results do not jump where one rule takes over from another. A member moves into another one along a
 * straight line in its numbers; wherever a decision of its sheet changes, every check of both sides
 * of a step of 1e-11 of the way is compared. The jumps that the standard itself makes are named, with
 * their sizes, in standard-jumps.ts; the tests at the end prove that each does jump, so that none is
 * an excuse, and that every limit was crossed.
 */
const RUNS: Readonly<Record<keyof typeof PATHS, number>> = {
  ...{ columns: 8, torsion: 8, beams: 12, plates: 8, unequal: 8, boxes: 6, tubes: 9, steels: 10 },
  ...{ stiffened: 2, axial: 10, moments: 10, crests: 6, places: 10, restraints: 10, varying: 6 },
  ...{
    flanges: 3,
    squashed: 5,
    passed: 5,
    stories: 3,
    singleAxis: 4,
    analysed: 6,
    sprung: 3,
    ties: 4,
  },
};
const MOST = 8;

const crossed = new Set<string>();
const jumped = new Map<string, { by: number; share: number }>();

function faultsAlong([a, b]: Path): readonly Fault[] {
  return crossingsBetween(a, b, MOST).flatMap((c) => {
    for (const key of [...c.flipped, ...c.appeared]) crossed.add(key);
    const { faults, seen } = compareSides(c);
    for (const { name, by, size } of seen) {
      const before = jumped.get(name) ?? { by: 0, share: 0 };
      const share = size > 0 ? by / size : 0;
      jumped.set(name, { by: Math.max(before.by, by), share: Math.max(before.share, share) });
    }
    const where = `crossing ${[...c.flipped, ...c.appeared].join(', ')}`;
    return faults.map((text) => ({
      text: `${where}: ${text}`,
      input: { before: c.before.input, after: c.after.input },
    }));
  });
}

describe("no jump but the standard's own", () => {
  for (const [name, runs] of Object.entries(RUNS))
    test(name, { timeout: 600_000 }, () => {
      assertProperty(
        PATHS[name as keyof typeof PATHS],
        { seed: 23, runs, unbiased: true },
        faultsAlong,
      );
    });
});

describe('no jump where a load passes', () => {
  const drawn = fc.record({
    m: members({ kinds: ['rolled', 'hss', 'i', 'mono-i'], minor: false }).map(
      (m): Member => ({ ...m, Cb: 'auto' }),
    ),
    ...{ at: fc.nat(8), share: number(0.05, 0.3), kind: fc.constantFrom('point', 'uniform') },
  });
  /** The ends of segments and bays, and the quarter points between them. */
  const placesOf = ({ L, restraints = [] }: Member): readonly number[] => {
    const ends = [0, ...restraints.map(({ at }) => at), L];
    return ends.slice(1).flatMap((to, i) => {
      const from = ends[i] as number;
      return [0.25, 0.5, 0.75, 1].map((share) => from + share * (to - from));
    });
  };
  /** Beyond what counts as one place (1e-9 of the length). */
  const REACH = 1e-8;
  test('quarter points, restraints and ends', { timeout: 600_000 }, () => {
    assertProperty(drawn, { seed: 24, runs: 150, unbiased: true }, ({ m, at, share, kind }) => {
      const places = placesOf(m);
      const place = places[at % places.length] as number;
      const w = (16 * share * scaleOf(m.section, m.Fy).Mx) / m.L ** 2;
      const load = (z: number): Load =>
        kind === 'point'
          ? { kind, bends: 'x', height: 'centre', W: w * m.L, at: z }
          : { kind: 'uniform', bends: 'x', height: 'centre', w, from: 0, to: z };
      const of = (z: number): Member => ({ ...m, loads: [...m.loads, load(z)] });
      const [low, high] = [place - REACH * m.L, Math.min(m.L, place + REACH * m.L)];
      return [of(place), of(high)].flatMap((other) => {
        const step = stepBetween(of(low), other);
        const input = { before: step.before.input, after: step.after.input };
        // Over a held point a point load is carried there and shears no bay.
        return compareSides(step)
          .faults.filter((text) => kind !== 'point' || !text.startsWith('G/'))
          .map((text) => ({ text, input }));
      });
    });
  });
});

/** Every limit of the clauses and of the theory that a number can cross, by plain key. */
const LIMITS = [
  ...['section/pna', 'given/sense', 'D1/preferred', 'D3/net', 'E3/branch', 'E4/applies'],
  ...['B4/flange/class', 'B4/web/class', 'B4/top-flange/class', 'B4/wall/class'],
  ...['E7/flange/effective', 'E7/web/effective', 'E7/top-flange/effective', 'E7/wall/effective'],
  ...['E7/wall/range', 'B4/x/web/plastic', 'B4/x/FL/case'],
  ...['B4/x/flange/class', 'B4/x/web/class', 'B4/y/flange/class', 'B4/y/web/class'],
  ...['B4/x/wall/class', 'B4/y/wall/class', 'F2/LTB/range', 'F4/LTB/range', 'F5/LTB/range'],
  ...['F4/web/case', 'F4/TFY/applies', 'F5/TFY/applies', 'F7/x/LTB/range', 'F8/x/scope'],
  ...['F8/y/scope', 'F13/flanges', 'F13/web', 'F4/side', 'F1/r/holds'],
  ...['G2/x/case', 'G2/x/branch', 'G2/x/panel', 'G4/x/branch', 'G4/y/branch', 'G6/y/branch'],
  ...['H1/branch', 'H1.3/applies', 'H1.3/in-plane/branch', 'C2/branch', 'C2/ratio/limit'],
  ...['App7/limit', 'App7/x/K/ends', 'App8/x/Cm', 'App8/x/stable', 'App8/y/stable'],
  ...['App8/x/B1/limit', 'App8/y/B1/limit', 'App8/x/B2/stable', 'App8/x/B2/ratio/limit'],
  ...['theory/x/larger', 'theory/x/curvature', 'theory/x/place', 'theory/y/place'],
  ...['theory/x/inside', 'theory/x/first/inside', 'theory/x/below', 'theory/x/tension'],
  ...['given/x/load/at', 'theory/x/first/M', 'H1/Mx/extreme', 'F1/Mmax/extreme'],
];

test('every limit was crossed', () => {
  expect(LIMITS.filter((key) => !crossed.has(key))).toEqual([]);
});

describe('the named jumps are there', () => {
  test.each(JUMPS)('$name', ({ name, exact }) => {
    const { by, share } = jumped.get(name) ?? { by: 0, share: 0 };
    expect(by).toBeGreaterThan(100 * SMOOTH);
    if (exact) expect(Math.abs(share - 1)).toBeLessThan(0.001);
  });
});
