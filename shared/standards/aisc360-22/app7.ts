import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// Appendix 7.2, effective length method, and 7.3, first-order analysis method.
export const app7Formulas = {
  share: formula({
    id: 'App.7.3-share',
    clause: 'App. 7.3',
    title: 'Axial force over the cross-section strength',
    symbol: 'Pu',
    dimension: 'none',
    expression: 'alpha*Pr/Pns',
    operands: { alpha: 'none', Pr: 'force', Pns: 'force' },
    prints: 'display',
  }),
  beamLoad: formula({
    id: 'App.7.3-Pe',
    clause: 'App. 7.3',
    title: 'Elastic critical load of the beam',
    symbol: 'Pe',
    dimension: 'force',
    expression: 'pi^2*E*I/L^2',
    operands: { E: 'stress', I: 'inertia', L: 'length' },
  }),
  beamShare: formula({
    id: 'A-7-1-share',
    clause: 'App. 7.3',
    equation: 'A-7-1',
    title: 'Axial force over the elastic critical load of the beam',
    symbol: 'beamShare',
    dimension: 'none',
    expression: 'alpha*Pr/Pe',
    operands: { alpha: 'none', Pr: 'force', Pe: 'force' },
    prints: 'display',
  }),
  lateralLoad: formula({
    id: 'A-7-3',
    clause: 'App. 7.3',
    equation: 'A-7-3',
    title: 'Additional lateral load before its lower limit',
    symbol: 'Nitrial',
    dimension: 'force',
    expression: '2.1*alpha*(Delta/Lstory)*Yi',
    operands: { alpha: 'none', Delta: 'deflection', Lstory: 'length', Yi: 'force' },
  }),
  lateralLoadLeast: formula({
    id: 'A-7-3-least',
    clause: 'App. 7.3',
    equation: 'A-7-3',
    title: 'Least additional lateral load',
    symbol: 'Nileast',
    dimension: 'force',
    expression: '0.0042*Yi',
    operands: { Yi: 'force' },
    prints: 'display',
  }),
  unitK: formula({
    id: 'App.7.2-K',
    clause: 'App. 7.2',
    title: 'Effective length factor, small second-order drift',
    symbol: 'K',
    dimension: 'none',
    expression: '1',
    operands: {},
  }),
};

/**
 * 7.3.1: αPr ≤ 0.5 Pns for members whose flexural stiffness contributes to lateral stability.
 * Whether this one does is not an input, so a force above it is a caution.
 */
export function firstOrderAxialLimit(
  r: Recorder,
  alpha: Quantity,
  Pr: Quantity,
  Pns: Quantity,
): void {
  const title = 'Axial force in the first-order analysis method';
  const share = r.formula(app7Formulas.share, 'App7/share', { alpha, Pr, Pns });
  const within = r.choice(
    'App7/limit',
    [{ left: share, relation: '<=', right: 0.5, outcome: 'the method may be used' }],
    'the method may be used only where this member does not contribute to lateral stability',
    { title, clause: clause('App. 7.3') },
  );
  if (within !== 0)
    r.notice(
      'App7/above',
      'caution',
      'first-order-axial-limit',
      'The axial force exceeds half the cross-section strength. The first-order analysis method does not allow that in a member whose flexural stiffness contributes to the lateral stability of the structure: use the direct analysis method, or see that this member does not contribute.',
      { title, clause: clause('App. 7.3') },
    );
}

/**
 * 7.3.1, A-7-1: αPr ≤ 0.08 Pe, Pe = π²EI/L² with the nominal stiffness, for a nominally horizontal
 * member of a moment frame that bends in the frame's plane. Called for members that are said to be
 * one. False, with an outside-scope notice, where the method may not be used. Pr in compression.
 */
export function firstOrderBeamLimit(
  r: Recorder,
  alpha: Quantity,
  Pr: Quantity,
  beam: { readonly E: Quantity; readonly I: Quantity; readonly L: Quantity },
): boolean {
  const title = 'Axial force in a beam of a moment frame, first-order analysis method';
  const Pe = r.formula(app7Formulas.beamLoad, 'App7/beam/Pe', { ...beam });
  const share = r.formula(app7Formulas.beamShare, 'App7/beam/share', { alpha, Pr, Pe });
  const place = clause('App. 7.3', 'A-7-1');
  const within = r.choice(
    'App7/beam/limit',
    [{ left: share, relation: '<=', right: 0.08, outcome: 'the method may be used' }],
    'the method may not be used',
    { title, clause: place },
  );
  if (within !== 0)
    r.notice(
      'App7/beam/above',
      'outside scope',
      'first-order-beam-limit',
      'The axial force in a beam of a moment frame exceeds 0.08 of its elastic critical load. The first-order analysis method may not be used: use the direct analysis method.',
      { title, clause: place },
    );
  return within === 0;
}

/**
 * A-7-3: N_i = 2.1 α (Δ/L) Yi, not less than 0.0042 Yi, to be applied at every level in all
 * combinations. Yi is the gravity load of the level at the level of the design method; Δ/L the
 * largest ratio of first-order drift to height over the stories, of that same combination, as a size.
 */
export function firstOrderLateralLoad(
  r: Recorder,
  q: {
    readonly alpha: Quantity;
    readonly Delta: Quantity;
    readonly L: Quantity;
    readonly Yi: Quantity;
  },
  at = 'App7/lateral',
): Quantity {
  const { alpha, Delta, L, Yi } = q;
  const operands = { alpha, Delta, Lstory: L, Yi };
  const trial = r.formula(app7Formulas.lateralLoad, `${at}/trial`, operands);
  const least = r.formula(app7Formulas.lateralLoadLeast, `${at}/least`, { Yi });
  return r.governing(`${at}/Ni`, 'max', [trial, least], {
    title: 'Additional lateral load at the level',
    clause: clause('App. 7.3', 'A-7-3'),
    symbol: 'Ni',
  });
}

/**
 * 7.2.3: K = 1 for all columns where the second-order drift is at most 1.1 times the first-order
 * one, with nominal stiffness (`ratio`, or B2 in its place). null where K follows from a sidesway
 * buckling analysis.
 */
export function unitKForSmallDrift(r: Recorder, at: string, ratio: Quantity): Quantity | null {
  const taken = r.choice(
    `${at}/small-drift`,
    [{ left: ratio, relation: '<=', right: 1.1, outcome: 'the factor is 1' }],
    'the factor follows from an analysis of sidesway buckling',
    { title: 'Effective length factor, small second-order drift', clause: clause('App. 7.2') },
  );
  return taken === 0 ? r.formula(app7Formulas.unitK, `${at}/K`, {}) : null;
}
