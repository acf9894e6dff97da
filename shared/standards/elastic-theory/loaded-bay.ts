import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { Bay, BayResult } from './bay.ts';
import { extremeOf, type Known, largestBetween, momentsAt } from './bay-result.ts';
import { findExtremes } from './find-extremes.ts';
import { largestSize } from './size.ts';
import {
  type OrderOf,
  operandsAt,
  type SolvedStretch,
  walkFormulas,
  withSeries,
} from './solve-stretches.ts';
import { momentAt } from './transfer.ts';

/** Moments of a bay whose stretches are solved. */
export function momentsOf(
  r: Recorder,
  at: string,
  bay: Bay,
  solution: OrderOf,
  solved: readonly SolvedStretch[],
): Pick<BayResult, 'moment' | 'largestWithin' | 'largest'> {
  const { ends, axis } = bay;
  const nodes: Known[] = solved
    .slice(0, -1)
    .map(({ stretch, Mj }) => ({ place: stretch.to, M: Mj }));
  const extremes = findExtremes(r, at, bay.L1, solution, solved);
  const known = [...nodes, ...extremes];
  const candidates = [ends.MA, ends.MB, ...known.map((k) => k.M)];
  const largest = candidates.length > 2 ? governed() : atTheEnds(bay);
  const moment = momentsAt(bay, known, (reader, key, z) =>
    writeMoment(reader, key, bay, solution, solved, z),
  );
  return {
    moment,
    largest,
    largestWithin: largestBetween(bay, moment, nodes, extremes, largest.size.M),
  };

  function governed(): BayResult['largest'] {
    const symbols =
      solution.order === 'first'
        ? { highest: 'M1high', lowest: 'M1low', size: `M1max${axis}` }
        : { highest: 'Mhigh', lowest: 'Mlow', size: `Mmax${axis}` };
    const found = largestSize(r, at, candidates, { word: 'moment', letter: 'M', symbols });
    const governs = (sense: 1 | -1): Quantity =>
      candidates.reduce((a, b) => (sense * (b.value - a.value) > 0 ? b : a));
    const highest = extremeOf(bay, known, governs(1), found.highest);
    const lowest = extremeOf(bay, known, governs(-1), found.lowest);
    const larger = Math.abs(lowest.M.value) > Math.abs(highest.M.value) ? lowest : highest;
    return { highest, lowest, size: { ...larger, M: found.size } };
  }
}

/** Nothing between the ends passes them. */
export function atTheEnds({ ends }: Bay): BayResult['largest'] {
  const { MA, MB, M2, largerEnd } = ends;
  const [highest, lowest] = MA.value >= MB.value ? (['A', 'B'] as const) : (['B', 'A'] as const);
  const at = (end: 'A' | 'B') => ({ M: end === 'A' ? MA : MB, end, place: null });
  return { size: { M: M2, end: largerEnd, place: null }, highest: at(highest), lowest: at(lowest) };
}

/** Moment at a place inside a stretch. */
function writeMoment(
  r: Recorder,
  key: string,
  bay: Bay,
  solution: OrderOf,
  solved: readonly SolvedStretch[],
  z: Quantity,
): Quantity {
  const s = solved.find(({ stretch }) => z.value < stretch.to.value) as SolvedStretch;
  return r.formula(
    momentAt[solution.order][s.stretch.load.shape],
    key,
    placeIn(r, key, bay, solution, s, z),
    { title: `Moment at the place${withSeries(solution.order, s.stretch)}` },
  );
}

/** What the transfer formulas take at a place, by its distance in its stretch. */
export function placeIn(
  r: Recorder,
  key: string,
  bay: Bay,
  solution: OrderOf,
  s: SolvedStretch,
  z: Quantity,
): Record<string, Quantity> {
  const { from } = s.stretch;
  const xi = from ? r.formula(walkFormulas.distance, `${key}/xi`, { zj: z, zi: from }) : z;
  return operandsAt(r, `${key}/k`, bay.L1, solution, s, xi, {
    title: 'Axial parameter up to the place',
    symbol: 'kxi',
  });
}
