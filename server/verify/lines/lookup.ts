import type { LineOf } from '#shared/calc/line.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import type { LineContext } from './line-context.ts';
import { publishedFor } from './published.ts';

/** A look-up: its place and its text are the shipped table's, its value is that text's. */
export function* checkLookup(line: LineOf<'lookup'>, context: LineContext): Iterable<string> {
  const read = parseQuantity(line.published, line.dimension);
  if (!read.ok) yield `published "${line.published}" ${read.reason}`;
  else if (read.quantity.value !== line.value)
    yield `is ${line.value} in base units, but "${line.published}" is ${read.quantity.value}`;
  const shipped = publishedFor(line, context);
  if (!shipped) {
    yield `is in no table shipped here (${line.table}, row ${line.row}, column ${line.column})`;
    return;
  }
  if (shipped.row !== line.row) yield `reads row ${line.row} in place of ${shipped.row}`;
  if (shipped.column !== line.column)
    yield `reads column ${line.column} in place of ${shipped.column}`;
  if (shipped.published !== line.published)
    yield `says "${line.published}", but the table has "${shipped.published}"`;
  if (shipped.tableSource !== line.tableSource) yield 'names another publication than the table';
}
