import { describe, expect, it } from 'vitest';
import { reproduces } from '#server/verify/evaluate-precisely.ts';
import { closeLines } from '#shared/calc/closure.ts';
import { closureProblems } from '#shared/calc/closure-problems.ts';
import type { Recorder } from '#shared/calc/recorder.ts';
import { sprungBay } from '#shared/standards/elastic-theory/end-springs.ts';
import { secondOrderBay } from '#shared/standards/elastic-theory/second-order-bay.ts';
import { firstOrderBay } from '#shared/standards/elastic-theory/statics.ts';
import { UNIT_SETS } from '#shared/units/unit-set.ts';
import { type Random, seededRandom } from '../rules/random.ts';
import { type BayNumbers, bayOf, type LoadNumbers } from './bay.ts';

/*
 * Random bays: every line follows from its printed operands and from the second evaluator, the
 * largest moment is not passed anywhere, and a load given in two parts acts as the whole. Structural:
 * no expected values.
 */
const SHARES = [1e-12, 1e-6, 0.01, 0.3, 0.7, 0.95, 0.999, -1e-9, -0.3, -4, -10];

function randomLoad(random: Random, L: number): LoadNumbers {
  const place = () =>
    random.chance(0.5) ? L * random.pick([0.25, 0.5, 0.75]) : random.between(0.05, 0.95) * L;
  const w = () => Math.round(random.between(-30, 30) * 10) / 10;
  const kind = random.pick(['point', 'whole', 'varying', 'part', 'varying part'] as const);
  if (kind === 'point') return { W: Math.round(random.between(-1e5, 1e5)), at: place() };
  if (kind === 'varying') return { wa: random.chance(0.5) ? 0 : w(), wb: w() };
  const [from, to] = [place(), place()].sort((a, b) => a - b) as [number, number];
  if (kind === 'whole' || to - from < 1) return { w: w() };
  return kind === 'part' ? { w: w(), from, to } : { wa: w(), wb: w(), from, to };
}

function randomBay(random: Random, share: number): BayNumbers {
  const EI = random.size(1e12, 1e15);
  const L = Math.round(random.between(2000, 15000));
  const moment = () => (random.chance(0.3) ? 0 : Math.round(random.between(-1, 1) * 1e8));
  const MA = moment();
  return {
    EI,
    L,
    P: (share * Math.PI ** 2 * EI) / L ** 2,
    MA,
    MB: random.chance(0.2) ? -MA : random.chance(0.2) ? MA : moment(),
    loads: Array.from({ length: random.whole(0, 3) }, () => randomLoad(random, L)),
  };
}

function faultsOf(r: Recorder): string[] {
  const values = new Map(r.lines.flatMap((l) => ('value' in l ? [[l.key, l.value]] : [])));
  const placed = (lines: Recorder['lines']) =>
    lines.map((line) => ({ address: line.key, combination: null, line }));
  return [
    ...r.lines.flatMap((l) => {
      if (l.kind !== 'formula') return [];
      const operands = Object.fromEntries(
        Object.entries(l.operands).map(([name, { ref }]) => [name, values.get(ref) ?? Number.NaN]),
      );
      return reproduces(l.expression, operands, l.value) ? [] : [`${l.key} is not reproduced`];
    }),
    ...Object.values(UNIT_SETS).flatMap((set) =>
      closureProblems(placed(closeLines(placed(r.lines), set)), set).map(
        (p) => `${set.name} ${p.address}: ${p.reason}`,
      ),
    ),
  ];
}

const solve = (c: BayNumbers) => {
  const made = bayOf(c);
  const second = secondOrderBay(made.r, 'theory/x', made.bay, made.axial);
  if (typeof second === 'string') throw new Error(second);
  return { ...made, second, first: firstOrderBay(made.r, 'theory/x', made.bay) };
};

describe('random bays', () => {
  for (const share of SHARES)
    it(`close at P/Pe1 = ${share}`, { timeout: 120_000 }, () => {
      const random = seededRandom(Math.round(1e6 * (share + 20)));
      for (let i = 0; i < 4; i += 1) {
        const c = randomBay(random, share);
        const { r, given, second, first } = solve(c);
        first.largestShear?.(r, 'shear');
        for (const f of [0.25, 0.5, 0.6]) {
          const z = given('zi', 'length', f * c.L);
          second.moment(r, `second/${f}`, z);
          first.moment(r, `first/${f}`, z);
          second.deflection?.(r, `y/${f}`, z);
        }
        const [from, to] = [0.2, 0.6].map((f) => given('zi', 'length', f * c.L));
        if (from && to) second.largestWithin(r, 'part', from, to);
        expect(faultsOf(r), JSON.stringify(c)).toEqual([]);
      }
    });

  for (const share of [1e-6, 0.4, 1, 1.3, 0, -2])
    it(`close between end springs at P/Pe1 = ${share}`, { timeout: 120_000 }, () => {
      const random = seededRandom(Math.round(1e6 * (share + 40)));
      for (let i = 0; i < 3; i += 1) {
        const c = randomBay(random, share);
        const made = bayOf({ ...c, loads: [randomLoad(random, c.L), ...(c.loads ?? [])] });
        const spring = (low: number) =>
          made.given('k', 'rotationalStiffness', (random.size(low, 50) * c.EI) / c.L);
        const { L1, loads } = made.bay;
        sprungBay(
          made.r,
          'sprung',
          { axis: 'x', L1, loads, kA: spring(3), kB: spring(0.1) },
          made.axial,
        );
        expect(faultsOf(made.r), JSON.stringify(c)).toEqual([]);
      }
    });

  for (const share of SHARES)
    it(`have no moment beyond the largest at P/Pe1 = ${share}`, () => {
      const random = seededRandom(Math.round(1e6 * (share + 60)));
      for (let i = 0; i < 12; i += 1) {
        const c = randomBay(random, share);
        const { r, given, second, first } = solve(c);
        for (const result of [second, first]) {
          const { highest, lowest, size } = result.largest;
          const within = 1e-9 * (size.M.value + 1);
          const [from, to] = [0.31, 0.68];
          let part = 0;
          for (let n = 1; n < 200; n += 1) {
            const z = given('zi', 'length', (n / 200) * c.L);
            const M = result.moment(r, `${result.order}/${n}`, z).value;
            const where = `${JSON.stringify(c)}, ${result.order} order, z = ${z.value}`;
            expect(M, where).toBeLessThanOrEqual(highest.M.value + within);
            expect(M, where).toBeGreaterThanOrEqual(lowest.M.value - within);
            if (n / 200 > from && n / 200 < to) part = Math.max(part, Math.abs(M));
          }
          const [a, b] = [from, to].map((f) => given('zi', 'length', f * c.L));
          if (!a || !b) continue;
          const most = result.largestWithin(r, `${result.order}/part`, a, b).value;
          expect(most).toBeGreaterThanOrEqual(part - within);
          expect(most).toBeLessThanOrEqual(size.M.value + within);
          expect(most).toBeLessThanOrEqual(1.02 * part + within + size.M.value * 0.02);
        }
      }
    });

  // Near Pe1 the crest of a small end moment lies more than a quarter wave from that end: g < 0.
  it('have a crest behind a hogging end near the critical load', () => {
    for (const turned of [1, -1]) {
      const c = { EI: 1e13, L: 5000, P: (0.97 * Math.PI ** 2 * 1e13) / 5000 ** 2 };
      const { r, given, second } = solve({
        ...c,
        MA: -40e6 * turned,
        MB: 45e6 * turned,
        loads: [{ w: 0.2 * turned, from: 4000 }],
      });
      const formulas = r.lines.flatMap((l) => (l.kind === 'formula' ? [l.formula] : []));
      const [word, extreme] =
        turned > 0
          ? (['crest', second.largest.highest] as const)
          : (['trough', second.largest.lowest] as const);
      expect(formulas).toContain(`elastic-theory/h-${word}-against`);
      expect(faultsOf(r)).toEqual([]);
      const at = (z: number) => turned * second.moment(r, `m${z}`, given('zi', 'length', z)).value;
      const place = extreme.place?.value ?? Number.NaN;
      const [before, after] = [at(place - 1), at(place + 1)];
      // A parabola through three places a millimetre apart has its top at the middle one.
      const top = turned * extreme.M.value;
      expect(Math.abs(before - after) / (2 * top - before - after)).toBeLessThan(1e-3);
    }
  });

  for (const share of SHARES)
    it(`feel a load in two parts as the whole at P/Pe1 = ${share}`, () => {
      const random = seededRandom(Math.round(1e6 * (share + 80)));
      for (let i = 0; i < 6; i += 1) {
        const c = { ...randomBay(random, share), loads: [] };
        const [wa, wb] = [random.between(-20, 20), random.between(-20, 20)];
        const cut = random.between(0.1, 0.9);
        const wc = wa + (wb - wa) * cut;
        const whole = solve({ ...c, loads: [{ wa, wb }] });
        const parts = solve({
          ...c,
          loads: [
            { wa: wc, wb, from: cut * c.L, to: c.L },
            { wa, wb: wc, from: 0, to: cut * c.L },
          ],
        });
        for (const order of ['first', 'second'] as const) {
          const [one, two] = [whole[order].largest.size.M.value, parts[order].largest.size.M.value];
          expect(Math.abs(one - two) / one, JSON.stringify({ c, wa, wb, cut })).toBeLessThan(1e-8);
        }
      }
    });

  // Mirrored, end A's spring, loads and moment are end B's; moments keep their sign.
  for (const share of [1e-6, 0.5, 1, 1.4, 2.6, 0, -3])
    it(`between end springs are the same mirrored, and nowhere beyond the largest, at P/Pe1 = ${share}`, () => {
      const random = seededRandom(Math.round(1e6 * (share + 100)));
      let solved = 0;
      for (let i = 0; i < 14; i += 1) {
        const c = randomBay(random, share);
        const loads = [randomLoad(random, c.L), ...(c.loads ?? [])];
        const [a, b] = [random.size(8, 500), random.size(8, 500)];
        const straight = sprung({ ...c, loads }, a, b);
        const mirrored = sprung({ ...c, loads: loads.map((l) => mirror(l, c.L)) }, b, a);
        if (!straight || !mirrored) continue;
        solved += 1;
        const where = JSON.stringify({ c, loads, a, b });
        const [one, two] = [straight.bay.ends, mirrored.bay.ends];
        const size = straight.result.largest.size.M.value;
        expect(Math.abs(one.MA.value - two.MB.value), where).toBeLessThan(1e-8 * size);
        expect(Math.abs(one.MB.value - two.MA.value), where).toBeLessThan(1e-8 * size);
        expect(Math.abs(size - mirrored.result.largest.size.M.value)).toBeLessThan(1e-8 * size);
        for (let n = 1; n < 100; n += 1) {
          const M = straight.moment((n / 100) * c.L, n);
          const other = mirrored.moment((1 - n / 100) * c.L, n);
          expect(Math.abs(M - other), where).toBeLessThan(1e-7 * size);
          expect(M, where).toBeLessThanOrEqual(
            straight.result.largest.highest.M.value + 1e-9 * size,
          );
          expect(M, where).toBeGreaterThanOrEqual(
            straight.result.largest.lowest.M.value - 1e-9 * size,
          );
        }
        // The rotation that gave the end moment is that of the deflection line.
        const middle = straight.given('zi', 'length', c.L / 2);
        if (!straight.result.deflection) continue;
        straight.result.deflection(straight.r, 'y', middle);
        const [turned, drawn] = [
          straight.valueAt('sprung/springs/thA'),
          straight.valueAt('sprung/thA'),
        ];
        expect(Math.abs(turned / drawn - 1), where).toBeLessThan(1e-6);
      }
      expect(solved).toBeGreaterThan(5);
    });

  // Between nearly fixed ends kL comes near 2π, and the one stretch of a load over the whole bay may
  // hold a crest and a trough: it is solved in two halves.
  for (const share of [3.2, 3.8, 3.95])
    it(`between nearly fixed ends have no moment beyond the largest at P/Pe1 = ${share}`, () => {
      const random = seededRandom(Math.round(1e6 * (share + 120)));
      for (let i = 0; i < 12; i += 1) {
        const c = randomBay(random, share);
        const [wa, wb] = [random.between(-20, 20), random.between(-20, 20)];
        const s = sprung({ ...c, loads: [{ wa, wb }] }, 1e4, 1e4);
        if (!s) throw new Error('beyond the critical load');
        const { highest, lowest, size } = s.result.largest;
        for (let n = 1; n < 200; n += 1) {
          const M = s.moment((n / 200) * c.L, n);
          const where = JSON.stringify({ c, wa, wb, n });
          expect(M, where).toBeLessThanOrEqual(highest.M.value + 1e-9 * size.M.value);
          expect(M, where).toBeGreaterThanOrEqual(lowest.M.value - 1e-9 * size.M.value);
        }
      }
    });
});

function sprung(c: BayNumbers, kapA: number, kapB: number) {
  const made = bayOf(c);
  const { r, given, bay, axial } = made;
  const spring = (kap: number) => given('k', 'rotationalStiffness', (kap * c.EI) / c.L);
  const { L1, loads } = bay;
  const found = sprungBay(
    r,
    'sprung',
    { axis: 'x', L1, loads, kA: spring(kapA), kB: spring(kapB) },
    axial,
  );
  if (typeof found === 'string') return null;
  const moment = (z: number, n: number): number =>
    found.result.moment(r, `at/${n}`, given('zi', 'length', z)).value;
  return { ...made, ...found, moment };
}

const mirror = (load: LoadNumbers, L: number): LoadNumbers => {
  if ('W' in load) return { ...load, at: L - load.at };
  const part = { from: L - (load.to ?? L), to: L - (load.from ?? 0) };
  return 'w' in load ? { ...load, ...part } : { wa: load.wb, wb: load.wa, ...part };
};
