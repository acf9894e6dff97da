import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { formula } from './writer.ts';

/*
 * A member with pinned ends and an initial bow e0 at its middle, in compression or tension (negative):
 * total deflection over e0, and the moment at the middle, P times the total deflection. The half sine is
 * exact with 1/(1 − P/Pe); a parabola acts as a uniform load 8Pe0/L², a V as a force 4Pe0/L in the
 * middle. S. P. Timoshenko, J. M. Gere, Theory of Elastic Stability, 2nd ed., McGraw-Hill 1961,
 * chapter 1; from memory.
 */
export type BowShape = 'sine' | 'parabola' | 'kink';

const amplified = (id: string, title: string, expression: string, sine = false) =>
  formula({
    id: `bow-${id}`,
    clause: '6',
    title,
    symbol: 'amplbow',
    dimension: 'none',
    expression,
    operands: sine ? { alpha: 'none', Pr: 'force', Pe1: 'force' } : { kL: 'angle' },
    prints: 'display',
  });

const PARABOLA = 'Amplification of a parabolic bow';
const KINK = 'Amplification of a bow of two straight lines';
export const bowFormulas = {
  sine: amplified('sine', 'Amplification of a half-sine bow', '1/(1-alpha*Pr/Pe1)', true),
  parabola: amplified('parabola', PARABOLA, '(4*sin(kL/4)/kL)^2/cos(kL/2)'),
  parabolaTension: amplified('parabola-tension', PARABOLA, '(4*sinh(kL/4)/kL)^2/cosh(kL/2)'),
  kink: amplified('kink', KINK, '2*tan(kL/2)/kL'),
  kinkTension: amplified('kink-tension', KINK, '2*tanh(kL/2)/kL'),
  moment: formula({
    id: 'bow-M',
    clause: '6',
    title: 'Moment at the middle from the initial bow',
    symbol: 'Mbow',
    dimension: 'moment',
    expression: 'alpha*Pr*e0*amplbow',
    operands: { alpha: 'none', Pr: 'force', e0: 'length', amplbow: 'none' },
  }),
};

/**
 * Moment at the middle from an initial bow, with the sign of the axial force times the bow; 'failed'
 * at αP ≥ Pe1, of which the caller has told.
 */
export function bowMoment(
  r: Recorder,
  at: string,
  shape: BowShape,
  q: {
    readonly alpha: Quantity;
    readonly Pr: Quantity;
    readonly Pe1: Quantity;
    readonly kL: Quantity;
    readonly e0: Quantity;
  },
): Quantity | 'failed' {
  const { alpha, Pr, Pe1, kL, e0 } = q;
  if (alpha.value * Pr.value >= Pe1.value) return 'failed';
  const text = shape === 'sine' ? 'sine' : Pr.value > 0 ? shape : (`${shape}Tension` as const);
  const amplbow = r.formula(bowFormulas[text], `${at}/bow`, { alpha, Pr, Pe1, kL });
  return r.formula(bowFormulas.moment, `${at}/Mbow`, { alpha, Pr, e0, amplbow });
}
