import type { CalculationRecord, CoverageRow, MemberRecord } from '../calc/record.ts';
import { sectionText } from '../figures/section-text.ts';
import { outsideTable } from './cautions.ts';
import { cell, ratioCell, strongCell } from './cells.ts';
import { shortReference } from './reference-text.ts';
import type { Block, TableCell } from './tree.ts';

type Cell = CoverageRow['cells'][number];

/** Limit states × combinations of each member, then what lies outside every sheet. */
export const completenessBlocks = (record: CalculationRecord): Block[] => [
  ...record.members.map(memberTable),
  outsideTable(),
];

/** Combinations in the same state for the same reason share a row, so that none is left out. */
export function memberTable(member: MemberRecord): Block {
  const names = new Map(member.combinations.map((c) => [c.id, c.name]));
  const rows = member.completeness.flatMap((row) =>
    alike(row.cells).map((cells, index): TableCell[] => {
      const [first] = cells;
      const worst = cells.reduce((a, b) => ((b.ratio ?? -1) > (a.ratio ?? -1) ? b : a));
      return [
        index === 0 ? strongCell(row.title) : cell(''),
        cell(index === 0 ? shortReference(row.clause) : ''),
        cell(first?.state ?? '', first?.state === 'governs' ? 'strong' : 'plain'),
        cell(combinationWords(cells, names)),
        ratioCell(
          worst.ratioText,
          worst.address === null ? null : { member: member.id, address: worst.address },
        ),
        cell(first?.because ?? '', 'quiet'),
      ];
    }),
  );
  return {
    kind: 'table',
    caption: `Completeness of ${member.mark}, ${sectionText(member.section)}`,
    head: ['Limit state', 'Clause', 'State', 'Combinations', 'Largest ratio', 'Because'].map(
      (words) => cell(words),
    ),
    rows,
    widths: [4, 1.6, 2.4, 3.6, 1.6, 5],
  };
}

function alike(cells: readonly Cell[]): [Cell, ...Cell[]][] {
  const groups = new Map<string, [Cell, ...Cell[]]>();
  for (const one of cells) {
    const key = `${one.state}\n${one.because}`;
    const group = groups.get(key);
    if (group) group.push(one);
    else groups.set(key, [one]);
  }
  return [...groups.values()];
}

/** The combinations of some cells, with the segments where these are for parts of the member. */
function combinationWords(cells: readonly Cell[], names: ReadonlyMap<string, string>): string {
  const whole = cells.every((c) => !c.segment);
  if (whole && cells.length === names.size && cells.length > 1) return `all ${cells.length}`;
  const segments = new Map<string, string[]>();
  for (const { combination, segment } of cells)
    segments.set(combination, [
      ...(segments.get(combination) ?? []),
      ...(segment ? [segment.replace('s', '')] : []),
    ]);
  return [...segments]
    .map(([id, parts]) => {
      const name = names.get(id) ?? id;
      return parts.length === 0
        ? name
        : `${name}, segment${parts.length > 1 ? 's' : ''} ${parts.join(', ')}`;
    })
    .join('; ');
}
