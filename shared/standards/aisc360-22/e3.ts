import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// E2 slenderness, E3 flexural buckling of members without slender elements.
export const e3Formulas = {
  slenderness: formula({
    id: 'E2-Lc/r',
    clause: 'E2',
    title: 'Slenderness',
    symbol: 'slenderness',
    dimension: 'none',
    expression: 'Lc/r',
    operands: { Lc: 'length', r: 'length' },
  }),
  elasticStress: formula({
    id: 'E3-4',
    clause: 'E3',
    equation: 'E3-4',
    title: 'Elastic flexural buckling stress',
    symbol: 'Fe',
    dimension: 'stress',
    expression: 'pi^2*E/(Lc/r)^2',
    operands: { E: 'stress', Lc: 'length', r: 'length' },
  }),
  stressRatio: formula({
    id: 'E3-Fy/Fe',
    clause: 'E3',
    title: 'Yield stress over elastic buckling stress',
    symbol: 'FyFe',
    dimension: 'none',
    expression: 'Fy/Fe',
    operands: { Fy: 'stress', Fe: 'stress' },
  }),
  inelastic: formula({
    id: 'E3-2',
    clause: 'E3',
    equation: 'E3-2',
    title: 'Nominal stress, inelastic buckling',
    symbol: 'Fn',
    dimension: 'stress',
    expression: '0.658^(Fy/Fe)*Fy',
    operands: { Fy: 'stress', Fe: 'stress' },
    validity: 'where Fy/Fe ≤ 2.25',
  }),
  elastic: formula({
    id: 'E3-3',
    clause: 'E3',
    equation: 'E3-3',
    title: 'Nominal stress, elastic buckling',
    symbol: 'Fn',
    dimension: 'stress',
    expression: '0.877*Fe',
    operands: { Fe: 'stress' },
    validity: 'where Fy/Fe > 2.25',
  }),
  strength: formula({
    id: 'E3-1',
    clause: 'E3',
    equation: 'E3-1',
    title: 'Nominal compressive strength',
    symbol: 'Pn',
    dimension: 'force',
    expression: 'Fn*Ag',
    operands: { Fn: 'stress', Ag: 'area' },
    validity: 'where no element is slender in compression',
  }),
  availableLrfd: formula({
    id: 'E1-LRFD',
    clause: 'E1',
    title: 'Design compressive strength',
    symbol: 'Pc',
    dimension: 'force',
    expression: 'phic*Pn',
    operands: { phic: 'none', Pn: 'force' },
  }),
  availableAsd: formula({
    id: 'E1-ASD',
    clause: 'E1',
    title: 'Allowable compressive strength',
    symbol: 'Pc',
    dimension: 'force',
    expression: 'Pn/Omegac',
    operands: { Omegac: 'none', Pn: 'force' },
  }),
};

/** E2 User Note: a slenderness above 200 is not preferred. */
const PREFERRED_SLENDERNESS = 200;

/** E3-4 about one axis, with the slenderness of E2 beside it. */
export function elasticFlexuralStress(
  r: Recorder,
  axis: 'x' | 'y',
  E: Quantity,
  Lc: Quantity,
  radius: Quantity,
): { readonly stress: Quantity; readonly slenderness: Quantity } {
  const word = axis === 'x' ? 'major' : 'minor';
  const slenderness = r.formula(
    e3Formulas.slenderness,
    `E2/${axis}/slenderness`,
    { Lc, r: radius },
    {
      title: `Slenderness about the ${word} axis`,
      symbol: `slenderness${axis}`,
    },
  );
  const stress = r.formula(
    e3Formulas.elasticStress,
    `E3/${axis}/Fe`,
    { E, Lc, r: radius },
    {
      title: `Elastic buckling stress about the ${word} axis`,
      symbol: `Fe${axis}`,
    },
  );
  return { stress, slenderness };
}

/** E2 User Note as a note line; it sets no limit. */
export function slendernessNote(r: Recorder, slendernesses: readonly Quantity[]): void {
  const largest = r.governing('E2/slenderness', 'max', slendernesses, {
    title: 'Largest slenderness',
    symbol: 'slendernessmax',
    clause: clause('E2'),
  });
  if (largest.value > PREFERRED_SLENDERNESS)
    r.notice(
      'E2/preferred',
      'caution',
      'slenderness-above-200',
      'The slenderness exceeds 200. The User Note of E2 prefers members in compression to stay below; it is not a limit.',
      { title: 'Slenderness above 200', clause: clause('E2') },
    );
}

/** E3-2 or E3-3, decided on Fy/Fe ≤ 2.25 alone. */
export function nominalStress(r: Recorder, Fy: Quantity, Fe: Quantity): Quantity {
  const ratio = r.formula(e3Formulas.stressRatio, 'E3/FyFe', { Fy, Fe });
  const taken = r.choice(
    'E3/branch',
    [{ left: ratio, relation: '<=', right: 2.25, outcome: 'buckling is inelastic: E3-2 applies' }],
    'buckling is elastic: E3-3 applies',
    { title: 'Inelastic or elastic buckling', clause: clause('E3') },
  );
  return taken === 0
    ? r.formula(e3Formulas.inelastic, 'E3/Fn', { Fy, Fe })
    : r.formula(e3Formulas.elastic, 'E3/Fn', { Fe });
}

/** φc Pn or Pn/Ωc of E1. */
export function availableCompression(
  r: Recorder,
  design: 'LRFD' | 'ASD',
  constant: Quantity,
  Pn: Quantity,
  more: { title?: string; symbol?: string } = {},
): Quantity {
  return design === 'LRFD'
    ? r.formula(e3Formulas.availableLrfd, 'E1/Pc', { phic: constant, Pn }, more)
    : r.formula(e3Formulas.availableAsd, 'E1/Pc', { Omegac: constant, Pn }, more);
}
