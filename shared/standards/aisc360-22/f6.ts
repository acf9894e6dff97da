import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { ClassWithLimits } from './b4-flexure.ts';
import { clause, formula } from './writer.ts';

// F6 I-shapes and channels bent about the minor axis.
export const f6Formulas = {
  plastic: formula({
    id: 'F6-1',
    clause: 'F6.1',
    equation: 'F6-1',
    title: 'Plastic moment before its limit',
    symbol: 'FyZy',
    dimension: 'moment',
    expression: 'Fy*Zy',
    operands: { Fy: 'stress', Zy: 'modulus' },
  }),
  cap: formula({
    id: 'F6-1-cap',
    clause: 'F6.1',
    equation: 'F6-1',
    title: 'Limit of the plastic moment',
    symbol: 'Mycap',
    dimension: 'moment',
    expression: '1.6*Fy*Sy',
    operands: { Fy: 'stress', Sy: 'modulus' },
  }),
  noncompact: formula({
    id: 'F6-2',
    clause: 'F6.2',
    equation: 'F6-2',
    title: 'Flange local buckling, noncompact flange',
    symbol: 'MnFLB',
    dimension: 'moment',
    expression: 'Mp-(Mp-0.7*Fy*Sy)*(lambda-lambdapf)/(lambdarf-lambdapf)',
    operands: {
      Mp: 'moment',
      Fy: 'stress',
      Sy: 'modulus',
      lambda: 'none',
      lambdapf: 'none',
      lambdarf: 'none',
    },
    validity: 'where λpf < λ ≤ λrf',
  }),
  criticalStress: formula({
    id: 'F6-4',
    clause: 'F6.2',
    equation: 'F6-4',
    title: 'Critical stress, slender flange',
    symbol: 'Fcr',
    dimension: 'stress',
    expression: '0.70*E/lambda^2',
    operands: { E: 'stress', lambda: 'none' },
    validity: 'where λ > λrf',
  }),
  slender: formula({
    id: 'F6-3',
    clause: 'F6.2',
    equation: 'F6-3',
    title: 'Flange local buckling, slender flange',
    symbol: 'MnFLB',
    dimension: 'moment',
    expression: 'Fcr*Sy',
    operands: { Fcr: 'stress', Sy: 'modulus' },
    validity: 'where λ > λrf',
  }),
};

export interface MinorFlexure {
  readonly E: Quantity;
  readonly Fy: Quantity;
  readonly Sy: Quantity;
  readonly Zy: Quantity;
  readonly lambdaf: Quantity;
}

export interface MinorStrength {
  readonly Mn: Quantity;
  readonly Mp: Quantity;
  readonly FLB: Quantity | null;
}

/** F6: yielding with its limit, flange local buckling by class; the lower governs. */
export function minorFlexuralStrength(
  r: Recorder,
  q: MinorFlexure,
  flange: ClassWithLimits,
): MinorStrength {
  const { E, Fy, Sy, Zy, lambdaf } = q;
  const plastic = r.formula(f6Formulas.plastic, 'F6/FyZy', { Fy, Zy });
  const cap = r.formula(f6Formulas.cap, 'F6/cap', { Fy, Sy });
  const Mp = r.governing('F6/Mp', 'min', [plastic, cap], {
    title: 'Plastic moment about the minor axis',
    symbol: 'Mpy',
    clause: clause('F6.1', 'F6-1'),
  });
  if (flange.class === 'compact') return { Mn: Mp, Mp, FLB: null };
  const FLB =
    flange.class === 'noncompact'
      ? r.formula(f6Formulas.noncompact, 'F6/FLB/Mn', {
          Mp,
          Fy,
          Sy,
          lambda: lambdaf,
          lambdapf: flange.lambdap,
          lambdarf: flange.lambdar,
        })
      : r.formula(f6Formulas.slender, 'F6/FLB/Mn', {
          Fcr: r.formula(f6Formulas.criticalStress, 'F6/FLB/Fcr', { E, lambda: lambdaf }),
          Sy,
        });
  const Mn = r.governing('F6/Mn', 'min', [Mp, FLB], {
    title: 'Nominal flexural strength, minor axis',
    symbol: 'Mny',
    clause: clause('F6'),
  });
  return { Mn, Mp, FLB };
}
