import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// H1.2 flexure and tension: the required tension, and what tension adds to Cb. Its interaction is
// that of H1.1 (h1.ts).
export const h1TensionFormulas = {
  required: formula({
    id: 'H1.2-Pr',
    clause: 'H1.2',
    title: 'Required tensile strength',
    symbol: 'Prt',
    dimension: 'force',
    expression: '-P',
    operands: { P: 'force' },
    prints: 'display',
  }),
  Pey: formula({
    id: 'H1-2',
    clause: 'H1.2',
    equation: 'H1-2',
    title: 'Elastic critical load about the minor axis over the unbraced length',
    symbol: 'Pey',
    dimension: 'force',
    expression: 'pi^2*E*Iy/Lb^2',
    operands: { E: 'stress', Iy: 'inertia', Lb: 'length' },
    validity: 'for doubly symmetric members in tension',
  }),
  Cb: formula({
    id: 'H1.2-Cb',
    clause: 'H1.2',
    title: 'Lateral-torsional buckling modification factor with tension',
    symbol: 'Cbt',
    dimension: 'none',
    expression: 'Cb*sqrt(1+alpha*Pr/Pey)',
    operands: { Cb: 'none', alpha: 'none', Pr: 'force', Pey: 'force' },
    prints: 'display',
    validity: 'for doubly symmetric members in tension',
  }),
};

/** The tension of a combination whose axial force P is negative, as a positive force. */
export const requiredTension = (r: Recorder, P: Quantity): Quantity =>
  r.formula(h1TensionFormulas.required, 'H1.2/Pr', { P });

export interface TensionOnCb {
  readonly Cb: Quantity;
  /** 1.0 for LRFD, 1.6 for ASD. */
  readonly alpha: Quantity;
  /** Tension that acts with the flexure, positive. */
  readonly Pr: Quantity;
  readonly E: Quantity;
  readonly Iy: Quantity;
  /** Unbraced length of the segment that Cb belongs to, more than zero. */
  readonly Lb: Quantity;
  readonly symmetry: 'a doubly symmetric section' | 'a singly symmetric section';
}

/**
 * H1.2: Cb times √(1 + αPr/Pey), for doubly symmetric sections; Cb unchanged for others. The clause
 * permits it and does not ask for it; F2 still limits Mn to Mp.
 */
export function increasedCb(r: Recorder, q: TensionOnCb): Quantity {
  const { Cb, alpha, Pr, E, Iy, Lb, symmetry } = q;
  const taken = r.choice(
    'H1.2/permitted',
    [
      {
        left: symmetry,
        relation: 'is',
        right: 'a doubly symmetric section',
        outcome: 'tension may raise the modification factor',
      },
    ],
    'the modification factor stays',
    { title: 'Tension and lateral-torsional buckling', clause: clause('H1.2') },
  );
  if (taken < 0) return Cb;
  const Pey = r.formula(h1TensionFormulas.Pey, 'H1.2/Pey', { E, Iy, Lb });
  return r.formula(h1TensionFormulas.Cb, 'H1.2/Cb', { Cb, alpha, Pr, Pey });
}
