import type { PageText } from '#server/verify/pages/page-text.ts';
import type { CalculationRecord } from '#shared/calc/record.ts';

/** A piece of marked content: its page, and its id there. */
export interface Place {
  readonly page: number;
  readonly id: number;
}

/** Finds things on the pages of a PDF as it was made, where ids count the segments of a page. */
export function findPlaces(record: CalculationRecord, pages: readonly PageText[]) {
  /** Printed number of a line: its member's place, and its own among the lines that are counted. */
  function numberOf(mark: string, address: string): string {
    const at = record.members.findIndex((m) => m.mark === mark);
    const { lines = [], combinations = [] } = record.members[at] ?? {};
    const all = [
      ...lines.map(({ key, kind }) => ({ at: key, kind })),
      ...combinations.flatMap((c) =>
        c.lines.map(({ key, kind }) => ({ at: `${c.id}:${key}`, kind })),
      ),
    ];
    const counted = all.filter((line) => line.kind !== 'section');
    return `${at + 1}.${counted.findIndex((line) => line.at === address) + 1}`;
  }

  /** The first segment with such a text; with a line, the first from its number on. */
  function place(wanted: RegExp, line?: readonly [mark: string, address: string]): Place {
    const number = line ? numberOf(...line) : null;
    for (const { segments, number: page } of pages) {
      const from = number === null ? 0 : segments.findIndex((s) => s.visible === number);
      if (from < 0) continue;
      const id = segments.findIndex((s, i) => i >= from && wanted.test(s.visible));
      if (id >= 0) return { page, id };
    }
    throw new Error(`no ${wanted} on the pages${line ? ` for ${line.join(' ')}` : ''}`);
  }

  return { numberOf, place };
}
