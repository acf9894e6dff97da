import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// C2.3 stiffness of the direct analysis method; App. 7 and App. 8 use the nominal one otherwise.
export const c2Formulas = {
  crossSection: formula({
    id: 'C2.3-Pns',
    clause: 'C2.3',
    title: 'Cross-section compressive strength',
    symbol: 'Pns',
    dimension: 'force',
    expression: 'Fy*Ag',
    operands: { Fy: 'stress', Ag: 'area' },
  }),
  crossSectionSlender: formula({
    id: 'C2.3-Pns-slender',
    clause: 'C2.3',
    title: 'Cross-section compressive strength, slender elements',
    symbol: 'Pns',
    dimension: 'force',
    expression: 'Fy*Ae',
    operands: { Fy: 'stress', Ae: 'area' },
  }),
  share: formula({
    id: 'C2.3-share',
    clause: 'C2.3',
    title: 'Axial force over the cross-section strength',
    symbol: 'Pu',
    dimension: 'none',
    expression: 'alpha*Pr/Pns',
    operands: { alpha: 'none', Pr: 'force', Pns: 'force' },
    prints: 'display',
  }),
  taubFull: formula({
    id: 'C2-2a',
    clause: 'C2.3',
    equation: 'C2-2a',
    title: 'Stiffness reduction factor',
    symbol: 'taub',
    dimension: 'none',
    expression: '1',
    operands: {},
  }),
  taubReduced: formula({
    id: 'C2-2b',
    clause: 'C2.3',
    equation: 'C2-2b',
    title: 'Stiffness reduction factor',
    symbol: 'taub',
    dimension: 'none',
    expression: '4*Pu*(1-Pu)',
    operands: { Pu: 'none' },
  }),
  reducedRigidity: formula({
    id: 'C2.3-EI',
    clause: 'C2.3',
    title: 'Flexural rigidity, reduced',
    symbol: 'EIstar',
    dimension: 'rigidity',
    expression: '0.8*taub*E*I',
    operands: { taub: 'none', E: 'stress', I: 'inertia' },
  }),
  nominalRigidity: formula({
    id: 'App.8-EI',
    clause: 'App. 8.1.2',
    title: 'Flexural rigidity, nominal',
    symbol: 'EIstar',
    dimension: 'rigidity',
    expression: 'E*I',
    operands: { E: 'stress', I: 'inertia' },
  }),
};

/** τb of C2.3(b); not computable at αPr ≥ Pns, where the notice says so. */
export function stiffnessReduction(
  r: Recorder,
  alpha: Quantity,
  Pr: Quantity,
  Pns: Quantity,
): Quantity | null {
  const share = r.formula(c2Formulas.share, 'C2/share', { alpha, Pr, Pns });
  if (share.value >= 1) {
    r.notice(
      'C2/squash',
      'failed',
      'cross-section-strength-reached',
      'The axial force reaches the cross-section strength; no stiffness is left for a second-order moment.',
      { title: 'Cross-section strength reached', clause: clause('C2.3') },
    );
    return null;
  }
  const taken = r.choice(
    'C2/branch',
    [{ left: share, relation: '<=', right: 0.5, outcome: 'C2-2a applies' }],
    'C2-2b applies',
    { title: 'Stiffness reduction', clause: clause('C2.3') },
  );
  return taken === 0
    ? r.formula(c2Formulas.taubFull, 'C2/taub', {})
    : r.formula(c2Formulas.taubReduced, 'C2/taub', { Pu: share });
}
