import type { Formula } from '../calc/formula.ts';
import { symbolText } from '../report/symbol-text.ts';
import { BOOKS, symbolTex } from '../standards/library.ts';
import { clausesOf, type LibraryClause } from './clauses.ts';

/** A formula as it is searched: everything in small letters. */
interface Entry {
  readonly formula: Formula;
  readonly equation: string;
  readonly clause: string;
  /** `theory`, `1.1`; `app.`, `appendix`, `8.1.2`. */
  readonly places: readonly string[];
  readonly words: readonly string[];
  /** Names and written forms of the result, then of the operands. */
  readonly result: readonly string[];
  readonly symbols: readonly string[];
}

const small = (text: string) => text.toLowerCase();

const entryOf = (formula: Formula, { reference, title }: LibraryClause): Entry => {
  const forms = (name: string) => [small(name), small(symbolText(symbolTex(name, formula.book)))];
  return {
    formula,
    equation: small(formula.equation ?? ''),
    clause: small(formula.clause),
    places: small(reference).replace('app.', 'app. appendix').split(' '),
    words: small(`${formula.title} ${title}`).split(/[^\p{L}\p{N}]+/u),
    result: forms(formula.symbol),
    symbols: formula.expression.symbols.flatMap(forms),
  };
};

let entries: readonly Entry[] | null = null;

const everything = (): readonly Entry[] => {
  entries ??= BOOKS.flatMap(clausesOf).flatMap((clause) =>
    clause.formulas.map((formula) => entryOf(formula, clause)),
  );
  return entries;
};

/** How well one word fits, the best first; null where it does not at all. */
function fitOf(entry: Entry, word: string): number | null {
  const { equation, clause, places, words, result, symbols } = entry;
  if (equation === word) return 0;
  if (equation !== '' && equation.startsWith(word)) return 1;
  if (clause === word) return 1;
  if (places.some((one) => one.startsWith(word))) return 2;
  if (result.includes(word)) return 2;
  if (symbols.includes(word)) return 3;
  if (words.some((one) => one.startsWith(word))) return 3;
  const begun = word.length > 1 && [...result, ...symbols].some((one) => one.startsWith(word));
  return begun ? 4 : null;
}

/**
 * Formulas that every word of a query fits: an equation number, a clause, a symbol, a word of a
 * title. The best fit first, else in the books' order. Empty for an empty query.
 */
export function searchFormulas(query: string): Formula[] {
  const words = small(query).trim().replace(/−/g, '-').split(/\s+/).filter(Boolean);
  if (words.length === 0) return [];
  return everything()
    .flatMap((entry) => {
      const fits = words.map((word) => fitOf(entry, word));
      return fits.includes(null) ? [] : [{ entry, worst: Math.max(...fits.map(Number)) }];
    })
    .sort((a, b) => a.worst - b.worst)
    .map(({ entry }) => entry.formula);
}
