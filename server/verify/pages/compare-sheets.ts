import type { VerifyProblem } from '../problem.ts';
import { type Compared, compareSegments, significant } from './compare-segments.ts';
import type { ExpectedBlock, ExpectedSegment } from './expected-pages.ts';
import { type FoundBlock, misplaced } from './misplaced.ts';
import type { Segment } from './page-text.ts';

export interface PageProblem {
  readonly block: ExpectedBlock;
  readonly reason: string;
}

interface ComparedSheets {
  readonly problems: readonly PageProblem[];
  /** Blocks whose words differ while their numbers agree. */
  readonly reworded: number;
}

/** Compares the sheets of all members with the segments of the pages, block by block. */
export function compareSheets(
  blocks: readonly ExpectedBlock[],
  found: readonly Segment[],
): ComparedSheets {
  const problems: PageProblem[] = [];
  const placed: FoundBlock[] = [];
  let reworded = 0;
  let at = startOf(blocks, found);
  let before: ExpectedBlock | null = null;
  let beforeAt = at;
  for (const block of blocks) {
    const place = block.line ? placeOf(block, found, at, beforeAt + 1) : at;
    if (place > at) {
      const extra = found.slice(at, place).map((s) => s.visible);
      problems.push({
        block: before ?? block,
        reason: `page ${found[at]?.page} shows "${extra.join(' ')}" beside what the record gives`,
      });
    }
    const own = found.slice(place, place + block.segments.length);
    placed.push({ block, found: own });
    const compared = block.name === 'a figure' ? figure(block, own, blocks) : lineOf(block, own);
    problems.push(...compared.reasons.map((reason) => ({ block, reason })));
    if (compared.reworded) reworded += 1;
    before = block;
    beforeAt = place;
    at = place + block.segments.length;
  }
  for (const { block, found: own } of misplaced(placed)) {
    const reason = `page ${own[0]?.page} shows a part of it in another line's place`;
    problems.push({ block, reason });
  }
  return { problems, reworded };
}

/** Number, clause and result of a line, and the record's own words, agree in every character. */
const lineOf = ({ line, segments, fixed }: ExpectedBlock, found: readonly Segment[]): Compared =>
  compareSegments(
    segments,
    found,
    (index) =>
      fixed.has(segments[index]?.visible ?? '') ||
      (line !== null && (index < 2 || (line.result && index === segments.length - 1))),
  );

/** A figure may be drawn otherwise by another version, but shows no number that its sheet lacks. */
function figure(
  block: ExpectedBlock,
  found: readonly Segment[],
  blocks: readonly ExpectedBlock[],
): Compared {
  const same = compareSegments(block.segments, found, () => false);
  if (same.reasons.length === 0) return same;
  const known = new Set(
    blocks.filter((b) => b.member === block.member).flatMap((b) => b.segments.flatMap(numbersIn)),
  );
  const reasons = found.flatMap((segment) =>
    numbersIn(segment)
      .filter((number) => !known.has(number))
      .map((number) => `page ${segment.page} shows ${number}, which the sheet does not have`),
  );
  return { reasons, reworded: reasons.length === 0 };
}

const numbersIn = ({ pieces, alt }: ExpectedSegment): string[] =>
  [...pieces, alt ?? '']
    .flatMap((text) => significant(text).split(' '))
    .filter((token) => /\d/.test(token));

const isNumber = (block: ExpectedBlock, found: readonly Segment[], at: number): boolean =>
  found[at]?.visible === block.line?.number;

/** Whether a line stands at a place: its number and what follows it. */
const standsAt = (block: ExpectedBlock, found: readonly Segment[], at: number): boolean =>
  isNumber(block, found, at) &&
  (block.segments[1] === undefined || found[at + 1]?.visible === block.segments[1].visible);

/** Where the sheets begin: so many segments before the number of their first line. */
function startOf(blocks: readonly ExpectedBlock[], found: readonly Segment[]): number {
  const first = blocks.findIndex((b) => b.line !== null);
  const lead = blocks.slice(0, Math.max(first, 0)).reduce((n, b) => n + b.segments.length, 0);
  const block = blocks[first];
  const at = block ? found.findIndex((_, i) => standsAt(block, found, i)) : -1;
  const total = blocks.reduce((n, b) => n + b.segments.length, 0);
  return Math.max(0, at < 0 ? found.length - total : at - lead);
}

/** Where a line stands: as expected, or else wherever its number is found after `least`. */
function placeOf(
  block: ExpectedBlock,
  found: readonly Segment[],
  expected: number,
  least: number,
): number {
  if (isNumber(block, found, expected)) return expected;
  for (let at = least; at < found.length; at += 1) if (standsAt(block, found, at)) return at;
  return expected;
}

/** A page's problem as a problem of the verification. */
export const pageProblem = (
  { block, reason }: PageProblem,
  markOf: (member: string) => string,
): VerifyProblem => ({
  member: { id: block.member, mark: markOf(block.member) },
  address: block.line?.address ?? null,
  kind: block.line?.kind ?? 'page',
  by: 'page',
  reason: block.line ? reason : `${block.name}: ${reason}`,
});
