import { describe, expect, it } from 'vitest';
import type { BayResult } from '#shared/standards/elastic-theory/bay.ts';
import { sprungBay } from '#shared/standards/elastic-theory/end-springs.ts';
import { secondOrderBay } from '#shared/standards/elastic-theory/second-order-bay.ts';
import { firstOrderBay } from '#shared/standards/elastic-theory/statics.ts';
import { type BayNumbers, bayOf, type LoadNumbers } from './bay.ts';
import { casesIn, near, number, type Reference } from './elastic-theory-cases.ts';

/*
 * Bays under loads that vary, over parts and over each other: numbers computed for this project by
 * integrating influence functions with 30 digits (elastic-theory/varying-loads.json says how).
 */
const cases = casesIn('varying-loads');
const numbersOf = ({ inputs }: Reference): BayNumbers => ({
  EI: number(inputs.EI_Nmm2),
  L: number(inputs.L_mm),
  P: number(inputs.P_N),
  MA: Number(inputs.MA_Nmm ?? 0),
  MB: Number(inputs.MB_Nmm ?? 0),
  loads: inputs.loads as LoadNumbers[],
});
/** The bay with all its moments and loads to the other side. */
const turned = (c: BayNumbers): BayNumbers => ({
  ...c,
  ...{ MA: -(c.MA ?? 0), MB: -(c.MB ?? 0) },
  loads: (c.loads ?? []).map((l) => {
    if ('W' in l) return { ...l, W: -l.W };
    return 'w' in l ? { ...l, w: -l.w } : { ...l, wa: -l.wa, wb: -l.wb };
  }),
});
const at = (name: string) => Number(/_at_(.*)$/.exec(name)?.[1]);

function solve(c: BayNumbers) {
  const made = bayOf(c);
  const result =
    c.P === 0
      ? firstOrderBay(made.r, 'theory/x', made.bay)
      : secondOrderBay(made.r, 'theory/x', made.bay, made.axial);
  if (typeof result === 'string') throw new Error(result);
  return { ...made, result };
}

/** Moments, shears, deflections and extremes of a case; `sign` is −1 for the turned bay. */
function compare(
  { r, given }: Pick<ReturnType<typeof bayOf>, 'r' | 'given'>,
  result: BayResult,
  expected: Reference['expected'],
  sign: 1 | -1,
): void {
  const { highest, lowest } = result.largest;
  const [high, low] = sign === 1 ? [highest, lowest] : [lowest, highest];
  const { shear, deflection } = result;
  for (const [name, wanted] of Object.entries(expected)) {
    const place = () => given('zi', 'length', at(name));
    const value = (): number | undefined => {
      if (name === 'VA') return shear?.A.value;
      if (name === 'VB') return shear?.B.value;
      if (name === 'M_high') return high.M.value;
      if (name === 'M_low') return low.M.value;
      if (name.startsWith('M_at')) return result.moment(r, `asked/${name}`, place()).value;
      return deflection?.(r, `asked/${name}`, place()).value;
    };
    if (name === 'x_high') near(high.place?.value ?? Number.NaN, wanted, name);
    else if (name === 'x_low') {
      if (low.place) near(low.place.value, wanted, name);
      else expect(low.end).toBe(wanted === 0 ? 'A' : 'B');
    } else if (/^([MVy]_|V[AB]$)/.test(name) && name !== 'V_turn')
      near(sign * (value() ?? Number.NaN), wanted, name);
  }
}

describe('pinned bays under varying loads', () => {
  const pinned = cases.filter(({ id }) => !id.startsWith('SPRUNG'));
  it('has all of them', () => expect(pinned).toHaveLength(7));
  for (const c of pinned)
    for (const sign of [1, -1] as const)
      it(`${c.id}${sign === 1 ? '' : ', to the other side'}`, () => {
        const b = solve(sign === 1 ? numbersOf(c) : turned(numbersOf(c)));
        compare(b, b.result, c.expected, sign);
        if (c.expected.x_turn === undefined) return;
        const under = b.result.order === 'first' ? 'theory/x/first' : 'theory/x';
        near(b.valueAt(`${under}/turn1`), c.expected.x_turn, 'where the shear turns');
        near(sign * b.valueAt(`${under}/turn1/V`), c.expected.V_turn, 'the shear there');
      });
});

/*
 * The largest shear in first order, by hand. L = 6000, load from −20 to 30 N/mm: nothing at 2400, where
 * the shear has risen by 20·2400/2 = 24 000; from there it falls by 30·3600/2 = 54 000. Its part in VA is
 * L(2·(−20) + 30)/6 = −10 000. With MB − MA = 180e6 VA = −10 000 + 30 000: 20 000, 44 000, −10 000.
 * Without load and MB − MA = −180e6: −30 000 all along.
 */
describe('the largest shear as a size', () => {
  const bay = { EI: 2.5e13, L: 6000, P: 0 };
  const varying = { ...bay, MA: -100e6, MB: 80e6, loads: [{ wa: -20, wb: 30 }] };
  for (const sign of [1, -1] as const)
    it(`lies where the load is nothing${sign === 1 ? '' : ', to the other side'}`, () => {
      const { r, result, valueAt } = solve(sign === 1 ? varying : turned(varying));
      near(result.largestShear?.(r, 'G/x').value ?? Number.NaN, 44_000, 'V');
      near(valueAt('G/x/Vturn1'), 2400, 'its place');
      near(sign * valueAt('G/x/Vturn1/V'), 44_000, 'V with its sign');
    });
  it('is the one shear of a bay without load', () => {
    const { r, result } = solve({ ...bay, MA: 100e6, MB: -80e6 });
    near(result.largestShear?.(r, 'G/x').value ?? Number.NaN, 30_000, 'V');
  });
});

/*
 * End moments alone, both negative: the largest moment has their sign. Timoshenko and Gere, Theory of
 * Elastic Stability, 2nd ed., chapter 1: equal couples M give M sec(kL/2) at the middle; at P = 0.36 Pe
 * kL = 0.6 π and sec 0.3 π = 1.7013016167.
 */
it('equal couples to the other side have a trough in the middle', () => {
  const [EI, L] = [2.5e13, 6000];
  const P = (0.36 * Math.PI ** 2 * EI) / L ** 2;
  const { result } = solve({ EI, L, P, MA: -64e6, MB: -64e6 });
  const { lowest, highest, size } = result.largest;
  near(lowest.M.value, -64e6 * 1.70130161670408, 'M');
  near(lowest.place?.value ?? Number.NaN, 3000, 'its place');
  near(size.M.value, 64e6 * 1.70130161670408, 'as a size');
  near(highest.M.value, -64e6, 'the ends');
});

describe('sprung bays under varying loads', () => {
  const sprung = cases.filter(({ id }) => id.startsWith('SPRUNG'));
  it('has all of them', () => expect(sprung).toHaveLength(4));
  for (const c of sprung)
    it(c.id, () => {
      const numbers = numbersOf(c);
      const made = bayOf(numbers);
      const { r, bay, axial, given, valueAt } = made;
      const spring = (end: 'A' | 'B') =>
        given(
          'k',
          'rotationalStiffness',
          (number(c.inputs[`rot_spring_${end}_L_over_EI`]) * numbers.EI) / numbers.L,
        );
      const found = sprungBay(
        r,
        'sprung',
        { axis: 'x', L1: bay.L1, loads: bay.loads, kA: spring('A'), kB: spring('B') },
        axial,
      );
      if (typeof found === 'string') throw new Error(found);
      near(found.bay.ends.MA.value, c.expected.M_A, 'M at A');
      near(found.bay.ends.MB.value, c.expected.M_B, 'M at B');
      near(valueAt('sprung/springs/thA'), c.expected.theta_A, 'rotation at A');
      const { M_A, M_B, theta_A, ...along } = c.expected;
      compare(made, found.result, along, 1);
      // Above kL = π the bay is cut at its middle, so that each part has one extreme at most.
      if (c.id === 'SPRUNG 1.4') near(valueAt('sprung/middle'), 3000, 'the middle');
    });
});

// kL = √(T/EI)·L = √(100/100)·10 = 10. The limit is the book's own, no source.
it('the solution in tension holds up to kL = 10', () => {
  const of = (P: number) => {
    const { r, bay, axial } = bayOf({ EI: 100, L: 10, P, loads: [{ w: 1 }] });
    return typeof secondOrderBay(r, 'theory/x', bay, axial);
  };
  expect([of(-100), of(-100.1)]).toEqual(['object', 'string']);
});

// A bay with end springs has no equilibrium at its critical load itself.
it('a sprung bay fails at its critical load', () => {
  const at = (P: number) => {
    const { r, bay, axial, given } = bayOf({ EI: 2.5e13, L: 6000, P, loads: [{ w: 12 }] });
    const k = given('k', 'rotationalStiffness', 8e9);
    return sprungBay(r, 'sprung', { axis: 'x', L1: bay.L1, loads: bay.loads, kA: k, kB: k }, axial);
  };
  const below = at(5e6);
  if (typeof below === 'string') throw new Error(below);
  expect(at(below.Pcr.value)).toBe('failed');
  expect(typeof at(below.Pcr.value * (1 - 1e-9))).toBe('object');
});
