import type { Formula } from '../calc/formula.ts';
import { clauseText } from '../report/reference-text.ts';
import type { Book } from '../standards/book.ts';
import { bookNamed } from '../standards/library.ts';
import { CLAUSE_TITLES } from './clause-titles.ts';

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

/** The clauses of a book in the standard's order: chapters by letter, then the appendices. */
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
      title: CLAUSE_TITLES[book.id]?.[clause] ?? formulas[0]?.title ?? clause,
    }))
    .sort((a, b) => compareClauses(a.clause, b.clause));
}

/** The clause of that name, or undefined where the book has no formula of it. */
export function clauseNamed(bookId: string, clause: string): LibraryClause | undefined {
  const book = bookNamed(bookId);
  return book && clausesOf(book).find((one) => one.clause === clause);
}

const APPENDIX = /^App(endix|\.) /;

/** Order of two clauses of one book: numbers as numbers, an appendix after every chapter. */
export function compareClauses(a: string, b: string): number {
  const appendix = Number(APPENDIX.test(a)) - Number(APPENDIX.test(b));
  return appendix || a.localeCompare(b, 'en', { numeric: true });
}
