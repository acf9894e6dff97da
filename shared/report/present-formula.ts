import type { PlacedLine } from '../calc/address.ts';
import type { LineOf } from '../calc/line.ts';
import type { PrintedForm } from '../calc/printed.ts';
import { parseExpression } from '../expr/parse.ts';
import { type Leaf, type LeafOf, texOf } from '../expr/tex.ts';
import { textOf } from '../expr/text.ts';
import { type Presenter, usedForm } from './presenter.ts';
import { isCompound, symbolText } from './symbol-text.ts';

/** TeX of an operand, marked with the line it leads to. */
export const linked = (address: string, tex: string): string =>
  `\\htmlData{ref=${address}}{${tex}}`;

export const valueLeaf = (form: PrintedForm, address: string): Leaf => ({
  tex: linked(address, form.number.tex),
  kind: 'value',
  negative: form.number.tex.startsWith('-'),
  power: form.number.tex.includes('\\times'),
});

/** A symbol that is an expression of its own is bracketed like a ×10ⁿ value. */
const symbolLeaf = (tex: string, address: string | null): Leaf => ({
  tex: address === null ? tex : linked(address, tex),
  kind: 'symbol',
  negative: false,
  power: isCompound(tex),
});

export interface Step {
  readonly tex: string;
  readonly text: string;
}

type Computed = LineOf<'formula'> | LineOf<'root'>;

const operandOf = (line: Computed, name: string): { ref: string; symbol: string } => {
  const operand = line.operands[name];
  if (!operand) throw new Error(`${line.key}: no operand ${name}`);
  return operand;
};

/** The formula in symbols, those of the operands where they differ from the formula's own. */
export function symbolicStep(p: Presenter, placed: PlacedLine, line: Computed): Step {
  const { tree } = parseExpression(line.expression);
  const unknown = line.kind === 'root' ? line.unknown : null;
  const texFor = (name: string): string =>
    p.symbolTex(line, name === unknown ? name : operandOf(line, name).symbol);
  const leaf: LeafOf = (name) =>
    symbolLeaf(
      texFor(name),
      name === unknown ? null : p.at(operandOf(line, name).ref, placed).address,
    );
  const plainLeaf = (name: string): string => {
    const tex = texFor(name);
    const words = symbolText(tex);
    return /[/+−*]/.test(words) && !/^\|.*\|$/.test(words) ? `(${words})` : words;
  };
  return {
    tex: texOf(tree, leaf),
    text: textOf(tree, plainLeaf).replace(/\(\(([^()]*)\)\)/g, '($1)'),
  };
}

/** The same with the operands' printed values; the unknown of a root stays a symbol. */
export function substitutedStep(p: Presenter, placed: PlacedLine, line: Computed): Step {
  const { tree } = parseExpression(line.expression);
  const unknown = line.kind === 'root' ? line.unknown : null;
  const own = (name: string): string => p.symbolTex(line, name);
  const form = (name: string): PrintedForm => usedForm(p, operandOf(line, name).ref, placed);
  const leaf: LeafOf = (name) =>
    name === unknown
      ? symbolLeaf(own(name), null)
      : valueLeaf(form(name), p.at(operandOf(line, name).ref, placed).address);
  return {
    tex: texOf(tree, leaf),
    text: textOf(tree, (name) =>
      name === unknown ? symbolText(own(name)) : form(name).number.text,
    ),
  };
}
