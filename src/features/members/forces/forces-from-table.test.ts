import { describe, expect, it } from 'vitest';
import { forcesFromTable, pastedTable } from './forces-from-table.ts';

const options = {
  units: 'us',
  taken: [],
  source: (row: number) => ({ kind: 'file', file: 'forces.xlsx', row: String(row) }) as const,
  confirmed: false,
} as const;

const understood = (text: string, units: 'us' | 'si' = 'us') =>
  forcesFromTable(pastedTable(text), { ...options, units });

describe('a table of forces from a spreadsheet', () => {
  it('recognises columns by their headers, with units in brackets', () => {
    const { combinations, problems } = understood(
      'Combination\tPu (kip)\tMxA [kip-ft]\tMxB [kip-ft]\tRemark\r\n1.2D + 1.6L\t310\t118\t-104\tworst\r\n',
    );
    expect(problems).toEqual([]);
    expect(combinations).toHaveLength(1);
    const [row] = combinations;
    expect(row?.name).toBe('1.2D + 1.6L');
    expect(row?.P.text).toBe('310 kip');
    expect(row?.MxA.text).toBe('118 kip ft');
    expect(row?.MxB.text).toBe('-104 kip ft');
    expect(row?.MyA.text).toBe('');
    expect(row?.P.source).toEqual({ kind: 'file', file: 'forces.xlsx', row: '2' });
  });

  it('takes units from a row below the header, and from the cells', () => {
    const { combinations } = understood(
      'LC\tAxial\tMajor A\n\tkN\tkN·m\nA\t1200\t80\nB\t90 kip\t7 kip ft',
    );
    expect(combinations.map(({ P, MxA }) => [P.text, MxA.text])).toEqual([
      ['1200 kN', '80 kN m'],
      ['90 kip', '7 kip ft'],
    ]);
  });

  it('takes shear forces by the axis that their load bends about', () => {
    const [row] = understood('name\tP\tVx (kip)\tShear minor\nA\t10\t24\t3.5').combinations;
    expect([row?.Vx?.text, row?.Vy?.text]).toEqual(['24 kip', '3.5 kip']);
  });

  it('takes the units of the calculation where none are said', () => {
    expect(understood('name\tP\tMy1\nA\t10\t2', 'si').combinations[0]?.MyA.text).toBe('2 kN m');
    expect(understood('name\tP\tMy1\nA\t10\t2', 'us').combinations[0]?.P.text).toBe('10 kip');
  });

  it('names what it cannot read by row and column, and keeps it as it stands', () => {
    const { combinations, problems } = understood('name\tP\tMxA\nA\t1,200\t10\n\tn/a\t4 ksi');
    expect(combinations.map(({ P }) => P.text)).toEqual(['1,200 kip', 'n/a']);
    expect(problems.map(({ row, column }) => [row, column])).toEqual([
      [2, 'P'],
      [3, 'P'],
      [3, 'MxA'],
      [3, 'Combination'],
    ]);
    expect(problems[0]?.message).toContain('comma');
  });

  it('reads quoted cells with line ends and tabs in them', () => {
    const { combinations } = understood('name\tP\n"1.2D +\n1.6L"\t5\n"say ""A"""\t6');
    expect(combinations.map(({ name }) => name)).toEqual(['1.2D + 1.6L', 'say "A"']);
  });

  it('asks what the columns are where there is no header', () => {
    const table = pastedTable('A\t10\t20\nB\t11\t21');
    expect(table.hasHeader).toBe(false);
    expect(table.rows).toHaveLength(2);
    expect(table.columns.map(({ use }) => use)).toEqual(['leave', 'leave', 'leave']);
  });

  it('gives every row an id of its own beside those that are there', () => {
    const first = understood('name\tP\nA\t1\nB\t2').combinations;
    const next = forcesFromTable(pastedTable('name\tP\nC\t3'), { ...options, taken: first });
    expect([...first, ...next.combinations].map(({ id }) => id)).toEqual(['c1', 'c2', 'c3']);
  });
});
