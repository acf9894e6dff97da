import fc from 'fast-check';
import { describe, expect, test, vi } from 'vitest';
import { designationsOf, findShape } from '#shared/sections/table.ts';
import { type Kind, loaded, members, number, plain, SECTIONS, scaleOf } from './arbitraries.ts';
import { assertProperty, type Fault } from './assert-property.ts';
import { plainKey } from './crossings.ts';
import type { Load, Member, Section } from './member.ts';
import { checksOf, type Run, run } from './results.ts';
import { mirrored, quarterTurned, turnedOver } from './turn-member.ts';

vi.mock('#shared/calc/closure.ts', () => import('./no-digits.ts'));

/** The largest ratio of each check, over all segments, and the member's verdict. */
function outcome(r: Run, rename: (key: string) => string): ReadonlyMap<string, number | string> {
  const worst = new Map<string, number | string>([['verdict', r.of.summary.verdict]]);
  for (const { key, ratio } of checksOf(r)) {
    const name = rename(plainKey(key));
    worst.set(name, Math.max(ratio, (worst.get(name) as number | undefined) ?? 0));
  }
  return worst;
}

/** Checks that differ by more than a share between a member and another look at it. */
function differences(
  a: Member,
  b: Member,
  close: number,
  rename = (key: string) => key,
): readonly Fault[] {
  const [before, after] = [run(a), run(b)];
  const [one, two] = [outcome(before, (key) => key), outcome(after, rename)];
  const input = { one: before.input, other: after.input };
  const keys = [...new Set([...one.keys(), ...two.keys()])];
  return keys.flatMap((key) => {
    const [x, y] = [one.get(key), two.get(key)];
    const same =
      typeof x === 'number' && typeof y === 'number'
        ? Math.abs(x - y) <= close * Math.max(1, x, y)
        : x === y;
    return same ? [] : [{ text: `${key}: ${x} and ${y}`, input }];
  });
}

const squareHss = designationsOf('HSS').filter((name) => {
  const shape = findShape(name);
  return shape?.kind === 'rect-hss' && shape.properties.B.value === shape.properties.Ht.value;
});

/** Sections that are the same after a right angle. */
const square: fc.Arbitrary<Section> = fc.oneof(
  fc.constantFrom(...squareHss),
  SECTIONS.pipe,
  SECTIONS.round,
  fc
    .record({ B: number(80, 450), s: number(9, 70) })
    .map(({ B, s }): Section => ({ shape: 'tube', B, Ht: B, t: Number((B / s).toPrecision(6)) })),
  fc.record({ B: number(200, 600), s: number(15, 90) }).map(({ B, s }): Section => {
    const t = Number((B / s).toPrecision(6));
    return { shape: 'box', B, d: B, tf: t, tw: t };
  }),
);

const EXCHANGED: Readonly<Record<string, string>> = {
  ...{ 'H1/x': 'H1/y', 'H1/y': 'H1/x', 'G/x/check': 'G/y/check', 'G/y/check': 'G/x/check' },
};

describe('square and round sections', () => {
  const drawn = fc
    .record({ m: members({ kinds: ['tube'] }), section: square })
    // Loads at a flange twist a member that they bend about the minor axis.
    .map(({ m, section }): Member => {
      const holds = (words: readonly string[]) =>
        words.filter((word) => !['top', 'bottom'].includes(word));
      return {
        ...{
          ...m,
          section,
          loads: m.loads.map((load) => ({ ...load, height: 'centre' as const })),
        },
        ...(m.restraints && {
          restraints: m.restraints.map((r) => ({ ...r, holds: ['twist', ...holds(r.holds)] })),
        }),
        supports: m.supports.map(({ at, Mx = 0, My = 0 }) => ({ at, Mx, My })),
      };
    });
  test('both axes are alike', { timeout: 600_000 }, () => {
    expect(squareHss.length).toBeGreaterThan(50);
    assertProperty(drawn, { seed: 51, runs: 150 }, (m) =>
      differences(m, quarterTurned(m), 1e-12, (key) => EXCHANGED[key] ?? key),
    );
  });
});

const DOUBLY: readonly Kind[] = ['rolled', 'hss', 'pipe', 'i', 'slender', 'box', 'tube', 'round'];

test('doubly symmetric sections bear moments of either sign alike', { timeout: 600_000 }, () => {
  assertProperty(members({ kinds: DOUBLY }), { seed: 52, runs: 150 }, (m) =>
    differences(m, turnedOver(m), 1e-12),
  );
});

test('a singly symmetric section on its head bears the moments of the other sign', {
  timeout: 600_000,
}, () => {
  assertProperty(members({ kinds: ['mono-i'] }), { seed: 53, runs: 100 }, (m) => {
    if (typeof m.section === 'string' || m.section.shape !== 'mono-i') return [];
    const { bfTop, tfTop, bfBottom, tfBottom, ...rest } = m.section;
    const section = { ...rest, bfTop: bfBottom, tfTop: tfBottom, bfBottom: bfTop, tfBottom: tfTop };
    return differences(m, { ...turnedOver(m), section }, 1e-12);
  });
});

test('a member end for end is the same member', { timeout: 600_000 }, () => {
  assertProperty(members(), { seed: 54, runs: 200 }, (m) => differences(m, mirrored(m), 1e-9));
});

test('a beam end for end has the same Cb', { timeout: 600_000 }, () => {
  const drawn = fc.record({
    section: fc
      .constantFrom(...(['rolled', 'channel', 'i', 'slender'] as const))
      .chain((kind) => SECTIONS[kind]),
    ...{ slenderness: number(90, 250), A: number(-1, 1), B: number(-1, 1), p: number(0, 0.02) },
    secondOrder: fc.constantFrom('amplified' as const, 'exact' as const),
  });
  assertProperty(
    drawn,
    { seed: 58, runs: 80 },
    ({ section, slenderness, A, B, p, secondOrder }) => {
      const L = slenderness * scaleOf(section, 345).r;
      const m = loaded(plain(section, { L, secondOrder, Cb: 'auto' }), { p, mx: [A, B] });
      return differences(m, mirrored(m), 1e-10);
    },
  );
});

describe('loads', () => {
  const under = members().filter(({ loads }) => loads.length > 0);
  test('a uniform load in two pieces is one load', { timeout: 600_000 }, () => {
    const drawn = fc.record({ m: under, at: number(0.05, 0.95) });
    assertProperty(drawn, { seed: 55, runs: 120 }, ({ m, at }) => {
      const pieces = m.loads.flatMap((load): readonly Load[] => {
        if (load.kind !== 'uniform') return [load];
        const { from = 0, to = m.L } = load;
        const middle = from + at * (to - from);
        return [
          { ...load, from, to: middle },
          { ...load, from: middle, to },
        ];
      });
      return differences(m, { ...m, loads: pieces }, 1e-9);
    });
  });
  test('a load that varies from one value to the same is uniform', { timeout: 600_000 }, () => {
    assertProperty(under, { seed: 56, runs: 80 }, (m) => {
      const varying = m.loads.map((load): Load => {
        if (load.kind !== 'uniform') return load;
        const { w, kind: _, ...rest } = load;
        return { ...rest, kind: 'linear', wFrom: w, wTo: w };
      });
      return differences(m, { ...m, loads: varying }, 1e-9);
    });
  });
  test('a point load is a short load of the same size', { timeout: 600_000 }, () => {
    const SHORT = 1e-6;
    assertProperty(under, { seed: 57, runs: 120 }, (m) => {
      const reach = SHORT * m.L;
      const places = [0, m.L, ...(m.restraints ?? []).map(({ at }) => at)];
      const spread = m.loads.map((load): Load => {
        if (load.kind !== 'point') return load;
        // Over a held point a point load is carried, a short one shears both bays.
        if (places.some((z) => Math.abs(z - load.at) <= reach)) return load;
        const { W, at, kind: _, ...rest } = load;
        return { ...rest, kind: 'uniform', w: W / reach, from: at - reach / 2, to: at + reach / 2 };
      });
      // The moment under the load is lower by W·reach/8, a share of some of the reach over the length.
      return differences(m, { ...m, loads: spread }, 50 * SHORT);
    });
  });
});
