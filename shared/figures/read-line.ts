import type { ValuedLine } from '../calc/line.ts';
import { formOf, type PrintedForm, printedForms, printForm } from '../calc/printed.ts';
import type { UnitSet } from '../units/unit-set.ts';
import type { NamedDrawn } from './drawing.ts';

export const withUnit = (form: PrintedForm): string =>
  form.unit === '' ? form.number.text : `${form.number.text} ${form.unit}`;

/** The value of a line as it is read in a figure, a table, a sentence: `134.4 kip ft`. */
export function readText(line: ValuedLine, set: UnitSet): string {
  const form = formOf(line, 'display', set);
  const digits = line.print[form];
  if (digits) return withUnit(printForm(line, form, digits, set));
  const { working, display, typed } = printedForms(line, set);
  const printed = display ?? working;
  return printed ? withUnit(printed) : (typed ?? '');
}

/** A line as the figures draw it: value for the geometry, printed form for the label. */
export const drawn = (line: ValuedLine, set: UnitSet): NamedDrawn => ({
  symbol: line.symbol,
  value: line.value,
  text: readText(line, set),
});
