import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { LtbClause, LtbLimits } from './ltb-range.ts';
import { clause, formula } from './writer.ts';

// F2 doubly symmetric compact I-shapes and channels bent about the major axis.
export const f2Formulas = {
  plasticMoment: formula({
    id: 'F2-1',
    clause: 'F2.1',
    equation: 'F2-1',
    title: 'Plastic moment',
    symbol: 'Mpx',
    dimension: 'moment',
    expression: 'Fy*Zx',
    operands: { Fy: 'stress', Zx: 'modulus' },
  }),
  Lp: formula({
    id: 'F2-5',
    clause: 'F2.2',
    equation: 'F2-5',
    title: 'Limit of yielding',
    symbol: 'Lp',
    dimension: 'length',
    expression: '1.76*ry*sqrt(E/Fy)',
    operands: { ry: 'length', E: 'stress', Fy: 'stress' },
  }),
  c: formula({
    id: 'F2-8a',
    clause: 'F2.2',
    equation: 'F2-8a',
    title: 'Coefficient of a doubly symmetric I-shape',
    symbol: 'c',
    dimension: 'none',
    expression: '1',
    operands: {},
  }),
  cChannel: formula({
    id: 'F2-8b',
    clause: 'F2.2',
    equation: 'F2-8b',
    title: 'Coefficient of a channel',
    symbol: 'c',
    dimension: 'none',
    expression: 'ho/2*sqrt(Iy/Cw)',
    operands: { ho: 'length', Iy: 'inertia', Cw: 'warping' },
  }),
  Lr: formula({
    id: 'F2-6',
    clause: 'F2.2',
    equation: 'F2-6',
    title: 'Limit of inelastic lateral-torsional buckling',
    symbol: 'Lr',
    dimension: 'length',
    expression: '1.95*rts*E/(0.7*Fy)*sqrt(J*c/(Sx*ho)+sqrt((J*c/(Sx*ho))^2+6.76*(0.7*Fy/E)^2))',
    operands: {
      rts: 'length',
      E: 'stress',
      Fy: 'stress',
      J: 'inertia',
      c: 'none',
      Sx: 'modulus',
      ho: 'length',
    },
  }),
  inelastic: formula({
    id: 'F2-2',
    clause: 'F2.2',
    equation: 'F2-2',
    title: 'Inelastic lateral-torsional buckling',
    symbol: 'MnLTBtrial',
    dimension: 'moment',
    expression: 'Cb*(Mp-(Mp-0.7*Fy*Sx)*(Lb-Lp)/(Lr-Lp))',
    operands: {
      Cb: 'none',
      Mp: 'moment',
      Fy: 'stress',
      Sx: 'modulus',
      Lb: 'length',
      Lp: 'length',
      Lr: 'length',
    },
    validity: 'where Lp < Lb ≤ Lr, up to Mp',
  }),
  criticalStress: formula({
    id: 'F2-4',
    clause: 'F2.2',
    equation: 'F2-4',
    title: 'Critical stress, elastic lateral-torsional buckling',
    symbol: 'Fcr',
    dimension: 'stress',
    expression: 'Cb*pi^2*E/(Lb/rts)^2*sqrt(1+0.078*(J*c/(Sx*ho))*(Lb/rts)^2)',
    operands: {
      Cb: 'none',
      E: 'stress',
      Lb: 'length',
      rts: 'length',
      J: 'inertia',
      c: 'none',
      Sx: 'modulus',
      ho: 'length',
    },
    validity: 'where Lb > Lr',
  }),
  elastic: formula({
    id: 'F2-3',
    clause: 'F2.2',
    equation: 'F2-3',
    title: 'Elastic lateral-torsional buckling',
    symbol: 'MnLTBtrial',
    dimension: 'moment',
    expression: 'Fcr*Sx',
    operands: { Fcr: 'stress', Sx: 'modulus' },
    validity: 'where Lb > Lr, up to Mp',
  }),
};

export interface MajorFlexure {
  readonly E: Quantity;
  readonly Fy: Quantity;
  readonly Sx: Quantity;
  readonly Zx: Quantity;
  readonly ry: Quantity;
  readonly rts: Quantity;
  readonly J: Quantity;
  readonly ho: Quantity;
}

/** Iy and Cw of a channel, for its coefficient c; null for a doubly symmetric I-shape. */
export type ChannelWarping = { readonly Iy: Quantity; readonly Cw: Quantity } | null;

export interface F2Limits extends LtbLimits {
  readonly c: Quantity | null;
}

export const F2_LTB: LtbClause = {
  at: 'F2',
  clause: 'F2.2',
  limit: 'F2-5',
  inelastic: 'F2-2',
  elastic: 'F2-3',
};

/** F2.1. */
export const plasticMomentMajor = (r: Recorder, q: MajorFlexure): Quantity =>
  r.formula(f2Formulas.plasticMoment, 'F2/Mp', { Fy: q.Fy, Zx: q.Zx });

/**
 * F2-5 to F2-8 for a member whose longest unbraced length is `longest`: no limit where that is
 * null or zero, Lr only where it exceeds Lp.
 */
export function ltbLimitsF2(
  r: Recorder,
  q: MajorFlexure,
  warping: ChannelWarping,
  longest: Quantity | null,
): F2Limits {
  if (!longest || longest.value === 0) return { Lp: null, Lr: null, c: null };
  const { E, Fy, Sx, ry, rts, J, ho } = q;
  const Lp = r.formula(f2Formulas.Lp, 'F2/Lp', { ry, E, Fy });
  if (longest.value <= Lp.value) return { Lp, Lr: null, c: null };
  const c = warping
    ? r.formula(f2Formulas.cChannel, 'F2/c', { ho, ...warping })
    : r.formula(f2Formulas.c, 'F2/c', {});
  const Lr = r.formula(f2Formulas.Lr, 'F2/Lr', { rts, E, Fy, J, c, Sx, ho });
  return { Lp, Lr, c };
}

/** F2-2 or F2-3, not more than Mp. Throws where the limits of the range were not written. */
export function ltbStrengthF2(
  r: Recorder,
  q: MajorFlexure,
  limits: F2Limits,
  Mp: Quantity,
  segment: {
    readonly range: 'inelastic' | 'elastic';
    readonly Lb: Quantity;
    readonly Cb: Quantity;
  },
): Quantity {
  const { Lp, Lr, c } = limits;
  if (!Lp || !Lr || !c) throw new Error('F2.2: a limit is not written');
  const { Fy, Sx, E, rts, J, ho } = q;
  const { Lb, Cb } = segment;
  const trial =
    segment.range === 'inelastic'
      ? r.formula(f2Formulas.inelastic, 'F2/LTB/trial', { Cb, Mp, Fy, Sx, Lb, Lp, Lr })
      : r.formula(f2Formulas.elastic, 'F2/LTB/trial', {
          Fcr: r.formula(f2Formulas.criticalStress, 'F2/LTB/Fcr', { Cb, E, Lb, rts, J, c, Sx, ho }),
          Sx,
        });
  return r.governing('F2/LTB/Mn', 'min', [trial, Mp], {
    title: 'Lateral-torsional buckling strength, not more than the plastic moment',
    symbol: 'MnLTB',
    clause: clause('F2.2'),
  });
}
