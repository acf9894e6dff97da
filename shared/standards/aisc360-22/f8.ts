import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { ClassWithLimits } from './b4-flexure.ts';
import { clause, formula } from './writer.ts';

// F8 round HSS and pipe. No lateral-torsional buckling.
export const f8Formulas = {
  limit: formula({
    id: 'F8-limit',
    clause: 'F8',
    title: 'Slenderness beyond which F8 has no rule',
    symbol: 'lambdamost',
    dimension: 'none',
    expression: '0.45*E/Fy',
    operands: { E: 'stress', Fy: 'stress' },
  }),
  plastic: formula({
    id: 'F8-1',
    clause: 'F8.1',
    equation: 'F8-1',
    title: 'Plastic moment',
    symbol: 'Mp',
    dimension: 'moment',
    expression: 'Fy*Z',
    operands: { Fy: 'stress', Z: 'modulus' },
    validity: 'where D/t < 0.45E/Fy',
  }),
  noncompact: formula({
    id: 'F8-2',
    clause: 'F8.2',
    equation: 'F8-2',
    title: 'Local buckling, noncompact wall',
    symbol: 'MnLB',
    dimension: 'moment',
    expression: '(0.021*E/lambda+Fy)*S',
    operands: { E: 'stress', lambda: 'none', Fy: 'stress', S: 'modulus' },
    validity: 'where 0.07E/Fy < D/t ≤ 0.31E/Fy',
  }),
  criticalStress: formula({
    id: 'F8-4',
    clause: 'F8.2',
    equation: 'F8-4',
    title: 'Critical stress, slender wall',
    symbol: 'Fcr',
    dimension: 'stress',
    expression: '0.33*E/lambda',
    operands: { E: 'stress', lambda: 'none' },
    validity: 'where 0.31E/Fy < D/t < 0.45E/Fy',
  }),
  slender: formula({
    id: 'F8-3',
    clause: 'F8.2',
    equation: 'F8-3',
    title: 'Local buckling, slender wall',
    symbol: 'MnLB',
    dimension: 'moment',
    expression: 'Fcr*S',
    operands: { Fcr: 'stress', S: 'modulus' },
    validity: 'where 0.31E/Fy < D/t < 0.45E/Fy',
  }),
};

export interface RoundFlexure {
  readonly axis: 'x' | 'y';
  readonly E: Quantity;
  readonly Fy: Quantity;
  readonly S: Quantity;
  readonly Z: Quantity;
  /** D/t. */
  readonly lambda: Quantity;
}

/** F8: D/t below 0.45E/Fy, as lines; false after an outside-scope notice. */
export function roundWithinScope(r: Recorder, q: RoundFlexure): boolean {
  const at = `F8/${q.axis}`;
  const limit = r.formula(f8Formulas.limit, `${at}/limit`, { E: q.E, Fy: q.Fy });
  const within = r.choice(
    `${at}/scope`,
    [{ left: q.lambda, relation: '<', right: limit, outcome: 'F8 applies' }],
    'F8 does not apply',
    { title: 'Range of F8', clause: clause('F8') },
  );
  if (within === 0) return true;
  r.notice(
    `${at}/outside`,
    'outside scope',
    'wall-too-slender',
    'D/t is not below 0.45E/Fy: F8 has no rule for such a wall. Flexure is not checked.',
    { title: 'Wall beyond the range of F8', clause: clause('F8') },
  );
  return false;
}

/** F8-1, and F8-2 or F8-3 for a wall that is not compact. */
export function roundStrengths(
  r: Recorder,
  q: RoundFlexure,
  wall: ClassWithLimits,
): { readonly Mp: Quantity; readonly LB: Quantity | null } {
  const { E, Fy, S, Z, lambda } = q;
  const at = `F8/${q.axis}`;
  const Mp = r.formula(f8Formulas.plastic, `${at}/Mp`, { Fy, Z }, { symbol: `Mp${q.axis}` });
  if (wall.class === 'compact') return { Mp, LB: null };
  const LB =
    wall.class === 'noncompact'
      ? r.formula(f8Formulas.noncompact, `${at}/LB/Mn`, { E, lambda, Fy, S })
      : r.formula(f8Formulas.slender, `${at}/LB/Mn`, {
          Fcr: r.formula(f8Formulas.criticalStress, `${at}/LB/Fcr`, { E, lambda }),
          S,
        });
  return { Mp, LB };
}
