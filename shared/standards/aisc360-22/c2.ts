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
    validity: 'where no element is slender in compression',
  }),
  crossSectionSlender: formula({
    id: 'C2.3-Pns-slender',
    clause: 'C2.3',
    title: 'Cross-section compressive strength, slender elements',
    symbol: 'Pns',
    dimension: 'force',
    expression: 'Fy*Ae',
    operands: { Fy: 'stress', Ae: 'area' },
    validity: 'where an element is slender in compression, with Ae of E7 at Fn = Fy',
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
    validity: 'where αPr/Pns ≤ 0.5',
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
    validity: 'where αPr/Pns > 0.5',
  }),
  taubByNotionalLoad: formula({
    id: 'C2.3c-taub',
    clause: 'C2.3',
    title: 'Stiffness reduction factor by a further notional load',
    symbol: 'taub',
    dimension: 'none',
    expression: '1',
    operands: {},
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
  notionalLoad: formula({
    id: 'C2-1',
    clause: 'C2.2b',
    equation: 'C2-1',
    title: 'Notional load at the level',
    symbol: 'Ni',
    dimension: 'force',
    expression: '0.002*alpha*Yi',
    operands: { alpha: 'none', Yi: 'force' },
    prints: 'display',
  }),
  notionalForStiffness: formula({
    id: 'C2.3c-Ni',
    clause: 'C2.3',
    title: 'Notional load in place of the stiffness reduction',
    symbol: 'Ni',
    dimension: 'force',
    expression: '0.001*alpha*Yi',
    operands: { alpha: 'none', Yi: 'force' },
    prints: 'display',
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

/** How the structure was analysed: Chapter C, App. 7.2, App. 7.3. */
export type StabilityMethod = 'direct' | 'effective-length' | 'first-order';

/** C2.2b and C2.3(c): a notional load that the analysis has to hold, from the gravity load Yi of a level. */
export const notionalLoad = (
  r: Recorder,
  alpha: Quantity,
  Yi: Quantity,
  at = 'C2/notional',
): Quantity => r.formula(c2Formulas.notionalLoad, `${at}/Ni`, { alpha, Yi });

/**
 * C2.3(c): τb = 1 at any axial force, where the basis of the calculation says that the analysis
 * holds a further notional load of 0.001 α Yi at every level in every combination. Where this
 * member needs it (αPr > 0.5 Pns) a note says so, with its size if the gravity load is given.
 */
export function stiffnessByNotionalLoad(
  r: Recorder,
  q: { readonly alpha: Quantity; readonly Pr: Quantity; readonly Pns: Quantity },
  Yi: Quantity | null,
): Quantity {
  const title = 'Notional load in place of the stiffness reduction';
  const share = r.formula(c2Formulas.share, 'C2/share', { ...q });
  const taken = r.choice(
    'C2/branch',
    [{ left: share, relation: '<=', right: 0.5, outcome: 'C2-2a applies' }],
    'the factor stays 1, for which the further notional load stands in',
    { title: 'Stiffness reduction', clause: clause('C2.3') },
  );
  if (taken !== 0) {
    if (Yi)
      r.formula(
        c2Formulas.notionalForStiffness,
        'C2/further/Ni',
        { alpha: q.alpha, Yi },
        { title },
      );
    r.notice(
      'C2/further',
      'note',
      'further-notional-load',
      'The stiffness is not reduced further because the analysis holds a notional load of 0.001 times the gravity load of each level, at the LRFD load level, in all combinations and beside any notional load for out-of-plumbness.',
      { title, clause: clause('C2.3') },
    );
  }
  return r.formula(
    taken === 0 ? c2Formulas.taubFull : c2Formulas.taubByNotionalLoad,
    'C2/taub',
    {},
  );
}

/** Largest ratio of second-order to first-order drift up to which a method's easements hold. */
const DRIFT_LIMITS = {
  direct: { limit: 1.7, clause: 'C2.1' },
  'effective-length': { limit: 1.5, clause: 'App. 7.2' },
  'first-order': { limit: 1.5, clause: 'App. 7.3' },
} as const;

/**
 * Δ2nd/Δ1st at the LRFD load level, or B2 in its place, against the limit of the method: 1.7 with
 * reduced stiffness (C2.1(b), C2.2b(d)), 1.5 with nominal stiffness (App. 7.2.1, 7.3.1). False,
 * with an outside-scope notice, where the method may not be used; the direct analysis method always may.
 */
export function secondOrderRatio(
  r: Recorder,
  method: StabilityMethod,
  ratio: Quantity,
  at = 'C2/ratio',
): boolean {
  const { limit, clause: place } = DRIFT_LIMITS[method];
  const title = 'Second-order drift over first-order drift';
  const direct = method === 'direct';
  const within = r.choice(
    `${at}/limit`,
    [
      {
        left: ratio,
        relation: '<=',
        right: limit,
        outcome: direct
          ? 'the easements for small second-order drift may be used'
          : 'the method may be used',
      },
    ],
    direct
      ? 'the easements for small second-order drift may not be used'
      : 'the method may not be used',
    { title, clause: clause(place) },
  );
  if (within === 0) return true;
  if (direct)
    r.notice(
      `${at}/above`,
      'caution',
      'second-order-drift-large',
      'The second-order drift is more than 1.7 times the first-order drift. The analysis of the structure has to hold the effect of axial force between the ends of its members, and the notional loads, or the modelled out-of-plumbness, in all combinations, those with lateral loads included.',
      { title, clause: clause(place) },
    );
  else
    r.notice(
      `${at}/above`,
      'outside scope',
      'method-drift-limit',
      `The second-order drift is more than 1.5 times the first-order drift. The ${method === 'first-order' ? 'first-order analysis' : 'effective length'} method may not be used: use the direct analysis method.`,
      { title, clause: clause(place) },
    );
  return direct;
}
