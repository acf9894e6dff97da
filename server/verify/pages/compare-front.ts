import type { FontSet } from '#server/pdf/font-set.ts';
import { placedLines } from '#shared/calc/address.ts';
import type { CalculationRecord } from '#shared/calc/record.ts';
import { basisBlock } from '#shared/report/basis-block.ts';
import { memberTable } from '#shared/report/completeness-block.ts';
import { coverBlock } from '#shared/report/cover-block.ts';
import { unsignedDocument } from '#shared/report/document-data.ts';
import { resultsBlock } from '#shared/report/results-block.ts';
import { standardNames, standardsUsed } from '#shared/report/sheet-books.ts';
import type { Block } from '#shared/report/tree.ts';
import { unconfirmedBlock } from '#shared/report/unconfirmed-block.ts';
import { compareSegments } from './compare-segments.ts';
import { type ExpectedSegment, rowSegments, rowsOf, segmentsOf } from './expected-pages.ts';
import { bare, type Segment } from './page-text.ts';

export interface FrontProblem {
  readonly member: string | null;
  readonly reason: string;
}

/** Fields of the cover and of the basis that the record alone fills. */
const FIELDS = new Set([
  ...['Standard', 'Members', 'Worst result', 'Inputs not confirmed', 'Program', 'Result hash'],
  ...['Design method', 'Analysis method', 'Second-order moments', 'Units', 'Materials'],
]);

export interface ComparedFront {
  readonly problems: readonly FrontProblem[];
  /** Rows and fields whose words differ while their numbers agree. */
  readonly reworded: number;
  readonly notes: readonly string[];
}

/** Compares the tables of the whole report, and the fields that the record alone fills. */
export function compareFront(
  record: CalculationRecord,
  found: readonly Segment[],
  fonts: FontSet,
): ComparedFront {
  const own = recordTexts(record);
  const isOwn = (segment: ExpectedSegment): boolean => own.has(segment.visible);
  const tables: { member: string | null; block: Block }[] = [
    { member: null, block: resultsBlock(record) },
    { member: null, block: unconfirmedBlock(record) },
    ...record.members.map((m) => ({ member: m.id, block: memberTable(m) })),
  ];
  const parts = [
    ...tables.flatMap(({ member, block }) => {
      if (block.kind !== 'table') return [];
      const rows = rowsOf([block], record, fonts).map((row) => rowSegments(row, fonts));
      return [compareTable(block.caption, rows, found, member, isOwn)];
    }),
    compareFields(record, found, fonts, isOwn),
  ];
  return {
    problems: parts.flatMap((part) => part.problems),
    reworded: parts.reduce((n, part) => n + part.reworded, 0),
    notes: parts.flatMap((part) => part.notes),
  };
}

/** Texts that the record itself has, as a cell may print them. */
function recordTexts(record: CalculationRecord): ReadonlySet<string> {
  const summaries = [record.summary, ...record.members.map((m) => m.summary)];
  return new Set(
    [
      record.resultHash ?? '',
      ...summaries.flatMap((s) => [s.verdict, s.ratioText ?? '']),
      ...record.members.flatMap((m) => [
        ...[m.mark, m.material],
        ...m.combinations.map((c) => c.name),
        ...m.completeness.flatMap((row) => [
          row.title,
          ...row.cells.flatMap((cell) => [cell.state, cell.because]),
        ]),
        ...placedLines(m).map((p) => p.line.title),
      ]),
      coverResult(record),
    ].map(bare),
  );
}

/** The worst result as the cover names it. */
const coverResult = ({ summary, members }: CalculationRecord): string => {
  const mark = members.find((m) => m.id === summary.member)?.mark;
  return `${summary.verdict} ${summary.ratioText ?? ''}${mark === undefined ? '' : `, member ${mark}`}`;
};

/** A table stands on the pages in one piece: its caption, its head, its rows. */
function compareTable(
  caption: string,
  rows: readonly (readonly ExpectedSegment[])[],
  found: readonly Segment[],
  member: string | null,
  isOwn: (segment: ExpectedSegment) => boolean,
): ComparedFront {
  const title = rows[0]?.[0]?.visible;
  let at = found.findIndex((s) => s.visible === title);
  if (at < 0) {
    const notes = [`no table "${caption}" on the pages: not compared`];
    return { problems: [], reworded: 0, notes };
  }
  const compared = rows.map((row) => {
    const own = found.slice(at, at + row.length);
    at += row.length;
    return compareSegments(row, own, (index) => row[index] !== undefined && isOwn(row[index]));
  });
  return {
    problems: compared.flatMap(({ reasons }) =>
      reasons.map((reason) => ({ member, reason: `the table "${caption}": ${reason}` })),
    ),
    reworded: compared.filter((c) => c.reworded).length,
    notes: [],
  };
}

function compareFields(
  record: CalculationRecord,
  found: readonly Segment[],
  fonts: FontSet,
  isOwn: (segment: ExpectedSegment) => boolean,
): ComparedFront {
  const document = unsignedDocument('', '', 'A4');
  const cover = coverBlock(record, document, standardNames(record.standard).name);
  const basis = basisBlock(record, document, standardsUsed(record));
  const pairs = [cover, basis].flatMap((block) => pairsOf(segmentsOf([block], record, fonts)));
  const names = new Set([...FIELDS].map(bare));
  const compared = pairs
    .filter(([label]) => names.has(label.visible))
    .flatMap(([label, value]) => {
      const places = found.flatMap((s, i) => (s.visible === label.visible ? [i + 1] : []));
      const tried = places.map((i) =>
        compareSegments([value], found.slice(i, i + 1), () => isOwn(value)),
      );
      // A label may stand elsewhere too: one place that agrees is enough.
      const best = tried.find((t) => t.reasons.length === 0) ?? tried[0];
      return best ? [{ label, ...best }] : [];
    });
  return {
    problems: compared.flatMap(({ label, reasons }) =>
      reasons.map((reason) => ({
        member: null,
        reason: `the field "${label.visible}": ${reason}`,
      })),
    ),
    reworded: compared.filter((c) => c.reworded).length,
    notes: [],
  };
}

const pairsOf = (segments: readonly ExpectedSegment[]) =>
  segments.slice(1).map((value, i) => [segments[i] as ExpectedSegment, value] as const);
