import type { Source } from '../calc/line.ts';
import type { GivenValue } from '../calc/quantity.ts';
import type { DimensionName } from '../units/dimension.ts';
import { parseQuantity } from '../units/parse.ts';
import type { Stated } from './resolved.ts';

export const TYPED: Source = { kind: 'typed' };

// In N and mm: beyond these nothing is built, and products leave the range of numbers.
const SMALLEST = 1e-9;
const LARGEST = 1e15;

/** A quantity as INPUT.json writes it, with or without its source and state. */
export type Given =
  | string
  | number
  | { value: string | number; source?: Source | undefined; confirmed?: boolean | undefined };

/** Its text, source and state; a text alone is typed and not confirmed. */
export const partsOf = (given: Given): { text: string; source: Source; confirmed: boolean } =>
  typeof given === 'object'
    ? {
        text: String(given.value),
        source: given.source ?? TYPED,
        confirmed: given.confirmed ?? false,
      }
    : { text: String(given), source: TYPED, confirmed: false };

/** A word that may carry its source and state. */
export function stateOf<T extends string>(
  given: T | { value: T; source?: Source | undefined; confirmed?: boolean | undefined },
): Stated<T> {
  return typeof given === 'string'
    ? { value: given, source: TYPED, confirmed: false }
    : { value: given.value, source: given.source ?? TYPED, confirmed: given.confirmed ?? false };
}

/** Reads quantities of one member; what is wrong goes to `problem` with the path in the member. */
export type ReadQuantity = (
  path: string,
  given: Given | undefined,
  dimension: DimensionName,
) => GivenValue | null;

export const quantityReader =
  (problem: (path: string, message: string) => void): ReadQuantity =>
  (path, given, dimension) => {
    if (given === undefined) return null;
    const { text, source, confirmed } = partsOf(given);
    const parsed = parseQuantity(text, dimension);
    if (!parsed.ok) {
      problem(path, parsed.reason);
      return null;
    }
    const size = Math.abs(parsed.quantity.value);
    if (size !== 0 && (size < SMALLEST || size > LARGEST)) {
      problem(path, `is ${text}, which no member has; see the number and its unit`);
      return null;
    }
    return { value: parsed.quantity.value, text: parsed.quantity.text, source, confirmed };
  };
