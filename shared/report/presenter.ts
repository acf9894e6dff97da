import { addressOf, type PlacedLine, placedLines } from '../calc/address.ts';
import { formUsed } from '../calc/closure-rules.ts';
import { isValued, type Line, type ValuedLine } from '../calc/line.ts';
import { type PrintedForm, printForm } from '../calc/printed.ts';
import type { MemberRecord } from '../calc/record.ts';
import { withUnit } from '../figures/read-line.ts';
import { printNumber } from '../units/format.ts';
import { UNIT_SETS, type UnitSet, type UnitSetName } from '../units/unit-set.ts';
import { symbolText } from './symbol-text.ts';
import type { Inline } from './tree.ts';

/** TeX of a symbol as a line's book writes it. */
export type SymbolTex = (book: string | null, name: string) => string;

/** What presenting a line needs to know of the sheet around it. */
export interface Presenter {
  readonly member: MemberRecord;
  readonly set: UnitSet;
  readonly placed: readonly PlacedLine[];
  /** Printed number of a line: `12.7`. */
  number(address: string): string;
  /** The line a reference found in `from` leads to, with its full address. */
  at(ref: string, from: PlacedLine): PlacedLine;
  symbolTex(line: Line, name: string): string;
}

/** Presents one member, the `position`th of its calculation (from 1), in the units of the record. */
export function createPresenter(
  member: MemberRecord,
  position: number,
  units: UnitSetName,
  symbolTex: SymbolTex,
): Presenter {
  const placed = placedLines(member);
  const byAddress = new Map(placed.map((p) => [p.address, p]));
  const counted = placed.filter((p) => p.line.kind !== 'section');
  const numbers = new Map(counted.map((p, index) => [p.address, `${position}.${index + 1}`]));
  return {
    member,
    set: UNIT_SETS[units],
    placed,
    number: (address) => numbers.get(address) ?? '',
    at: (ref, from) => {
      const found = byAddress.get(addressOf(ref, from.combination));
      if (!found) throw new Error(`${from.address} refers to ${ref}, which is not there`);
      return found;
    },
    symbolTex: (line, name) => symbolTex(line.clause?.book ?? null, name),
  };
}

export const valuedAt = (p: Presenter, ref: string, from: PlacedLine): ValuedLine => {
  const { line, address } = p.at(ref, from);
  if (!isValued(line)) throw new Error(`${address} has no value`);
  return line;
};

/** The printed form in which `from` uses the value at `ref`. */
export function usedForm(p: Presenter, ref: string, from: PlacedLine): PrintedForm {
  const operand = valuedAt(p, ref, from);
  const form = formUsed(from.line, operand, p.set);
  const digits = operand.print[form];
  if (!digits)
    throw new Error(`${ref} does not print in its ${form} unit, which ${from.address} uses`);
  return printForm(operand, form, digits, p.set);
}

/** A ratio or a percentage by the digits its line fixed. */
export const printedBy = (
  value: number,
  digits: { sig: number } | { dec: number } | null,
): string => printNumber(value, digits ?? { dec: 3 }).text;

export const text = (words: string): Inline => ({ kind: 'text', text: words });
export const strong = (words: string): Inline => ({ kind: 'text', text: words, strong: true });

/** `ψ = 0.8814` with the value as a link to its line. */
export function symbolAndValue(p: Presenter, ref: string, from: PlacedLine): Inline[] {
  const { line, address } = p.at(ref, from);
  if (line.kind === 'statement') return [text(line.statement)];
  const valued = valuedAt(p, ref, from);
  const tex = p.symbolTex(valued, valued.symbol);
  return [
    { kind: 'math', tex, text: symbolText(tex) },
    text(' = '),
    { kind: 'value', text: withUnit(usedForm(p, ref, from)), address },
  ];
}

export const plain = (inlines: readonly Inline[]): string => inlines.map((i) => i.text).join('');
