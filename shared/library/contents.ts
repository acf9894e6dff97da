import type { ManifestEntry } from '../standards/aisc360-22/manifest.ts';
import type { Book } from '../standards/book.ts';
import { clausesOf, compareClauses, type LibraryClause } from './clauses.ts';
import { manifestOf } from './manifests.ts';

export type ClauseState = ManifestEntry['state'];

/** A clause in a book's table of contents. */
export interface ContentsEntry extends Pick<ManifestEntry, 'clause' | 'title' | 'because'> {
  readonly state: ClauseState;
  /** Its formulas; null where the book has none of it. */
  readonly library: LibraryClause | null;
}

/** Every clause of a book in the standard's order: its manifest, or the clauses it has formulas of. */
export function contentsOf(book: Book): ContentsEntry[] {
  const library = new Map(clausesOf(book).map((clause) => [clause.clause, clause]));
  const manifest = manifestOf(book.id);
  const listed = new Set(manifest.map(({ clause }) => clause));
  return [
    ...manifest.map((entry) => ({ ...entry, library: library.get(entry.clause) ?? null })),
    ...[...library.values()]
      .filter(({ clause }) => !listed.has(clause))
      .map((clause) => ({
        ...{ clause: clause.clause, title: clause.title, because: '' },
        ...{ state: 'implemented' as const, library: clause },
      })),
  ].sort((a, b) => compareClauses(a.clause, b.clause));
}
