import type { Condition, LineOf, Side } from '#shared/calc/line.ts';
import { type LineContext, missing } from './line-context.ts';
import { sameNumber } from './same-number.ts';

type Value = number | string;

const same = (l: Value, r: Value): boolean =>
  typeof l === 'number' && typeof r === 'number' ? sameNumber(l, r) : l === r;

const RELATIONS: Readonly<Record<Condition['relation'], (l: Value, r: Value) => boolean>> = {
  '<': (l, r) => l < r && !same(l, r),
  '<=': (l, r) => l < r || same(l, r),
  '>': (l, r) => l > r && !same(l, r),
  '>=': (l, r) => l > r || same(l, r),
  '=': same,
  is: (l, r) => l === r,
};

/** A choice: each condition is as true as it says, the first true one is the last tried, and taken. */
export function* checkChoice(line: LineOf<'choice'>, context: LineContext): Iterable<string> {
  const holding: boolean[] = [];
  for (const [index, condition] of line.tried.entries()) {
    const [left, right] = [condition.left, condition.right].map((s) => sideValue(s, context));
    if (left === undefined || right === undefined) {
      for (const side of [condition.left, condition.right])
        if ('ref' in side && sideValue(side, context) === undefined) yield missing(side.ref);
      return;
    }
    if (typeof left !== typeof right) {
      yield `compares a number with words in its condition ${index + 1}`;
      return;
    }
    const holds = RELATIONS[condition.relation](left, right);
    holding.push(holds);
    if (holds !== condition.holds)
      yield `says that ${left} ${condition.relation} ${right} is ${condition.holds}`;
  }
  const taken = holding.indexOf(true);
  if (taken >= 0 && taken < line.tried.length - 1)
    yield `tries on after its condition ${taken + 1}, which holds`;
  const outcome = line.tried[taken]?.outcome ?? line.otherwise;
  if (outcome !== line.outcome) yield `takes "${line.outcome}", its conditions give "${outcome}"`;
}

function sideValue(side: Side, { valued }: LineContext): Value | undefined {
  if ('words' in side) return side.words;
  return 'constant' in side ? side.constant : valued(side.ref)?.value;
}
