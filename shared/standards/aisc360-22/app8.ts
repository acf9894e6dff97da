import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { CmEndMoments, multiplierB1 as multiplierOf } from './app8-b1.ts';
import { clause, formula } from './writer.ts';

// Appendix 8.1.2: the critical load and the moment of members whose ends do not translate.
export const app8Formulas = {
  criticalLoad: formula({
    id: 'A-8-5',
    clause: 'App. 8.1.2',
    equation: 'A-8-5',
    title: 'Elastic critical load in the plane of bending',
    symbol: 'Pe1',
    dimension: 'force',
    expression: 'pi^2*EIstar/L1^2',
    operands: { EIstar: 'rigidity', L1: 'length' },
  }),
  share: formula({
    id: 'App.8-share',
    clause: 'App. 8.1.2',
    title: 'Axial force over the elastic critical load',
    symbol: 'rho',
    dimension: 'none',
    expression: 'alpha*Pr/Pe1',
    operands: { alpha: 'none', Pr: 'force', Pe1: 'force' },
    prints: 'display',
  }),
  required: formula({
    id: 'A-8-1',
    clause: 'App. 8.1.1',
    equation: 'A-8-1',
    title: 'Amplified moment, no lateral translation',
    symbol: 'Mr',
    dimension: 'moment',
    expression: 'B1*Mnt',
    operands: { B1: 'none', Mnt: 'moment' },
    prints: 'display',
  }),
};

export interface Amplification {
  readonly alpha: Quantity;
  readonly Pr: Quantity;
  readonly Pe1: Quantity;
  readonly psi: Quantity;
}

const at = (axis: 'x' | 'y', name: string): string => `App8/${axis}/${name}`;

/** A-8-5 with the distance between points held in the plane of bending (K1 ≤ 1). */
export const criticalLoad = (
  r: Recorder,
  axis: 'x' | 'y',
  EIstar: Quantity,
  L1: Quantity,
): Quantity =>
  r.formula(app8Formulas.criticalLoad, at(axis, 'Pe1'), { EIstar, L1 }, { symbol: `Pe1${axis}` });

/** αPr/Pe1 as a line; Pr in compression. */
export const criticalLoadShare = (
  r: Recorder,
  axis: 'x' | 'y',
  alpha: Quantity,
  Pr: Quantity,
  Pe1: Quantity,
): Quantity =>
  r.formula(app8Formulas.share, at(axis, 'share'), { alpha, Pr, Pe1 }, { symbol: `rho${axis}` });

/** αPr against Pe1, both lines: true where a second-order moment exists. */
export const belowCriticalLoad = (
  r: Recorder,
  axis: 'x' | 'y',
  alpha: Quantity,
  Pr: Quantity,
  Pe1: Quantity,
): boolean => isStable(r, axis, criticalLoadShare(r, axis, alpha, Pr, Pe1));

/**
 * Whether the share αPr/Pe1 leaves a second-order moment. At or above the critical load the member
 * is unstable in that plane: a failed notice, never a number.
 */
export function isStable(r: Recorder, axis: 'x' | 'y', share: Quantity): boolean {
  const word = axis === 'x' ? 'major' : 'minor';
  const taken = r.choice(
    at(axis, 'stable'),
    [
      { left: share, relation: '>=', right: 1, outcome: 'the member is unstable in this plane' },
      {
        left: share,
        relation: '>',
        right: 0.9,
        outcome: 'a second-order moment exists, close to the critical load',
      },
    ],
    'a second-order moment exists',
    { title: `Axial force against the critical load, ${word} axis`, clause: clause('App. 8.1.2') },
  );
  if (taken === 0)
    r.notice(
      at(axis, 'unstable'),
      'failed',
      'at-critical-load',
      'The axial force at the LRFD load level reaches or exceeds the elastic critical load in the plane of bending. No finite second-order moment exists: choose a stiffer section or a shorter distance between points held.',
      {
        title: `Elastic critical load reached, ${word} axis`,
        clause: clause('App. 8.1.2', 'A-8-5'),
      },
    );
  if (taken === 1)
    r.notice(
      at(axis, 'near-critical'),
      'caution',
      'near-critical-load',
      'The axial force is above nine tenths of the elastic critical load: the moment grows without bound for a small change of length, stiffness or force.',
      { title: `Close to the critical load, ${word} axis`, clause: clause('App. 8.1.2') },
    );
  return taken !== 0;
}

/** Cm of A-8-4 and B1 of A-8-3, not less than 1, for a member without load between its supports. */
export const multiplierB1 = (r: Recorder, axis: 'x' | 'y', q: Amplification): Quantity =>
  multiplierOf(r, `App8/${axis}`, {
    alpha: q.alpha,
    Pr: q.Pr,
    Pe1: q.Pe1,
    Cm: CmEndMoments(r, `App8/${axis}`, q.psi),
  });

/** A-8-1 without lateral translation: B1 times the larger end moment. */
export const amplifiedMoment = (
  r: Recorder,
  axis: 'x' | 'y',
  B1: Quantity,
  Mnt: Quantity,
): Quantity =>
  r.formula(
    app8Formulas.required,
    at(axis, 'Mr'),
    { B1, Mnt },
    {
      title: `Amplified moment, ${axis === 'x' ? 'major' : 'minor'} axis`,
    },
  );
