import type { Formula } from '../calc/formula.ts';
import { clauseText } from '../report/reference-text.ts';
import type { Book } from '../standards/book.ts';
import { bookNamed } from '../standards/library.ts';
import { CLAUSE_TITLES } from './clause-titles.ts';
import { manifestOf } from './manifests.ts';

/** A clause of a book with the formulas that the book has of it. */
export interface LibraryClause {
  readonly book: Book;
  /** As the book writes it: `E3`, `App. 8.1.2`, `1.1`. */
  readonly clause: string;
  /** As a sheet refers to it: `E3`, `theory 1.1`. */
  readonly reference: string;
  /** In our own words; where nobody has given one, that of the first formula. */
  readonly title: string;
  readonly formulas: readonly Formula[];
}

/** The clauses of a book in the standard's order: chapters, appendices, what the commentary gives. */
export function clausesOf(book: Book): LibraryClause[] {
  const byClause = new Map<string, Formula[]>();
  for (const formula of book.formulas.values()) {
    const known = byClause.get(formula.clause);
    if (known) known.push(formula);
    else byClause.set(formula.clause, [formula]);
  }
  return [...byClause]
    .map(([clause, formulas]) => ({
      ...{ book, clause, formulas },
      reference: clauseText({ book: book.id, clause, equation: null }),
      title: titleOf(book, clause) ?? formulas[0]?.title ?? clause,
    }))
    .sort((a, b) => compareClauses(a.clause, b.clause));
}

/** As the book's manifest calls it; a book without one has a list of titles. */
export const titleOf = (book: Book, clause: string): string | undefined =>
  manifestOf(book.id).find((entry) => entry.clause === clause)?.title ??
  CLAUSE_TITLES[book.id]?.[clause];

/** The clause of that name, or undefined where the book has no formula of it. */
export function clauseNamed(bookId: string, clause: string): LibraryClause | undefined {
  const book = bookNamed(bookId);
  return book && clausesOf(book).find((one) => one.clause === clause);
}

/** In which part of a standard a clause stands. */
const partOf = (clause: string): number =>
  clause.startsWith('Commentary') ? 2 : clause.startsWith('App') ? 1 : 0;

/** Order of two clauses of one book: by parts of the standard, then by letters and numbers. */
export function compareClauses(a: string, b: string): number {
  return partOf(a) - partOf(b) || a.localeCompare(b, 'en', { numeric: true });
}
