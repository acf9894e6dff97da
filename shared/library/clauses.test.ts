import { describe, expect, it } from 'vitest';
import { BOOKS } from '../standards/library.ts';
import { clauseNamed, clausesOf, compareClauses, titleOf } from './clauses.ts';

describe('the clauses of a book', () => {
  it('stand in the order of the standard', () => {
    const clauses = [
      'Commentary App. 7.2',
      'H1.1',
      'App. 8.1.2',
      'E7',
      'F13.2',
      'E7.1',
      'F2.1',
      'App. 7.3',
      'B4.1',
    ];
    expect(clauses.sort(compareClauses)).toEqual([
      ...['B4.1', 'E7', 'E7.1', 'F2.1', 'F13.2', 'H1.1', 'App. 7.3', 'App. 8.1.2'],
      'Commentary App. 7.2',
    ]);
  });

  it.each(BOOKS.map((book) => [book.id, book] as const))(
    '%s: hold every formula once',
    (_, book) => {
      const formulas = clausesOf(book).flatMap((clause) => clause.formulas);
      expect(formulas).toHaveLength(book.formulas.size);
      expect(new Set(formulas)).toEqual(new Set(book.formulas.values()));
    },
  );

  it.each(BOOKS.map((book) => [book.id, book] as const))(
    '%s: each has a title in its manifest or in clause-titles.ts',
    (_, book) => {
      const without = clausesOf(book).filter(({ clause }) => !titleOf(book, clause));
      expect(without.map(({ clause }) => clause)).toEqual([]);
    },
  );

  it('are found by name, or not at all', () => {
    expect(clauseNamed('aisc360-22', 'E3')).toMatchObject({
      ...{ clause: 'E3', reference: 'E3', title: 'Flexural buckling' },
    });
    expect(clauseNamed('elastic-theory', '1.1')?.reference).toBe('theory 1.1');
    expect(clauseNamed('aisc360-22', 'Z9')).toBeUndefined();
    expect(clauseNamed('nothing', 'E3')).toBeUndefined();
  });
});
