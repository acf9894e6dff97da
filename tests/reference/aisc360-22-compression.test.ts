import { evaluate } from 'mathjs';
import { describe, expect, it } from 'vitest';
import type { Expected } from '#shared/published-cases/published-cases.ts';
import { formulaNamed } from '#shared/standards/library.ts';
import { type CompressionCase, compressionOf, sizeOf, type Texts } from './compression-of.ts';
import { inUnit } from './in-unit.ts';
import { roundsTo } from './printed-digits.ts';
import { readPublished } from './published-cases.ts';

/*
 * Published strengths of sections other than rolled W shapes, from the quantities that the examples
 * print. `fromInputs` and `explained` as for whole members. E.13 (two tees joined by connectors) is
 * outside the scope as a member: E6 and rows 3 and 4 of Table B4.1a are not in the book; its
 * equations of E3, E4 and E7 run singly. The slenderness of E.10 is not printed in the source.
 */
interface Case extends CompressionCase {
  readonly example: string;
  readonly name: string;
  readonly expected: readonly Expected[];
}
interface Equation {
  readonly example: string;
  readonly what: string;
  readonly formula: string;
  readonly operands: Texts;
  readonly unit: string;
  readonly printed: string;
  readonly fromInputs: number;
}
const data = readPublished('compression.json') as {
  readonly cases: readonly Case[];
  readonly formulas: readonly Equation[];
};

for (const c of data.cases)
  for (const method of ['LRFD', 'ASD'] as const)
    describe(`Design Examples v16.0, ${c.example}, ${c.name}, ${method}`, () => {
      const { at } = compressionOf(c, method);
      for (const e of c.expected.filter((x) => x.method === 'nominal' || x.method === method))
        it(`${e.what}: ${e.printed} ${e.unit} at ${e.line}`, () => {
          const value = at(e.line, e.unit);
          expect(Math.abs(value / e.fromInputs - 1), `${value}`).toBeLessThan(1e-6);
          const source = e.explained ? Number(evaluate(e.explained.expression)) : value;
          expect(roundsTo(source, e.printed), `${source} is not ${e.printed}`).toBe(true);
        });
    });

describe('Design Examples v16.0, single equations of two joined tees', () => {
  for (const row of data.formulas)
    it(`${row.example}: ${row.what} = ${row.printed} ${row.unit} by ${row.formula}`, () => {
      const operands = Object.fromEntries(
        Object.entries(row.operands).map(([name, text]) => [name, sizeOf(text).value]),
      );
      const value = formulaNamed(row.formula)?.expression.evaluate(operands) ?? Number.NaN;
      expect(Math.abs(inUnit(value, row.unit) / row.fromInputs - 1)).toBeLessThan(1e-6);
      expect(roundsTo(inUnit(value, row.unit), row.printed), `${value}`).toBe(true);
    });
});
