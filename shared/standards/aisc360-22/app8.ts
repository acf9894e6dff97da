import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// Appendix 8.1.2: the multiplier B1 for members without lateral translation of their ends.
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
  momentRatio: formula({
    id: 'App.8-M1/M2',
    clause: 'App. 8.1.2',
    title: 'Ratio of end moments in the sense of this appendix',
    symbol: 'M1M2',
    dimension: 'none',
    expression: '-psi',
    operands: { psi: 'none' },
  }),
  Cm: formula({
    id: 'A-8-4',
    clause: 'App. 8.1.2',
    equation: 'A-8-4',
    title: 'Equivalent uniform moment factor',
    symbol: 'Cm',
    dimension: 'none',
    expression: '0.6-0.4*M1M2',
    operands: { M1M2: 'none' },
  }),
  B1: formula({
    id: 'A-8-3',
    clause: 'App. 8.1.2',
    equation: 'A-8-3',
    title: 'Multiplier before its lower limit',
    symbol: 'B1trial',
    dimension: 'none',
    expression: 'Cm/(1-alpha*Pr/Pe1)',
    operands: { Cm: 'none', alpha: 'none', Pr: 'force', Pe1: 'force' },
    prints: 'display',
  }),
  B1least: formula({
    id: 'A-8-3-least',
    clause: 'App. 8.1.2',
    equation: 'A-8-3',
    title: 'Multiplier at its lower limit',
    symbol: 'B1',
    dimension: 'none',
    expression: '1',
    operands: {},
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

/**
 * αPr against Pe1: true where a second-order moment exists. At or above the critical load the
 * member is unstable in that plane: a failed notice, never a number.
 */
export function belowCriticalLoad(
  r: Recorder,
  axis: 'x' | 'y',
  alpha: Quantity,
  Pr: Quantity,
  Pe1: Quantity,
): boolean {
  const word = axis === 'x' ? 'major' : 'minor';
  const share = r.formula(
    app8Formulas.share,
    at(axis, 'share'),
    { alpha, Pr, Pe1 },
    { symbol: `rho${axis}` },
  );
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

/** Cm of A-8-4 and B1 of A-8-3, not less than 1. */
export function multiplierB1(r: Recorder, axis: 'x' | 'y', q: Amplification): Quantity {
  const M1M2 = r.formula(app8Formulas.momentRatio, at(axis, 'M1M2'), { psi: q.psi });
  const Cm = r.formula(app8Formulas.Cm, at(axis, 'Cm'), { M1M2 });
  const trial = r.formula(app8Formulas.B1, at(axis, 'B1/trial'), {
    Cm,
    alpha: q.alpha,
    Pr: q.Pr,
    Pe1: q.Pe1,
  });
  const taken = r.choice(
    at(axis, 'B1/limit'),
    [{ left: trial, relation: '>=', right: 1, outcome: 'the multiplier stands as computed' }],
    'the multiplier is 1',
    { title: 'Lower limit of the multiplier', clause: clause('App. 8.1.2', 'A-8-3') },
  );
  return taken === 0 ? trial : r.formula(app8Formulas.B1least, at(axis, 'B1'), {});
}

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
