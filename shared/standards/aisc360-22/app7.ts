import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// Appendix 7.3: the first-order analysis method.
export const app7Formulas = {
  share: formula({
    id: 'App.7.3-share',
    clause: 'App. 7.3',
    title: 'Axial force over the cross-section strength',
    symbol: 'Pu',
    dimension: 'none',
    expression: 'alpha*Pr/Pns',
    operands: { alpha: 'none', Pr: 'force', Pns: 'force' },
    prints: 'display',
  }),
};

/**
 * 7.3.1: αPr ≤ 0.5 Pns for members whose flexural stiffness contributes to lateral stability.
 * Whether this one does is not an input, so a force above it is a caution.
 */
export function firstOrderAxialLimit(
  r: Recorder,
  alpha: Quantity,
  Pr: Quantity,
  Pns: Quantity,
): void {
  const title = 'Axial force in the first-order analysis method';
  const share = r.formula(app7Formulas.share, 'App7/share', { alpha, Pr, Pns });
  const within = r.choice(
    'App7/limit',
    [{ left: share, relation: '<=', right: 0.5, outcome: 'the method may be used' }],
    'the method may be used only where this member does not contribute to lateral stability',
    { title, clause: clause('App. 7.3') },
  );
  if (within !== 0)
    r.notice(
      'App7/above',
      'caution',
      'first-order-axial-limit',
      'The axial force exceeds half the cross-section strength. The first-order analysis method does not allow that in a member whose flexural stiffness contributes to the lateral stability of the structure: use the direct analysis method, or see that this member does not contribute.',
      { title, clause: clause('App. 7.3') },
    );
}
