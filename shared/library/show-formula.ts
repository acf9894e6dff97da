import type { Formula } from '../calc/formula.ts';
import { type LeafOf, texOf } from '../expr/tex.ts';
import { textOf } from '../expr/text.ts';
import { isCompound, symbolText } from '../report/symbol-text.ts';
import { symbolNamed, symbolTex } from '../standards/library.ts';
import { UNIT_SETS, type UnitSetName } from '../units/unit-set.ts';

/**
 * A formula in its own symbols: `F_n = 0.658^{F_y/F_e} F_y`, for the eye and in one line of text.
 * A quantity whose symbol says how it is computed (`Fy/Fe`) stands without its equation.
 */
export function showFormula(formula: Formula): { readonly tex: string; readonly text: string } {
  const { book, symbol, expression } = formula;
  const leaf: LeafOf = (name) => {
    const tex = symbolTex(name, book);
    return { tex, kind: 'symbol', negative: false, power: isCompound(tex) };
  };
  const words = (name: string) => {
    const tex = symbolTex(name, book);
    return isCompound(tex) ? `(${symbolText(tex)})` : symbolText(tex);
  };
  const left = symbolTex(symbol, book);
  const [tex, text] = [texOf(expression.tree, leaf), textOf(expression.tree, words)];
  const letters = (one: string) => one.replace(/[\s()·]/g, '');
  if (letters(symbolText(left)) === letters(text)) return { tex, text };
  return { tex: `${left}=${tex}`, text: `${symbolText(left)} = ${text}` };
}

/** How a formula is called in a list: its equation's number, or the symbol of what it gives. */
export const shortNameOf = ({ equation, symbol, book }: Formula): string =>
  equation ?? symbolText(symbolTex(symbol, book));

/** One row of a table of symbols. */
export interface SymbolRow {
  /** Name in the book's table. */
  readonly name: string;
  readonly tex: string;
  /** In plain letters: `Fy`, `λrf`. */
  readonly text: string;
  readonly meaning: string;
  /** Units in which it prints, working unit first: `in`, `ft`; none for a plain number. */
  readonly units: Readonly<Record<UnitSetName, readonly string[]>>;
}

/** The symbols of some formulas of one book, each once, in the order in which they first appear. */
export function symbolsOf(formulas: readonly Formula[]): SymbolRow[] {
  const rows = new Map<string, SymbolRow>();
  for (const { book, symbol, expression } of formulas)
    for (const name of [symbol, ...expression.symbols])
      if (!rows.has(name)) rows.set(name, symbolRow(name, book));
  return [...rows.values()];
}

function symbolRow(name: string, book: string): SymbolRow {
  const found = symbolNamed(name, book);
  if (!found) throw new Error(`no symbol ${name}`);
  const { tex, meaning, dimension } = found;
  const unitsIn = (set: UnitSetName): string[] => {
    const { working, display } = UNIT_SETS[set];
    return [working[dimension], display[dimension]].flatMap((unit) => unit?.name || []);
  };
  const units = { us: unitsIn('us'), si: unitsIn('si') };
  return { name, tex, text: symbolText(tex), meaning, units };
}
