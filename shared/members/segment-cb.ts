import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { placeFormulas } from '../standards/aisc360-22/e2.ts';
import { f1Formulas, modificationFactor } from '../standards/aisc360-22/f1.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type { BayResult } from '../standards/elastic-theory/bay.ts';
import { endMomentFormulas } from '../standards/elastic-theory/end-moments.ts';
import type { BayMoments } from './bay-moments.ts';
import { compareFactors } from './modification-factor.ts';
import type { PlaneMoments } from './plane-moments.ts';
import type { ResolvedInput } from './resolved.ts';
import { placeQuantity } from './restraint-lines.ts';
import {
  diagramOf,
  largestOn,
  momentAlong,
  type Segment,
  type SegmentContext,
} from './segments.ts';

const QUARTERS = [
  ['A', placeFormulas.quarterA, 'MA4', 'first quarter point'],
  ['B', placeFormulas.quarterB, 'MB4', 'middle'],
  ['C', placeFormulas.quarterC, 'MC4', 'third quarter point'],
] as const;

/**
 * Cb of one segment from the diagram whose largest moment enters Mr: the second-order one, or for
 * amplified moments the first-order one with the second-order value beside it.
 */
export function segmentCb(
  segment: Segment,
  input: ResolvedInput,
  m: SegmentContext,
  x: PlaneMoments,
  Lb: Quantity,
  compressed: boolean,
): Quantity {
  const { r } = segment;
  const { secondOrder } = input.analysis;
  r.section('F1', 'Lateral-torsional buckling modification factor', clause('F1'));
  const drawn = x.bays.filter((bay) => bay.state === 'done');
  // From an analysis, at or beyond the critical load of pinned ends: no curve between given moments.
  const beyond = compressed && secondOrder === 'from-analysis' && drawn.some((bay) => !bay.exact);
  const unknown = beyond || (x.givenMax && !x.bays.some((bay) => bay.loads.length > 0));
  if (unknown || drawn.some((bay) => bay.swayed)) return one(r, unknown ? UNKNOWN : SWAY);
  const places = quarterPlaces(segment, m, Lb);
  const Cb = factorAlong(segment, m, x, places, 'F1', diagramOf, {
    title: x.bays.some((bay) => bay.alongExact)
      ? 'Modification factor, second-order diagram'
      : 'Modification factor, first-order diagram',
  });
  if (!Cb) return one(r, UNKNOWN);
  if (secondOrder !== 'amplified' || !drawn.every((bay) => bay.exact)) return Cb;
  const second = factorAlong(
    segment,
    m,
    x,
    places,
    'F1/second',
    (bay) => bay.exact ?? bay.first(),
    { title: 'The same from the second-order diagram', symbol: 'Cb2' },
  );
  if (second) compareFactors(r, Cb, second);
  return Cb;
}

const UNKNOWN =
  'The shape of the moment diagram is not given. Cb is taken as 1, which is on the safe side.';
const SWAY =
  'Moments with and without lateral translation have diagrams of their own, whose signs combine both ways. Cb is taken as 1, which is on the safe side.';

function one(r: Recorder, text: string): Quantity {
  const code = text === SWAY ? 'diagram-with-sway' : 'diagram-unknown';
  r.notice('F1/taken', 'note', code, text, { title: 'Modification factor', clause: clause('F1') });
  return r.formula(f1Formulas.CbOne, 'F1/Cb', {});
}

type Quarters = Readonly<Record<'A' | 'B' | 'C', Quantity>>;

/** Places of the quarter points, distances from end A. */
function quarterPlaces(segment: Segment, m: SegmentContext, Lb: Quantity): Quarters {
  const za = placeQuantity(m.q.places, segment.from) ?? m.start();
  const place = ([name, formula]: (typeof QUARTERS)[number]) =>
    [name, segment.r.formula(formula, `F1/${name}/place`, { za, Lb })] as const;
  return Object.fromEntries(QUARTERS.map(place)) as Quarters;
}

function factorAlong(
  segment: Segment,
  m: SegmentContext,
  x: PlaneMoments,
  places: Quarters,
  at: string,
  of: (bay: BayMoments) => BayResult,
  named: { readonly title: string; readonly symbol?: string },
): Quantity | null {
  const { r } = segment;
  const Mmax = largestOn(segment, m, x, of, `${at}/Mmax`);
  if (!Mmax || Mmax.value === 0) return null;
  const [MA4, MB4, MC4] = QUARTERS.map(([name, , symbol, words]) => {
    const M = momentAlong(r, m, x, `${at}/${name}/M`, places[name], of);
    const title = `Size of the moment at the ${words}`;
    return r.formula(endMomentFormulas.size, `${at}/${name}/abs`, { M }, { symbol, title });
  }) as [Quantity, Quantity, Quantity];
  return modificationFactor(r, at, { Mmax, MA4, MB4, MC4 }, named);
}
