import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import {
  amplifiedMoment,
  belowCriticalLoad,
  criticalLoad,
  multiplierB1,
} from '../standards/aisc360-22/app8.ts';
import { c2Formulas, stiffnessReduction } from '../standards/aisc360-22/c2.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import {
  type EndMoments,
  endMomentFormulas,
  endMoments,
} from '../standards/elastic-theory/end-moments.ts';
import { largestMoment, type SecondOrder } from '../standards/elastic-theory/second-order.ts';
import { clause as theory } from '../standards/elastic-theory/writer.ts';
import type { ResolvedCombination, ResolvedInput } from './resolved.ts';

export type Axis = 'x' | 'y';
export const AXES: readonly Axis[] = ['x', 'y'];
const WORD = { x: 'major', y: 'minor' } as const;

/** What the axial force does to the stiffness; the same for both planes. */
export interface AxialState {
  readonly Pr: Quantity;
  readonly alpha: Quantity;
  /** null: no reduced stiffness is used; 'failed': none is left. */
  readonly taub: Quantity | null | 'failed';
}

/** Required moment of one plane and what the sheet shows beside it. */
export interface PlaneResult {
  readonly state: 'none' | 'done' | 'failed' | 'outside scope';
  /** Required strength; null unless done. */
  readonly Mr: Quantity | null;
  readonly ends: EndMoments | null;
  readonly exact: SecondOrder | null;
  /** B1 times the larger end moment, where it was computed. */
  readonly code: Quantity | null;
}

const NONE: PlaneResult = { state: 'none', Mr: null, ends: null, exact: null, code: null };

/** Whether a combination bends the member in a plane. */
export const bends = (c: ResolvedCombination, axis: Axis): boolean => {
  const { A, B, max } = c.moments[axis];
  return A.value !== 0 || B.value !== 0 || (max?.value ?? 0) !== 0;
};

export interface Plane {
  readonly axis: Axis;
  readonly L: Quantity;
  readonly E: Quantity;
  readonly I: Quantity;
  /** The plane is held between the member's ends (buckling length below the length). */
  readonly heldBetween: boolean;
  readonly sense: 'bending' | 'joint';
}

/** C2.1(d) and C2.3(b): α, and τb where the analysis is direct. Pr is above zero. */
export function axialState(
  r: Recorder,
  input: ResolvedInput,
  Pr: Quantity,
  alpha: Quantity,
  Pns: Quantity | null,
): AxialState {
  if (input.analysis.method !== 'direct' || !Pns) return { Pr, alpha, taub: null };
  r.section('C2', 'Stiffness of the direct analysis', clause('C2.3'));
  return { Pr, alpha, taub: stiffnessReduction(r, alpha, Pr, Pns) ?? 'failed' };
}

/** Required moment of one plane under one combination; `axial` is null when there is no axial force. */
export function requiredMoment(
  r: Recorder,
  input: ResolvedInput,
  c: ResolvedCombination,
  plane: Plane,
  axial: AxialState | null,
): PlaneResult {
  const { axis } = plane;
  if (!bends(c, axis)) return NONE;
  const { secondOrder, includesMemberEffect } = input.analysis;
  const at = `theory/${axis}`;
  r.section(`theory/${axis}`, `Required moment, ${WORD[axis]} axis`, clause('App. 8'));
  const given = c.moments[axis];
  const moment = (end: 'A' | 'B') =>
    r.given(`given/M${axis}${end}`, `M${axis}${end}`, 'moment', given[end], {
      title: `Moment at end ${end}, ${WORD[axis]} axis`,
    });
  const ends = endMoments(r, at, axis, { MA: moment('A'), MB: moment('B'), sense: plane.sense });
  const outside = (code: string, text: string, title: string): PlaneResult => {
    r.notice(`${at}/outside`, 'outside scope', code, text, { title, clause: clause('App. 8.1.2') });
    return { ...NONE, state: 'outside scope', ends };
  };

  if (plane.heldBetween)
    return outside(
      'held-within-bending-plane',
      `The buckling length about the ${WORD[axis]} axis is shorter than the member, which bends in that plane: it is continuous over the points that hold it. Moments there are not given, so the second-order moment is not computed. Where the buckling length is shorter because the ends are held against rotation, give the length of the member: the end moments carry that restraint.`,
      `Held within the plane of ${WORD[axis]}-axis bending`,
    );
  const largest = given.max
    ? r.formula(
        endMomentFormulas.size,
        `${at}/absMax`,
        {
          M: r.given(`given/M${axis}Max`, `M${axis}Max`, 'moment', given.max, {
            title: `Largest moment, ${WORD[axis]} axis`,
          }),
        },
        { title: 'Size of the given largest moment', symbol: `absM${axis}Max` },
      )
    : null;
  if (largest && secondOrder !== 'from-analysis')
    return outside(
      'transverse-load',
      'A largest moment is given beside the end moments, so the member carries load between its ends. Amplifying it is outside the scope of this version: give second-order moments from an analysis.',
      'Load between the ends',
    );

  if (axial && largest && !includesMemberEffect && largest.value > ends.M2.value)
    return outside(
      'transverse-load',
      'The given largest moment exceeds both end moments, so the member carries load between its ends. The analysis leaves out the effect of the axial force between the ends, and without the load it cannot be added here: give moments from an analysis that includes it.',
      'Load between the ends',
    );

  const solved = axial
    ? solve(r, plane, axial, ends, secondOrder === 'from-analysis' && includesMemberEffect)
    : null;
  if (solved === 'failed') return { ...NONE, state: 'failed', ends };
  const { exact, code } = solved ?? { exact: null, code: null };

  const required = (): Quantity => {
    if (secondOrder === 'from-analysis') {
      const candidates = [
        ends.absA,
        ends.absB,
        ...(largest ? [largest] : []),
        ...(!includesMemberEffect && exact ? [exact.Mmax] : []),
      ];
      const Mr = r.governing(`${at}/Mr`, 'max', candidates, {
        title: `Required moment, ${WORD[axis]} axis: the largest ${includesMemberEffect ? 'given' : 'of the given and the second-order one'}`,
        symbol: `Mr${axis}`,
      });
      if (includesMemberEffect && exact) besideAnalysis(r, axis, Mr, exact.Mmax);
      return Mr;
    }
    if (!exact || !code) return ends.M2;
    const [used, other] = secondOrder === 'exact' ? [exact.Mmax, code] : [code, exact.Mmax];
    compare(r, axis, code, used, other);
    return used;
  };
  return { state: 'done', Mr: required(), ends, exact, code };
}

/** EI*, Pe1, the exact solution and the code's amplified moment; 'failed' at the critical load. */
function solve(
  r: Recorder,
  { axis, L, E, I }: Plane,
  { Pr, alpha, taub }: AxialState,
  ends: EndMoments,
  complete: boolean,
): { exact: SecondOrder | null; code: Quantity | null } | 'failed' {
  if (taub === 'failed') return complete ? { exact: null, code: null } : 'failed';
  const { psi, M2, largerEnd } = ends;
  if (complete && !psi) return { exact: null, code: null };
  const named = { symbol: `EIstar${axis}` };
  const EIstar = taub
    ? r.formula(c2Formulas.reducedRigidity, `C2/${axis}/EI`, { taub, E, I }, named)
    : r.formula(c2Formulas.nominalRigidity, `C2/${axis}/EI`, { E, I }, named);
  const Pe1 = criticalLoad(r, axis, EIstar, L);
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
    return { exact: null, code: null };
  }
  if (!belowCriticalLoad(r, axis, alpha, Pr, Pe1)) return 'failed';
  if (!psi) return { exact: null, code: null };
  const exact = largestMoment(r, `theory/${axis}`, axis, {
    alpha,
    Pr,
    EIstar,
    L1: L,
    Pe1,
    M2,
    psi,
    largerEnd,
  });
  const B1 = multiplierB1(r, axis, { alpha, Pr, Pe1, psi });
  return { exact, code: amplifiedMoment(r, axis, B1, M2) };
}

/** The code's moment may be lower than the exact one by this share before the sheet cautions. */
const LOWER_BY = 0.05;
/** An exact moment above the analysis's largest by this share is cautioned. */
const ABOVE_BY = 0.02;

function compare(r: Recorder, axis: Axis, code: Quantity, used: Quantity, other: Quantity): void {
  const difference = r.comparison(
    `theory/${axis}/comparison`,
    used,
    other,
    used === code
      ? "The standard's amplified moment, used here, is {difference} the exact elastic one."
      : "The exact elastic moment, used here, is {difference} the standard's amplified one.",
    { title: `Amplified and exact moment, ${WORD[axis]} axis`, clause: theory('1.2') },
  );
  if (used === code && difference < -LOWER_BY)
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
}

function besideAnalysis(r: Recorder, axis: Axis, given: Quantity, exact: Quantity): void {
  const difference = r.comparison(
    `theory/${axis}/comparison`,
    given,
    exact,
    'The largest given moment is {difference} the exact elastic one between the given end moments.',
    { title: `Given and exact moment, ${WORD[axis]} axis`, clause: theory('1.2') },
  );
  if (1 / (1 + difference) - 1 > ABOVE_BY)
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
