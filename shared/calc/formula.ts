import { type ParsedExpression, parseExpression } from '../expr/parse.ts';
import type { DimensionName } from '../units/dimension.ts';

/** A formula of a book: written once; value, symbols, substitution and unit check all come from it. */
export interface Formula {
  /** `aisc360-22/E3-2`. */
  readonly id: string;
  readonly book: string;
  readonly clause: string;
  /** The standard's equation number, or null where it has none. */
  readonly equation: string | null;
  readonly title: string;
  readonly symbol: string;
  readonly dimension: DimensionName;
  readonly expression: ParsedExpression;
  readonly operands: Readonly<Record<string, DimensionName>>;
  /** Unit form of the substitution: coherent working units, or display units where it holds in them. */
  readonly prints: 'working' | 'display';
  /** The result is a utilisation: it prints with three decimals. */
  readonly ratio: boolean;
  /** Where it holds, in words that follow "Holds": `where Fy/Fe ≤ 2.25`; null where nothing is said. */
  readonly validity: string | null;
}

export interface FormulaText {
  readonly id: string;
  readonly clause: string;
  readonly equation?: string;
  readonly title: string;
  readonly symbol: string;
  readonly dimension: DimensionName;
  readonly expression: string;
  readonly operands: Readonly<Record<string, DimensionName>>;
  readonly prints?: 'working' | 'display';
  readonly ratio?: boolean;
  readonly validity?: string;
}

/** Makes a formula; throws unless the expression's symbols are exactly the declared operands. */
export function defineFormula(book: string, text: FormulaText): Formula {
  const expression = parseExpression(text.expression);
  const used = [...expression.symbols].sort().join(' ');
  const declared = Object.keys(text.operands).sort().join(' ');
  if (used !== declared)
    throw new Error(`${book}/${text.id}: uses "${used}", declares "${declared}"`);
  return Object.freeze({
    id: `${book}/${text.id}`,
    book,
    clause: text.clause,
    equation: text.equation ?? null,
    title: text.title,
    symbol: text.symbol,
    dimension: text.dimension,
    expression,
    operands: Object.freeze({ ...text.operands }),
    prints: text.prints ?? 'working',
    ratio: text.ratio ?? false,
    validity: text.validity ?? null,
  });
}
