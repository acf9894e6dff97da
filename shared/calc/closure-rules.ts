import { parseExpression } from '../expr/parse.ts';
import { areEqual } from '../units/equal.ts';
import { fromBase } from '../units/unit.ts';
import type { UnitSet } from '../units/unit-set.ts';
import { isValued, type Line, type LineOf, type Side, type ValuedLine } from './line.ts';
import { type Form, formOf, formUnit, type PrintedForm } from './printed.ts';

/*
 * Closure: what is printed reproduces from what is printed. Each rule says whether one line closes
 * at given printed numbers, and which printed operands it depends on. The same rules fix the digits
 * of a record (closure.ts) and prove a finished one (closure-problems.ts).
 */

/** An operand as a line uses it: which line, in which form. */
export interface Use {
  readonly ref: string;
  readonly form: Form;
}

/** How a rule reads the other lines of the sheet. */
export interface Sheet {
  readonly set: UnitSet;
  valued(ref: string): ValuedLine;
  printed(ref: string, form: Form): PrintedForm;
  /** The line's own printed number in a form. */
  own(form: Form): PrintedForm;
}

/** The form in which `line` prints its operand `operand`. */
export function formUsed(line: Line, operand: ValuedLine, set: UnitSet): Form {
  if (line.kind === 'formula') return formOf(operand, line.prints, set);
  if (line.kind === 'root') return 'working';
  return formOf(operand, 'display', set);
}

/** Rounds `value` to the printed step and allows one unit of the last digit. */
export const agrees = (value: number, printed: { value: number; step: number }): boolean =>
  Number.isFinite(value) &&
  Math.abs(Math.round(value / printed.step) - Math.round(printed.value / printed.step)) <= 1;

const operandValues = (
  line: LineOf<'formula'> | LineOf<'root'>,
  sheet: Sheet,
  exact: string | null,
): Record<string, number> =>
  Object.fromEntries(
    Object.entries(line.operands).map(([symbol, { ref }]) => {
      const operand = sheet.valued(ref);
      const form = formUsed(line, operand, sheet.set);
      const value =
        ref === exact
          ? fromBase(operand.value, formUnit(operand, form, sheet.set))
          : sheet.printed(ref, form).number.value;
      return [symbol, value];
    }),
  );

/**
 * What the line's own printed result should be from printed operands, in the unit it prints in.
 * With `exact`, that one operand enters unrounded.
 */
export function reproduced(
  line: LineOf<'formula'> | LineOf<'check'> | LineOf<'comparison'>,
  sheet: Sheet,
  exact: string | null = null,
): number {
  if (line.kind === 'formula')
    return parseExpression(line.expression).evaluate(operandValues(line, sheet, exact));
  const value = (ref: string): number => {
    const operand = sheet.valued(ref);
    const form = formOf(operand, 'display', sheet.set);
    return ref === exact
      ? fromBase(operand.value, formUnit(operand, form, sheet.set))
      : sheet.printed(ref, form).number.value;
  };
  if (line.kind === 'check')
    return value(line.demand) / (line.capacity === 1 ? 1 : value(line.capacity));
  return (value(line.used) / value(line.other) - 1) * 100;
}

/** Whether a line prints another number than it has. */
export function isRounded({ ref, form }: Use, sheet: Sheet): boolean {
  const line = sheet.valued(ref);
  const exact = fromBase(line.value, formUnit(line, form, sheet.set));
  return Math.abs(sheet.printed(ref, form).number.value - exact) > 1e-14 * Math.abs(exact);
}

/**
 * Whether a digit of that size is beyond what the line's operands carry: where terms cancel, the
 * rounding of operands that print all their digits moves the result by half a unit of it or more.
 */
export function isBeyondOperands(
  line: LineOf<'formula'>,
  sheet: Sheet,
  step: number,
  printsAll: (use: Use) => boolean,
): boolean {
  const plain = reproduced(line, sheet);
  const refs = new Set(Object.values(line.operands).map(({ ref }) => ref));
  const moved = [...refs]
    .filter((ref) => {
      const use = { ref, form: formUsed(line, sheet.valued(ref), sheet.set) };
      return !isRounded(use, sheet) || printsAll(use);
    })
    .map((ref) => Math.abs(reproduced(line, sheet, ref) - plain));
  return moved.reduce((a, b) => a + b, 0) >= step / 2;
}

/** Value of a root's equation at its printed root moved by `steps` of its last digit. */
export function residualAt(
  line: LineOf<'root'>,
  sheet: Sheet,
  steps: number,
  exact: string | null = null,
): number {
  const { number } = sheet.own('working');
  return parseExpression(line.expression).evaluate({
    ...operandValues(line, sheet, exact),
    [line.unknown]: number.value + steps * number.step,
  });
}

export interface SideValue {
  readonly real: number;
  readonly printed: number;
  readonly use: Use | null;
}

/** Whether the printed numbers of a comparison stand as the real ones do: on the same sides, or equal. */
export const standsAsReal = (left: SideValue, right: SideValue): boolean =>
  Math.sign(left.printed - right.printed) ===
  (areEqual(left.real, right.real) ? 0 : Math.sign(left.real - right.real));

/** Both sides of a numeric condition, in one unit; null for a condition on words. */
export function conditionSides(
  condition: { left: Side; right: Side },
  sheet: Sheet,
): readonly [SideValue, SideValue] | null {
  const side = (s: Side): SideValue | null => {
    if ('words' in s) return null;
    if ('constant' in s) return { real: s.constant, printed: s.constant, use: null };
    const operand = sheet.valued(s.ref);
    const form = formOf(operand, 'display', sheet.set);
    return {
      real: fromBase(operand.value, formUnit(operand, form, sheet.set)),
      printed: sheet.printed(s.ref, form).number.value,
      use: { ref: s.ref, form },
    };
  };
  const isWords = (s: Side) => 'words' in s;
  if (isWords(condition.left) || isWords(condition.right)) return null;
  const left = side(condition.left);
  const right = side(condition.right);
  return left && right ? [left, right] : null;
}

/** Every printed operand of a line, in the form it uses. */
export function usesOf(line: Line, valued: (ref: string) => Line, set: UnitSet): Use[] {
  const use = (ref: string): Use[] => {
    const operand = valued(ref);
    return isValued(operand) ? [{ ref, form: formUsed(line, operand, set) }] : [];
  };
  switch (line.kind) {
    case 'formula':
    case 'root':
      return Object.values(line.operands).flatMap((o) => use(o.ref));
    case 'choice':
      return line.tried.flatMap((c) =>
        [c.left, c.right].flatMap((s) => ('ref' in s ? use(s.ref) : [])),
      );
    case 'governing':
      return line.candidates.flatMap(use);
    case 'check':
      return [line.demand, ...(line.capacity === 1 ? [] : [line.capacity])].flatMap(use);
    case 'comparison':
      return [line.used, line.other].flatMap(use);
    default:
      return [];
  }
}
