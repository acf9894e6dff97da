import type { Formula } from '../calc/formula.ts';
import { aisc360 } from './aisc360-22/book.ts';
import type { Book, BookSymbol } from './book.ts';
import { elasticTheory } from './elastic-theory/book.ts';
import { sectionProperties } from './section-properties/book.ts';

/** All books, the standard first. */
export const BOOKS: readonly Book[] = [aisc360, elasticTheory, sectionProperties];

export const bookNamed = (id: string): Book | undefined => BOOKS.find((b) => b.id === id);

/** The formula of that id in its book, or undefined. */
export const formulaNamed = (id: string): Formula | undefined =>
  bookNamed(id.split('/')[0] ?? '')?.formulas.get(id);

/** A symbol in a book's table, else in any other book's; undefined where none knows it. */
export function symbolNamed(name: string, book?: string): BookSymbol | undefined {
  const first = book ? bookNamed(book)?.symbols[name] : undefined;
  return first ?? BOOKS.map((b) => b.symbols[name]).find((s) => s !== undefined);
}

/** TeX of a symbol; throws on a name without one, which a test would have found. */
export function symbolTex(name: string, book?: string): string {
  const found = symbolNamed(name, book);
  if (!found) throw new Error(`no symbol ${name}`);
  return found.tex;
}
