import { describe, expect, it } from 'vitest';
import { inUnit } from './in-unit.ts';
import { roundsTo } from './printed-digits.ts';
import { readPublished } from './published-cases.ts';
import { firstMember, recordOf, valueAt } from './run-input.ts';

describe('Design Examples v16.0, W rows of the quoted tables of the Manual', () => {
  interface Strength {
    readonly section: string;
    readonly quoted: string;
    readonly table: string;
    readonly axis: 'x' | 'y';
    readonly Lb?: string;
    readonly LRFD: { readonly printed: string; readonly fromInputs: number };
    readonly ASD: { readonly printed: string; readonly fromInputs: number };
    readonly reading?: string;
  }
  interface Limits {
    readonly section: string;
    readonly table: string;
    readonly Lp: { readonly printed: string; readonly fromInputs: number };
    readonly Lr: { readonly printed: string; readonly fromInputs: number };
  }
  const tables = readPublished('tables-w.json') as { strengths: Strength[]; limits: Limits[] };
  const run = (design: 'LRFD' | 'ASD', section: string, axis: 'x' | 'y', Lb?: string) =>
    firstMember(
      recordOf({
        format: 1,
        standard: 'aisc360-22',
        design,
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
            length: '20 ft',
            ends: 'held',
            ...(Lb && { Lb }),
            combinations: [{ name: 'any', P: '0 kip', [`M${axis}Max`]: '10 kip ft' }],
          },
        ],
      }),
    );
  for (const row of tables.strengths)
    for (const design of ['LRFD', 'ASD'] as const)
      it(`${row.section}, ${row.table}, ${row.axis}, ${row.Lb ?? 'any Lb'}, ${design}: ${row[design].printed} kip ft`, () => {
        const value = inUnit(
          valueAt(run(design, row.section, row.axis, row.Lb), `F1/${row.axis}/Mc`),
          'kip ft',
        );
        const { printed, fromInputs } = row[design];
        expect(Math.abs(value / fromInputs - 1)).toBeLessThan(5e-4);
        if (row.reading) expect(Math.abs(value - Number(printed))).toBeLessThan(1);
        else expect(roundsTo(value, printed), `${value}`).toBe(true);
      });
  for (const row of tables.limits)
    it(`${row.section}, ${row.table}: Lp ${row.Lp.printed} ft, Lr ${row.Lr.printed} ft`, () => {
      const member = run('LRFD', row.section, 'x', '20 ft');
      for (const name of ['Lp', 'Lr'] as const) {
        const value = inUnit(valueAt(member, `F2/${name}`), 'ft');
        expect(Math.abs(value / row[name].fromInputs - 1)).toBeLessThan(5e-4);
        expect(roundsTo(value, row[name].printed), `${name} ${value}`).toBe(true);
      }
    });
});
