import type { Formula } from '#shared/calc/formula.ts';
import type { Mutant } from './switchboard.ts';

const CONSTANT = /(?<![A-Za-z0-9_.])(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?/g;

/** A formula as 0, as its first operand, and with each constant of its text 1 % up and down. */
export function mutantsOf(formula: Formula): Mutant[] {
  const { id, expression } = formula;
  const text = expression.text;
  const made: Mutant[] = [];
  const add = (kind: Mutant['kind'], way: string, other: string) => {
    if (other !== text) made.push({ id: `${id} ${way}`, kind, at: id, text: other });
  };
  add('formula is 0', 'is 0', '0');
  const [first] = Object.keys(formula.operands);
  if (first) add('formula is its first operand', `is ${first}`, first);
  let place = 0;
  for (const found of text.matchAll(CONSTANT)) {
    place += 1;
    for (const factor of [1.01, 0.99]) {
      // A constant of nothing moves by a hundredth instead.
      const value = Number(found[0]) === 0 ? factor - 1 : Number(found[0]) * factor;
      const other = `${text.slice(0, found.index)}(${value})${text.slice(found.index + found[0].length)}`;
      const way = `${found[0]} (${place}) times ${factor}`;
      add('formula constant ±1 %', way, other);
    }
  }
  return made;
}
