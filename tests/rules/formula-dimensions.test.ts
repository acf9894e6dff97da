import { all, create, type Unit } from 'mathjs';
import { describe, expect, it } from 'vitest';
import type { Formula } from '#shared/calc/formula.ts';
import { BOOKS } from '#shared/standards/library.ts';
import { DIMENSIONS, type DimensionName } from '#shared/units/dimension.ts';
import { UNIT_SETS } from '#shared/units/unit-set.ts';
import { SERIES, same } from './printed-formula.ts';

/* Structural: the dimension of every formula of every book, and the units that it prints in. */
const formulas: readonly Formula[] = BOOKS.flatMap((b) => [...b.formulas.values()]);

const math = create(all ?? {});
math.import(SERIES);
const SYSTEMS = {
  'kip, in': { force: 'kip', length: 'inch' },
  'N, mm': { force: 'N', length: 'mm' },
} as const;

const unitOf = (dimension: DimensionName, system: keyof typeof SYSTEMS): string => {
  const { force, length } = DIMENSIONS[dimension];
  const names = SYSTEMS[system];
  return `${names.force}^${force} ${names.length}^${length}`;
};

// Sizes in N and mm that leave every formula finite.
const SIZES: Readonly<Record<DimensionName, number>> = {
  none: 0.43,
  angle: 0.9,
  length: 870,
  area: 13000,
  modulus: 1.9e6,
  inertia: 3.1e8,
  warping: 4.7e12,
  perLength: 0.0011,
  force: 2.3e5,
  stress: 345,
  moment: 2.1e8,
  rigidity: 6.3e13,
  lineLoad: 14,
  loadSlope: 0.011,
  rotationalStiffness: 3.7e9,
  deflection: 6.3,
};
const sized = (formula: Formula): Record<string, number> =>
  Object.fromEntries(
    Object.entries(formula.operands).map(([name, dimension], i) => [
      name,
      SIZES[dimension] * (1 + 0.13 * i),
    ]),
  );

describe('the dimension of every formula', () => {
  for (const formula of formulas)
    for (const system of Object.keys(SYSTEMS) as (keyof typeof SYSTEMS)[])
      it(`${formula.id} in ${system}`, () => {
        const base = sized(formula);
        const scope: Record<string, Unit | number> = { pi: Math.PI };
        for (const [name, dimension] of Object.entries(formula.operands)) {
          const { force, length } = DIMENSIONS[dimension];
          const value = base[name] ?? 0;
          if (force === 0 && length === 0) scope[name] = value;
          else
            scope[name] = math
              .unit(value, unitOf(dimension, 'N, mm'))
              .to(unitOf(dimension, system));
        }
        const result = math.evaluate(formula.expression.text, scope) as Unit | number;
        const expected = formula.expression.evaluate(base);
        expect(Number.isFinite(expected), `${expected}`).toBe(true);
        const { force, length } = DIMENSIONS[formula.dimension];
        if (force === 0 && length === 0) {
          expect(typeof result).toBe('number');
          expect(same(result as number, expected), `${result}`).toBe(true);
          return;
        }
        // toNumber throws where the dimension is another.
        const inBase = (result as Unit).toNumber(unitOf(formula.dimension, 'N, mm'));
        expect(same(inBase, expected), `${inBase} against ${expected}`).toBe(true);
      });
});

describe('every formula holds in the units that it prints in', () => {
  for (const set of Object.values(UNIT_SETS))
    for (const formula of formulas)
      it(`${formula.id}, ${set.name}, ${formula.prints}`, () => {
        const size = (dimension: DimensionName): number =>
          (
            (formula.prints === 'display' ? set.display[dimension] : undefined) ??
            set.working[dimension]
          ).factor;
        const base = sized(formula);
        const shown = Object.fromEntries(
          Object.entries(formula.operands).map(([name, dimension]) => [
            name,
            (base[name] ?? 0) / size(dimension),
          ]),
        );
        const value = formula.expression.evaluate(shown) * size(formula.dimension);
        const expected = formula.expression.evaluate(base);
        expect(same(value, expected), `${value} against ${expected}`).toBe(true);
      });
});
