import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// B4.1, Tables B4.1a and B4.1b: coefficient for slender flanges of built-up shapes and of F3 to F5.
export const kcFormulas = {
  trial: formula({
    id: 'B4.1-kc',
    clause: 'B4.1',
    title: 'Coefficient for slender flanges',
    symbol: 'kctrial',
    dimension: 'none',
    expression: '4/sqrt(lambdaw)',
    operands: { lambdaw: 'none' },
  }),
  least: formula({
    id: 'B4.1-kc-min',
    clause: 'B4.1',
    title: 'Least value of the coefficient',
    symbol: 'kcleast',
    dimension: 'none',
    expression: '0.35',
    operands: {},
  }),
  most: formula({
    id: 'B4.1-kc-max',
    clause: 'B4.1',
    title: 'Greatest value of the coefficient',
    symbol: 'kcmost',
    dimension: 'none',
    expression: '0.76',
    operands: {},
  }),
};

/** kc of Tables B4.1a and B4.1b from h/tw: 4/√(h/tw), within 0.35 and 0.76. Keys under `at`. */
export function coefficientKc(r: Recorder, at: string, lambdaw: Quantity): Quantity {
  const trial = r.formula(kcFormulas.trial, `${at}/kc/trial`, { lambdaw });
  const least = r.formula(kcFormulas.least, `${at}/kc/least`, {});
  const most = r.formula(kcFormulas.most, `${at}/kc/most`, {});
  const capped = r.governing(`${at}/kc/capped`, 'min', [trial, most], {
    title: 'kc, not more than 0.76',
    symbol: 'kc',
    clause: clause('B4.1'),
  });
  return r.governing(`${at}/kc`, 'max', [capped, least], {
    title: 'kc, not less than 0.35',
    symbol: 'kc',
    clause: clause('B4.1'),
  });
}
