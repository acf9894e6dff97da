import type { FormulaText } from '../../calc/formula.ts';
import type { LineOf } from '../../calc/line.ts';
import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// H1.1 flexure and compression; H1.2 the same equations with tension, H1.3(a) with the strengths in
// the plane of bending. Terms that are zero are left out of the equations; the number stays.
const AXIAL = { Pr: 'force', Pc: 'force' } as const;
const MAJOR = { Mrx: 'moment', Mcx: 'moment' } as const;
const MINOR = { Mry: 'moment', Mcy: 'moment' } as const;

/** The clause that sends to H1-1a and H1-1b: H1.1 compression, H1.2 tension, H1.3 in the plane. */
export type InteractionClause = 'H1.1' | 'H1.2' | 'H1.3';

const VALIDITY = { 'H1-1a': 'where Pr/Pc ≥ 0.2', 'H1-1b': 'where Pr/Pc < 0.2' } as const;

/** `suffix` tells the ids of one clause from those of the others. */
function interactionFormulas(number: InteractionClause, suffix: string) {
  const one = (
    id: string,
    equation: keyof typeof VALIDITY,
    title: string,
    expression: string,
    operands: FormulaText['operands'],
  ) =>
    formula({
      ...{ id: `${id}${suffix}`, clause: number, equation, title, symbol: 'ratio' },
      ...{ dimension: 'none', expression, operands, prints: 'display', ratio: true },
      validity: VALIDITY[equation],
    });
  const noMinor = 'Interaction, no minor-axis moment';
  const noMajor = 'Interaction, no major-axis moment';
  const x = { ...AXIAL, ...MAJOR };
  const y = { ...AXIAL, ...MINOR };
  const both = { ...x, ...MINOR };
  return {
    axialShare: formula({
      id: `H1-Pr/Pc${suffix}`,
      clause: number,
      title: 'Use of the axial strength',
      symbol: 'PrPc',
      dimension: 'none',
      expression: 'Pr/Pc',
      operands: AXIAL,
      prints: 'display',
    }),
    a: one('H1-1a', 'H1-1a', 'Interaction', 'Pr/Pc+8/9*(Mrx/Mcx+Mry/Mcy)', both),
    b: one('H1-1b', 'H1-1b', 'Interaction', 'Pr/(2*Pc)+(Mrx/Mcx+Mry/Mcy)', both),
    aMajor: one('H1-1a-x', 'H1-1a', noMinor, 'Pr/Pc+8/9*(Mrx/Mcx)', x),
    bMajor: one('H1-1b-x', 'H1-1b', noMinor, 'Pr/(2*Pc)+Mrx/Mcx', x),
    aMinor: one('H1-1a-y', 'H1-1a', noMajor, 'Pr/Pc+8/9*(Mry/Mcy)', y),
    bMinor: one('H1-1b-y', 'H1-1b', noMajor, 'Pr/(2*Pc)+Mry/Mcy', y),
  };
}

const FORMULAS = {
  'H1.1': interactionFormulas('H1.1', ''),
  'H1.2': interactionFormulas('H1.2', '-tension'),
  'H1.3': interactionFormulas('H1.3', '-plane'),
};

const biaxial = formula({
  id: 'H1-1b-M',
  clause: 'H1.1',
  equation: 'H1-1b',
  title: 'Interaction, no axial force',
  symbol: 'ratio',
  dimension: 'none',
  expression: 'Mrx/Mcx+Mry/Mcy',
  operands: { ...MAJOR, ...MINOR },
  prints: 'display',
  ratio: true,
});

/** Every formula of this file, for the book. */
export const h1Formulas = [...Object.values(FORMULAS).flatMap((f) => Object.values(f)), biaxial];

/** One of the two moments against its strength. */
export interface Flexure {
  readonly Mr: Quantity;
  readonly Mc: Quantity;
}

/** The axial force against its strength; both positive, in compression and in tension. */
export interface Axial {
  readonly Pr: Quantity;
  readonly Pc: Quantity;
}

export interface Interaction {
  readonly ratio: Quantity;
  readonly equation: 'H1-1a' | 'H1-1b';
}

/**
 * H1-1a or H1-1b, decided on Pr/Pc ≥ 0.2; terms of a plane without moment, or of no axial force,
 * are left out of the equation. `at` is the key of the lines: `H1` for the check. null where fewer
 * than two of axial force and moments are present.
 */
export function interaction(
  r: Recorder,
  at: string,
  axial: Axial | null,
  x: Flexure | null,
  y: Flexure | null,
  number: InteractionClause = 'H1.1',
): Interaction | null {
  const moments = { ...(x && { Mrx: x.Mr, Mcx: x.Mc }), ...(y && { Mry: y.Mr, Mcy: y.Mc }) };
  if (!axial)
    return x && y ? { ratio: r.formula(biaxial, `${at}/ratio`, moments), equation: 'H1-1b' } : null;
  if (!x && !y) return null;
  const formulas = FORMULAS[number];
  const share = r.formula(formulas.axialShare, `${at}/PrPc`, { ...axial });
  const large =
    r.choice(
      `${at}/branch`,
      [{ left: share, relation: '>=', right: 0.2, outcome: 'H1-1a applies' }],
      'H1-1b applies',
      { title: 'Which interaction equation', clause: clause(number) },
    ) === 0;
  const [a, b] =
    x && y
      ? [formulas.a, formulas.b]
      : x
        ? [formulas.aMajor, formulas.bMajor]
        : [formulas.aMinor, formulas.bMinor];
  return {
    ratio: r.formula(large ? a : b, `${at}/ratio`, { ...axial, ...moments }),
    equation: large ? 'H1-1a' : 'H1-1b',
  };
}

/** The interaction against 1, and each strength by itself (H1-1b halves the axial term). */
export function interactionChecks(
  r: Recorder,
  axial: Axial | null,
  x: Flexure | null,
  y: Flexure | null,
  number: 'H1.1' | 'H1.2' = 'H1.1',
): LineOf<'check'>[] {
  const checks: LineOf<'check'>[] = [];
  const found = interaction(r, 'H1', axial, x, y, number);
  if (found)
    checks.push(
      r.check('H1/check', found.ratio, 1, {
        title: axial
          ? `Flexure and ${number === 'H1.2' ? 'tension' : 'compression'}`
          : 'Flexure about both axes',
        clause: clause(axial ? number : 'H1.1', found.equation),
      }),
    );
  checks.push(...separateChecks(r, axial, x, y, number));
  return checks;
}

/** Each strength against its own demand, as far as both are known. */
export function separateChecks(
  r: Recorder,
  axial: Axial | null,
  x: Flexure | null,
  y: Flexure | null,
  number: InteractionClause = 'H1.1',
): LineOf<'check'>[] {
  const checks: LineOf<'check'>[] = [];
  if (axial)
    checks.push(
      r.check(
        'H1/axial',
        axial.Pr,
        axial.Pc,
        number === 'H1.2'
          ? { title: 'Tension alone', clause: clause('D2') }
          : { title: 'Compression alone', clause: clause('E1') },
      ),
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
