import { isValued, type Line, type LineKind, type LineOf } from '#shared/calc/line.ts';
import { bookNamed, symbolNamed } from '#shared/standards/library.ts';
import { checkCheck } from './check.ts';
import { checkChoice } from './choice.ts';
import { checkComparison } from './comparison.ts';
import { checkFormula } from './formula.ts';
import { checkGiven } from './given.ts';
import { checkGoverning } from './governing.ts';
import type { LineCheck, LineContext } from './line-context.ts';
import { checkLookup } from './lookup.ts';
import { checkRoot } from './root.ts';
import { checkStatement } from './statement.ts';

/** Nothing to evaluate: what a notice does is in the verdicts, its words in the run. */
const nothing = (): Iterable<string> => [];

const CHECKS = {
  given: checkGiven,
  statement: checkStatement,
  lookup: checkLookup,
  formula: checkFormula,
  choice: checkChoice,
  governing: checkGoverning,
  check: checkCheck,
  comparison: checkComparison,
  root: checkRoot,
  notice: nothing,
  section: nothing,
} as const satisfies { [K in LineKind]: LineCheck<LineOf<K>> };

/** Reasons why one line does not follow from the lines before it, the books and the tables. */
export function* checkLine(context: LineContext): Iterable<string> {
  const { line } = context.placed;
  if (line.clause && !bookNamed(line.clause.book))
    yield `cites the book ${line.clause.book}, which is not here`;
  if (isValued(line) && symbolNamed(line.symbol)?.dimension !== line.dimension)
    yield `names its value ${line.symbol}, which no book has as ${line.dimension}`;
  yield* (CHECKS[line.kind] as LineCheck<Line>)(line, context);
}
