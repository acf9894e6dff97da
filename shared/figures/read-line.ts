import type { ValuedLine } from '../calc/line.ts';
import { type PrintedForm, printedForms, textGiven } from '../calc/printed.ts';
import type { UnitSet } from '../units/unit-set.ts';
import type { NamedDrawn } from './drawing.ts';

/** A value as it is read, cut into number and unit: `22`, `ft`. */
export interface ReadForm {
  readonly value: string;
  readonly unit: string;
}

export const withUnit = (form: PrintedForm): string => joined(readForm(form));

const readForm = (form: PrintedForm): ReadForm => ({ value: form.number.text, unit: form.unit });

const joined = ({ value, unit }: ReadForm): string => (unit === '' ? value : `${value} ${unit}`);

/**
 * The printed forms of a value in the order they are read, at most two. A computed value and a
 * given one: the trade's unit first, then the working unit. A value from a table: as published,
 * then the working unit.
 */
export function readForms(line: ValuedLine, set: UnitSet): ReadForm[] {
  const { working, display, typed } = printedForms(line, set);
  if (line.kind === 'lookup') {
    const own = typed === null ? [] : [cut(typed)];
    return [...own, ...[working].filter((f) => f !== null).map(readForm)];
  }
  const forms = [display, working].filter((f) => f !== null).map(readForm);
  const text = textGiven(line);
  return forms.length === 0 && text !== null ? [cut(text)] : forms;
}

/** The value of a line as it is read in a figure, a table, a sentence: `134.4 kip ft`. */
export function readText(line: ValuedLine, set: UnitSet): string {
  const [first] = readForms(line, set);
  return first ? joined(first) : '';
}

const cut = (text: string): ReadForm => {
  const [, value = text, unit = ''] = /^([−\-+.\d\u2009]+)\s+(\D.*)$/.exec(text) ?? [];
  return { value, unit };
};

/** A line as the figures draw it: value for the geometry, printed form for the label. */
export const drawn = (line: ValuedLine, set: UnitSet): NamedDrawn => ({
  symbol: line.symbol,
  value: line.value,
  text: readText(line, set),
});

/** The same with the label in the working unit of the sheet, whatever the table publishes in. */
export function drawnInWorkingUnit(line: ValuedLine, set: UnitSet): NamedDrawn {
  const form = readForms(line, set).at(-1);
  return { symbol: line.symbol, value: line.value, text: form ? joined(form) : '' };
}
