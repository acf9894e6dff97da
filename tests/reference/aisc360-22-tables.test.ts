import { describe, expect, it } from 'vitest';
import { PUBLISHED_TABLES, tableInput } from '#shared/published-cases/published-cases.ts';
import { inUnit } from './in-unit.ts';
import { roundsTo } from './printed-digits.ts';
import { firstMember, recordOf, valueAt } from './run-input.ts';

describe('Design Examples v16.0, W rows of the quoted tables of the Manual', () => {
  const run = (design: 'LRFD' | 'ASD', row: Parameters<typeof tableInput>[0]) =>
    firstMember(recordOf(tableInput(row, design)));
  for (const row of PUBLISHED_TABLES.strengths)
    for (const design of ['LRFD', 'ASD'] as const)
      it(`${row.section}, ${row.table}, ${row.axis}, ${row.Lb ?? 'any Lb'}, ${design}: ${row[design].printed} kip ft`, () => {
        const value = inUnit(valueAt(run(design, row), `F1/${row.axis}/Mc`), 'kip ft');
        const { printed, fromInputs } = row[design];
        expect(Math.abs(value / fromInputs - 1)).toBeLessThan(5e-4);
        if (row.reading) expect(Math.abs(value - Number(printed))).toBeLessThan(1);
        else expect(roundsTo(value, printed), `${value}`).toBe(true);
      });
  for (const row of PUBLISHED_TABLES.limits)
    it(`${row.section}, ${row.table}: Lp ${row.Lp.printed} ft, Lr ${row.Lr.printed} ft`, () => {
      const member = run('LRFD', { section: row.section, axis: 'x', Lb: '20 ft' });
      for (const name of ['Lp', 'Lr'] as const) {
        const value = inUnit(valueAt(member, `F2/${name}`), 'ft');
        expect(Math.abs(value / row[name].fromInputs - 1)).toBeLessThan(5e-4);
        expect(roundsTo(value, row[name].printed), `${name} ${value}`).toBe(true);
      }
    });
});
