import type { CalculationRecord } from '../calc/record.ts';

type Analysis = CalculationRecord['analysis'];

/** Methods of analysis with the clause of ANSI/AISC 360-22 that gives each. */
export const METHOD_WORDS: Record<Analysis['method'], string> = {
  direct: 'direct analysis method (C2, C3)',
  'effective-length': 'effective length method (App. 7.2)',
  'first-order': 'first-order analysis method (App. 7.3)',
};

export function secondOrderWords(analysis: Analysis): string {
  switch (analysis.secondOrder) {
    case 'from-analysis':
      return analysis.includesMemberEffect
        ? 'from the analysis, with the effect of axial force between the ends (P-δ) in it'
        : 'from the analysis, without the effect of axial force between the ends (P-δ); that is added here';
    case 'amplified':
      return 'first-order moments amplified by B1 (App. 8)';
    case 'exact':
      return 'exact elastic solution of the member under its end moments';
  }
}

export const DESIGN_WORDS: Record<CalculationRecord['design'], string> = {
  LRFD: 'LRFD, load and resistance factor design',
  ASD: 'ASD, allowable strength design',
};
