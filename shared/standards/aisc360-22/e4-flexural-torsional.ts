import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { formula } from './writer.ts';

// E4(b) singly symmetric and E4(c) unsymmetric members twisting about the shear centre.
export const e4FlexuralTorsionalFormulas = {
  polarRadius: formula({
    id: 'E4-9',
    clause: 'E4',
    equation: 'E4-9',
    title: 'Polar radius of gyration about the shear centre',
    symbol: 'ro',
    dimension: 'length',
    // xo is zero: the shear centre lies on the axis of symmetry.
    expression: 'sqrt(yo^2+(Ix+Iy)/Ag)',
    operands: { yo: 'length', Ix: 'inertia', Iy: 'inertia', Ag: 'area' },
  }),
  flexuralConstant: formula({
    id: 'E4-8',
    clause: 'E4',
    equation: 'E4-8',
    title: 'Flexural constant',
    symbol: 'H',
    dimension: 'none',
    expression: '1-yo^2/ro^2',
    operands: { yo: 'length', ro: 'length' },
  }),
  torsional: formula({
    id: 'E4-7',
    clause: 'E4',
    equation: 'E4-7',
    title: 'Elastic torsional buckling stress',
    symbol: 'Fez',
    dimension: 'stress',
    expression: '(pi^2*E*Cw/Lcz^2+G*J)/(Ag*ro^2)',
    operands: {
      E: 'stress',
      Cw: 'warping',
      Lcz: 'length',
      G: 'stress',
      J: 'inertia',
      Ag: 'area',
      ro: 'length',
    },
  }),
  singlySymmetric: formula({
    id: 'E4-3',
    clause: 'E4',
    equation: 'E4-3',
    title: 'Elastic flexural-torsional buckling stress',
    symbol: 'Feft',
    dimension: 'stress',
    // E4-3 without its difference: multiplied above and below by its bracket with a plus sign.
    expression: '2*Fey*Fez/(Fey+Fez+sqrt((Fey-Fez)^2+4*(1-H)*Fey*Fez))',
    operands: { Fey: 'stress', Fez: 'stress', H: 'none' },
    validity: 'for shapes with one axis of symmetry',
  }),
  unsymmetric: formula({
    id: 'E4-4',
    clause: 'E4',
    equation: 'E4-4',
    title: 'Elastic flexural-torsional buckling stress, unsymmetric',
    symbol: 'cubic',
    dimension: 'none',
    // E4-4 over Fex Fey Fez.
    expression:
      '(Fe/Fex-1)*(Fe/Fey-1)*(Fe/Fez-1)-(Fe/Fez)*((Fe/Fex)*(Fe/Fey-1)*(xo/ro)^2+(Fe/Fey)*(Fe/Fex-1)*(yo/ro)^2)',
    operands: {
      Fe: 'stress',
      Fex: 'stress',
      Fey: 'stress',
      Fez: 'stress',
      xo: 'length',
      yo: 'length',
      ro: 'length',
    },
    validity: 'for shapes without an axis of symmetry',
  }),
};

/** E4-9 and E4-8 of a shape symmetric about y; yo from the centroid, either sign. */
export function shearCentreConstants(
  r: Recorder,
  q: Readonly<Record<'yo' | 'Ix' | 'Iy' | 'Ag', Quantity>>,
): { readonly ro: Quantity; readonly H: Quantity } {
  const { yo, Ix, Iy, Ag } = q;
  const ro = r.formula(e4FlexuralTorsionalFormulas.polarRadius, 'E4/ro', { yo, Ix, Iy, Ag });
  return {
    ro,
    H: r.formula(e4FlexuralTorsionalFormulas.flexuralConstant, 'E4/H', { yo, ro }),
  };
}

export type Twist = Readonly<Record<'E' | 'G' | 'Cw' | 'J' | 'Lcz' | 'Ag' | 'ro', Quantity>>;

/** Fez, E4-7. */
export const elasticTwistStress = (r: Recorder, q: Twist): Quantity => {
  const { E, Cw, Lcz, G, J, Ag, ro } = q;
  return r.formula(e4FlexuralTorsionalFormulas.torsional, 'E4/z/Fe', {
    E,
    Cw,
    Lcz,
    G,
    J,
    Ag,
    ro,
  });
};

/**
 * E4-3 of a singly symmetric shape, whatever its lengths. `flexural` is the flexural stress about
 * the axis of symmetry: Fey of a mono-symmetric I-shape, Fex of a channel.
 */
export const singlySymmetricStress = (
  r: Recorder,
  flexural: Quantity,
  Fez: Quantity,
  H: Quantity,
): Quantity =>
  r.formula(e4FlexuralTorsionalFormulas.singlySymmetric, 'E4/Fe', { Fey: flexural, Fez, H });

/**
 * E4-4: the lowest root for a shape without an axis of symmetry; xo and yo are the shear centre from
 * the centroid. The equation is −1 at zero and not negative at the least of the three stresses, and
 * its other two roots lie above the lesser of Fex and Fey, so there is one root between.
 */
export const unsymmetricStress = (
  r: Recorder,
  q: Readonly<Record<'Fex' | 'Fey' | 'Fez' | 'xo' | 'yo' | 'ro', Quantity>>,
): Quantity => {
  const { Fex, Fey, Fez, xo, yo, ro } = q;
  const least = Math.min(Fex.value, Fey.value, Fez.value);
  return r.root(
    e4FlexuralTorsionalFormulas.unsymmetric,
    'E4/Fe',
    { symbol: 'Fe', dimension: 'stress', bracket: [0, least] },
    { Fex, Fey, Fez, xo, yo, ro },
  );
};
