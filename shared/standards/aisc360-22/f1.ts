import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { Design } from './parameters.ts';
import { formula } from './writer.ts';

// F1 general: available strength; Cb from the moments at the quarter points of the unbraced segment.
const quarter = (id: string, title: string, symbol: string, expression: string) =>
  formula({
    id,
    clause: 'F1',
    equation: 'F1-1',
    title,
    symbol,
    dimension: 'moment',
    expression,
    operands: { MA: 'moment', MB: 'moment' },
    prints: 'display',
  });

export const f1Formulas = {
  quarterA: quarter(
    'F1-MA',
    'First-order moment at the first quarter point',
    'MA4',
    'abs(0.75*MA+0.25*MB)',
  ),
  quarterB: quarter('F1-MB', 'First-order moment at the middle', 'MB4', 'abs(0.5*MA+0.5*MB)'),
  quarterC: quarter(
    'F1-MC',
    'First-order moment at the third quarter point',
    'MC4',
    'abs(0.25*MA+0.75*MB)',
  ),
  CbOne: formula({
    id: 'F1-Cb-1',
    clause: 'F1',
    title: 'Modification factor, taken as 1',
    symbol: 'Cb',
    dimension: 'none',
    expression: '1',
    operands: {},
  }),
  Cb: formula({
    id: 'F1-1',
    clause: 'F1',
    equation: 'F1-1',
    title: 'Lateral-torsional buckling modification factor',
    symbol: 'Cb',
    dimension: 'none',
    expression: '12.5*Mmax/(2.5*Mmax+3*MA4+4*MB4+3*MC4)',
    operands: { Mmax: 'moment', MA4: 'moment', MB4: 'moment', MC4: 'moment' },
    prints: 'display',
    validity: 'for doubly symmetric members, and for others in single curvature',
  }),
  availableLrfd: formula({
    id: 'F1-LRFD',
    clause: 'F1',
    title: 'Design flexural strength',
    symbol: 'Mc',
    dimension: 'moment',
    expression: 'phib*Mn',
    operands: { phib: 'none', Mn: 'moment' },
    prints: 'display',
  }),
  availableAsd: formula({
    id: 'F1-ASD',
    clause: 'F1',
    title: 'Allowable flexural strength',
    symbol: 'Mc',
    dimension: 'moment',
    expression: 'Mn/Omegab',
    operands: { Omegab: 'none', Mn: 'moment' },
    prints: 'display',
  }),
};

/**
 * F1-1 from the largest moment and those at the quarter points of the segment, all positive. For
 * doubly symmetric members, and singly symmetric ones in single curvature. A singly symmetric
 * member in reverse curvature has the strength of both flanges checked, each with the moment that
 * compresses it: call `majorSection` once for either flange.
 */
export const modificationFactor = (
  r: Recorder,
  at: string,
  q: { Mmax: Quantity; MA4: Quantity; MB4: Quantity; MC4: Quantity },
  named: { title?: string; symbol?: string } = {},
): Quantity => r.formula(f1Formulas.Cb, `${at}/Cb`, { ...q }, named);

/** Quarter-point moments of a straight first-order diagram between the ends of the segment. */
export const firstOrderQuarters = (r: Recorder, at: string, MA: Quantity, MB: Quantity) => ({
  MA4: r.formula(f1Formulas.quarterA, `${at}/MA`, { MA, MB }),
  MB4: r.formula(f1Formulas.quarterB, `${at}/MB`, { MA, MB }),
  MC4: r.formula(f1Formulas.quarterC, `${at}/MC`, { MA, MB }),
});

/** φb Mn or Mn/Ωb of F1(a) about one axis; `constant` is φb or Ωb. */
export function availableFlexure(
  r: Recorder,
  axis: 'x' | 'y',
  design: Design,
  constant: Quantity,
  Mn: Quantity,
  named: { at?: string; what?: string } = {},
): Quantity {
  const { at = `F1/${axis}`, what = 'flexural strength' } = named;
  const more = {
    symbol: `Mc${axis}`,
    title: `${design === 'LRFD' ? 'Design' : 'Allowable'} ${what}, ${axis === 'x' ? 'major' : 'minor'} axis`,
  };
  return design === 'LRFD'
    ? r.formula(f1Formulas.availableLrfd, `${at}/Mc`, { phib: constant, Mn }, more)
    : r.formula(f1Formulas.availableAsd, `${at}/Mc`, { Omegab: constant, Mn }, more);
}
