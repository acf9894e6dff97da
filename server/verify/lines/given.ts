import { canonicalText } from '#shared/calc/hashes.ts';
import type { LineOf } from '#shared/calc/line.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import { givenIn } from './given-in.ts';
import type { LineContext } from './line-context.ts';

/** A given value: its typed text reads as the value, and both are those of the input. */
export function* checkGiven(line: LineOf<'given'>, context: LineContext): Iterable<string> {
  const read = parseQuantity(line.typed, line.dimension);
  if (!read.ok) yield `typed "${line.typed}" ${read.reason}`;
  else if (read.quantity.value !== line.value)
    yield `is ${line.value} in base units, but "${line.typed}" is ${read.quantity.value}`;
  const { input, basis, placed } = context;
  if (!input || !basis) return;
  const given = givenIn(basis, input, placed.combination, line.key);
  if (!given) {
    yield 'is not among the values of the input';
    return;
  }
  if (given.text !== line.typed) yield `says "${line.typed}", but the input says "${given.text}"`;
  if (given.confirmed !== line.confirmed)
    yield `says ${stateWord(line.confirmed)}, but the input says ${stateWord(given.confirmed)}`;
  if (canonicalText(given.source) !== canonicalText(line.source))
    yield 'names another source than the input';
}

export const stateWord = (confirmed: boolean): string =>
  confirmed ? 'confirmed' : 'not confirmed';
