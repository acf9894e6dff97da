import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// E4(d), (e), (f): lateral bracing offset from the shear centre, which does not hold twist.
const polarRadius = (letter: 'd' | 'e' | 'f', offset: 'ya' | 'xa' | 'offset') =>
  formula({
    id: `E4${letter}-ro`,
    clause: `E4(${letter})`,
    title: 'Polar radius of gyration about the lateral restraint',
    symbol: 'roa',
    dimension: 'length',
    expression: `sqrt(rx^2+ry^2+${offset}^2)`,
    operands: { rx: 'length', ry: 'length', [offset]: 'length' },
  });

const TITLE = 'Elastic torsional buckling stress about the lateral restraint';

export const e4ConstrainedFormulas = {
  minorRadius: polarRadius('d', 'ya'),
  majorRadius: polarRadius('e', 'xa'),
  closedRadius: polarRadius('f', 'offset'),
  minor: formula({
    id: 'E4d-Fe',
    clause: 'E4(d)',
    title: TITLE,
    symbol: 'Fea',
    dimension: 'stress',
    expression: '(pi^2*E*Iy*(ho^2/4+ya^2)/Lcz^2+G*J)/(Ag*roa^2)',
    operands: {
      E: 'stress',
      Iy: 'inertia',
      Lcz: 'length',
      ho: 'length',
      ya: 'length',
      G: 'stress',
      J: 'inertia',
      Ag: 'area',
      roa: 'length',
    },
  }),
  major: formula({
    id: 'E4e-Fe',
    clause: 'E4(e)',
    title: TITLE,
    symbol: 'Fea',
    dimension: 'stress',
    expression: '(pi^2*E*Iy*(ho^2/4+Ix*xa^2/Iy)/Lcz^2+G*J)/(Ag*roa^2)',
    operands: {
      E: 'stress',
      Iy: 'inertia',
      Lcz: 'length',
      ho: 'length',
      Ix: 'inertia',
      xa: 'length',
      G: 'stress',
      J: 'inertia',
      Ag: 'area',
      roa: 'length',
    },
  }),
  closed: formula({
    id: 'E4f-Fe',
    clause: 'E4(f)',
    title: TITLE,
    symbol: 'Fea',
    dimension: 'stress',
    // Twist about an enforced axis (Timoshenko and Gere, Theory of Elastic Stability, 5.5), Cw = 0.
    expression: '(pi^2*E*I*offset^2/Lcz^2+G*J)/(Ag*roa^2)',
    operands: {
      E: 'stress',
      I: 'inertia',
      offset: 'length',
      Lcz: 'length',
      G: 'stress',
      J: 'inertia',
      Ag: 'area',
      roa: 'length',
    },
  }),
};

/** A lateral restraint of buckling about `axis`, at a distance from the shear centre, free to twist. */
export interface OffsetRestraint {
  readonly axis: 'x' | 'y';
  readonly distance: Quantity;
}

export type ConstrainedTwist = Readonly<
  Record<'E' | 'G' | 'J' | 'Ix' | 'Iy' | 'rx' | 'ry' | 'Ag' | 'Lcz', Quantity>
>;

/**
 * E4(d) minor-axis and E4(e) major-axis bracing of a doubly symmetric I-shape offset along the
 * other axis; Lcz between points held against twist. The distance counts with either sign. A
 * member that such a restraint holds does not twist about its shear centre, so E4(a) is not
 * checked beside it.
 */
export function constrainedTorsionalStress(
  r: Recorder,
  restraint: OffsetRestraint,
  q: ConstrainedTwist & { readonly ho: Quantity },
): Quantity {
  const { E, G, J, Ix, Iy, rx, ry, ho, Ag, Lcz } = q;
  r.notice(
    'E4/about',
    'note',
    'twist-about-restraint',
    'The lateral restraint is offset from the shear centre and leaves the member free to twist: it twists about the restraint, not about its shear centre.',
    {
      title: 'Restraint offset from the shear centre',
      clause: clause(`E4(${restraint.axis === 'y' ? 'd' : 'e'})`),
    },
  );
  const { axis, distance } = restraint;
  if (axis === 'y') {
    const roa = r.formula(e4ConstrainedFormulas.minorRadius, 'E4/ro', { rx, ry, ya: distance });
    return r.formula(e4ConstrainedFormulas.minor, 'E4/Fe', {
      ...{ E, Iy, Lcz, ho, ya: distance, G, J, Ag, roa },
    });
  }
  const roa = r.formula(e4ConstrainedFormulas.majorRadius, 'E4/ro', { rx, ry, xa: distance });
  return r.formula(e4ConstrainedFormulas.major, 'E4/Fe', {
    ...{ E, Iy, Lcz, ho, Ix, xa: distance, G, J, Ag, roa },
  });
}

/**
 * E4(f) for closed doubly symmetric shapes: twist about the restraint, by the elastic theory of
 * torsion about an enforced axis, without warping stiffness.
 */
export function closedConstrainedStress(
  r: Recorder,
  restraint: OffsetRestraint,
  q: ConstrainedTwist,
): Quantity {
  const { E, G, J, rx, ry, Ag, Lcz } = q;
  const { axis, distance: offset } = restraint;
  const I = axis === 'x' ? q.Ix : q.Iy;
  const roa = r.formula(e4ConstrainedFormulas.closedRadius, 'E4/ro', { rx, ry, offset });
  return r.formula(e4ConstrainedFormulas.closed, 'E4/Fe', { E, I, offset, Lcz, G, J, Ag, roa });
}

/** E4(f): singly symmetric shapes with such bracing need an analysis, which is not in the book. */
export const offsetByAnalysis = (r: Recorder): void =>
  r.notice(
    'E4/outside',
    'outside scope',
    'offset-bracing-by-analysis',
    'The lateral restraint is offset from the shear centre and does not hold twist. For this shape E4(f) asks for an analysis of the elastic buckling stress; the compressive strength is not computed.',
    { title: 'Offset restraint of a singly symmetric shape', clause: clause('E4(f)') },
  );
