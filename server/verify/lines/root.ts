import type { LineOf } from '#shared/calc/line.ts';
import { evaluatePrecisely, reproduces } from '../evaluate-precisely.ts';
import { bookProblems, operandValues } from './formula.ts';
import type { LineContext } from './line-context.ts';

/** The equation changes sign within this share of the root on either side. */
const WITHIN = 1e-9;

/** A root: the book's equation changes its sign at the root, inside the bracket. */
export function* checkRoot(line: LineOf<'root'>, context: LineContext): Iterable<string> {
  const formula = context.formulaNamed(line.formula);
  if (!formula) {
    yield `uses ${line.formula}, which is in no book`;
    return;
  }
  yield* bookProblems(line, formula);
  const operands = yield* operandValues(line, formula, context, line.unknown);
  if (!operands) return;
  const at = (x: number): number =>
    evaluatePrecisely(line.expression, { ...operands, [line.unknown]: x });
  const [low, high] = line.bracket;
  if (line.value < low || line.value > high) yield 'lies outside its bracket';
  if (!(at(low) * at(high) <= 0)) yield 'has a bracket without a change of sign';
  const step = Math.abs(line.value) * WITHIN;
  if (!(at(line.value - step) * at(line.value + step) <= 0))
    yield `is ${line.value}, where the equation does not change its sign`;
  if (!reproduces(line.expression, { ...operands, [line.unknown]: line.value }, line.residual))
    yield `says the residual ${line.residual}, the equation leaves ${at(line.value)}`;
}
