import { placedLines } from '#shared/calc/address.ts';
import type { Line } from '#shared/calc/line.ts';
import type { CoverageRow, MemberRecord } from '#shared/calc/record.ts';
import { printNumber } from '#shared/units/format.ts';

type Cell = CoverageRow['cells'][number];

export interface CoverageProblem {
  /** The line the cell cites, where it is there. */
  readonly address: string | null;
  readonly reason: string;
}

/** Every limit state has a cell under every combination, and what a cell cites is as it says. */
export function* checkCompleteness(member: MemberRecord): Iterable<CoverageProblem> {
  const lines = new Map(placedLines(member).map((p) => [p.address, p.line]));
  const names = new Map(member.combinations.map((c) => [c.id, c.name]));
  for (const row of member.completeness) {
    const parts = row.cells.map((cell) => `${cell.combination} ${cell.segment ?? ''}`);
    const covered = new Set(row.cells.map((cell) => cell.combination));
    if ([...covered].join(' ') !== [...names.keys()].join(' '))
      yield { address: null, reason: `${row.title}: does not cover each combination` };
    if (new Set(parts).size !== parts.length)
      yield { address: null, reason: `${row.title}: covers a part of the member twice` };
    for (const cell of row.cells)
      for (const reason of cellReasons(cell, member, lines))
        yield { address: null, reason: `${row.title}, ${names.get(cell.combination)}: ${reason}` };
  }
}

function cellReasons(cell: Cell, member: MemberRecord, lines: ReadonlyMap<string, Line>): string[] {
  const { address, ratio, ratioText, state } = cell;
  const line = lines.get(address ?? '');
  if (address !== null && !line) return [`cites ${address}, which is not there`];
  if (line?.kind !== 'check')
    return ratio === null && ratioText === null ? [] : ['has a ratio without a check'];
  const printed = printNumber(line.ratio, line.print.working ?? { dec: 3 }).text;
  const summary = member.combinations.find((c) => c.id === cell.combination)?.summary;
  const governs = summary?.governing?.address === address;
  return [
    ...(ratio === line.ratio ? [] : [`says the ratio ${ratio}, its check has ${line.ratio}`]),
    ...(ratioText === printed ? [] : [`prints ${ratioText}, its check prints ${printed}`]),
    ...((state === 'governs') === governs ? [] : [`says "${state}" against the summary`]),
  ];
}
