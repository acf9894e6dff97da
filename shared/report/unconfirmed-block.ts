import { placedLines } from '../calc/address.ts';
import type { CalculationRecord } from '../calc/record.ts';
import { readText } from '../figures/read-line.ts';
import { UNIT_SETS } from '../units/unit-set.ts';
import { cell, strongCell } from './cells.ts';
import { sourceText } from './source-text.ts';
import type { Block, TableCell } from './tree.ts';

/** Every given value and statement that nobody has confirmed, with its source. */
export function unconfirmedBlock(record: CalculationRecord): Block {
  const set = UNIT_SETS[record.units];
  const rows = record.members.flatMap((member) => {
    const names = new Map(member.combinations.map((c) => [c.id, c.name]));
    return placedLines(member).flatMap(({ line, combination }): TableCell[][] => {
      if ((line.kind !== 'given' && line.kind !== 'statement') || line.confirmed) return [];
      return [
        [
          strongCell(member.mark),
          cell(combination === null ? 'all' : (names.get(combination) ?? combination)),
          cell(line.title),
          cell(line.kind === 'given' ? readText(line, set) : line.statement),
          cell(sourceText(line.source)),
        ],
      ];
    });
  });
  if (rows.length === 0)
    return { kind: 'paragraph', content: [{ kind: 'text', text: 'All inputs are confirmed.' }] };
  return {
    kind: 'table',
    caption: 'Inputs that are not confirmed',
    head: ['Member', 'Combination', 'Input', 'Value', 'Source'].map((words) => cell(words)),
    rows,
    widths: [2, 3, 4, 3, 5],
  };
}
