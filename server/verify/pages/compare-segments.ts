import type { ExpectedSegment } from './expected-pages.ts';
import type { Segment } from './page-text.ts';

/** What a comparison found: reasons, and whether words other than numbers differ. */
export interface Compared {
  readonly reasons: readonly string[];
  readonly reworded: boolean;
}

/*
 * What must not differ: figures with their signs, relations, verdicts, and the small word that turns
 * a sentence around. Other words belong to the version of the program that wrote the pages.
 */
const SIGNIFICANT = /NOTOK|NOTCHECKED|FAILED|OK|not|[\d.]*\d|[⁰¹²³⁴⁵⁶⁷⁸⁹]+|[−×<>≤≥=%]/g;

export const significant = (text: string): string => (text.match(SIGNIFICANT) ?? []).join(' ');

const WAYS = [
  { says: 'shows', of: (s: ExpectedSegment) => [s.visible] },
  { says: 'is copied as', of: (s: ExpectedSegment) => s.actual },
  { says: 'is read aloud as', of: (s: ExpectedSegment) => (s.alt === null ? [] : [s.alt]) },
] as const;

/**
 * Compares the segments of a block with those on the pages, one by one; `strict` says which of them
 * must agree in every character.
 */
export function compareSegments(
  expected: readonly ExpectedSegment[],
  found: readonly Segment[],
  strict: (index: number) => boolean,
): Compared {
  const reasons: string[] = [];
  let reworded = false;
  for (const [index, want] of expected.entries()) {
    const have = found[index];
    if (!have) {
      reasons.push(`the pages lack "${short(want.visible)}"`);
      continue;
    }
    for (const { says, of } of WAYS) {
      const [a, b] = [of(have).join('|'), of(want).join('|')];
      if (a === b) continue;
      if (strict(index) || significant(a) !== significant(b))
        reasons.push(`page ${have.page} ${says} ${differing(a, b)}`);
      else reworded = true;
    }
  }
  return { reasons, reworded };
}

/** The neighbourhood of the first difference of two texts. */
function differing(found: string, wanted: string): string {
  let at = 0;
  while (at < found.length && at < wanted.length && found[at] === wanted[at]) at += 1;
  const from = at <= 24 ? 0 : at - 16;
  const part = (text: string): string => `"${from > 0 ? '…' : ''}${short(text.slice(from))}"`;
  return `${part(found)}, the record gives ${part(wanted)}`;
}

const short = (text: string): string => (text.length > 48 ? `${text.slice(0, 48)}…` : text);
