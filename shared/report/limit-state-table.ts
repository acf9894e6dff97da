import type { CombinationRecord, CoverageRow, MemberRecord } from '../calc/record.ts';
import { cell, ratioCell, strongCell } from './cells.ts';
import { shortReference } from './reference-text.ts';
import type { Block, Inline, TableCell } from './tree.ts';

type Cell = CoverageRow['cells'][number];

/**
 * Every limit state of one combination, segment by segment: its ratio, whether it governs, or why
 * it is not there. Its figures and states lead to their lines.
 */
export function limitStateTable(member: MemberRecord, combination: CombinationRecord): Block {
  const rows = member.completeness.flatMap((row) => {
    const own = row.cells.filter((c) => c.combination === combination.id);
    return alike(own).map((cells, index): TableCell[] => {
      const [first] = cells;
      const { state, because, address, ratioText } = first;
      return [
        index === 0 ? strongCell(row.title) : cell(''),
        cell(index === 0 ? shortReference(row.clause) : ''),
        cell(segmentWords(cells, own)),
        linked(state, member.id, address, state === 'governs' ? 'strong' : 'plain'),
        ratioCell(ratioText, address === null ? null : { member: member.id, address }),
        cell(because, 'quiet'),
      ];
    });
  });
  const segmented = member.completeness.some((row) =>
    row.cells.some((c) => c.combination === combination.id && c.segment),
  );
  const columns = ['Limit state', 'Clause', 'Segment', 'State', 'Ratio', 'Because'];
  const widths = [4.4, 1.6, 1.5, 2.4, 1.3, 4.6];
  const kept = (_: unknown, column: number): boolean => segmented || column !== 2;
  return {
    kind: 'table',
    caption: `Limit states of ${member.mark}, combination ${combination.name}`,
    head: columns.filter(kept).map((words) => cell(words)),
    rows: rows.map((row) => row.filter(kept)),
    widths: widths.filter(kept),
  };
}

/** Segments without a ratio that are told the same share a row. */
function alike(cells: readonly Cell[]): [Cell, ...Cell[]][] {
  const groups: [Cell, ...Cell[]][] = [];
  for (const one of cells) {
    const same = groups.find(
      ([first]) =>
        one.ratio === null &&
        first.ratio === null &&
        first.state === one.state &&
        first.because === one.because,
    );
    if (same) same.push(one);
    else groups.push([one]);
  }
  return groups;
}

function segmentWords(cells: readonly Cell[], all: readonly Cell[]): string {
  if (cells.every((c) => !c.segment)) return '';
  if (cells.length === all.length && all.length > 1) return 'all';
  return cells.map((c) => c.segment?.replace('s', '') ?? '').join(', ');
}

const linked = (
  text: string,
  member: string,
  address: string | null,
  tone: NonNullable<TableCell['tone']>,
): TableCell => {
  const content: Inline =
    address === null ? { kind: 'text', text } : { kind: 'value', text, member, address };
  return { content: [content], tone };
};
