import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { ClassWithLimits } from './b4-flexure.ts';
import { coefficientKc } from './b4-kc.ts';
import { formula } from './writer.ts';

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
    validity: 'where λpf < λ ≤ λrf',
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
    validity: 'where λ > λrf',
  }),
};

export interface FlangeLocalBuckling {
  readonly E: Quantity;
  readonly Fy: Quantity;
  readonly Sx: Quantity;
  readonly Mp: Quantity;
  readonly lambdaf: Quantity;
  readonly lambdaw: Quantity;
  /** Where the flange's limit has already taken it (built-up shapes). */
  readonly kc?: Quantity | null;
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
  const kc = q.kc ?? coefficientKc(r, 'F3', lambdaw);
  return r.formula(f3Formulas.slender, 'F3/FLB/Mn', { E, kc, Sx, lambda: lambdaf });
}
