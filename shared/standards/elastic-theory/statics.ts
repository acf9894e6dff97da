import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { Bay, FirstOrderBay } from './bay.ts';
import { momentsOf } from './loaded-bay.ts';
import { largestSize, sizeFormulas } from './size.ts';
import { type SolvedStretch, solveStretches, startShear } from './solve-stretches.ts';
import { shearAt, turningShear } from './transfer.ts';

const FIRST = { order: 'first', kL: null } as const;

/**
 * Moment and shear of a bay by equilibrium alone: the straight line between the end moments, and
 * the loads as on a simply supported bay.
 */
export const firstOrderBay: FirstOrderBay = (r, at, bay) => {
  const under = `${at}/first`;
  const VA = startShear(r, under, bay, FIRST);
  const solved = solveStretches(r, under, bay, FIRST, { VA, middle: false });
  return {
    order: 'first',
    ...momentsOf(r, under, bay, FIRST, solved),
    shear: { A: VA, B: solved.at(-1)?.Vj ?? VA },
    largestShear: (reader, key) => largestShear(reader, key, bay, solved),
    deflection: null,
    endMomentsOnly: null,
  };
};

/** Shear is largest or least at the ends of stretches, or where a varying load changes its sign. */
function largestShear(
  r: Recorder,
  key: string,
  bay: Bay,
  solved: readonly SolvedStretch[],
): Quantity {
  const turns = solved.flatMap((s) => {
    const { load, index, length: li } = s.stretch;
    if (load.shape !== 'linear' || load.wi.value * load.wj.value >= 0) return [];
    const { wi, wj } = load;
    const xi = r.root(
      turningShear.first,
      `${key}/Vturn${index}`,
      { symbol: 'xi', dimension: 'length', bracket: [0, li.value] },
      { wi, wj, li },
      { title: `Distance of the zero of the load from the start of stretch ${index}` },
    );
    const shear = shearAt.first.linear;
    return shear
      ? [
          r.formula(
            shear,
            `${key}/Vturn${index}/V`,
            { Vi: s.Vi, wi, wj, xi, li },
            { title: 'Shear there', symbol: 'Vz' },
          ),
        ]
      : [];
  });
  const all = [...solved.flatMap(({ Vi, Vj }) => [Vi, Vj]), ...turns];
  const candidates = all.filter((q, i) => all.findIndex((p) => p.ref === q.ref) === i);
  const [only] = candidates;
  if (only && candidates.length === 1)
    return r.formula(
      sizeFormulas.shear,
      `${key}/Vmax`,
      { V: only },
      { title: 'Largest shear', symbol: `Vmax${bay.axis}` },
    );
  return largestSize(r, key, candidates, {
    word: 'shear',
    letter: 'V',
    symbols: { highest: 'Vhigh', lowest: 'Vlow', size: `Vmax${bay.axis}` },
  }).size;
}
