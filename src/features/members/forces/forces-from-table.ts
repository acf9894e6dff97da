import type { DraftSource } from '#shared/contracts/draft-quantity.ts';
import { actionNames, actionOf, type DraftCombination } from '#shared/contracts/members.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import { firstCombination } from '../first-draft.ts';
import { readTable } from './read-table.ts';
import { type Column, isHeader, isUnitRow, recogniseColumns } from './recognise-columns.ts';

/** A pasted table as it was understood, before it becomes combinations. */
export interface PastedTable {
  readonly columns: readonly Column[];
  readonly rows: readonly (readonly string[])[];
  /** Row of the first data row as pasted, from 1. */
  readonly firstRow: number;
  readonly hasHeader: boolean;
}

export interface TableProblem {
  /** Row as pasted, from 1. */
  readonly row: number;
  readonly column: string;
  readonly message: string;
}

export interface FromTable {
  readonly combinations: readonly DraftCombination[];
  readonly problems: readonly TableProblem[];
}

export function pastedTable(text: string): PastedTable {
  const cells = readTable(text);
  const width = Math.max(0, ...cells.map((row) => row.length));
  const [first = []] = cells;
  const hasHeader = isHeader(first);
  const below = hasHeader ? cells[1] : undefined;
  const unitRow = below && isUnitRow(below) ? below : null;
  const names = Array.from({ length: width }, (_, i) =>
    hasHeader ? (first[i] ?? '') : `column ${i + 1}`,
  );
  const skipped = (hasHeader ? 1 : 0) + (unitRow ? 1 : 0);
  return {
    columns: recogniseColumns(names, unitRow),
    rows: cells.slice(skipped),
    firstRow: skipped + 1,
    hasHeader,
  };
}

const LONGEST = 60;

/**
 * The rows as combinations: a number without a unit takes its column's, else that of the units
 * chosen. What cannot be read is taken over as it stands and named, so that nothing is lost.
 */
export function forcesFromTable(
  table: Pick<PastedTable, 'columns' | 'rows' | 'firstRow'>,
  options: {
    readonly units: 'us' | 'si';
    readonly taken: readonly DraftCombination[];
    /** Source of a value in a row as pasted (from 1). */
    readonly source: (row: number) => DraftSource | undefined;
    readonly confirmed: boolean;
  },
): FromTable {
  const problems: TableProblem[] = [];
  const combinations: DraftCombination[] = [];
  table.rows.forEach((cells, index) => {
    const row = table.firstRow + index;
    const add = (column: string, message: string) => problems.push({ row, column, message });
    let combination = firstCombination([...options.taken, ...combinations]);
    const source = options.source(row);
    table.columns.forEach(({ header, use, unit }, at) => {
      const cell = cells[at] ?? '';
      if (use === 'leave' || cell === '') return;
      if (use === 'name') {
        combination = { ...combination, name: cell.slice(0, 120) };
        return;
      }
      const text = quantityText(cell, unit ?? usualUnit(use, options.units));
      if (text.length > LONGEST) add(header, `is longer than ${LONGEST} characters: "${cell}"`);
      else {
        const parsed = parseQuantity(text, isForce(use) ? 'force' : 'moment');
        if (!parsed.ok) add(header, `"${cell}" ${said(parsed.reason)}`);
      }
      const quantity = {
        text: text.slice(0, LONGEST),
        ...(source ? { source } : {}),
        confirmed: options.confirmed,
      };
      combination = { ...combination, [use]: quantity };
    });
    if (combination.name === '') add('Combination', 'has no name');
    if (actionNames.every((action) => actionOf(combination, action).text === '')) {
      add('Forces', 'has no force or moment');
    }
    combinations.push(combination);
  });
  return { combinations, problems };
}

const isForce = (use: Column['use']): boolean => use === 'P' || use === 'Vx' || use === 'Vy';

const usualUnit = (use: Column['use'], units: 'us' | 'si'): string => {
  if (isForce(use)) return units === 'us' ? 'kip' : 'kN';
  return units === 'us' ? 'kip ft' : 'kN m';
};

const quantityText = (cell: string, unit: string): string =>
  /[\p{L}'"]\s*$/u.test(cell) ? cell : `${cell} ${unit}`;

const said = (reason: string): string => reason.replace(/^"[^"]*" /, '');
