import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { f1Formulas, firstOrderQuarters, modificationFactor } from '../standards/aisc360-22/f1.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { secondOrderQuarters } from '../standards/elastic-theory/second-order.ts';
import type { BayMoments } from './bay-moments.ts';
import type { ResolvedInput } from './resolved.ts';

/** The second-order factor may be lower by this share before the sheet cautions. */
const LOWER_BY = 0.05;

const one = (r: Recorder, code: string, text: string): Quantity => {
  r.notice('F1/taken', 'note', code, text, { title: 'Modification factor', clause: clause('F1') });
  return r.formula(f1Formulas.CbOne, 'F1/Cb', {});
};

/**
 * Cb "auto": from the diagram whose maximum enters Mr, over the unbraced segment, which has to be
 * the member. Exact moments: the second-order diagram; amplified: the first-order one, with the
 * second-order value beside it. Where the diagram is not known Cb = 1, which F1 allows.
 */
export function automaticCb(
  r: Recorder,
  input: ResolvedInput,
  plane: { readonly bay: BayMoments; readonly givenMax: boolean },
  q: { L: Quantity; Lb: Quantity; compressed: boolean },
): Quantity {
  r.section('F1', 'Lateral-torsional buckling modification factor', clause('F1'));
  if (q.Lb.value !== q.L.value)
    return one(
      r,
      'segment-not-member',
      'The unbraced length is not the length of the member and the places of the braces are not given: the moments of the segment are not known. Cb is taken as 1, which is on the safe side.',
    );
  const { ends, exact: along } = plane.bay;
  const exact = along?.endMomentsOnly ?? null;
  if (!ends.psi || plane.givenMax)
    return one(
      r,
      'diagram-unknown',
      'The shape of the moment diagram is not given. Cb is taken as 1, which is on the safe side.',
    );
  // A compressed member without the exact solution: at or beyond the critical load of pinned ends.
  if (q.compressed && !exact)
    return one(
      r,
      'diagram-beyond-critical-load',
      'The axial force reaches the critical load of the member with pinned ends: the moment diagram between the given end moments is not known. Cb is taken as 1, which is on the safe side.',
    );
  const { MA, MB } = ends;
  const { secondOrder } = input.analysis;
  if (exact && secondOrder !== 'amplified')
    return modificationFactor(
      r,
      'F1',
      { Mmax: exact.Mmax, ...secondOrderQuarters(r, 'F1', MA, MB, exact.kL) },
      { title: 'Modification factor, second-order diagram' },
    );
  const Cb = modificationFactor(
    r,
    'F1',
    { Mmax: ends.M2, ...firstOrderQuarters(r, 'F1', MA, MB) },
    { title: 'Modification factor, first-order diagram' },
  );
  if (!exact) return Cb;
  const second = modificationFactor(
    r,
    'F1/second',
    { Mmax: exact.Mmax, ...secondOrderQuarters(r, 'F1/second', MA, MB, exact.kL) },
    { title: 'The same from the second-order diagram', symbol: 'Cb2' },
  );
  compareFactors(r, Cb, second);
  return Cb;
}

/** Says by how much the factor used differs from the second-order one; a caution if that is lower. */
export function compareFactors(r: Recorder, Cb: Quantity, second: Quantity): void {
  const difference = r.comparison(
    'F1/comparison',
    Cb,
    second,
    'The modification factor used, from the first-order diagram, is {difference} the one from the second-order diagram.',
    {
      title: 'Modification factor, first and second order',
      clause: clause('F1', 'F1-1'),
    },
  );
  if (difference !== null && 1 / (1 + difference) - 1 < -LOWER_BY)
    r.notice(
      'F1/lower',
      'caution',
      'second-order-cb-lower',
      'From the second-order diagram the modification factor is more than 5 % lower than the one used.',
      {
        title: 'Lower modification factor in second order',
        clause: clause('F1', 'F1-1'),
      },
    );
}
