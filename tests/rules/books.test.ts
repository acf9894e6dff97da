import { describe, expect, it } from 'vitest';
import { defineFormula, type Formula } from '#shared/calc/formula.ts';
import { texOf } from '#shared/expr/tex.ts';
import { defineBook } from '#shared/standards/book.ts';
import { BOOKS, symbolTex } from '#shared/standards/library.ts';
import { render, same } from './printed-formula.ts';
import { valueOfTex } from './tex-reader.ts';

/* Structural: the books, and every formula of theirs as it prints in symbols. */
const formulas: readonly Formula[] = BOOKS.flatMap((b) => [...b.formulas.values()]);

describe('the books', () => {
  it('hold both standards with their formulas', () => {
    expect(BOOKS.map((b) => b.id)).toEqual(['aisc360-22', 'elastic-theory', 'section-properties']);
    expect(formulas.length).toBeGreaterThan(80);
    expect(new Set(formulas.map((f) => f.id)).size).toBe(formulas.length);
  });
  it('refuse a formula whose symbols are not its operands', () => {
    const text = {
      id: 'x',
      clause: 'A',
      title: 'any',
      symbol: 'Pn',
      dimension: 'force',
      expression: 'Fn*Ag',
    } as const;
    expect(() => defineFormula('b', { ...text, operands: { Fn: 'stress' } })).toThrow(/declares/);
    expect(() =>
      defineFormula('b', { ...text, operands: { Fn: 'stress', Ag: 'area', d: 'length' } }),
    ).toThrow(/declares/);
  });
  it('refuse a symbol without an entry, or of another dimension, and an id twice', () => {
    const [book] = BOOKS;
    if (!book) throw new Error('no book');
    const formula = (dimension: 'force' | 'moment', symbol = 'Pn') =>
      defineFormula('b', {
        id: 'x',
        clause: 'A',
        title: 'any',
        symbol,
        dimension,
        expression: 'Fn*Ag',
        operands: { Fn: 'stress', Ag: 'area' },
      });
    const { id, name, title, symbols } = book;
    const define = (...with_: Formula[]) => defineBook({ id, name, title, symbols }, with_);
    expect(define(formula('force')).formulas.size).toBe(1);
    expect(() => define(formula('moment'))).toThrow(/Pn is force, not moment/);
    expect(() => define(formula('force', 'Nothing'))).toThrow(/no symbol Nothing/);
    expect(() => define(formula('force'), formula('force'))).toThrow(/two formulas/);
  });
});

describe('a printed equation in symbols', () => {
  for (const formula of formulas)
    it(formula.id, () => {
      const names = Object.keys(formula.operands);
      // Its own symbols set without an error; symbols v₁ … read back to the value.
      render(
        texOf(formula.expression.tree, (name) => ({
          tex: symbolTex(name, formula.book),
          kind: 'symbol',
          negative: false,
          power: false,
        })),
      );
      const tex = texOf(formula.expression.tree, (name) => ({
        tex: `v_{${names.indexOf(name)}}`,
        kind: 'symbol',
        negative: false,
        power: false,
      }));
      const values = names.map((_, i) => 0.31 + 0.17 * i);
      const expected = formula.expression.evaluate(
        Object.fromEntries(names.map((n, i) => [n, values[i] ?? 0])),
      );
      const read = valueOfTex(tex, Object.fromEntries(values.map((v, i) => [`v_{${i}}`, v])));
      expect(same(read, expected), `${tex} reads as ${read}, is ${expected}`).toBe(true);
    });
});

describe('every symbol of the books', () => {
  for (const book of BOOKS)
    it(`${book.id} sets`, () => {
      for (const { tex, meaning } of Object.values(book.symbols)) {
        render(tex);
        expect(meaning.length).toBeGreaterThan(3);
      }
    });
});
