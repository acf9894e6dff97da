import type { Condition } from '#shared/calc/line.ts';
import { between, type Member } from './member.ts';
import { addressAt, linesOfKind, type Run, run, valueIn } from './results.ts';

/** A key without combination, parts, and numbers of restraints and stretches. */
export const plainKey = (address: string): string =>
  address
    .replace(/^c1:/, '')
    .replace(/^((bay\d+|s\d+|top|bottom)\/)+/, '')
    .replace(/\/r\d+\//, '/r/')
    .replace(/(inside|extreme|turn|load|first\/M)\d+/g, '$1')
    .replace(/\/\d+(?=\/|$)/g, '');

/**
 * What a run decided, by address: outcomes of its choices, notices that end a check, the equation of
 * Cm, and which loads a bay has.
 */
export function decisionsOf(r: Run): ReadonlyMap<string, string> {
  return new Map([
    ...linesOfKind(r, 'choice').map(({ address, line }) => [address, line.outcome] as const),
    ...linesOfKind(r, 'notice').flatMap(({ address, line }) =>
      line.severity === 'outside scope' || line.severity === 'failed'
        ? [[address, line.code] as const]
        : [],
    ),
    ...linesOfKind(r, 'formula').flatMap(({ address, line }) =>
      /\/Cm$|bay\d+\/(given|theory\/x\/first\/M\d)/.test(address)
        ? [[address, line.formula] as const]
        : [],
    ),
  ]);
}

/** A step across a limit: two members a hair's breadth apart that are decided differently. */
export interface Crossing {
  readonly before: Run;
  readonly after: Run;
  /** Plain keys of what is decided otherwise. */
  readonly flipped: readonly string[];
  /** Plain keys of what is decided on one side only. */
  readonly appeared: readonly string[];
}

interface Point {
  readonly t: number;
  readonly r: Run;
  readonly decisions: ReadonlyMap<string, string>;
  readonly signature: string;
}

function pointOf(member: Member, t: number): Point {
  const r = run(member);
  const decisions = decisionsOf(r);
  return { t, r, decisions, signature: JSON.stringify([...decisions]) };
}

/** The step from one member to another close by, whether it crosses a limit or not. */
export const stepBetween = (a: Member, b: Member): Crossing =>
  crossingOf(pointOf(a, 0), pointOf(b, 1));

/** Steps are this share of the path wide. */
const STEP = 1e-11;

/**
 * Walks from one member to another and stops at every place where a decision changes, the nearest
 * first, up to `most` times.
 */
export function crossingsBetween(a: Member, b: Member, most: number): readonly Crossing[] {
  const at = (t: number): Point => pointOf(between(a, b, t), t);
  const end = at(1);
  const found: Crossing[] = [];
  let from = at(0);
  while (found.length < most && from.signature !== end.signature) {
    const [low, high] = narrowed(from, end, at);
    found.push(crossingOf(low, high));
    from = high;
  }
  return found;
}

/** The first change of the decisions between two points, by halves and by straight lines in turn. */
function narrowed(from: Point, to: Point, at: (t: number) => Point): readonly [Point, Point] {
  let [low, high] = [from, to];
  for (let turn = 0; high.t - low.t > STEP; turn += 1) {
    const crossing = turn % 3 === 0 ? null : crossedBy(low, high);
    const beside = (turn % 3 === 1 ? 0.4 : -0.4) * STEP;
    const guess = crossing === null ? Number.NaN : crossing + beside;
    const middle = at(guess > low.t && guess < high.t ? guess : (low.t + high.t) / 2);
    if (middle.signature === low.signature) low = middle;
    else high = middle;
  }
  return [low, high];
}

/**
 * Where both sides of a condition that decides differently would be equal, were they straight; of
 * several such conditions the nearest.
 */
function crossedBy(low: Point, high: Point): number | null {
  const places = [...low.decisions].flatMap(([address, outcome]) => {
    const [a, b] = [low.r.lines.get(address), high.r.lines.get(address)];
    if (outcome === high.decisions.get(address) || a?.kind !== 'choice' || b?.kind !== 'choice')
      return [];
    const i = a.tried.findIndex((tried, n) => tried.holds !== b.tried[n]?.holds);
    const [g, h] = [gap(low.r, address, a.tried[i]), gap(high.r, address, b.tried[i])];
    if (g === null || h === null || g * h >= 0) return [];
    return [low.t + ((high.t - low.t) * g) / (g - h)];
  });
  return places.length === 0 ? null : Math.min(...places);
}

function gap(r: Run, address: string, condition: Condition | undefined): number | null {
  const [left, right] = [condition?.left, condition?.right].map((side) => {
    if (side && 'ref' in side) return valueIn(r, addressAt(side.ref, address));
    return side && 'constant' in side ? side.constant : null;
  });
  return typeof left === 'number' && typeof right === 'number' ? left - right : null;
}

function crossingOf(low: Point, high: Point): Crossing {
  const keys = [...new Set([...low.decisions.keys(), ...high.decisions.keys()])];
  const differing = keys.filter((key) => low.decisions.get(key) !== high.decisions.get(key));
  const both = (key: string) => low.decisions.has(key) && high.decisions.has(key);
  const names = (chosen: readonly string[]) => [...new Set(chosen.map(plainKey))];
  return {
    ...{ before: low.r, after: high.r, flipped: names(differing.filter(both)) },
    appeared: names(differing.filter((key) => !both(key))),
  };
}
