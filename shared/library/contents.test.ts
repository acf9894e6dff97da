import { describe, expect, it } from 'vitest';
import { BOOKS, bookNamed } from '../standards/library.ts';
import { clausesOf } from './clauses.ts';
import { contentsOf } from './contents.ts';

describe('the contents of a book', () => {
  it.each(BOOKS.map((book) => [book.id, book] as const))(
    '%s: lead to every clause with formulas, once',
    (_, book) => {
      const led = contentsOf(book).flatMap(({ library }) => library?.clause ?? []);
      expect(led).toEqual(clausesOf(book).map(({ clause }) => clause));
    },
  );

  it('say of ANSI/AISC 360-22 what is not in the book and why, in its place', () => {
    const book = bookNamed('aisc360-22');
    if (!book) throw new Error('the book is not there');
    const contents = contentsOf(book);
    const [before, e5, after] = contents.slice(
      contents.findIndex(({ clause }) => clause === 'E5') - 1,
    );
    expect(before?.clause).toBe('E4(f)');
    // ANSI/AISC 360-22, E5 is on single angles in compression.
    expect(e5).toMatchObject({ state: 'outside scope', library: null });
    expect(e5?.because).not.toBe('');
    expect(after?.clause).toBe('E6');
  });
});
