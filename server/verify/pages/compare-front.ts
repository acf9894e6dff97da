import type { FontSet } from '#server/pdf/font-set.ts';
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
import type { Segment } from './page-text.ts';

export interface FrontProblem {
  readonly member: string | null;
  readonly reason: string;
}

/** Fields of the cover and of the basis that the record alone fills. */
const FIELDS = new Set([
  ...['Standard', 'Members', 'Worst result', 'Inputs not confirmed', 'Program', 'Result hash'],
  ...['Design method', 'Analysis method', 'Second-order moments', 'Units', 'Materials'],
]);

/** Compares the tables of the whole report, and the fields that the record alone fills. */
export function compareFront(
  record: CalculationRecord,
  found: readonly Segment[],
  fonts: FontSet,
): { problems: FrontProblem[]; notes: string[] } {
  const tables: { member: string | null; block: Block }[] = [
    { member: null, block: resultsBlock(record) },
    { member: null, block: unconfirmedBlock(record) },
    ...record.members.map((m) => ({ member: m.id, block: memberTable(m) })),
  ];
  const compared = tables.map(({ member, block }) => {
    if (block.kind !== 'table') return { problems: [], notes: [] };
    const rows = rowsOf([block], record, fonts).map((row) => rowSegments(row, fonts));
    return compareTable(block.caption, rows, found, member);
  });
  return {
    problems: [...compared.flatMap((c) => c.problems), ...compareFields(record, found, fonts)],
    notes: compared.flatMap((c) => c.notes),
  };
}

/** A table stands on the pages in one piece: its caption, its head, its rows. */
function compareTable(
  caption: string,
  rows: readonly (readonly ExpectedSegment[])[],
  found: readonly Segment[],
  member: string | null,
): { problems: FrontProblem[]; notes: string[] } {
  const title = rows[0]?.[0]?.visible;
  let at = found.findIndex((s) => s.visible === title);
  if (at < 0) return { problems: [], notes: [`no table "${caption}" on the pages: not compared`] };
  const problems = rows.flatMap((row) => {
    const own = found.slice(at, at + row.length);
    at += row.length;
    const { reasons } = compareSegments(row, own, () => false);
    return reasons.map((reason) => ({ member, reason: `the table "${caption}": ${reason}` }));
  });
  return { problems, notes: [] };
}

function compareFields(
  record: CalculationRecord,
  found: readonly Segment[],
  fonts: FontSet,
): FrontProblem[] {
  const document = unsignedDocument('', '', 'A4');
  const cover = coverBlock(record, document, standardNames(record.standard).name);
  const basis = basisBlock(record, document, standardsUsed(record));
  const pairs = [cover, basis].flatMap((block) => pairsOf(segmentsOf([block], record, fonts)));
  const names = new Set([...FIELDS].map((name) => name.replaceAll(' ', '')));
  return pairs
    .filter(([label]) => names.has(label.visible))
    .flatMap(([label, value]) => {
      const places = found.flatMap((s, i) => (s.visible === label.visible ? [i + 1] : []));
      const results = places.map((i) =>
        compareSegments([value], found.slice(i, i + 1), () => false),
      );
      const [first] = results;
      if (!first || results.some((r) => r.reasons.length === 0)) return [];
      return first.reasons.map((reason) => ({
        member: null,
        reason: `the field "${label.visible}": ${reason}`,
      }));
    });
}

const pairsOf = (segments: readonly ExpectedSegment[]) =>
  segments.slice(1).map((value, i) => [segments[i] as ExpectedSegment, value] as const);
