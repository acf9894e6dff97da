import type { Part, Row, RunningHead } from './items.ts';
import type { PaperSize } from './paper.ts';

/** A row at its place on a page, y from the top of the page. */
export interface PlacedRow {
  readonly y: number;
  readonly parts: readonly Part[];
}

export interface PageContent {
  readonly rows: readonly PlacedRow[];
  readonly running: RunningHead | null;
}

/**
 * Lays rows on pages: a row is never split, a row that keeps with the next one goes with it, and
 * a table's head is repeated. Throws if a single row is higher than a page.
 */
export function paginate(rows: readonly Row[], paper: PaperSize): PageContent[] {
  const room = paper.bottom - paper.top;
  const pages: { rows: PlacedRow[]; running: RunningHead | null; y: number }[] = [];
  const openPage = (first: Row): void => {
    // A break at the top of a page leaves no blank page behind.
    if (pages.at(-1)?.rows.every((row) => row.parts.length === 0)) pages.pop();
    pages.push({ rows: [], running: first.running ?? null, y: 0 });
    for (const head of first.repeated ?? []) {
      place({ ...head, parts: head.parts.map((part) => ({ ...part, tag: null })) });
    }
  };
  const place = (row: Row): void => {
    const page = pages.at(-1);
    if (!page) throw new Error('no page is open');
    const y = page.y + (page.y === 0 ? 0 : row.before);
    page.rows.push({ y: paper.top + y, parts: row.parts });
    page.y = y + row.height;
  };
  const fits = (chain: readonly Row[]): boolean => {
    const page = pages.at(-1);
    if (!page || chain[0]?.breakBefore) return false;
    const height = page.y + heightOf(chain);
    return height - (page.y === 0 ? (chain[0]?.before ?? 0) : 0) <= room;
  };
  for (const chain of chainsOf(rows)) {
    const isWhole = heightOf([...(chain[0]?.repeated ?? []), ...chain]) <= room;
    for (const part of isWhole ? [chain] : chain.map((row) => [row])) {
      const [first] = part;
      if (!first) continue;
      if (first.height > room) throw new Error(`a row of ${first.height} pt is higher than a page`);
      if (!fits(part)) openPage(first);
      part.forEach(place);
    }
  }
  return pages;
}

const heightOf = (rows: readonly Row[]): number =>
  rows.reduce((sum, row) => sum + row.before + row.height, 0);

/** Rows that must stand on one page. */
function chainsOf(rows: readonly Row[]): Row[][] {
  const chains: Row[][] = [];
  let open = false;
  for (const row of rows) {
    if (open && !row.breakBefore) chains.at(-1)?.push(row);
    else chains.push([row]);
    open = row.keep;
  }
  return chains;
}
