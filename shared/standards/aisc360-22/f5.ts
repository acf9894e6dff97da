import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { ClassWithLimits } from './b4-flexure.ts';
import { coefficientKc } from './b4-kc.ts';
import { type FlangedSection, yieldingLimit } from './f4.ts';
import type { LtbClause, LtbLimits } from './ltb-range.ts';
import { clause, formula } from './writer.ts';

// F5 I-shapes with slender webs, major axis.
export const f5Formulas = {
  Rpg: formula({
    id: 'F5-6',
    clause: 'F5.2',
    equation: 'F5-6',
    title: 'Bending strength reduction factor',
    symbol: 'Rpg',
    dimension: 'none',
    expression: '1-aw/(1200+300*aw)*(lambda-5.7*sqrt(E/Fy))',
    operands: { aw: 'none', lambda: 'none', E: 'stress', Fy: 'stress' },
    validity: 'up to 1.0, with aw not above 10',
  }),
  CFY: formula({
    id: 'F5-1',
    clause: 'F5.1',
    equation: 'F5-1',
    title: 'Compression flange yielding',
    symbol: 'MnCFY',
    dimension: 'moment',
    expression: 'Rpg*Fy*Sxc',
    operands: { Rpg: 'none', Fy: 'stress', Sxc: 'modulus' },
  }),
  LTB: formula({
    id: 'F5-2',
    clause: 'F5.2',
    equation: 'F5-2',
    title: 'Lateral-torsional buckling',
    symbol: 'MnLTB',
    dimension: 'moment',
    expression: 'Rpg*Fcr*Sxc',
    operands: { Rpg: 'none', Fcr: 'stress', Sxc: 'modulus' },
  }),
  inelastic: formula({
    id: 'F5-3',
    clause: 'F5.2',
    equation: 'F5-3',
    title: 'Critical stress before its limit, inelastic lateral-torsional buckling',
    symbol: 'FcrLTBtrial',
    dimension: 'stress',
    expression: 'Cb*(Fy-0.3*Fy*(Lb-Lp)/(Lr-Lp))',
    operands: { Cb: 'none', Fy: 'stress', Lb: 'length', Lp: 'length', Lr: 'length' },
    validity: 'where Lp < Lb ≤ Lr, up to Fy',
  }),
  elastic: formula({
    id: 'F5-4',
    clause: 'F5.2',
    equation: 'F5-4',
    title: 'Critical stress before its limit, elastic lateral-torsional buckling',
    symbol: 'FcrLTBtrial',
    dimension: 'stress',
    expression: 'Cb*pi^2*E/(Lb/rt)^2',
    operands: { Cb: 'none', E: 'stress', Lb: 'length', rt: 'length' },
    validity: 'where Lb > Lr, up to Fy',
  }),
  Lr: formula({
    id: 'F5-5',
    clause: 'F5.2',
    equation: 'F5-5',
    title: 'Limit of inelastic lateral-torsional buckling',
    symbol: 'Lr',
    dimension: 'length',
    expression: 'pi*rt*sqrt(E/(0.7*Fy))',
    operands: { rt: 'length', E: 'stress', Fy: 'stress' },
  }),
  FLB: formula({
    id: 'F5-7',
    clause: 'F5.3',
    equation: 'F5-7',
    title: 'Flange local buckling',
    symbol: 'MnFLB',
    dimension: 'moment',
    expression: 'Rpg*Fcr*Sxc',
    operands: { Rpg: 'none', Fcr: 'stress', Sxc: 'modulus' },
  }),
  FLBNoncompact: formula({
    id: 'F5-8',
    clause: 'F5.3',
    equation: 'F5-8',
    title: 'Critical stress, noncompact flange',
    symbol: 'Fcr',
    dimension: 'stress',
    expression: 'Fy-0.3*Fy*(lambda-lambdapf)/(lambdarf-lambdapf)',
    operands: { Fy: 'stress', lambda: 'none', lambdapf: 'none', lambdarf: 'none' },
    validity: 'where λpf < λ ≤ λrf',
  }),
  FLBSlender: formula({
    id: 'F5-9',
    clause: 'F5.3',
    equation: 'F5-9',
    title: 'Critical stress, slender flange',
    symbol: 'Fcr',
    dimension: 'stress',
    expression: '0.9*E*kc/lambda^2',
    operands: { E: 'stress', kc: 'none', lambda: 'none' },
    validity: 'where λ > λrf',
  }),
  TFY: formula({
    id: 'F5-10',
    clause: 'F5.4',
    equation: 'F5-10',
    title: 'Tension flange yielding',
    symbol: 'MnTFY',
    dimension: 'moment',
    expression: 'Fy*Sxt',
    operands: { Fy: 'stress', Sxt: 'modulus' },
    validity: 'where Sxt < Sxc',
  }),
};

export const F5_LTB: LtbClause = {
  at: 'F5',
  clause: 'F5.2',
  limit: 'F4-7',
  inelastic: 'F5-3',
  elastic: 'F5-4',
};

/**
 * Rpg of F5-6 for a slender web of slenderness `lambda`: hc/tw of an I-shape, h/tw of a box (F7.3).
 * The web is slender, so that it lies below its limit of 1; `aw` is at most 10 (checked by F13.2).
 */
export const reductionFactor = (
  r: Recorder,
  at: string,
  q: {
    readonly aw: Quantity;
    readonly lambda: Quantity;
    readonly E: Quantity;
    readonly Fy: Quantity;
  },
): Quantity =>
  r.formula(f5Formulas.Rpg, `${at}/Rpg`, { aw: q.aw, lambda: q.lambda, E: q.E, Fy: q.Fy });

/** F5.1 and F5.4: yielding of the compression flange, and of the tension flange where Sxt < Sxc. */
export function flangeYieldingF5(
  r: Recorder,
  q: FlangedSection,
  Rpg: Quantity,
): { readonly CFY: Quantity; readonly TFY: Quantity | null } {
  const { Fy, Sxc, Sxt } = q;
  const CFY = r.formula(f5Formulas.CFY, 'F5/CFY/Mn', { Rpg, Fy, Sxc });
  if (q.IycIy === null) return { CFY, TFY: null };
  const applies = r.choice(
    'F5/TFY/applies',
    [{ left: Sxt, relation: '<', right: Sxc, outcome: 'tension flange yielding is checked' }],
    'tension flange yielding does not apply',
    { title: 'Tension flange yielding', clause: clause('F5.4') },
  );
  const TFY = applies < 0 ? null : r.formula(f5Formulas.TFY, 'F5/TFY/Mn', { Fy, Sxt });
  return { CFY, TFY };
}

/** F4-7 and F5-5 for a member whose longest unbraced length is `longest`, as in F2.2. */
export function ltbLimitsF5(
  r: Recorder,
  q: FlangedSection,
  rt: Quantity,
  longest: Quantity | null,
): LtbLimits {
  if (!longest || longest.value === 0) return { Lp: null, Lr: null };
  const { E, Fy } = q;
  const Lp = yieldingLimit(r, 'F5', { rt, E, Fy });
  const Lr = longest.value <= Lp.value ? null : r.formula(f5Formulas.Lr, 'F5/Lr', { rt, E, Fy });
  return { Lp, Lr };
}

/** F5-2 with Fcr of F5-3 or F5-4, not more than Fy. Throws where a limit was not written. */
export function ltbStrengthF5(
  r: Recorder,
  q: FlangedSection,
  of: { readonly rt: Quantity; readonly Rpg: Quantity; readonly limits: LtbLimits },
  segment: {
    readonly range: 'inelastic' | 'elastic';
    readonly Lb: Quantity;
    readonly Cb: Quantity;
  },
): Quantity {
  const { rt, Rpg } = of;
  const { Lp, Lr } = of.limits;
  if (!Lp || !Lr) throw new Error('F5.2: a limit is not written');
  const { E, Fy, Sxc } = q;
  const { Lb, Cb } = segment;
  const trial =
    segment.range === 'inelastic'
      ? r.formula(f5Formulas.inelastic, 'F5/LTB/Fcr/trial', { Cb, Fy, Lb, Lp, Lr })
      : r.formula(f5Formulas.elastic, 'F5/LTB/Fcr/trial', { Cb, E, Lb, rt });
  const Fcr = r.governing('F5/LTB/Fcr', 'min', [trial, Fy], {
    title: 'Critical stress, not more than the yield stress',
    symbol: 'Fcr',
    clause: clause('F5.2'),
  });
  return r.formula(f5Formulas.LTB, 'F5/LTB/Mn', { Rpg, Fcr, Sxc });
}

/** F5.3; null for a compact flange. `kc` where the flange's class has written it already. */
export function flangeLocalBucklingF5(
  r: Recorder,
  q: FlangedSection,
  Rpg: Quantity,
  kc: Quantity | null,
  flange: ClassWithLimits,
): Quantity | null {
  const { E, Fy, Sxc, lambdaf: lambda } = q;
  if (flange.class === 'compact') return null;
  const Fcr =
    flange.class === 'noncompact'
      ? r.formula(f5Formulas.FLBNoncompact, 'F5/FLB/Fcr', {
          Fy,
          lambda,
          lambdapf: flange.lambdap,
          lambdarf: flange.lambdar,
        })
      : r.formula(f5Formulas.FLBSlender, 'F5/FLB/Fcr', {
          E,
          kc: kc ?? coefficientKc(r, 'F5', q.lambdaw),
          lambda,
        });
  return r.formula(f5Formulas.FLB, 'F5/FLB/Mn', { Rpg, Fcr, Sxc });
}
