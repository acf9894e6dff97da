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
  tensionYielding: {
    clause: 'D2',
    title: 'Tensile yielding',
    LRFD: ['phit', '0.90'],
    ASD: ['Omegat', '1.67'],
  },
  tensionRupture: {
    clause: 'D2',
    title: 'Tensile rupture',
    LRFD: ['phitu', '0.75'],
    ASD: ['Omegatu', '2.00'],
  },
  shear: { clause: 'G1', title: 'Shear', LRFD: ['phiv', '0.90'], ASD: ['Omegav', '1.67'] },
  shearStockyWeb: {
    clause: 'G2.1',
    title: 'Shear of a rolled I-shape with a stocky web',
    LRFD: ['phiv', '1.00'],
    ASD: ['Omegav', '1.50'],
  },
  loadLevel: {
    clause: 'C2.1',
    title: 'Load level of the stability checks',
    LRFD: ['alpha', '1.0'],
    ASD: ['alpha', '1.6'],
  },
} as const;

/**
 * φ or Ω of D2, E1, F1(a), G1 and G2.1(a), α of C2.1(d), as a line; under its clause, or under `at`
 * where a member has it twice.
 */
export function methodConstant(
  r: Recorder,
  name: keyof typeof CONSTANTS,
  design: Design,
  at?: string,
): Quantity {
  const entry = CONSTANTS[name];
  const [symbol, published] = entry[design];
  return r.lookup(
    `${at ?? entry.clause}/${symbol}`,
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
