import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { ClassWithLimits } from './b4.ts';
import { clause, formula } from './writer.ts';

// F3 doubly symmetric I-shapes with compact web and noncompact or slender flanges, major axis.
export const f3Formulas = {
  noncompact: formula({
    id: 'F3-1',
    clause: 'F3.2',
    equation: 'F3-1',
    title: 'Flange local buckling, noncompact flange',
    symbol: 'MnFLB',
    dimension: 'moment',
    expression: 'Mp-(Mp-0.7*Fy*Sx)*(lambda-lambdapf)/(lambdarf-lambdapf)',
    operands: {
      Mp: 'moment',
      Fy: 'stress',
      Sx: 'modulus',
      lambda: 'none',
      lambdapf: 'none',
      lambdarf: 'none',
    },
  }),
  kcTrial: formula({
    id: 'B4.1-kc',
    clause: 'B4.1',
    title: 'Coefficient for slender flanges',
    symbol: 'kctrial',
    dimension: 'none',
    expression: '4/sqrt(lambdaw)',
    operands: { lambdaw: 'none' },
  }),
  kcLeast: formula({
    id: 'B4.1-kc-min',
    clause: 'B4.1',
    title: 'Least value of the coefficient',
    symbol: 'kcleast',
    dimension: 'none',
    expression: '0.35',
    operands: {},
  }),
  kcMost: formula({
    id: 'B4.1-kc-max',
    clause: 'B4.1',
    title: 'Greatest value of the coefficient',
    symbol: 'kcmost',
    dimension: 'none',
    expression: '0.76',
    operands: {},
  }),
  slender: formula({
    id: 'F3-2',
    clause: 'F3.2',
    equation: 'F3-2',
    title: 'Flange local buckling, slender flange',
    symbol: 'MnFLB',
    dimension: 'moment',
    expression: '0.9*E*kc*Sx/lambda^2',
    operands: { E: 'stress', kc: 'none', Sx: 'modulus', lambda: 'none' },
  }),
};

export interface FlangeLocalBuckling {
  readonly E: Quantity;
  readonly Fy: Quantity;
  readonly Sx: Quantity;
  readonly Mp: Quantity;
  readonly lambdaf: Quantity;
  readonly lambdaw: Quantity;
}

/** F3.2; null for a compact flange, where it does not apply. */
export function flangeLocalBucklingMajor(
  r: Recorder,
  q: FlangeLocalBuckling,
  flange: ClassWithLimits,
): Quantity | null {
  const { E, Fy, Sx, Mp, lambdaf, lambdaw } = q;
  if (flange.class === 'compact') return null;
  if (flange.class === 'noncompact')
    return r.formula(f3Formulas.noncompact, 'F3/FLB/Mn', {
      Mp,
      Fy,
      Sx,
      lambda: lambdaf,
      lambdapf: flange.lambdap,
      lambdarf: flange.lambdar,
    });
  const trial = r.formula(f3Formulas.kcTrial, 'F3/kc/trial', { lambdaw });
  const least = r.formula(f3Formulas.kcLeast, 'F3/kc/least', {});
  const most = r.formula(f3Formulas.kcMost, 'F3/kc/most', {});
  const capped = r.governing('F3/kc/capped', 'min', [trial, most], {
    title: 'kc, not more than 0.76',
    symbol: 'kc',
    clause: clause('B4.1'),
  });
  const kc = r.governing('F3/kc', 'max', [capped, least], {
    title: 'kc, not less than 0.35',
    symbol: 'kc',
    clause: clause('B4.1'),
  });
  return r.formula(f3Formulas.slender, 'F3/FLB/Mn', { E, kc, Sx, lambda: lambdaf });
}
