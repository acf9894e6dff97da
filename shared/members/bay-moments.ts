import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { amplifiedMoment, belowCriticalLoad, criticalLoad } from '../standards/aisc360-22/app8.ts';
import {
  CmEndMoments,
  CmTransverse,
  multiplierB1,
  multiplierB1Tension,
} from '../standards/aisc360-22/app8-b1.ts';
import { requiredMoment } from '../standards/aisc360-22/app8-b2.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type { BayLoad, BayResult } from '../standards/elastic-theory/bay.ts';
import { type EndMoments, endMoments } from '../standards/elastic-theory/end-moments.ts';
import { secondOrderBay } from '../standards/elastic-theory/second-order-bay.ts';
import { firstOrderBay } from '../standards/elastic-theory/statics.ts';
import { clause as theory } from '../standards/elastic-theory/writer.ts';
import type { ResolvedInput } from './resolved.ts';
import type { Bay } from './restraint-lines.ts';

export type Axis = 'x' | 'y';
export const AXES: readonly Axis[] = ['x', 'y'];
export const WORD = { x: 'major', y: 'minor' } as const;

/** What the axial force does to the stiffness; the same for both planes. */
export interface AxialState {
  /** Compression, above zero. */
  readonly Pr: Quantity;
  readonly alpha: Quantity;
  /** null: no reduced stiffness is used; 'failed': none is left. */
  readonly taub: Quantity | null | 'failed';
}

export interface BayQuestion {
  readonly axis: Axis;
  readonly bay: Bay;
  readonly input: ResolvedInput;
  readonly MA: Quantity;
  readonly MB: Quantity;
  readonly sense: 'bending' | 'joint';
  readonly loads: readonly BayLoad[];
  /** Size of the largest moment that the analysis gives for the whole member. */
  readonly largest: Quantity | null;
  readonly axial: AxialState | null;
  /** Flexural rigidity of the plane, written once; asked for only where it is needed. */
  readonly EIstar: () => Quantity;
  /** Largest moment from lateral translation and its multiplier (App. 8.1.3). */
  readonly sway: { readonly B2: Quantity; readonly Mlt: Quantity } | null;
}

/** Required moment of one bay and what the sheet shows beside it. */
export interface BayMoments {
  readonly state: 'none' | 'done' | 'failed' | 'outside scope';
  readonly r: Recorder;
  readonly bay: Bay;
  readonly ends: EndMoments;
  readonly loads: readonly BayLoad[];
  /** Required strength of every segment of the bay, but for exact moments; null unless done. */
  readonly Mr: Quantity | null;
  /** First-order moments along the bay; written when asked for. */
  readonly first: () => BayResult;
  /** Moments with the axial force, where they were computed. */
  readonly exact: BayResult | null;
  /** The standard's amplified moment, where it was computed. */
  readonly code: Quantity | null;
  /** The moments that enter Mr run along `exact`, not along `first`. */
  readonly alongExact: boolean;
  /** Moments from lateral translation are in Mr. */
  readonly swayed: boolean;
  /** The standard's moment, which is used, is cautioned to be lower than the exact one. */
  readonly codeLower: boolean;
}

/** First-order end moments and loads of a bay to its required moment. */
export function bayMoments(r: Recorder, q: BayQuestion): BayMoments {
  const { axis, bay, input, loads, axial, largest } = q;
  const at = `theory/${axis}`;
  const ends = endMoments(r, at, axis, { MA: q.MA, MB: q.MB, sense: q.sense });
  let statics: BayResult | null = null;
  const first = () => (statics ??= firstOrderBay(r, at, { axis, L1: bay.L1, ends, loads }));
  const outcome = (
    state: BayMoments['state'],
    more: Partial<Pick<BayMoments, 'Mr' | 'exact' | 'code' | 'alongExact' | 'codeLower'>> = {},
  ): BayMoments => ({
    ...{ state, r, bay, ends, loads, first, Mr: null, exact: null, code: null },
    ...{ alongExact: false, swayed: q.sway !== null, codeLower: false },
    ...more,
  });
  const bent =
    ends.psi !== null || loads.length > 0 || (largest?.value ?? 0) > 0 || q.sway !== null;
  if (!bent) return outcome('none');
  const { secondOrder, includesMemberEffect } = input.analysis;
  const given = secondOrder === 'from-analysis';
  // The size that B1 multiplies: without loads the larger end moment.
  const size = (): Quantity => (loads.length === 0 ? ends.M2 : first().largest.size.M);

  const solved = axial ? solve(r, q, axial, ends, size, given && includesMemberEffect) : null;
  if (solved === 'failed' || solved === 'outside scope') return outcome(solved);
  const { exact, code } = solved ?? { exact: null, code: null };
  if (given) {
    const Mr = fromAnalysis(r, q, ends, exact, () => first().largest.size.M);
    return outcome('done', { Mr, exact, alongExact: exact !== null });
  }
  if (q.sway && !code) {
    const B1 = multiplierB1Tension(r, `App8/${axis}`);
    return outcome('done', { Mr: withSway(r, axis, B1, size(), q.sway) });
  }
  if (!exact || !code) return outcome('done', { Mr: size(), exact, code });
  const alongExact = secondOrder === 'exact' && !q.sway;
  const used = alongExact ? exact.largest.size.M : code;
  const codeLower =
    !q.sway && compare(r, axis, code, used, alongExact ? code : exact.largest.size.M);
  return outcome('done', { Mr: used, exact, code, alongExact, codeLower });
}

type Solved = { readonly exact: BayResult | null; readonly code: Quantity | null };

/** Pe1, the exact solution and the code's amplified moment; 'failed' at the critical load. */
function solve(
  r: Recorder,
  q: BayQuestion,
  { Pr, alpha, taub }: AxialState,
  ends: EndMoments,
  size: () => Quantity,
  complete: boolean,
): Solved | 'failed' | 'outside scope' {
  const { axis, bay, loads } = q;
  const nothing: Solved = { exact: null, code: null };
  if (taub === 'failed') return complete ? nothing : 'failed';
  const known = ends.psi !== null || loads.length > 0;
  if (complete && !known) return nothing;
  const EIstar = q.EIstar();
  const Pe1 = criticalLoad(r, axis, EIstar, bay.L1);
  if (complete && alpha.value * Pr.value >= Pe1.value) {
    r.notice(
      `theory/${axis}/beyond`,
      'caution',
      'beyond-pin-ended-critical-load',
      'The axial force reaches the critical load of the member with pinned ends. The moments come from a complete second-order analysis, which may hold it by its ends; no comparison with the pin-ended solution is possible.',
      {
        title: `Critical load of pinned ends reached, ${WORD[axis]} axis`,
        clause: clause('App. 8.1.2'),
      },
    );
    return nothing;
  }
  if (!belowCriticalLoad(r, axis, alpha, Pr, Pe1)) return 'failed';
  if (!known && !q.sway) return nothing;
  const exact = known
    ? secondOrderBay(
        r,
        `theory/${axis}`,
        { axis, L1: bay.L1, ends, loads },
        { alpha, Pr, EIstar, Pe1 },
      )
    : null;
  if (exact === 'failed' || exact === 'outside scope') return exact;
  const app8 = `App8/${axis}`;
  const Cm =
    loads.length > 0 || !ends.psi
      ? CmTransverse(r, app8, null, alpha)
      : CmEndMoments(r, app8, ends.psi);
  const B1 = multiplierB1(r, app8, { alpha, Pr, Pe1, Cm });
  const code = q.sway
    ? withSway(r, axis, B1, size(), q.sway)
    : amplifiedMoment(r, axis, B1, size());
  return { exact, code };
}

const withSway = (
  r: Recorder,
  axis: Axis,
  B1: Quantity,
  Mnt: Quantity,
  { B2, Mlt }: { readonly B2: Quantity; readonly Mlt: Quantity },
): Quantity => requiredMoment(r, axis, B1, Mnt, B2, Mlt);

/**
 * Moments from an analysis. With P-δ in it the largest given one; where loads are given and no
 * largest moment, the exact one between the given ends stands in. Without P-δ the larger of both.
 */
function fromAnalysis(
  r: Recorder,
  { axis, input, loads, largest, axial }: BayQuestion,
  ends: EndMoments,
  exact: BayResult | null,
  firstSize: () => Quantity,
): Quantity {
  const { includesMemberEffect } = input.analysis;
  const spanUnknown = loads.length > 0 && !largest;
  const span = exact?.largest.size.M ?? (spanUnknown && !axial ? firstSize() : null);
  const candidates = [
    ends.absA,
    ends.absB,
    ...(largest ? [largest] : []),
    ...(span && (!includesMemberEffect || spanUnknown) && !(loads.length === 0 && !exact)
      ? [span]
      : []),
  ];
  const Mr = r.governing(`theory/${axis}/Mr`, 'max', candidates, {
    title: `Required moment, ${WORD[axis]} axis: the largest ${includesMemberEffect ? 'given' : 'of the given and the second-order one'}`,
    symbol: `Mr${axis}`,
  });
  if (includesMemberEffect && exact && !spanUnknown)
    besideAnalysis(r, axis, Mr, exact.largest.size.M);
  return Mr;
}

/** The code's moment may be lower than the exact one by this share before the sheet cautions. */
const LOWER_BY = 0.05;
/** An exact moment above the analysis's largest by this share is cautioned. */
const ABOVE_BY = 0.02;

/** Both moments side by side; true where the code's, used here, is cautioned to be lower. */
function compare(
  r: Recorder,
  axis: Axis,
  code: Quantity,
  used: Quantity,
  other: Quantity,
): boolean {
  const difference = r.comparison(
    `theory/${axis}/comparison`,
    used,
    other,
    used === code
      ? "The standard's amplified moment, used here, is {difference} the exact elastic one."
      : "The exact elastic moment, used here, is {difference} the standard's amplified one.",
    { title: `Amplified and exact moment, ${WORD[axis]} axis`, clause: theory('1.2') },
  );
  const lower = used === code && difference !== null && difference < -LOWER_BY;
  if (lower)
    r.notice(
      `theory/${axis}/lower`,
      'caution',
      'code-moment-lower',
      "The standard's amplified moment is more than 5 % below the exact elastic one. Where the interaction is checked, its utilisation with the exact moment stands beside it.",
      {
        title: `Amplified moment below the exact one, ${WORD[axis]} axis`,
        clause: clause('App. 8.1.2', 'A-8-3'),
      },
    );
  return lower;
}

function besideAnalysis(r: Recorder, axis: Axis, given: Quantity, exact: Quantity): void {
  const difference = r.comparison(
    `theory/${axis}/comparison`,
    given,
    exact,
    'The largest given moment is {difference} the exact elastic one between the given end moments.',
    { title: `Given and exact moment, ${WORD[axis]} axis`, clause: theory('1.2') },
  );
  if (difference !== null && 1 / (1 + difference) - 1 > ABOVE_BY)
    r.notice(
      `theory/${axis}/above`,
      'caution',
      'analysis-moment-lower',
      'Between the given end moments the exact elastic solution is more than 2 % above the largest given moment: see whether the analysis divided the member finely enough.',
      {
        title: `Exact moment above the given one, ${WORD[axis]} axis`,
        clause: clause('C2.1'),
      },
    );
}
