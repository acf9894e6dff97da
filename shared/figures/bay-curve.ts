import type { BayDrawing, LoadDrawing } from './drawing.ts';

/** Below this k²z² the terms of second order equal their limits to double precision. */
const STRAIGHT = 1e-6;

/** Share of a bay within which a place is its end. */
export const SAME = 1e-9;

/** Points along a member's whole length. */
const STEPS = 96;

export interface Sample {
  /** Distance from end A, mm. */
  readonly z: number;
  readonly value: number;
}

/** Moment and shear along a bay, by the distance from its start, mm. */
export interface BayCurve {
  readonly moment: (z: number) => number;
  /** Slope of the moment; at a force, behind it. */
  readonly shear: (z: number) => number;
}

/** A load cut to a bay, distances from the bay's start. */
type Cut =
  | { readonly kind: 'point'; readonly W: number; readonly at: number }
  | {
      readonly kind: 'line';
      readonly from: number;
      readonly to: number;
      readonly start: number;
      readonly slope: number;
      readonly end: number;
    };

/**
 * The curve of a bay, for drawing only: M″ + k²M = −w between pinned ends with end moments, by
 * initial values; k = 0 is first order, tension its continuation (Timoshenko and Gere, Theory of
 * Elastic Stability, 2nd ed., 1961, chapter 1). Null where kL, compression, is not between 0 and π:
 * no stable solution exists.
 */
export function bayCurve(
  bay: BayDrawing,
  loads: readonly LoadDrawing[],
  kL: number,
  tension: boolean,
): BayCurve | null {
  if (!(kL >= 0 && (tension || kL < Math.PI))) return null;
  const length = bay.to - bay.from;
  const k2 = (tension ? -1 : 1) * (kL / length) ** 2;
  const terms = (z: number) => transfer(k2, Math.max(z, 0));
  const cuts = cutToBay(bay, loads);
  const loadMoment = (z: number): number =>
    -sum(cuts, (load) => {
      if (load.kind === 'point') return load.W * terms(z - load.at).s;
      const [a, b] = [terms(z - load.from), terms(z - load.to)];
      return load.start * a.s1 - load.end * b.s1 + load.slope * (a.s2 - b.s2);
    });
  const loadShear = (z: number): number =>
    -sum(cuts, (load) => {
      if (load.kind === 'point') return z < load.at ? 0 : load.W * terms(z - load.at).c;
      const [a, b] = [terms(z - load.from), terms(z - load.to)];
      return load.start * a.s - load.end * b.s + load.slope * (a.s1 - b.s1);
    });
  const whole = terms(length);
  const VA = (bay.MB - bay.MA * whole.c - loadMoment(length)) / whole.s;
  return {
    moment: (z) => bay.MA * terms(z).c + VA * terms(z).s + loadMoment(z),
    shear: (z) => VA * terms(z).c - k2 * bay.MA * terms(z).s + loadShear(z),
  };
}

/** cos kz, sin kz / k, and that integrated once and twice; their continuation for k² < 0. */
function transfer(k2: number, z: number) {
  const x = k2 * z * z;
  if (Math.abs(x) < STRAIGHT)
    return {
      c: 1 - x / 2,
      s: z * (1 - x / 6),
      s1: (z ** 2 / 2) * (1 - x / 12),
      s2: (z ** 3 / 6) * (1 - x / 20),
    };
  const k = Math.sqrt(Math.abs(k2));
  const [c, s, half] =
    k2 > 0
      ? [Math.cos(k * z), Math.sin(k * z) / k, Math.sin((k * z) / 2)]
      : [Math.cosh(k * z), Math.sinh(k * z) / k, Math.sinh((k * z) / 2)];
  return { c, s, s1: 2 * (half / k) ** 2, s2: (z - s) / k2 };
}

function cutToBay(bay: BayDrawing, loads: readonly LoadDrawing[]): Cut[] {
  return loads.flatMap((load): Cut[] => {
    if (load.kind === 'point') {
      const at = load.at.value - bay.from;
      return isInside(bay, at) ? [{ kind: 'point', W: load.force.value, at }] : [];
    }
    const [from, to] = [Math.max(load.from, bay.from), Math.min(load.to, bay.to)];
    if (to <= from) return [];
    const slope = (load.end.value - load.start.value) / (load.to - load.from);
    const at = (z: number) => load.start.value + slope * (z - load.from);
    const [start, end] = [at(from), at(to)];
    return [{ kind: 'line', from: from - bay.from, to: to - bay.from, start, slope, end }];
  });
}

const isInside = ({ from, to }: BayDrawing, z: number): boolean =>
  z > SAME * (to - from) && z < (1 - SAME) * (to - from);

const sum = <T>(all: readonly T[], value: (one: T) => number): number =>
  all.reduce((total, one) => total + value(one), 0);

/**
 * Places of a bay to draw through, from its start: evenly spaced by a share of `spread` (mm; infinite:
 * only its ends), and where loads begin and end.
 */
export function bayPlaces(
  bay: BayDrawing,
  loads: readonly LoadDrawing[],
  spread: number,
): number[] {
  const length = bay.to - bay.from;
  const steps = spread === Infinity ? 1 : Math.max(24, Math.ceil((STEPS * length) / spread));
  const even = Array.from({ length: steps + 1 }, (_, i) => (i / steps) * length);
  const edges = loads
    .flatMap((load) => (load.kind === 'point' ? [load.at.value] : [load.from, load.to]))
    .map((z) => z - bay.from)
    .filter((z) => isInside(bay, z));
  return [...new Set([...even, ...edges])].sort((a, b) => a - b);
}
