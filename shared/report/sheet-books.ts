import type { CalculationRecord } from '../calc/record.ts';
import type { Book } from '../standards/book.ts';
import { bookNamed, symbolNamed } from '../standards/library.ts';

export type StandardNames = Pick<Book, 'name' | 'title'>;

export function standardNames(id: string): StandardNames {
  const book = bookNamed(id);
  if (!book) throw new Error(`no book ${id}`);
  return book;
}

/** TeX of a symbol as the book writes it; throws on a symbol that no book has. */
export function symbolTex(bookId: string, name: string): string {
  const found = symbolNamed(name, bookId);
  if (found) return found.tex;
  throw new Error(`no symbol ${name} in ${bookId} nor in another book`);
}

/** The calculation's standard first, then the other books its lines cite. */
export function standardsUsed(record: CalculationRecord): StandardNames[] {
  const cited = new Set([record.standard]);
  for (const member of record.members)
    for (const line of [...member.lines, ...member.combinations.flatMap((c) => c.lines)])
      if (line.clause) cited.add(line.clause.book);
  return [...cited].map(standardNames);
}
