import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// E4(a) torsional buckling of doubly symmetric shapes.
export const e4Formulas = {
  elasticStress: formula({
    id: 'E4-2',
    clause: 'E4',
    equation: 'E4-2',
    title: 'Elastic torsional buckling stress',
    symbol: 'Fet',
    dimension: 'stress',
    expression: '(pi^2*E*Cw/Lcz^2+G*J)/(Ix+Iy)',
    operands: {
      E: 'stress',
      Cw: 'warping',
      Lcz: 'length',
      G: 'stress',
      J: 'inertia',
      Ix: 'inertia',
      Iy: 'inertia',
    },
    validity: 'for doubly symmetric shapes',
  }),
  strength: formula({
    id: 'E4-1',
    clause: 'E4',
    equation: 'E4-1',
    title: 'Nominal compressive strength, torsional buckling',
    symbol: 'Pn',
    dimension: 'force',
    expression: 'Fn*Ag',
    operands: { Fn: 'stress', Ag: 'area' },
  }),
};

export interface TorsionalBuckling {
  readonly E: Quantity;
  readonly G: Quantity;
  readonly Cw: Quantity;
  readonly J: Quantity;
  readonly Ix: Quantity;
  readonly Iy: Quantity;
  readonly Lcy: Quantity;
  readonly Lcz: Quantity;
}

/** E4-2: a doubly symmetric shape that twists about its shear centre. */
export function doublySymmetricStress(r: Recorder, q: Omit<TorsionalBuckling, 'Lcy'>): Quantity {
  const { E, Cw, Lcz, G, J, Ix, Iy } = q;
  return r.formula(e4Formulas.elasticStress, 'E4/Fe', { E, Cw, Lcz, G, J, Ix, Iy });
}

/**
 * E4-2 of a rolled doubly symmetric shape, which E4 covers when Lcz exceeds Lcy; null where it
 * doesn't. Built-up shapes are covered always.
 */
export function elasticTorsionalStress(r: Recorder, q: TorsionalBuckling): Quantity | null {
  const taken = r.choice(
    'E4/applies',
    [{ left: q.Lcz, relation: '>', right: q.Lcy, outcome: 'torsional buckling is checked' }],
    'torsional buckling need not be checked',
    {
      title: 'Torsional buckling of a doubly symmetric shape',
      clause: clause('E4'),
      because: 'E4 applies where the torsional buckling length exceeds the lateral one.',
    },
  );
  return taken < 0 ? null : doublySymmetricStress(r, q);
}

/** E1: closed shapes do not buckle in torsion before they buckle in flexure; a note says so. */
export const closedShapeNote = (r: Recorder): void =>
  r.notice(
    'E4/closed',
    'note',
    'closed-shape',
    'A closed shape is stiff in torsion: flexural buckling governs whatever the torsional length (User Note of E1), so E4 is not evaluated.',
    { title: 'Torsional buckling of a closed shape', clause: clause('E1') },
  );
