import { areEqual } from '../units/equal.ts';
import type { Condition, Side } from './line.ts';
import type { Quantity } from './quantity.ts';

/** A condition that a procedure tries: quantities, constants of the clause, or words. */
export interface Tried {
  readonly left: Quantity | number | string;
  readonly relation: Condition['relation'];
  readonly right: Quantity | number | string;
  readonly outcome: string;
}

const side = (s: Tried['left']): Side =>
  typeof s === 'number' ? { constant: s } : typeof s === 'string' ? { words: s } : { ref: s.ref };

const number = (s: Tried['left']): number =>
  typeof s === 'number' ? s : typeof s === 'string' ? Number.NaN : s.value;

/** Whether it holds; values that differ by rounding only are equal (`areEqual`). */
export function holds({ left, relation, right }: Tried): boolean {
  if (relation === 'is') return left === right;
  const [l, r] = [number(left), number(right)];
  const same = areEqual(l, r);
  return {
    '<': l < r && !same,
    '<=': l < r || same,
    '>': l > r && !same,
    '>=': l > r || same,
    '=': same,
  }[relation];
}

/** The condition as a line holds it. */
export const conditionOf = (tried: Tried): Condition => ({
  left: side(tried.left),
  relation: tried.relation,
  right: side(tried.right),
  holds: holds(tried),
  outcome: tried.outcome,
});
