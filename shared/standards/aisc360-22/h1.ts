import type { FormulaText } from '../../calc/formula.ts';
import type { LineOf } from '../../calc/line.ts';
import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// H1.1 doubly symmetric members in flexure and compression. Terms that are zero are left out of the
// equations; the equation number stays.
const AXIAL = { Pr: 'force', Pc: 'force' } as const;
const MAJOR = { Mrx: 'moment', Mcx: 'moment' } as const;
const MINOR = { Mry: 'moment', Mcy: 'moment' } as const;

const interactionFormula = (
  id: string,
  equation: string,
  title: string,
  expression: string,
  operands: FormulaText['operands'],
) =>
  formula({
    ...{ id, clause: 'H1.1', equation, title, symbol: 'ratio', dimension: 'none' },
    ...{ expression, operands, prints: 'display', ratio: true },
  });

const NO_MINOR = 'Interaction, no minor-axis moment';
const NO_MAJOR = 'Interaction, no major-axis moment';

export const h1Formulas = {
  axialShare: formula({
    id: 'H1-Pr/Pc',
    clause: 'H1.1',
    title: 'Use of the axial strength',
    symbol: 'PrPc',
    dimension: 'none',
    expression: 'Pr/Pc',
    operands: AXIAL,
    prints: 'display',
  }),
  a: interactionFormula('H1-1a', 'H1-1a', 'Interaction', 'Pr/Pc+8/9*(Mrx/Mcx+Mry/Mcy)', {
    ...AXIAL,
    ...MAJOR,
    ...MINOR,
  }),
  b: interactionFormula('H1-1b', 'H1-1b', 'Interaction', 'Pr/(2*Pc)+(Mrx/Mcx+Mry/Mcy)', {
    ...AXIAL,
    ...MAJOR,
    ...MINOR,
  }),
  aMajor: interactionFormula('H1-1a-x', 'H1-1a', NO_MINOR, 'Pr/Pc+8/9*(Mrx/Mcx)', {
    ...AXIAL,
    ...MAJOR,
  }),
  bMajor: interactionFormula('H1-1b-x', 'H1-1b', NO_MINOR, 'Pr/(2*Pc)+Mrx/Mcx', {
    ...AXIAL,
    ...MAJOR,
  }),
  aMinor: interactionFormula('H1-1a-y', 'H1-1a', NO_MAJOR, 'Pr/Pc+8/9*(Mry/Mcy)', {
    ...AXIAL,
    ...MINOR,
  }),
  bMinor: interactionFormula('H1-1b-y', 'H1-1b', NO_MAJOR, 'Pr/(2*Pc)+Mry/Mcy', {
    ...AXIAL,
    ...MINOR,
  }),
  biaxial: interactionFormula(
    'H1-1b-M',
    'H1-1b',
    'Interaction, no axial force',
    'Mrx/Mcx+Mry/Mcy',
    {
      ...MAJOR,
      ...MINOR,
    },
  ),
};

/** One of the two moments against its strength. */
export interface Flexure {
  readonly Mr: Quantity;
  readonly Mc: Quantity;
}

export interface Compression {
  readonly Pr: Quantity;
  readonly Pc: Quantity;
}

/**
 * H1-1a or H1-1b, decided on Pr/Pc ≥ 0.2; terms of a plane without moment, or of no axial force,
 * are left out of the equation. `at` is the key of the lines: `H1` for the check.
 */
export function interaction(
  r: Recorder,
  at: string,
  axial: Compression | null,
  x: Flexure | null,
  y: Flexure | null,
): Quantity | null {
  const moments = { ...(x && { Mrx: x.Mr, Mcx: x.Mc }), ...(y && { Mry: y.Mr, Mcy: y.Mc }) };
  if (!axial) return x && y ? r.formula(h1Formulas.biaxial, `${at}/ratio`, moments) : null;
  if (!x && !y) return null;
  const share = r.formula(h1Formulas.axialShare, `${at}/PrPc`, { ...axial });
  const large =
    r.choice(
      `${at}/branch`,
      [{ left: share, relation: '>=', right: 0.2, outcome: 'H1-1a applies' }],
      'H1-1b applies',
      { title: 'Which interaction equation', clause: clause('H1.1') },
    ) === 0;
  const used =
    x && y
      ? large
        ? h1Formulas.a
        : h1Formulas.b
      : x
        ? large
          ? h1Formulas.aMajor
          : h1Formulas.bMajor
        : large
          ? h1Formulas.aMinor
          : h1Formulas.bMinor;
  return r.formula(used, `${at}/ratio`, { ...axial, ...moments });
}

/** H1.1: the interaction against 1, and each strength by itself (H1-1b halves the axial term). */
export function interactionChecks(
  r: Recorder,
  axial: Compression | null,
  x: Flexure | null,
  y: Flexure | null,
): LineOf<'check'>[] {
  const checks: LineOf<'check'>[] = [];
  const ratio = interaction(r, 'H1', axial, x, y);
  if (ratio)
    checks.push(
      r.check('H1/check', ratio, 1, {
        title: axial ? 'Flexure and compression' : 'Flexure about both axes',
        clause: clause('H1.1', axial ? (checksEquation(r) ?? null) : 'H1-1b'),
      }),
    );
  checks.push(...separateChecks(r, axial, x, y));
  return checks;
}

/** Each strength against its own demand, as far as both are known. */
export function separateChecks(
  r: Recorder,
  axial: Compression | null,
  x: Flexure | null,
  y: Flexure | null,
): LineOf<'check'>[] {
  const checks: LineOf<'check'>[] = [];
  if (axial)
    checks.push(
      r.check('H1/axial', axial.Pr, axial.Pc, { title: 'Compression alone', clause: clause('E1') }),
    );
  if (x)
    checks.push(
      r.check('H1/x', x.Mr, x.Mc, { title: 'Major-axis flexure alone', clause: clause('F1') }),
    );
  if (y)
    checks.push(
      r.check('H1/y', y.Mr, y.Mc, { title: 'Minor-axis flexure alone', clause: clause('F1') }),
    );
  return checks;
}

/** Equation number of the interaction line just written. */
const checksEquation = (r: Recorder): string | null | undefined =>
  r.lines.findLast((l) => l.key === 'H1/ratio')?.clause?.equation;
