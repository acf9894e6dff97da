import { type Digits, type PrintedNumber, printNumber, printTyped } from '../units/format.ts';
import { parseQuantity } from '../units/parse.ts';
import { fromBase, type Unit } from '../units/unit.ts';
import type { UnitSet } from '../units/unit-set.ts';
import type { ValuedLine } from './line.ts';

export type Form = 'working' | 'display';

export interface PrintedForm {
  readonly number: PrintedNumber;
  readonly unit: string;
}

/** All forms in which a value stands on the sheet; null where a form is not printed. */
export interface PrintedForms {
  readonly working: PrintedForm | null;
  readonly display: PrintedForm | null;
  /** The text as typed or published, where it is in neither of those units. */
  readonly typed: string | null;
}

/** The unit of a form of a dimension; a dimension without a display unit has only its working one. */
export const formUnit = (line: ValuedLine, form: Form, set: UnitSet): Unit =>
  (form === 'display' ? set.display[line.dimension] : undefined) ?? set.working[line.dimension];

/** `display` where the dimension has a display unit and it is asked for, else `working`. */
export const formOf = (line: ValuedLine, asked: Form, set: UnitSet): Form =>
  asked === 'display' && set.display[line.dimension] ? 'display' : 'working';

/** Text as typed or published, for lines that have one. */
export const textGiven = (line: ValuedLine): string | null =>
  line.kind === 'given' ? line.typed : line.kind === 'lookup' ? line.published : null;

/** A number of more digits was computed: it prints as other values do, with its text beside it. */
const MOST_TYPED = 12;

/** The number in a typed text when the text is that number in that unit, else null. */
export function numberTyped(line: ValuedLine, unit: Unit): string | null {
  const text = textGiven(line);
  if (text === null) return null;
  const parsed = parseQuantity(text, line.dimension);
  if (!parsed.ok || parsed.quantity.unit.name !== unit.name) return null;
  const number = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?/i.exec(
    text.trim().replace(/\u2212/g, '-'),
  )?.[0];
  if (number === undefined || digitsIn(number) > MOST_TYPED) return null;
  // Feet and inches together are not one number.
  return Math.abs(Number(number) - fromBase(line.value, unit)) <=
    1e-12 * Math.abs(Number(number)) + 1e-300
    ? number
    : null;
}

const digitsIn = (number: string): number =>
  number.replace(/e.*/i, '').replace(/\D/g, '').replace(/^0+/, '').length;

/** Prints one form at the given digits; typed and table values print as they stand. */
export function printForm(line: ValuedLine, form: Form, digits: Digits, set: UnitSet): PrintedForm {
  const unit = formUnit(line, form, set);
  const typed = numberTyped(line, unit);
  if (typed !== null) return { number: printTyped(typed), unit: unit.name };
  const value = Number(fromBase(line.value, unit).toPrecision(15));
  const exact = isExact(line) ? fewestDigits(value, digits) : null;
  return { number: printNumber(value, exact ?? digits), unit: unit.name };
}

/** Given and table values, and constants of an equation, are not results of rounding. */
const isExact = (line: ValuedLine): boolean =>
  textGiven(line) !== null || (line.kind === 'formula' && Object.keys(line.operands).length === 0);

/** A converted given value that is exact with fewer digits prints without trailing zeros. */
const fewestDigits = (value: number, digits: Digits): Digits | null => {
  if (!('sig' in digits)) return null;
  for (let sig = 1; sig < digits.sig; sig += 1)
    if (Number(value.toPrecision(sig)) === value && Math.abs(value) < 10 ** sig) return { sig };
  return null;
};

/** The forms a line of a finished record prints in. */
export function printedForms(line: ValuedLine, set: UnitSet): PrintedForms {
  const { working, display } = line.print;
  const forms = {
    working: working ? printForm(line, 'working', working, set) : null,
    display:
      display && set.display[line.dimension] ? printForm(line, 'display', display, set) : null,
  };
  const text = textGiven(line);
  const shown =
    text === null ||
    (forms.working && numberTyped(line, formUnit(line, 'working', set)) !== null) ||
    (forms.display && numberTyped(line, formUnit(line, 'display', set)) !== null);
  return { ...forms, typed: shown ? null : text };
}
