import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

/*
 * Pin-ended member under axial compression and end moments:
 * M(z) = [MA sin k(L − z) + MB sin kz] / sin kL, 0 < kL < π.
 * S. P. Timoshenko, J. M. Gere, Theory of Elastic Stability, 2nd ed., McGraw-Hill 1961, chapter 1
 * (beam-columns with couples; from memory). 1 − 2ψ cos kL + ψ² is written (1 − ψ)² + 4ψ sin²(kL/2),
 * and ψ − cos kL as (ψ − 1) + 2 sin²(kL/2), which do not cancel for small axial force.
 */
export const secondOrderFormulas = {
  kL: formula({
    id: 'kL',
    clause: '1',
    title: 'Axial parameter',
    symbol: 'kL',
    dimension: 'angle',
    expression: 'sqrt(alpha*Pr/EIstar)*L1',
    operands: { alpha: 'none', Pr: 'force', EIstar: 'rigidity', L1: 'length' },
  }),
  threshold: formula({
    id: 'threshold',
    clause: '1.1',
    title: 'Axial parameter from which the largest moment lies in the span',
    symbol: 'acospsi',
    dimension: 'angle',
    expression: 'acos(psi)',
    operands: { psi: 'none' },
  }),
  largest: formula({
    id: 'Mmax',
    clause: '1.1',
    title: 'Largest second-order moment',
    symbol: 'Mmax',
    dimension: 'moment',
    expression: 'M2abs*sqrt((1-psi)^2+4*psi*sin(kL/2)^2)/sin(kL)',
    operands: { M2abs: 'moment', psi: 'none', kL: 'angle' },
    prints: 'display',
    validity: 'where arccos ψ < kL < π',
  }),
  largestAtEnd: formula({
    id: 'Mmax-end',
    clause: '1.1',
    title: 'Largest second-order moment, at the end',
    symbol: 'Mmax',
    dimension: 'moment',
    expression: 'M2abs',
    operands: { M2abs: 'moment' },
    prints: 'display',
    validity: 'where kL ≤ arccos ψ',
  }),
  place: formula({
    id: 'z2',
    clause: '1.1',
    title: 'Its distance from the end with the larger moment',
    symbol: 'zs',
    dimension: 'length',
    expression: 'atan2((psi-1)+2*sin(kL/2)^2,sin(kL))*L1/kL',
    operands: { psi: 'none', kL: 'angle', L1: 'length' },
    prints: 'display',
    validity: 'where arccos ψ < kL < π',
  }),
  placeFromA: formula({
    id: 'zmax-A',
    clause: '1.1',
    title: 'Its distance from end A',
    symbol: 'zmax',
    dimension: 'length',
    expression: 'zs',
    operands: { zs: 'length' },
    prints: 'display',
  }),
  placeFromB: formula({
    id: 'zmax-B',
    clause: '1.1',
    title: 'Its distance from end A',
    symbol: 'zmax',
    dimension: 'length',
    expression: 'L1-zs',
    operands: { L1: 'length', zs: 'length' },
    prints: 'display',
  }),
  amplification: formula({
    id: 'amplification',
    clause: '1.1',
    title: 'Amplification of the larger end moment',
    symbol: 'amplification',
    dimension: 'none',
    expression: 'Mmax/M2abs',
    operands: { Mmax: 'moment', M2abs: 'moment' },
    prints: 'display',
  }),
  secant: formula({
    id: 'secant',
    clause: '1.2',
    title: 'Amplification of a uniform moment',
    symbol: 'secant',
    dimension: 'none',
    expression: '1/cos(kL/2)',
    operands: { kL: 'angle' },
    validity: 'where kL < π',
  }),
  CmSecant: formula({
    id: 'Cm-sec',
    clause: '1.2',
    title: 'Equivalent moment factor that pairs with sec(kL/2)',
    symbol: 'Cmsec',
    dimension: 'none',
    expression: 'sqrt((1-psi)^2+4*psi*sin(kL/2)^2)/(2*sin(kL/2))',
    operands: { psi: 'none', kL: 'angle' },
    validity: 'where arccos ψ < kL < π',
  }),
  CmSecantEnd: formula({
    id: 'Cm-sec-end',
    clause: '1.2',
    title: 'Equivalent moment factor that pairs with sec(kL/2), maximum at the end',
    symbol: 'Cmsec',
    dimension: 'none',
    expression: 'cos(kL/2)',
    operands: { kL: 'angle' },
    validity: 'where kL ≤ arccos ψ',
  }),
  CmAmplifier: formula({
    id: 'Cm-B1',
    clause: '1.2',
    title: 'Equivalent moment factor that pairs with 1/(1 − αPr/Pe1)',
    symbol: 'CmB1',
    dimension: 'none',
    expression: 'amplification*(1-alpha*Pr/Pe1)',
    operands: { amplification: 'none', alpha: 'none', Pr: 'force', Pe1: 'force' },
    prints: 'display',
  }),
  quarterA: formula({
    id: 'M-quarter',
    clause: '1',
    title: 'Second-order moment at the first quarter point',
    symbol: 'MA4',
    dimension: 'moment',
    expression: 'abs(MA*sin(3*kL/4)+MB*sin(kL/4))/sin(kL)',
    operands: { MA: 'moment', MB: 'moment', kL: 'angle' },
    prints: 'display',
  }),
  quarterB: formula({
    id: 'M-middle',
    clause: '1',
    title: 'Second-order moment at the middle',
    symbol: 'MB4',
    dimension: 'moment',
    expression: 'abs(MA+MB)/(2*cos(kL/2))',
    operands: { MA: 'moment', MB: 'moment', kL: 'angle' },
    prints: 'display',
  }),
  quarterC: formula({
    id: 'M-three-quarters',
    clause: '1',
    title: 'Second-order moment at the third quarter point',
    symbol: 'MC4',
    dimension: 'moment',
    expression: 'abs(MA*sin(kL/4)+MB*sin(3*kL/4))/sin(kL)',
    operands: { MA: 'moment', MB: 'moment', kL: 'angle' },
    prints: 'display',
  }),
};

export interface SecondOrder {
  readonly kL: Quantity;
  readonly Mmax: Quantity;
  readonly inSpan: boolean;
  /** Distance of the largest moment from end A; null when it is at an end. */
  readonly zmax: Quantity | null;
  readonly amplification: Quantity;
  readonly CmB1: Quantity;
}

export interface BeamColumn {
  readonly alpha: Quantity;
  /** Above zero and, times alpha, below Pe1. */
  readonly Pr: Quantity;
  readonly EIstar: Quantity;
  readonly L1: Quantity;
  readonly Pe1: Quantity;
  readonly M2: Quantity;
  readonly psi: Quantity;
  readonly largerEnd: 'A' | 'B';
}

/**
 * Largest second-order moment, its place, and both theoretical equivalent moment factors.
 * The end rule is tested first, always: outside its validity the span formula describes a crest
 * beyond the member.
 */
export function largestMoment(
  r: Recorder,
  at: string,
  axis: 'x' | 'y',
  q: BeamColumn,
): SecondOrder {
  const { alpha, Pr, EIstar, L1, Pe1, psi } = q;
  const word = axis === 'x' ? 'major' : 'minor';
  const M2abs = q.M2;
  const kL = r.formula(secondOrderFormulas.kL, `${at}/kL`, { alpha, Pr, EIstar, L1 });
  const threshold = r.formula(secondOrderFormulas.threshold, `${at}/threshold`, { psi });
  const inSpan =
    r.choice(
      `${at}/place`,
      [
        {
          left: kL,
          relation: '>',
          right: threshold,
          outcome: 'the largest moment lies in the span',
        },
      ],
      'the largest moment is the larger end moment',
      {
        title: 'Place of the largest moment',
        clause: clause('1.1'),
        because:
          'The moment rises from the end with the larger moment only if kL exceeds arccos ψ.',
      },
    ) === 0;
  const named = { title: `Largest second-order moment, ${word} axis`, symbol: `Mmax${axis}` };
  const Mmax = inSpan
    ? r.formula(secondOrderFormulas.largest, `${at}/Mmax`, { M2abs, psi, kL }, named)
    : r.formula(secondOrderFormulas.largestAtEnd, `${at}/Mmax`, { M2abs }, named);
  const zs = inSpan ? r.formula(secondOrderFormulas.place, `${at}/z2`, { psi, kL, L1 }) : null;
  const zmax = !zs
    ? null
    : q.largerEnd === 'A'
      ? r.formula(secondOrderFormulas.placeFromA, `${at}/zmax`, { zs })
      : r.formula(secondOrderFormulas.placeFromB, `${at}/zmax`, { L1, zs });
  const amplification = r.formula(secondOrderFormulas.amplification, `${at}/amplification`, {
    Mmax,
    M2abs,
  });
  r.formula(secondOrderFormulas.secant, `${at}/secant`, { kL });
  if (inSpan) r.formula(secondOrderFormulas.CmSecant, `${at}/Cmsec`, { psi, kL });
  else r.formula(secondOrderFormulas.CmSecantEnd, `${at}/Cmsec`, { kL });
  const CmB1 = r.formula(secondOrderFormulas.CmAmplifier, `${at}/CmB1`, {
    amplification,
    alpha,
    Pr,
    Pe1,
  });
  return { kL, Mmax, inSpan, zmax, amplification, CmB1 };
}

/** Second-order moments at the quarter points, for Cb. */
export const secondOrderQuarters = (
  r: Recorder,
  at: string,
  MA: Quantity,
  MB: Quantity,
  kL: Quantity,
) => ({
  MA4: r.formula(secondOrderFormulas.quarterA, `${at}/MA`, { MA, MB, kL }),
  MB4: r.formula(secondOrderFormulas.quarterB, `${at}/MB`, { MA, MB, kL }),
  MC4: r.formula(secondOrderFormulas.quarterC, `${at}/MC`, { MA, MB, kL }),
});
