import type { FontSet } from '#server/pdf/font-set.ts';
import type { Item, Part, Row } from '#server/pdf/items.ts';
import { measureDocument } from '#server/pdf/measure-document.ts';
import { papers } from '#server/pdf/paper.ts';
import { setText } from '#server/pdf/text-runs.ts';
import { placedLines } from '#shared/calc/address.ts';
import type { Line, LineKind } from '#shared/calc/line.ts';
import type { CalculationRecord } from '#shared/calc/record.ts';
import { pageFrame } from '#shared/report/assemble.ts';
import { unsignedDocument } from '#shared/report/document-data.ts';
import { wholeMemberSheet } from '#shared/report/member-sheet.ts';
import type { Block, DocumentTree, LineBlock } from '#shared/report/tree.ts';
import { bare, type Segment } from './page-text.ts';

export type ExpectedSegment = Omit<Segment, 'page' | 'baselines'>;

/** A block of a member's sheet with the segments that it must stand in. */
export interface ExpectedBlock {
  readonly member: string;
  /** Of a line; null for heads, figures and the verdict. */
  readonly line: {
    readonly address: string;
    readonly kind: LineKind;
    readonly number: string;
    /** Its last segment is its result or its verdict. */
    readonly result: boolean;
  } | null;
  /** Texts that the record itself has: they are no words of the program. */
  readonly fixed: ReadonlySet<string>;
  /** What the block is called where it is not a line. */
  readonly name: string;
  readonly segments: readonly ExpectedSegment[];
}

const NAMES: Readonly<Partial<Record<Block['kind'], string>>> = {
  sheetHead: 'the head of the sheet',
  verdict: 'the verdict',
  figure: 'a figure',
  lineSection: 'the head of a section',
  heading: 'the head of a combination',
};

/** The sheets of all members as their pages must say them, in order. */
export function expectedSheets(record: CalculationRecord, fonts: FontSet): ExpectedBlock[] {
  return record.members.flatMap((member) => {
    const lines = new Map(placedLines(member).map((p) => [p.address, p.line]));
    return wholeMemberSheet(record, member.id).map(
      (block): ExpectedBlock => ({
        member: member.id,
        line: block.kind === 'line' ? lineOf(block) : null,
        fixed: fixedTexts(block, 'address' in block ? lines.get(block.address ?? '') : undefined),
        name: NAMES[block.kind] ?? block.kind,
        segments: segmentsOf([block], record, fonts),
      }),
    );
  });
}

function fixedTexts(block: Block, line: Line | undefined): ReadonlySet<string> {
  if (block.kind === 'sheetHead') return new Set([block.mark].map(bare));
  if (block.kind === 'lineSection') return new Set([block.title, block.reference].map(bare));
  if (block.kind !== 'line') return new Set();
  const words =
    line?.kind === 'notice' ? line.text : line?.kind === 'statement' ? line.statement : '';
  return new Set([block.title, words].map(bare));
}

const lineOf = ({ address, lineKind, number, result, verdict }: LineBlock) => ({
  address,
  kind: lineKind as LineKind,
  number,
  result: result !== null || verdict !== null,
});

/** The segments of some blocks, as the report sets them. */
export const segmentsOf = (
  blocks: readonly Block[],
  record: CalculationRecord,
  fonts: FontSet,
): ExpectedSegment[] => rowsOf(blocks, record, fonts).flatMap((row) => rowSegments(row, fonts));

/** Rows of blocks: widths and page breaks don't matter, only what stands in them. */
export function rowsOf(blocks: readonly Block[], record: CalculationRecord, fonts: FontSet): Row[] {
  const frame = pageFrame(record, unsignedDocument('', '', 'A4'));
  const tree: DocumentTree = { language: 'en', title: '', frame, blocks };
  return measureDocument(tree, papers.A4, fonts);
}

export const rowSegments = (row: Row, fonts: FontSet): ExpectedSegment[] =>
  row.parts.flatMap((part) => partSegment(part, fonts) ?? []);

function partSegment({ tag, items }: Part, fonts: FontSet): ExpectedSegment | null {
  const content = items.filter((i) => ['text', 'formula', 'path'].includes(i.kind));
  if (!tag || content.length === 0) return null;
  const pieces = content.map((item) => bare(visibleText(item, fonts))).filter((p) => p !== '');
  return {
    visible: pieces.join(''),
    pieces,
    actual: content.flatMap((item) => actualText(item, fonts)).map(bare),
    alt: tag.alt === undefined ? null : bare(tag.alt),
  };
}

function visibleText(item: Item, fonts: FontSet): string {
  if (item.kind === 'formula')
    return item.lines
      .flatMap(({ formula }) => formula.pieces.map((p) => (p.kind === 'glyphs' ? p.text : '')))
      .join('');
  if (item.kind !== 'text') return '';
  const { face, text } = item;
  return [...bare(text)].map((c) => (fonts.has(face, c) ? c : '\ufffd')).join('');
}

function actualText(item: Item, fonts: FontSet): string[] {
  if (item.kind === 'formula') return [item.text];
  return item.kind === 'text' && setText(fonts, item.face, item.text).altered ? [item.text] : [];
}
