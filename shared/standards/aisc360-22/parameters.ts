import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause } from './writer.ts';

export type Design = 'LRFD' | 'ASD';

export const SPECIFICATION =
  'ANSI/AISC 360-22, Specification for Structural Steel Buildings, August 1, 2022';

/** Constants that clauses give, by design method where it differs. */
const CONSTANTS = {
  compression: {
    clause: 'E1',
    title: 'Compression',
    LRFD: ['phic', '0.90'],
    ASD: ['Omegac', '1.67'],
  },
  flexure: { clause: 'F1', title: 'Flexure', LRFD: ['phib', '0.90'], ASD: ['Omegab', '1.67'] },
  loadLevel: {
    clause: 'C2.1',
    title: 'Load level of the stability checks',
    LRFD: ['alpha', '1.0'],
    ASD: ['alpha', '1.6'],
  },
} as const;

/** φ or Ω of E1 and F1(a), α of C2.1(d), as a line. */
export function methodConstant(
  r: Recorder,
  name: keyof typeof CONSTANTS,
  design: Design,
): Quantity {
  const entry = CONSTANTS[name];
  const [symbol, published] = entry[design];
  return r.lookup(
    `${entry.clause}/${symbol}`,
    symbol,
    'none',
    {
      value: Number(published),
      published,
      table: `Clause ${entry.clause}`,
      row: design,
      column: symbol,
      tableSource: SPECIFICATION,
    },
    { title: `${entry.title}, ${design}`, clause: clause(entry.clause) },
  );
}

/** c1 and c2 of Table E7.1 for an element kind. */
export const EFFECTIVE_WIDTH = {
  web: { row: '(a) stiffened elements except walls of HSS', c1: '0.18', c2: '1.31' },
  flange: { row: '(c) all other elements', c1: '0.22', c2: '1.49' },
} as const;

export function effectiveWidthConstants(
  r: Recorder,
  element: 'web' | 'flange',
): { c1: Quantity; c2: Quantity } {
  const entry = EFFECTIVE_WIDTH[element];
  const read = (column: 'c1' | 'c2') =>
    r.lookup(
      `E7/${element}/${column}`,
      column,
      'none',
      {
        value: Number(entry[column]),
        published: entry[column],
        table: 'Table E7.1',
        row: entry.row,
        column,
        tableSource: SPECIFICATION,
      },
      {
        title: column === 'c1' ? 'Imperfection factor' : 'Effective-width factor',
        clause: clause('E7.1', 'Table E7.1'),
      },
    );
  return { c1: read('c1'), c2: read('c2') };
}
