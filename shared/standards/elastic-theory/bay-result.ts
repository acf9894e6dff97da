import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { Bay, BayResult, Extreme } from './bay.ts';
import { endMomentFormulas } from './end-moments.ts';
import type { InnerExtreme } from './find-extremes.ts';
import { clause } from './writer.ts';

/** A place between the ends whose moment has a line. */
export interface Known {
  readonly place: Quantity;
  readonly M: Quantity;
}

/** Answers the moment at a place, once per place. */
export function momentsAt(
  bay: Bay,
  known: readonly Known[],
  write: (r: Recorder, key: string, z: Quantity) => Quantity,
): BayResult['moment'] {
  const { L1, ends } = bay;
  const found = new Map<number, Quantity>(known.map(({ place, M }) => [place.value, M]));
  return (r, key, z) => {
    if (z.value === 0) return ends.MA;
    if (z.value === L1.value) return ends.MB;
    if (!(z.value > 0 && z.value < L1.value))
      throw new Error(`${z.value} is no place of a bay of ${L1.value}`);
    const before = found.get(z.value);
    if (before) return before;
    const M = write(r, key, z);
    found.set(z.value, M);
    return M;
  };
}

/**
 * The largest size of the moment between two places: their moments, and those of load ends and
 * extremes between them.
 */
export function largestBetween(
  bay: Bay,
  moment: BayResult['moment'],
  nodes: readonly Known[],
  extremes: readonly InnerExtreme[],
  whole: Quantity,
): BayResult['largestWithin'] {
  const { ends, L1, axis } = bay;
  const sizes = new Map<string, Quantity>([
    [ends.MA.ref, ends.absA],
    [ends.MB.ref, ends.absB],
  ]);
  return (r, key, from, to) => {
    if (from.value === 0 && to.value === L1.value) return whole;
    const sizeOf = (name: string, title: string, M: Quantity): Quantity => {
      const before = sizes.get(M.ref);
      if (before) return before;
      const size = r.formula(endMomentFormulas.size, `${key}/${name}/size`, { M }, { title });
      sizes.set(M.ref, size);
      return size;
    };
    const between = (z: Quantity) => z.value > from.value && z.value < to.value;
    const candidates = [
      sizeOf('from', 'Size of the moment at the start of the part', moment(r, `${key}/from`, from)),
      sizeOf('to', 'Size of the moment at the end of the part', moment(r, `${key}/to`, to)),
      ...nodes.flatMap(({ place, M }, i) =>
        between(place)
          ? [sizeOf(`node${i + 1}`, 'Size of the moment at a point within the part', M)]
          : [],
      ),
      ...extremes.flatMap(({ place, M }, i) =>
        isBetween(r, `${key}/extreme${i + 1}`, place, from, to)
          ? [sizeOf(`extreme${i + 1}`, 'Size of the extreme moment', M)]
          : [],
      ),
    ];
    return r.governing(key, 'max', candidates, {
      title: 'Largest moment within the part',
      symbol: `Mpart${axis}`,
      clause: clause('2.1'),
    });
  };
}

const isBetween = (
  r: Recorder,
  key: string,
  place: Quantity,
  from: Quantity,
  to: Quantity,
): boolean =>
  r.choice(
    key,
    [
      { left: place, relation: '<=', right: from, outcome: 'the extreme lies before the part' },
      { left: place, relation: '>=', right: to, outcome: 'the extreme lies behind the part' },
    ],
    'the extreme lies within the part',
    { title: 'Whether the extreme lies within the part', clause: clause('2.1') },
  ) < 0;

/** Where a moment lies that is one of the candidates. */
export function extremeOf(
  bay: Bay,
  known: readonly Known[],
  M: Quantity,
  value: Quantity,
): Extreme {
  if (M.ref === bay.ends.MA.ref) return { M: value, end: 'A', place: null };
  if (M.ref === bay.ends.MB.ref) return { M: value, end: 'B', place: null };
  const found = known.find((k) => k.M.ref === M.ref);
  if (!found) throw new Error(`no place of ${M.ref}`);
  return { M: value, end: null, place: found.place };
}
