import type { FormulaText } from '../../calc/formula.ts';
import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { type Design, methodConstant } from './parameters.ts';
import { clause, formula } from './writer.ts';

// D1 slenderness, D2 tensile yielding of the gross section and rupture of the net section.
const force = (
  id: string,
  title: string,
  symbol: string,
  expression: string,
  operands: FormulaText['operands'],
  equation?: string,
) =>
  formula({
    ...{ id, clause: 'D2', title, symbol, dimension: 'force', expression, operands },
    ...(equation && { equation }),
  });

export const d2Formulas = {
  slenderness: formula({
    id: 'D1-L/r',
    clause: 'D1',
    title: 'Slenderness in tension',
    symbol: 'Lrt',
    dimension: 'none',
    expression: 'L/rmin',
    operands: { L: 'length', rmin: 'length' },
  }),
  yielding: force(
    'D2-1',
    'Nominal strength, yielding of the gross section',
    'PnTY',
    'Fy*Ag',
    { Fy: 'stress', Ag: 'area' },
    'D2-1',
  ),
  rupture: force(
    'D2-2',
    'Nominal strength, rupture of the net section',
    'PnTR',
    'Fu*Ae',
    { Fu: 'stress', Ae: 'area' },
    'D2-2',
  ),
  yieldingLrfd: force('D2-TY-LRFD', 'Design strength in yielding', 'PcTY', 'phit*PnTY', {
    phit: 'none',
    PnTY: 'force',
  }),
  yieldingAsd: force('D2-TY-ASD', 'Allowable strength in yielding', 'PcTY', 'PnTY/Omegat', {
    Omegat: 'none',
    PnTY: 'force',
  }),
  ruptureLrfd: force('D2-TR-LRFD', 'Design strength in rupture', 'PcTR', 'phitu*PnTR', {
    phitu: 'none',
    PnTR: 'force',
  }),
  ruptureAsd: force('D2-TR-ASD', 'Allowable strength in rupture', 'PcTR', 'PnTR/Omegatu', {
    Omegatu: 'none',
    PnTR: 'force',
  }),
};

/** D1 User Note: a slenderness above 300 is not preferred. */
const PREFERRED_SLENDERNESS = 300;

/** L/r of D1 with the least radius of gyration, and a note above 300; it sets no limit. */
export function tensionSlenderness(r: Recorder, L: Quantity, radii: readonly Quantity[]): void {
  const rmin = r.governing('D1/r', 'min', radii, {
    title: 'Least radius of gyration',
    symbol: 'rmin',
    clause: clause('D1'),
  });
  const slenderness = r.formula(d2Formulas.slenderness, 'D1/slenderness', { L, rmin });
  const taken = r.choice(
    'D1/preferred',
    [
      {
        left: slenderness,
        relation: '>',
        right: PREFERRED_SLENDERNESS,
        outcome: 'the member is more slender than the User Note of D1 prefers',
      },
    ],
    'the member is as stocky as the User Note of D1 prefers',
    { title: 'Preferred slenderness in tension', clause: clause('D1') },
  );
  if (taken === 0)
    r.notice(
      'D1/slender',
      'note',
      'tension-slenderness-above-300',
      'The slenderness exceeds 300. The User Note of D1 prefers members in tension, rods and hangers apart, to stay below; it is not a limit.',
      { title: 'Slenderness above 300', clause: clause('D1') },
    );
}

/** D2-1 with φt or Ωt: available strength in yielding of the gross section. */
export function tensileYielding(r: Recorder, design: Design, Fy: Quantity, Ag: Quantity): Quantity {
  const PnTY = r.formula(d2Formulas.yielding, 'D2/yielding/Pn', { Fy, Ag });
  const constant = methodConstant(r, 'tensionYielding', design);
  return design === 'LRFD'
    ? r.formula(d2Formulas.yieldingLrfd, 'D2/yielding/Pc', { phit: constant, PnTY })
    : r.formula(d2Formulas.yieldingAsd, 'D2/yielding/Pc', { Omegat: constant, PnTY });
}

/** D2-2 with φt or Ωt: available strength in rupture of the effective net section. */
export function tensileRupture(r: Recorder, design: Design, Fu: Quantity, Ae: Quantity): Quantity {
  const PnTR = r.formula(d2Formulas.rupture, 'D2/rupture/Pn', { Fu, Ae });
  const constant = methodConstant(r, 'tensionRupture', design);
  return design === 'LRFD'
    ? r.formula(d2Formulas.ruptureLrfd, 'D2/rupture/Pc', { phitu: constant, PnTR })
    : r.formula(d2Formulas.ruptureAsd, 'D2/rupture/Pc', { Omegatu: constant, PnTR });
}

/** The lower of yielding and rupture. */
export const lowerTensileStrength = (
  r: Recorder,
  yielding: Quantity,
  rupture: Quantity,
): Quantity =>
  r.governing('D2/Pc', 'min', [yielding, rupture], {
    title: 'Available tensile strength',
    symbol: 'Pc',
    clause: clause('D2'),
  });
