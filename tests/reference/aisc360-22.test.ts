import { readdirSync } from 'node:fs';
import { evaluate } from 'mathjs';
import { describe, expect, it } from 'vitest';
import {
  type Expected,
  PUBLISHED_CASES,
  publishedInput,
} from '#shared/published-cases/published-cases.ts';
import { inUnit } from './in-unit.ts';
import { roundsTo } from './printed-digits.ts';
import { firstMember, recordOf, valueAt } from './run-input.ts';

/*
 * Published examples through the whole engine. Each file names its source. `fromInputs` is the
 * example's chain worked again from its inputs, without rounding on the way, by hand and with
 * another program (the working stands beside it): the engine agrees to 0.05 %. `printed` is what
 * the source prints: the engine's value rounds to it, or, where the source rounds on the way,
 * `explained` gives the printed intermediates that lead to it.
 */
const publishedFrom = (base: number, e: Expected): number =>
  e.derive === undefined
    ? inUnit(base, e.unit)
    : Number(evaluate(e.derive, { x: inUnit(base, e.lineUnit ?? '') }));

it('has every published case of the folder', () => {
  const folder = new URL('../../shared/published-cases/aisc360-22/', import.meta.url);
  const other = ['equations.json', 'tables-w.json'];
  const files = readdirSync(folder).filter((file) => !other.includes(file));
  expect(PUBLISHED_CASES).toHaveLength(files.length);
  expect(new Set(PUBLISHED_CASES).size).toBe(files.length);
  expect(files.length).toBeGreaterThanOrEqual(43);
});

for (const data of PUBLISHED_CASES)
  for (const design of ['LRFD', 'ASD'] as const) {
    const input = publishedInput(data, design);
    if (input === null) continue;
    describe(`Design Examples v16.0, ${data.id}, ${design}`, () => {
      const member = firstMember(recordOf(input));
      for (const e of data.expected.filter((x) => x.method === 'nominal' || x.method === design))
        it(`${e.what}: ${e.printed} ${e.unit} at ${e.line}`, () => {
          const value = publishedFrom(valueAt(member, e.line), e);
          expect(
            Math.abs(value / e.fromInputs - 1),
            `${value}, by hand ${e.fromInputs}`,
          ).toBeLessThan(5e-4);
          const source = e.explained ? Number(evaluate(e.explained.expression)) : value;
          expect(roundsTo(source, e.printed), `${source} does not print as ${e.printed}`).toBe(
            true,
          );
        });
    });
  }
