import type { Formula } from '#shared/calc/formula.ts';
import type { LineOf } from '#shared/calc/line.ts';
import { evaluatePrecisely, reproduces, symbolsIn } from '../evaluate-precisely.ts';
import { type LineContext, missing } from './line-context.ts';

type Computed = LineOf<'formula'> | LineOf<'root'>;

/** A formula line: the book's formula of that id, complete operands, the value it gives. */
export function* checkFormula(line: LineOf<'formula'>, context: LineContext): Iterable<string> {
  const formula = context.formulaNamed(line.formula);
  if (!formula) {
    yield `uses ${line.formula}, which is in no book`;
    return;
  }
  yield* bookProblems(line, formula);
  if (formula.dimension !== line.dimension)
    yield `is ${line.dimension}, but ${formula.id} gives ${formula.dimension}`;
  if (formula.prints !== line.prints) yield `prints in ${line.prints} units, against the book`;
  const operands = yield* operandValues(line, formula, context, null);
  if (!operands) return;
  if (!reproduces(line.expression, operands, line.value))
    yield `is ${line.value}, its operands give ${evaluatePrecisely(line.expression, operands)}`;
}

/** Text, clause and equation number as the book has them. */
export function* bookProblems(line: Computed, formula: Formula): Iterable<string> {
  const { text } = formula.expression;
  if (line.expression !== text)
    yield `has the expression ${line.expression}, but ${formula.id} is ${text}`;
  const { book, clause, equation } = formula;
  const own = line.clause;
  if (own?.book !== book || own.clause !== clause || own.equation !== equation)
    yield `cites ${cited(own)}, but ${formula.id} stands in ${cited(formula)}`;
}

const cited = (at: { clause: string; equation: string | null } | null): string =>
  at === null ? 'no clause' : [at.clause, at.equation].filter(Boolean).join(', ');

/** Values of the operands by symbol; null, with reasons, where they are not complete. */
export function* operandValues(
  line: Computed,
  formula: Formula,
  { valued }: LineContext,
  unknown: string | null,
): Generator<string, Record<string, number> | null> {
  const declared = Object.keys(formula.operands).filter((name) => name !== unknown);
  const names = Object.keys(line.operands);
  const lacking = declared.filter((name) => !Object.hasOwn(line.operands, name));
  const extra = names.filter((name) => !declared.includes(name));
  if (lacking.length > 0) yield `lacks the operand ${lacking.join(', ')}`;
  if (extra.length > 0) yield `has the operand ${extra.join(', ')}, which its formula doesn't use`;
  const values: Record<string, number> = {};
  let complete = lacking.length === 0;
  for (const [name, { ref, symbol }] of Object.entries(line.operands)) {
    const operand = valued(ref);
    if (!operand) {
      yield missing(ref);
      complete = false;
      continue;
    }
    values[name] = operand.value;
    if (operand.symbol !== symbol)
      yield `prints its operand ${name} as ${symbol}, but ${ref} is ${operand.symbol}`;
    const wanted = formula.operands[name];
    if (wanted !== undefined && operand.dimension !== wanted)
      yield `takes ${ref} as ${name}, which is ${operand.dimension}, not ${wanted}`;
  }
  const unbound = [...symbolsIn(line.expression)].filter(
    (name) => name !== unknown && !Object.hasOwn(values, name),
  );
  return complete && unbound.length === 0 ? values : null;
}
