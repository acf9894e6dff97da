import type { CombinationRecord, CoverageRow, MemberRecord } from '../calc/record.ts';
import { cell, ratioCell, strongCell } from './cells.ts';
import { shortReference } from './reference-text.ts';
import type { Block, Inline, TableCell } from './tree.ts';

type Cell = CoverageRow['cells'][number];
interface Told {
  readonly row: CoverageRow;
  readonly cells: readonly [Cell, ...Cell[]];
  /** All segments of the limit state are told the same. */
  readonly whole: boolean;
}

/**
 * Every limit state of one combination. What is checked, or should be, has a row with its largest
 * ratio and the segment of it; what does not apply stands in a second table, by its reason. Figures
 * and states lead to their lines.
 */
export function limitStateTables(member: MemberRecord, combination: CombinationRecord): Block[] {
  const told = member.completeness.flatMap((row) => toldOf(row, combination.id));
  const idle = told.filter(isIdle);
  const named = `of ${member.mark}, combination ${combination.name}`;
  return [
    checkedTable(
      `Limit states ${named}`,
      member,
      told.filter((each) => !isIdle(each)),
    ),
    ...(idle.length > 0
      ? [
          idleTable(
            `Limit states that are not checked, combination ${combination.name}`,
            member,
            idle,
          ),
        ]
      : []),
  ];
}

/** Limit states that no sheet checks, whatever the member is. */
const OUTSIDE_EVERY_SHEET = new Set(['torsion', 'concentrated', 'holes', 'bracing', 'deflection']);

const isIdle = ({ row, cells: [{ state }] }: Told): boolean =>
  state === 'not applicable' || OUTSIDE_EVERY_SHEET.has(row.id);

/** A limit state's cells, those together that are in the same state for the same reason. */
function toldOf(row: CoverageRow, combination: string): Told[] {
  const own = row.cells.filter((c) => c.combination === combination);
  const groups: [Cell, ...Cell[]][] = [];
  for (const one of own) {
    const same = groups.find(
      ([first]) =>
        first.because === one.because &&
        first.state === one.state &&
        (first.ratio === null) === (one.ratio === null),
    );
    if (same) same.push(one);
    else groups.push([one]);
  }
  return groups.map((cells) => {
    const [first, ...others] = cells.sort((a, b) => (b.ratio ?? -1) - (a.ratio ?? -1));
    return { row, cells: [first as Cell, ...others], whole: groups.length === 1 };
  });
}

function checkedTable(caption: string, member: MemberRecord, told: readonly Told[]): Block {
  const segmented = told.some(({ cells }) => cells.some((c) => c.segment));
  const rows = told.map((each, index): TableCell[] => {
    const [first, ...others] = each.cells;
    const { state, because, address, ratioText } = first;
    const goesOn = told[index - 1]?.row === each.row;
    const withRatio = ratioText !== null;
    const tone = state === 'governs' ? 'strong' : state === 'outside scope' ? 'over' : 'quiet';
    return [
      goesOn ? cell('') : strongCell(each.row.title),
      cell(goesOn ? '' : shortReference(each.row.clause)),
      cell(segmentWords(withRatio ? [first] : each.cells, each.whole && !withRatio)),
      ratioCell(ratioText, address === null ? null : { member: member.id, address }),
      {
        content: [
          withRatio ? { kind: 'text', text: state } : linkTo(state, member.id, address),
          ...(because === '' ? [] : [quiet(`: ${because}`)]),
          ...otherRatios(withRatio ? others : [], member.id),
        ],
        tone,
      },
    ];
  });
  const columns = ['Limit state', 'Clause', 'Segment', 'Ratio', 'State'];
  const kept = (_: unknown, column: number): boolean => segmented || column !== 2;
  return {
    kind: 'table',
    caption,
    head: columns
      .map((words) => cell(words))
      .map((head, column): TableCell => (column === 3 ? { ...head, align: 'right' } : head))
      .filter(kept),
    rows: rows.map((row) => row.filter(kept)),
    widths: [4.6, 1.5, 1.3, 1.1, 6].filter(kept),
  };
}

/** `; in 1 0.212, in 3 0.498`: the smaller ratios of the other segments. */
const otherRatios = (cells: readonly Cell[], member: string): Inline[] =>
  cells.flatMap((each, index): Inline[] => [
    quiet(`${index === 0 ? '; ' : ', '}in ${segmentName(each)} `),
    linkTo(each.ratioText ?? '–', member, each.address),
  ]);

/** One row per state: the limit states in running text, those of one reason together. */
function idleTable(caption: string, member: MemberRecord, idle: readonly Told[]): Block {
  const states = grouped(idle, ({ cells: [{ state }] }) => state);
  const rows = [...states].map(([state, all]): TableCell[] => {
    const reasons = grouped(all, ({ cells: [{ because }] }) => because);
    const content = [...reasons].flatMap(([because, group], index): Inline[] => [
      ...(index === 0 ? [] : [quiet(' ')]),
      ...group.flatMap((each, at): Inline[] => [
        ...(at === 0 ? [] : [quiet(', ')]),
        ...idleWords(each, member.id),
      ]),
      quiet(`: ${because}.`),
    ]);
    return [cell(state, 'quiet'), { content, tone: 'quiet' }];
  });
  return {
    kind: 'table',
    caption,
    head: ['State', 'Limit states and why'].map((words) => cell(words)),
    rows,
    widths: [1.8, 12.2],
  };
}

function grouped(told: readonly Told[], by: (each: Told) => string): Map<string, Told[]> {
  const groups = new Map<string, Told[]>();
  for (const each of told) groups.set(by(each), [...(groups.get(by(each)) ?? []), each]);
  return groups;
}

function idleWords({ row, cells, whole }: Told, member: string): Inline[] {
  const where = segmentWords(cells, whole);
  const parts = where === '' || where === 'all' ? '' : `, segment ${where}`;
  return [
    linkTo(row.title, member, cells[0].address),
    quiet(` (${shortReference(row.clause)}${parts})`),
  ];
}

function segmentWords(cells: readonly Cell[], whole: boolean): string {
  if (cells.every((c) => !c.segment)) return '';
  return whole && cells.length > 1 ? 'all' : cells.map(segmentName).join(', ');
}

const segmentName = ({ segment }: Cell): string => segment?.replace('s', '') ?? '';

const quiet = (text: string): Inline => ({ kind: 'text', text, quiet: true });

const linkTo = (text: string, member: string, address: string | null): Inline =>
  address === null ? { kind: 'text', text } : { kind: 'value', text, member, address };
