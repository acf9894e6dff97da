import { describe, expect, test, vi } from 'vitest';
import { assertProperty, type Fault } from './assert-property.ts';
import { crossingsBetween } from './crossings.ts';
import { compareSides, SMOOTH } from './jumps-of.ts';
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
  ...{ flanges: 3, stories: 3, singleAxis: 4, analysed: 6, sprung: 3, ties: 4 },
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
  ...['given/x/load/at', 'theory/x/first/M'],
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
