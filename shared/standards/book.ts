import { defineFormula, type Formula, type FormulaText } from '../calc/formula.ts';
import type { Clause } from '../calc/line.ts';
import type { DimensionName } from '../units/dimension.ts';

/** A symbol as the standard writes it, with its meaning in our own words. */
export interface BookSymbol {
  readonly tex: string;
  readonly meaning: string;
  readonly dimension: DimensionName;
}

/** A constant that a clause gives: a resistance factor, α, a limit. */
export interface Parameter {
  readonly symbol: string;
  readonly value: number;
  readonly title: string;
  readonly clause: string;
}

/** A standard's edition as data; the procedure that orders its clauses stands in `members`. */
export interface Book {
  readonly id: string;
  /** Short name for references: `ANSI/AISC 360-22`. */
  readonly name: string;
  readonly title: string;
  readonly symbols: Readonly<Record<string, BookSymbol>>;
  readonly formulas: ReadonlyMap<string, Formula>;
}

export const symbol = (
  tex: string,
  meaning: string,
  dimension: DimensionName = 'none',
): BookSymbol => ({
  tex,
  meaning,
  dimension,
});

/** Makes the two short forms that a book's clause files use. */
export function bookWriter(book: string) {
  return {
    formula: (text: FormulaText): Formula => defineFormula(book, text),
    clause: (clause: string, equation: string | null = null): Clause => ({
      book,
      clause,
      equation,
    }),
  };
}

/** Registers a book's formulas; throws on a repeated id or a symbol that its table doesn't have. */
export function defineBook(book: Omit<Book, 'formulas'>, formulas: readonly Formula[]): Book {
  const byId = new Map<string, Formula>();
  for (const formula of formulas) {
    if (byId.has(formula.id)) throw new Error(`two formulas ${formula.id}`);
    for (const [name, dimension] of [
      ...Object.entries(formula.operands),
      [formula.symbol, formula.dimension] as const,
    ]) {
      const known = book.symbols[name];
      if (!known) throw new Error(`${formula.id}: no symbol ${name} in the table of ${book.id}`);
      if (known.dimension !== dimension)
        throw new Error(`${formula.id}: ${name} is ${known.dimension}, not ${dimension}`);
    }
    byId.set(formula.id, formula);
  }
  return Object.freeze({ ...book, formulas: byId });
}
