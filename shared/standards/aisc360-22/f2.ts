import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { Design } from './parameters.ts';
import { clause, formula } from './writer.ts';

// F2 doubly symmetric compact I-shapes bent about the major axis.
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
  }),
  availableLrfd: formula({
    id: 'F1-LRFD',
    clause: 'F1',
    title: 'Design flexural strength',
    symbol: 'Mc',
    dimension: 'moment',
    expression: 'phib*Mn',
    operands: { phib: 'none', Mn: 'moment' },
    prints: 'display',
  }),
  availableAsd: formula({
    id: 'F1-ASD',
    clause: 'F1',
    title: 'Allowable flexural strength',
    symbol: 'Mc',
    dimension: 'moment',
    expression: 'Mn/Omegab',
    operands: { Omegab: 'none', Mn: 'moment' },
    prints: 'display',
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
  readonly Lb: Quantity;
}

/** F2.1. */
export const plasticMomentMajor = (r: Recorder, q: MajorFlexure): Quantity =>
  r.formula(f2Formulas.plasticMoment, 'F2/Mp', { Fy: q.Fy, Zx: q.Zx });

export type LtbRange = 'continuous' | 'yielding' | 'inelastic' | 'elastic';

export interface LtbLimits {
  readonly range: LtbRange;
  readonly Lp: Quantity | null;
  readonly Lr: Quantity | null;
  readonly c: Quantity | null;
}

/** F2.2: which range Lb falls in; independent of Cb, so of the combination. */
export function ltbRange(r: Recorder, q: MajorFlexure): LtbLimits {
  const { Lb } = q;
  if (Lb.value === 0) {
    r.choice(
      'F2/LTB/range',
      [
        {
          left: Lb,
          relation: '=',
          right: 0,
          outcome:
            'lateral-torsional buckling does not apply: the compression flange is held continuously',
        },
      ],
      '',
      { title: 'Lateral-torsional buckling', clause: clause('F2.2') },
    );
    return { range: 'continuous', Lp: null, Lr: null, c: null };
  }
  const Lp = r.formula(f2Formulas.Lp, 'F2/Lp', { ry: q.ry, E: q.E, Fy: q.Fy });
  if (Lb.value <= Lp.value) {
    r.choice(
      'F2/LTB/range',
      [
        {
          left: Lb,
          relation: '<=',
          right: Lp,
          outcome: 'lateral-torsional buckling does not apply',
        },
      ],
      'lateral-torsional buckling is checked',
      { title: 'Lateral-torsional buckling', clause: clause('F2.2', 'F2-5') },
    );
    return { range: 'yielding', Lp, Lr: null, c: null };
  }
  const c = r.formula(f2Formulas.c, 'F2/c', {});
  const Lr = r.formula(f2Formulas.Lr, 'F2/Lr', {
    rts: q.rts,
    E: q.E,
    Fy: q.Fy,
    J: q.J,
    c,
    Sx: q.Sx,
    ho: q.ho,
  });
  const taken = r.choice(
    'F2/LTB/range',
    [
      { left: Lb, relation: '<=', right: Lp, outcome: 'lateral-torsional buckling does not apply' },
      {
        left: Lb,
        relation: '<=',
        right: Lr,
        outcome: 'lateral-torsional buckling is inelastic: F2-2 applies',
      },
    ],
    'lateral-torsional buckling is elastic: F2-3 applies',
    { title: 'Lateral-torsional buckling', clause: clause('F2.2') },
  );
  return { range: taken === 1 ? 'inelastic' : 'elastic', Lp, Lr, c };
}

/** F2-2 or F2-3, not more than Mp; null where lateral-torsional buckling does not apply. */
export function ltbStrength(
  r: Recorder,
  q: MajorFlexure,
  limits: LtbLimits,
  Mp: Quantity,
  Cb: Quantity,
): Quantity | null {
  const { Lp, Lr, c } = limits;
  if (!Lp || !Lr || !c) return null;
  const { Fy, Sx, Lb, E, rts, J, ho } = q;
  const trial =
    limits.range === 'inelastic'
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

/** φb Mn or Mn/Ωb of F1(a) about one axis. */
export function availableFlexure(
  r: Recorder,
  axis: 'x' | 'y',
  design: Design,
  constant: Quantity,
  Mn: Quantity,
): Quantity {
  const more = {
    symbol: `Mc${axis}`,
    title: `${design === 'LRFD' ? 'Design' : 'Allowable'} flexural strength, ${axis === 'x' ? 'major' : 'minor'} axis`,
  };
  return design === 'LRFD'
    ? r.formula(f2Formulas.availableLrfd, `F1/${axis}/Mc`, { phib: constant, Mn }, more)
    : r.formula(f2Formulas.availableAsd, `F1/${axis}/Mc`, { Omegab: constant, Mn }, more);
}
