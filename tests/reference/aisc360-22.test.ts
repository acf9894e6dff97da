import { readdirSync, readFileSync } from 'node:fs';
import { evaluate } from 'mathjs';
import { describe, expect, it } from 'vitest';
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
interface Expected {
  readonly what: string;
  readonly method: 'LRFD' | 'ASD' | 'nominal';
  readonly line: string;
  /** The published quantity from the line's value x in `lineUnit`. */
  readonly derive?: string;
  readonly lineUnit?: string;
  readonly unit: string;
  readonly printed: string;
  readonly fromInputs: number;
  readonly working: string;
  readonly explained?: { readonly by: string; readonly expression: string };
}
interface Case {
  readonly id: string;
  readonly source: { readonly edition: string; readonly example: string; readonly page: string };
  readonly analysis: unknown;
  readonly member: Record<string, unknown>;
  readonly combinations: Record<'LRFD' | 'ASD', readonly unknown[]>;
  readonly expected: readonly Expected[];
}

const folder = new URL('./aisc360-22/', import.meta.url);
const read = (file: string): unknown => JSON.parse(readFileSync(new URL(file, folder), 'utf8'));
const isCase = (data: unknown): data is Case =>
  typeof data === 'object' && data !== null && 'combinations' in data;
const cases = readdirSync(folder)
  .map((file) => ({ file, data: read(file) }))
  .filter((c): c is { file: string; data: Case } => isCase(c.data));

const publishedFrom = (base: number, e: Expected): number =>
  e.derive === undefined
    ? inUnit(base, e.unit)
    : Number(evaluate(e.derive, { x: inUnit(base, e.lineUnit ?? '') }));

it('has the published cases', () => {
  expect(cases.length).toBeGreaterThanOrEqual(18);
});

for (const { file, data } of cases)
  for (const design of ['LRFD', 'ASD'] as const) {
    if (data.combinations[design].length === 0) continue;
    describe(`Design Examples v16.0, ${data.source.example}, ${design} (${file})`, () => {
      const record = recordOf({
        format: 1,
        standard: 'aisc360-22',
        design,
        units: 'us',
        analysis: data.analysis,
        members: [{ ...data.member, combinations: data.combinations[design] }],
      });
      for (const e of data.expected.filter((x) => x.method === 'nominal' || x.method === design))
        it(`${e.what}: ${e.printed} ${e.unit} at ${e.line}`, () => {
          const value = publishedFrom(valueAt(firstMember(record), e.line), e);
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
