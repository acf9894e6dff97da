import { describe, expect, it } from 'vitest';
import type { Expected } from '#shared/published-cases/published-cases.ts';
import { type FlexureCase, majorOf } from './flexure-of.ts';
import { roundsTo } from './printed-digits.ts';
import { readPublished } from './published-cases.ts';

/*
 * Published flexural strengths of channels, HSS and pipe from the quantities that the examples print,
 * and the Manual's tables that they quote. `fromInputs` is the chain from the inputs. Table 3-13
 * confirms how Se is found: the ineffective width leaves the compression flange only, and the
 * neutral axis moves (removed from both flanges, the strength of HSS8×8×3/16 would be 45.3 kip ft).
 */
interface Case extends FlexureCase {
  readonly example: string;
  readonly name: string;
  readonly expected: readonly Expected[];
}
const { cases } = readPublished('flexure.json') as { readonly cases: readonly Case[] };

for (const c of cases)
  for (const method of ['LRFD', 'ASD'] as const)
    describe(`Design Examples v16.0, ${c.example}, ${c.name}, ${method}`, () => {
      const { at } = majorOf(c, method);
      for (const e of c.expected.filter((x) => x.method === 'nominal' || x.method === method))
        it(`${e.what}: ${e.printed} ${e.unit} at ${e.line}`, () => {
          const value = at(e.line, e.unit);
          expect(Math.abs(value / e.fromInputs - 1), `${value}`).toBeLessThan(1e-6);
          expect(roundsTo(value, e.printed), `${value} is not ${e.printed}`).toBe(true);
        });
    });
