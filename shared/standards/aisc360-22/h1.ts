import type { LineOf } from '../../calc/line.ts';
import type { Quantity, Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// H1.1 doubly symmetric members in flexure and compression.
export const h1Formulas = {
  axialShare: formula({
    id: 'H1-Pr/Pc',
    clause: 'H1.1',
    title: 'Use of the axial strength',
    symbol: 'PrPc',
    dimension: 'none',
    expression: 'Pr/Pc',
    operands: { Pr: 'force', Pc: 'force' },
    prints: 'display',
  }),
  a: formula({
    id: 'H1-1a',
    clause: 'H1.1',
    equation: 'H1-1a',
    title: 'Interaction',
    symbol: 'ratio',
    dimension: 'none',
    expression: 'Pr/Pc+8/9*(Mrx/Mcx+Mry/Mcy)',
    operands: {
      Pr: 'force',
      Pc: 'force',
      Mrx: 'moment',
      Mcx: 'moment',
      Mry: 'moment',
      Mcy: 'moment',
    },
    prints: 'display',
    ratio: true,
  }),
  b: formula({
    id: 'H1-1b',
    clause: 'H1.1',
    equation: 'H1-1b',
    title: 'Interaction',
    symbol: 'ratio',
    dimension: 'none',
    expression: 'Pr/(2*Pc)+(Mrx/Mcx+Mry/Mcy)',
    operands: {
      Pr: 'force',
      Pc: 'force',
      Mrx: 'moment',
      Mcx: 'moment',
      Mry: 'moment',
      Mcy: 'moment',
    },
    prints: 'display',
    ratio: true,
  }),
  aMajor: formula({
    id: 'H1-1a-x',
    clause: 'H1.1',
    equation: 'H1-1a',
    title: 'Interaction, no minor-axis moment',
    symbol: 'ratio',
    dimension: 'none',
    expression: 'Pr/Pc+8/9*(Mrx/Mcx)',
    operands: { Pr: 'force', Pc: 'force', Mrx: 'moment', Mcx: 'moment' },
    prints: 'display',
    ratio: true,
  }),
  bMajor: formula({
    id: 'H1-1b-x',
    clause: 'H1.1',
    equation: 'H1-1b',
    title: 'Interaction, no minor-axis moment',
    symbol: 'ratio',
    dimension: 'none',
    expression: 'Pr/(2*Pc)+Mrx/Mcx',
    operands: { Pr: 'force', Pc: 'force', Mrx: 'moment', Mcx: 'moment' },
    prints: 'display',
    ratio: true,
  }),
  aMinor: formula({
    id: 'H1-1a-y',
    clause: 'H1.1',
    equation: 'H1-1a',
    title: 'Interaction, no major-axis moment',
    symbol: 'ratio',
    dimension: 'none',
    expression: 'Pr/Pc+8/9*(Mry/Mcy)',
    operands: { Pr: 'force', Pc: 'force', Mry: 'moment', Mcy: 'moment' },
    prints: 'display',
    ratio: true,
  }),
  bMinor: formula({
    id: 'H1-1b-y',
    clause: 'H1.1',
    equation: 'H1-1b',
    title: 'Interaction, no major-axis moment',
    symbol: 'ratio',
    dimension: 'none',
    expression: 'Pr/(2*Pc)+Mry/Mcy',
    operands: { Pr: 'force', Pc: 'force', Mry: 'moment', Mcy: 'moment' },
    prints: 'display',
    ratio: true,
  }),
  biaxial: formula({
    id: 'H1-1b-M',
    clause: 'H1.1',
    equation: 'H1-1b',
    title: 'Interaction, no axial force',
    symbol: 'ratio',
    dimension: 'none',
    expression: 'Mrx/Mcx+Mry/Mcy',
    operands: { Mrx: 'moment', Mcx: 'moment', Mry: 'moment', Mcy: 'moment' },
    prints: 'display',
    ratio: true,
  }),
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
