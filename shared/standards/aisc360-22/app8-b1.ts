import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// Appendix 8.1.2: Cm and the multiplier B1. Every function writes under `at`, such as `App8/x`.
const CM = { clause: 'App. 8.1.2', symbol: 'Cm', dimension: 'none' } as const;
const TRANSVERSE = 'Equivalent uniform moment factor, load between the supports';
const tableRow = (id: string, expression: string) =>
  formula({
    ...CM,
    ...{ id, clause: 'Commentary App. 8.1.2', title: TRANSVERSE, expression },
    operands: { rho: 'none' },
  });

export const app8B1Formulas = {
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
    ...CM,
    id: 'A-8-4',
    equation: 'A-8-4',
    title: 'Equivalent uniform moment factor',
    expression: '0.6-0.4*M1M2',
    operands: { M1M2: 'none' },
    validity: 'without load between the supports',
  }),
  CmTransverse: formula({
    ...CM,
    ...{ id: 'App.8-Cm-transverse', title: TRANSVERSE, expression: '1', operands: {} },
  }),
  // The column Cm of Commentary Table C-A-8.1, whose six rows have these four expressions.
  CmTable0: formula({
    ...CM,
    ...{ id: 'C-A-8.1-0', clause: 'Commentary App. 8.1.2', title: TRANSVERSE },
    ...{ expression: '1', operands: {} },
  }),
  CmTable2: tableRow('C-A-8.1-2', '1-0.2*rho'),
  CmTable3: tableRow('C-A-8.1-3', '1-0.3*rho'),
  CmTable4: tableRow('C-A-8.1-4', '1-0.4*rho'),
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
    validity: 'where αPr < Pe1',
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
  B1tension: formula({
    id: 'App.8-B1-tension',
    clause: 'App. 8.1.2',
    title: 'Multiplier of a member not in compression',
    symbol: 'B1',
    dimension: 'none',
    expression: '1',
    operands: {},
  }),
};

/** Ends and load of the rows of Commentary Table C-A-8.1. */
export const TRANSVERSE_ROWS = {
  'simple-uniform': {
    words: 'both ends simply supported, uniform load',
    formula: app8B1Formulas.CmTable0,
    restrained: false,
  },
  'fixed-pinned-uniform': {
    words: 'one end fixed and one pinned, uniform load',
    formula: app8B1Formulas.CmTable4,
    restrained: true,
  },
  'fixed-uniform': {
    words: 'both ends fixed, uniform load',
    formula: app8B1Formulas.CmTable4,
    restrained: true,
  },
  'simple-central': {
    words: 'both ends simply supported, load at midspan',
    formula: app8B1Formulas.CmTable2,
    restrained: false,
  },
  'fixed-pinned-central': {
    words: 'one end fixed and one pinned, load at midspan',
    formula: app8B1Formulas.CmTable3,
    restrained: true,
  },
  'fixed-central': {
    words: 'both ends fixed, load at midspan',
    formula: app8B1Formulas.CmTable2,
    restrained: true,
  },
} as const;
export type TransverseRow = keyof typeof TRANSVERSE_ROWS;

/**
 * A-8-4: no load between the supports. `psi` is the ratio of the first-order end moments without
 * translation, smaller over larger, positive in single curvature; the standard's M1/M2 is −ψ.
 */
export function CmEndMoments(r: Recorder, at: string, psi: Quantity): Quantity {
  const M1M2 = r.formula(app8B1Formulas.momentRatio, `${at}/M1M2`, { psi });
  return r.formula(app8B1Formulas.Cm, `${at}/Cm`, { M1M2 });
}

/**
 * 8.1.2 with load between the supports: Cm = 1, or the Cm of the row of Commentary Table C-A-8.1
 * that somebody chose for this member. `share` is αPr/Pe1, below 1.
 */
export function CmTransverse(
  r: Recorder,
  at: string,
  row: TransverseRow | null,
  share: Quantity,
): Quantity {
  if (row === null) return r.formula(app8B1Formulas.CmTransverse, `${at}/Cm`, {});
  const { words, formula: used, restrained } = TRANSVERSE_ROWS[row];
  const operands: Record<string, Quantity> = 'rho' in used.operands ? { rho: share } : {};
  const Cm = r.formula(used, `${at}/Cm`, operands, {
    title: `Equivalent uniform moment factor, Table C-A-8.1: ${words}`,
  });
  if (restrained)
    r.notice(
      `${at}/Cm/ends`,
      'note',
      'restrained-table-row',
      'The factors of the table for fixed ends belong to the critical load of the member with those ends (effective length factor 0.7 with one end fixed, 0.5 with both). Where the critical load here is that of pinned ends (factor 1), the multiplier is on the safe side. The moment it multiplies is the largest first-order moment with those ends, that at a fixed end included.',
      {
        title: 'Critical load of the table for fixed ends',
        clause: clause('Commentary App. 8.1.2', 'Table C-A-8.1'),
      },
    );
  return Cm;
}

/**
 * A-8-3, not less than 1, for Pr in compression and αPr below Pe1. Throws at or above the critical
 * load: whether the member is stable is asked before, and a multiplier beyond it is no number.
 */
export function multiplierB1(
  r: Recorder,
  at: string,
  q: {
    readonly alpha: Quantity;
    readonly Pr: Quantity;
    readonly Pe1: Quantity;
    readonly Cm: Quantity;
  },
): Quantity {
  if (q.alpha.value * q.Pr.value >= q.Pe1.value)
    throw new Error(`${at}: no multiplier B1 at or above the critical load`);
  const trial = r.formula(app8B1Formulas.B1, `${at}/B1/trial`, { ...q });
  const taken = r.choice(
    `${at}/B1/limit`,
    [{ left: trial, relation: '>=', right: 1, outcome: 'the multiplier stands as computed' }],
    'the multiplier is 1',
    { title: 'Lower limit of the multiplier', clause: clause('App. 8.1.2', 'A-8-3') },
  );
  return taken === 0 ? trial : r.formula(app8B1Formulas.B1least, `${at}/B1`, {});
}

/** 8.1.2: B1 = 1 for a member in tension or without axial force. */
export const multiplierB1Tension = (r: Recorder, at: string): Quantity =>
  r.formula(app8B1Formulas.B1tension, `${at}/B1`, {});
