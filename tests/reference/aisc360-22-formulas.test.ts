import { evaluate } from 'mathjs';
import { describe, expect, it } from 'vitest';
import type { GivenValue } from '#shared/calc/quantity.ts';
import { createRecorder } from '#shared/calc/recorder.ts';
import { PUBLISHED_EQUATIONS } from '#shared/published-cases/published-cases.ts';
import { findShape, W_DESIGNATIONS } from '#shared/sections/table.ts';
import { majorFlexureClass } from '#shared/standards/aisc360-22/b4-flexure.ts';
import { nominalStress } from '#shared/standards/aisc360-22/e3.ts';
import { formulaNamed } from '#shared/standards/library.ts';
import { inUnit, UNIT_SIZES } from './in-unit.ts';
import { printedStep, roundsTo } from './printed-digits.ts';
import { readPublished } from './published-cases.ts';
import { firstMember, recordOf, valueAt } from './run-input.ts';

interface Limit {
  readonly Fy: string;
  readonly slenderness: { readonly printed: string };
  readonly Fe: { readonly printed: string };
}
const tableE1 = readPublished('table-e1.json') as { readonly rows: readonly Limit[] };

/** `5470 in⁶` in N and mm, without the program's own reading of units. */
function base(text: string): number {
  const [number, ...unit] = text.split(' ');
  const name = unit.join(' ');
  const size = { ...UNIT_SIZES, 'in⁶': 25.4 ** 6 }[name];
  if (size === undefined) throw new Error(`no unit ${name}`);
  return Number(number) * size;
}

describe.each(PUBLISHED_EQUATIONS.map(({ source, formulas }) => [source.title, formulas] as const))(
  'single equations: %s',
  (_, rows) => {
    for (const row of rows)
      it(`${row.example}: ${row.what} = ${row.printed ?? row.fromInputs} ${row.unit} by ${row.formula}`, () => {
        const formula = formulaNamed(row.formula);
        if (!formula) throw new Error(`no formula ${row.formula}`);
        const operands = Object.fromEntries(
          Object.entries(row.operands).map(([name, text]) => [name, base(text)]),
        );
        const value = inUnit(formula.expression.evaluate(operands), row.unit);
        expect(Math.abs(value / row.fromInputs - 1)).toBeLessThan(1e-6);
        if (row.printed === null) return;
        const source = row.explained ? Number(evaluate(row.explained.expression)) : value;
        expect(roundsTo(source, row.printed), `${source}`).toBe(true);
      });
  },
);

const given = (value: number): GivenValue => ({
  value,
  text: String(value),
  source: { kind: 'typed' },
  confirmed: false,
});

describe('Design Examples v16.0, Table E-1: where elastic buckling begins', () => {
  const branchAt = (Fy: string, slenderness: number): string => {
    const r = createRecorder('');
    const stress = (key: string, symbol: string, value: number) =>
      r.given(key, symbol, 'stress', given(value), { title: key });
    nominalStress(
      r,
      stress('Fy', 'Fy', base(Fy)),
      // Fe = π²E/(Lc/r)² at E = 29 000 ksi.
      stress('Fe', 'Fe', (Math.PI ** 2 * base('29000 ksi')) / slenderness ** 2),
    );
    return r.lines.find((l) => l.key === 'E3/Fn')?.clause?.equation ?? '';
  };
  for (const { Fy, slenderness, Fe } of tableE1.rows)
    it(`${Fy}: Lc/r = ${slenderness.printed}, Fe = ${Fe.printed} ksi`, () => {
      const half = printedStep(slenderness.printed) / 2;
      expect(branchAt(Fy, Number(slenderness.printed) - half)).toBe('E3-2');
      expect(branchAt(Fy, Number(slenderness.printed) + half)).toBe('E3-3');
      const limit = formulaNamed('aisc360-22/E3-4')?.expression.evaluate({
        E: 29000,
        Lc: 4.71 * Math.sqrt(29000 / inUnit(base(Fy), 'ksi')),
        r: 1,
      });
      expect(roundsTo(limit ?? 0, Fe.printed), `${limit}`).toBe(true);
    });
});

describe('Design Examples v16.0, section F3 introduction: noncompact flanges at 50 ksi', () => {
  const list = readPublished('noncompact-flanges.json') as {
    shapes: { section: string; printedPercent: number | null; fromInputs: number }[];
  };
  const member = (section: string) =>
    firstMember(
      recordOf({
        format: 1,
        standard: 'aisc360-22',
        design: 'LRFD',
        units: 'us',
        analysis: {
          method: 'direct',
          secondOrder: 'from-analysis',
          includesMemberEffect: true,
          sway: 'none',
        },
        members: [
          {
            mark: section,
            section,
            material: 'A992',
            length: '10 ft',
            ends: 'held',
            Lb: '0 ft',
            combinations: [{ name: 'any', P: '0 kip', MxMax: '1 kip ft' }],
          },
        ],
      }),
    );
  for (const { section, printedPercent, fromInputs } of list.shapes)
    it(`${section} reaches ${printedPercent ?? fromInputs.toFixed(2)} % of Mp`, () => {
      const m = member(section);
      const percent = (100 * valueAt(m, 'F2/Mn')) / valueAt(m, 'F2/Mp');
      expect(Math.abs(percent / fromInputs - 1)).toBeLessThan(5e-4);
      if (printedPercent !== null) expect(Math.abs(percent - printedPercent)).toBeLessThan(1);
    });
  it('no other W shape has a noncompact flange', () => {
    const noncompact = W_DESIGNATIONS.filter((designation) => {
      const shape = findShape(designation);
      if (shape?.kind !== 'i') return false;
      const r = createRecorder('');
      const quantity = (key: string, dimension: 'stress' | 'none', value: number) =>
        r.given(key, key, dimension, given(value), { title: key });
      const steel = {
        E: quantity('E', 'stress', base('29000 ksi')),
        Fy: quantity('Fy', 'stress', base('50 ksi')),
      };
      const { lambdaf, lambdaw } = shape.properties;
      return (
        majorFlexureClass(
          r,
          steel,
          quantity('lambdaf', 'none', lambdaf.value),
          quantity('lambdaw', 'none', lambdaw.value),
        ).flange.class !== 'compact'
      );
    });
    // User Note of F2 in the Specification, W shapes (M4X6 is not in this table).
    expect([...noncompact].sort()).toEqual(list.shapes.map((s) => s.section).sort());
  });
});
