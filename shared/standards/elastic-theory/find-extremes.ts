import type { Formula } from '../../calc/formula.ts';
import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import {
  auxiliaryLoad,
  extremeDistance,
  extremeMoment,
  placeFromStart,
  startLoad,
} from './extreme.ts';
import { type OrderOf, operandsAt, type SolvedStretch, withSeries } from './solve-stretches.ts';
import { numbered } from './stretches.ts';
import { type LoadShape, momentAt, shearAt, turningShear, zeroShear } from './transfer.ts';
import { clause } from './writer.ts';

/** A moment inside a stretch where the shear is zero, with its sign, and its place from end A. */
export interface InnerExtreme {
  readonly place: Quantity;
  readonly M: Quantity;
}

/** Where the names of an extreme's lines come from: 1, or 1b for the second one of a stretch. */
interface Found {
  readonly r: Recorder;
  readonly at: string;
  readonly L1: Quantity;
  readonly solution: OrderOf;
  readonly s: SolvedStretch;
}

/** The extremes inside the stretches, each with the choice that says whether there is one. */
export const findExtremes = (
  r: Recorder,
  at: string,
  L1: Quantity,
  solution: OrderOf,
  solved: readonly SolvedStretch[],
): InnerExtreme[] => solved.flatMap((s) => extremesOf({ r, at, L1, solution, s }));

function extremesOf(f: Found): InnerExtreme[] {
  const { Vi, Vj, stretch } = f.s;
  const { load, length } = stretch;
  // The shear of an unloaded stretch doesn't change in first order.
  if (f.solution.order === 'first' && load.shape === 'none') return [];
  const turn = load.shape === 'linear' ? turnOf(f) : null;
  if (turn) {
    const { xi, V } = turn;
    if (!turnChanges(f, V)) return [];
    return [
      ...(V.value * Vi.value < 0 ? [rootExtreme(f, '', [0, xi.value])] : []),
      ...(V.value * Vj.value < 0 ? [rootExtreme(f, 'b', [xi.value, length.value])] : []),
    ];
  }
  const word = Vi.value >= 0 ? 'crest' : 'trough';
  if (!shearChanges(f, word)) return [];
  return [
    load.shape === 'linear' || f.solution.order === 'tension'
      ? rootExtreme(f, '', [0, length.value])
      : closedExtreme(f, word),
  ];
}

/** Whether the shear, which doesn't turn, is zero inside the stretch. */
function shearChanges({ r, at, s }: Found, word: 'crest' | 'trough'): boolean {
  const { Vi, Vj, stretch } = s;
  const [none, beyond] = word === 'crest' ? (['<=', '>='] as const) : (['>=', '<='] as const);
  const outcome = `the moment has no ${word} inside stretch ${stretch.index}`;
  return (
    r.choice(
      `${at}/inside${stretch.index}`,
      [
        { left: Vi, relation: none, right: 0, outcome },
        { left: Vj, relation: beyond, right: 0, outcome },
      ],
      `the shear changes sign and the moment has a ${word} inside stretch ${stretch.index}`,
      { title: `Extreme moment inside stretch ${stretch.index}`, clause: clause('2.1') },
    ) < 0
  );
}

/** Whether the shear, which turns at V between ends on one side of zero, passes zero on its way. */
function turnChanges({ r, at, s }: Found, V: Quantity): boolean {
  const { Vi, Vj, stretch } = s;
  const [end, positive] = Vi.value === 0 ? [Vj, V.value > 0] : [V, Vi.value > 0];
  return (
    r.choice(
      `${at}/inside${stretch.index}`,
      [
        {
          left: end,
          relation: positive ? '>=' : '<=',
          right: 0,
          outcome: `the shear keeps its sign and the moment has no extreme inside stretch ${stretch.index}`,
        },
      ],
      `the shear changes sign on its way and the moment has an extreme inside stretch ${stretch.index}`,
      { title: `Extreme moment inside stretch ${stretch.index}`, clause: clause('2.1') },
    ) < 0
  );
}

/** Without load or under a uniform one, in first order and in compression. */
function closedExtreme({ r, at, L1, solution, s }: Found, word: 'crest' | 'trough'): InnerExtreme {
  const { Mi, Vi, stretch } = s;
  const { index, load } = stretch;
  const words = {
    title: `Moment at the ${word} in stretch ${index}`,
    symbol: numbered('Me', index),
  };
  const title = { title: `Distance of the ${word} from the start of stretch ${index}` };
  const wi = load.shape === 'none' ? null : load.wi;
  if (solution.order === 'first') {
    const known = { Mi, Vi, wi: wi as Quantity };
    const { place } = placed(r, at, stretch, (key, named) =>
      r.formula(extremeDistance.first, key, known, { ...title, ...named }),
    );
    return { place, M: r.formula(extremeMoment.first, `${at}/Me${index}`, known, words) };
  }
  const { kL } = solution;
  const gi = r.formula(
    startLoad[wi ? 'uniform' : 'none'],
    `${at}/g${index}`,
    { kL, L1, Mi, ...(wi ? { wi } : {}) },
    { symbol: numbered('g', index) },
  );
  const against = word === 'crest' ? gi.value < 0 : gi.value > 0;
  const hi = r.formula(
    auxiliaryLoad[against ? (`${word}Against` as const) : word],
    `${at}/h${index}`,
    { gi, kL, Vi, L1 },
    { symbol: numbered('h', index) },
  );
  const { place } = placed(r, at, stretch, (key, named) =>
    r.formula(extremeDistance.compression, key, { L1, kL, Vi, hi }, { ...title, ...named }),
  );
  return {
    place,
    M: r.formula(extremeMoment.compression, `${at}/Me${index}`, { Mi, Vi, hi }, words),
  };
}

/** The distance from the stretch's start and the place from end A; one line in the first stretch. */
function placed(
  r: Recorder,
  at: string,
  { index, from }: SolvedStretch['stretch'],
  write: (key: string, named: { symbol: string }) => Quantity,
  suffix = '',
): { xi: Quantity; place: Quantity } {
  const key = `${at}/z${index}${suffix}`;
  const symbol = numbered('ze', index, suffix);
  if (!from) {
    const xi = write(key, { symbol });
    return { xi, place: xi };
  }
  const xi = write(`${key}/xi`, { symbol: 'xi' });
  const title = 'Its distance from end A';
  return { xi, place: r.formula(placeFromStart, key, { zi: from, xi }, { title, symbol }) };
}

/** Without a closed form: the root of the shear between the bounds, and the moment there. */
function rootExtreme(
  { r, at, L1, solution, s }: Found,
  suffix: '' | 'b',
  bracket: readonly [number, number],
): InnerExtreme {
  const { stretch } = s;
  const { index, load } = stretch;
  const { order, kL } = solution;
  const zero = (zeroShear[order] as Partial<Record<LoadShape, Formula>>)[load.shape];
  if (!zero) throw new Error(`a closed form stands for ${order}, ${load.shape}`);
  const title = `Distance of zero shear from the start of stretch ${index}`;
  const { xi, place } = placed(
    r,
    at,
    stretch,
    (key) =>
      r.root(
        zero,
        key,
        { symbol: 'xi', dimension: 'length', bracket },
        { ...shearOperands(s), ...(kL ? { Mi: s.Mi, kL, L1 } : {}) },
        { title },
      ),
    suffix,
  );
  const key = `${at}/Me${index}${suffix}`;
  const M = r.formula(
    momentAt[order][load.shape],
    key,
    operandsAt(r, `${key}/k`, L1, solution, s, xi, {
      title: 'Axial parameter up to there',
      symbol: 'kxi',
    }),
    {
      title: `Moment there${withSeries(order, stretch)}`,
      symbol: numbered('Me', index, suffix),
    },
  );
  return { place, M };
}

const shearOperands = ({ Vi, stretch }: SolvedStretch): Record<string, Quantity> => {
  const { load, length: li } = stretch;
  if (load.shape === 'none') return { Vi };
  return load.shape === 'uniform' ? { Vi, wi: load.wi } : { Vi, wi: load.wi, wj: load.wj, li };
};

/**
 * Where the shear of a stretch with varying load turns inside it, with the shear there; null where it
 * doesn't. Written only where it can decide: both ends on one side, or the start at zero.
 */
function turnOf({ r, at, L1, solution, s }: Found): { xi: Quantity; V: Quantity } | null {
  const { stretch, Mi, Vi, Vj } = s;
  const { index, load, length: li } = stretch;
  if (load.shape !== 'linear' || Vi.value * Vj.value < 0) return null;
  const { order, kL } = solution;
  const { wi, wj } = load;
  const known = { ...(kL ? { Mi, Vi, kL, L1 } : {}), wi, wj, li };
  const values = Object.fromEntries(Object.entries(known).map(([name, q]) => [name, q.value]));
  const slope = (xi: number) => turningShear[order].expression.settle({ ...values, xi });
  if (slope(0) * slope(li.value) >= 0) return null;
  const xi = r.root(
    turningShear[order],
    `${at}/turn${index}`,
    { symbol: 'xi', dimension: 'length', bracket: [0, li.value] },
    known,
    { title: `Distance of the extreme shear from the start of stretch ${index}` },
  );
  const V = r.formula(
    shearAt[order].linear as NonNullable<(typeof shearAt)['first']['linear']>,
    `${at}/turn${index}/V`,
    operandsAt(r, `${at}/turn${index}/k`, L1, solution, s, xi, {
      title: 'Axial parameter up to there',
      symbol: 'kxi',
    }),
    { title: 'Shear there', symbol: 'Vz' },
  );
  return { xi, V };
}
