import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { Bay, BayAxial, BayResult, SecondOrderBay } from './bay.ts';
import { type Known, largestBetween, momentsAt } from './bay-result.ts';
import { deflectionOf } from './deflection.ts';
import { atTheEnds, momentsOf } from './loaded-bay.ts';
import { largestMoment, secondOrderFormulas } from './second-order.ts';
import {
  type AxialOrder,
  type SolvedStretch,
  solveStretches,
  startShear,
} from './solve-stretches.ts';
import { clause, formula } from './writer.ts';

export const bayFormulas = {
  kLtension: formula({
    id: 'kL-tension',
    clause: '1',
    title: 'Axial parameter, tension',
    symbol: 'kL',
    dimension: 'angle',
    expression: 'sqrt(alpha*abs(Pr)/EIstar)*L1',
    operands: { alpha: 'none', Pr: 'force', EIstar: 'rigidity', L1: 'length' },
  }),
  between: formula({
    id: 'M-between-ends',
    clause: '1',
    title: 'Second-order moment at the place',
    symbol: 'Mz',
    dimension: 'moment',
    expression: 'MA*sin(kL*(L1-zi)/L1)/sin(kL)+MB*sin(kL*zi/L1)/sin(kL)',
    operands: { MA: 'moment', MB: 'moment', kL: 'angle', L1: 'length', zi: 'length' },
    prints: 'display',
  }),
  signed: formula({
    id: 'Mmax-signed',
    clause: '1.1',
    title: 'Largest second-order moment with its sign',
    symbol: 'Mz',
    dimension: 'moment',
    expression: 'Mmax*M2/M2abs',
    operands: { Mmax: 'moment', M2: 'moment', M2abs: 'moment' },
    prints: 'display',
  }),
};

/**
 * kL up to which the lines from end to end keep their digits in tension: moment and shear at the
 * start hold a part that grows along the bay and one that decays, e²⁰ apart at its end.
 */
const MOST_KL_IN_TENSION = 10;

/** Moments of a bay with axial force, exact in elastic theory. */
export const secondOrderBay: SecondOrderBay = (r, at, bay, axial) => {
  const { Pr, alpha, Pe1 } = axial;
  if (Pr.value === 0) throw new Error('without axial force a bay is of first order');
  if (Pr.value > 0 && alpha.value * Pr.value >= Pe1.value) return 'failed';
  if (Pr.value > 0 && bay.loads.length === 0) return endMomentsOnly(r, at, bay, axial);
  const solution = axialParameter(r, at, bay, axial);
  if (!solution) return 'outside scope';
  const VA = startShear(r, at, bay, solution);
  return solvedBay(r, at, bay, axial, solution, VA);
};

/** kL of the bay's axial force; null, with the notice, where the tension is beyond the solution. */
export function axialParameter(
  r: Recorder,
  at: string,
  { L1 }: Bay,
  { alpha, Pr, EIstar }: BayAxial,
): AxialOrder | null {
  const known = { alpha, Pr, EIstar, L1 };
  if (Pr.value > 0)
    return { order: 'compression', kL: r.formula(secondOrderFormulas.kL, `${at}/kL`, known) };
  const kL = r.formula(bayFormulas.kLtension, `${at}/kL`, known);
  return isWithin(r, at, kL) ? { order: 'tension', kL } : null;
}

/** The bay from its shear at end A on. */
export function solvedBay(
  r: Recorder,
  at: string,
  bay: Bay,
  axial: BayAxial,
  solution: AxialOrder,
  VA: Quantity,
): BayResult {
  // Between the ends of a stretch the shear may pass zero once only if kl is below π.
  const middle = solution.order === 'compression' && solution.kL.value >= Math.PI;
  const solved = solveStretches(r, at, bay, solution, { VA, middle });
  return {
    order: 'second',
    ...momentsOf(r, at, bay, solution, solved),
    shear: { A: VA, B: (solved.at(-1) as SolvedStretch).Vj },
    largestShear: null,
    deflection: deflectionOf(at, bay, axial, solution, solved),
    endMomentsOnly: null,
  };
}

function isWithin(r: Recorder, at: string, kL: Quantity): boolean {
  const titled = { title: 'Size of the tension', clause: clause('2') };
  const beyond =
    r.choice(
      `${at}/tension`,
      [
        {
          left: kL,
          relation: '>',
          right: MOST_KL_IN_TENSION,
          outcome: 'the member is a tie more than a beam',
        },
      ],
      'the second-order moments are computed',
      titled,
    ) === 0;
  if (beyond)
    r.notice(
      `${at}/tie`,
      'outside scope',
      'tension-beyond-beam',
      `The tension is more than ten times the critical load of the bay (kL above ${MOST_KL_IN_TENSION}): it carries its load as a tie does, and the elastic solution of the beam loses its digits. The first-order moments stand.`,
      titled,
    );
  return !beyond;
}

/** End moments alone under compression. */
function endMomentsOnly(r: Recorder, at: string, bay: Bay, axial: BayAxial): BayResult {
  const { ends, L1, axis } = bay;
  const { alpha, Pr, EIstar, Pe1 } = axial;
  const { MA, MB, M2, psi, largerEnd } = ends;
  const none = { order: 'second', shear: null, largestShear: null } as const;
  if (!psi)
    return {
      ...none,
      moment: () => MA,
      largestWithin: () => M2,
      largest: atTheEnds(bay),
      deflection: null,
      endMomentsOnly: null,
    };
  const found = largestMoment(r, at, axis, { alpha, Pr, EIstar, L1, Pe1, M2, psi, largerEnd });
  const { kL, Mmax, zmax } = found;
  const crest: Known[] = zmax
    ? [
        {
          place: zmax,
          M: r.formula(bayFormulas.signed, `${at}/Mmax/signed`, {
            Mmax,
            M2: largerEnd === 'A' ? MA : MB,
            M2abs: M2,
          }),
        },
      ]
    : [];
  const moment = momentsAt(bay, crest, (reader, key, zi) =>
    reader.formula(bayFormulas.between, key, { MA, MB, kL, L1, zi }),
  );
  return {
    ...none,
    moment,
    largestWithin: largestBetween(bay, moment, [], crest, Mmax),
    largest: largestOf(bay, crest, Mmax),
    deflection: (reader, key, z) => {
      const solution = { order: 'compression', kL } as const;
      const VA = startShear(reader, key, bay, solution);
      const solved = solveStretches(reader, key, bay, solution, { VA, middle: false });
      return deflectionOf(key, bay, axial, solution, solved)(reader, key, z);
    },
    endMomentsOnly: found,
  };
}

function largestOf(bay: Bay, [crest]: readonly Known[], Mmax: Quantity): BayResult['largest'] {
  const ends = atTheEnds(bay);
  if (!crest) return { ...ends, size: { ...ends.size, M: Mmax } };
  const inside = { M: crest.M, end: null, place: crest.place };
  return {
    size: { ...inside, M: Mmax },
    highest: crest.M.value > 0 ? inside : ends.highest,
    lowest: crest.M.value < 0 ? inside : ends.lowest,
  };
}
