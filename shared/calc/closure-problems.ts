import { type Digits, printNumber } from '../units/format.ts';
import type { UnitSet } from '../units/unit-set.ts';
import { addressOf, type PlacedLine } from './address.ts';
import { MOST_DIGITS, START_DIGITS } from './closure.ts';
import {
  agrees,
  conditionSides,
  isBeyondOperands,
  reproduced,
  residualAt,
  type Sheet,
  standsAsReal,
  type Use,
  usesOf,
} from './closure-rules.ts';
import { isValued, type Line, type ValuedLine } from './line.ts';
import { type Form, formOf, formUnit, printForm } from './printed.ts';

export interface ClosureProblem {
  readonly address: string;
  readonly reason: string;
}

const isShort = (digits: Digits | null): boolean =>
  digits !== null && 'sig' in digits && digits.sig < START_DIGITS;

/** Proves that every printed line reproduces from its printed operands; empty when all do. */
export function closureProblems(placed: readonly PlacedLine[], set: UnitSet): ClosureProblem[] {
  const byAddress = new Map(placed.map((p) => [p.address, p.line]));
  return placed.flatMap((p) =>
    lineProblems(p, (ref) => byAddress.get(addressOf(ref, p.combination)), set).map((reason) => ({
      address: p.address,
      reason,
    })),
  );
}

function lineProblems(
  { line }: PlacedLine,
  find: (ref: string) => Line | undefined,
  set: UnitSet,
): string[] {
  const valued = (ref: string): ValuedLine => {
    const found = find(ref);
    if (!found || !isValued(found))
      throw new Error(`${line.key} refers to ${ref}, which has no value`);
    return found;
  };
  const printed = (l: ValuedLine, form: 'working' | 'display') => {
    const digits = l.print[form];
    if (!digits) throw new Error(`${l.key} does not print its ${form} form`);
    return printForm(l, form, digits, set);
  };
  const sheet: Sheet = {
    set,
    valued,
    printed: (ref, form) => printed(valued(ref), form),
    own: (form) => printed(line as ValuedLine, form),
  };
  /** One unit of the digit after the last printed one. */
  const nextStep = (l: ValuedLine, form: Form): number => {
    const digits = l.print[form];
    const next = digits && 'sig' in digits ? { sig: digits.sig + 1 } : null;
    return next ? printForm(l, form, next, set).number.step : 0;
  };
  const printsAll = ({ ref, form }: Use): boolean => {
    const operand = valued(ref);
    if (operand.kind === 'governing') return printsAll({ ref: operand.governs, form });
    // Its other form follows from the one that its formula gives.
    const first = operand.kind === 'formula' ? formOf(operand, operand.prints, set) : form;
    const digits = operand.print[first];
    if (digits && 'sig' in digits && digits.sig === MOST_DIGITS) return true;
    return (
      operand.kind === 'formula' &&
      isBeyondOperands(operand, sheet, nextStep(operand, first), () => true)
    );
  };
  const problems: string[] = [];
  const want = (holds: boolean, reason: string) => {
    if (!holds) problems.push(reason);
  };
  for (const { ref, form } of usesOf(line, (r) => find(r) ?? line, set))
    if (!valued(ref).print[form]) problems.push(`${ref} does not print the form used here`);
  if (problems.length > 0) return problems;

  // A given value may itself have that many.
  if ('print' in line && line.kind !== 'given')
    for (const digits of [line.print.working, line.print.display])
      if (digits)
        want(
          ('sig' in digits ? digits.sig : digits.dec) <= MOST_DIGITS,
          'prints more digits than there are',
        );
  if (isValued(line) && line.print.working && line.print.display && set.display[line.dimension]) {
    const first = line.kind === 'formula' ? formOf(line, line.prints, set) : 'working';
    const second = first === 'working' ? 'display' : 'working';
    const factor = formUnit(line, first, set).factor / formUnit(line, second, set).factor;
    if (line.kind === 'formula' || line.kind === 'governing' || line.kind === 'root')
      want(
        agrees(sheet.own(first).number.value * factor, sheet.own(second).number),
        'its two units disagree',
      );
  }
  switch (line.kind) {
    case 'formula': {
      const own = sheet.own(formOf(line, line.prints, set)).number;
      const value = reproduced(line, sheet);
      want(agrees(value, own), `prints ${own.text}, its printed operands give ${value}`);
      if (isShort(line.print[formOf(line, line.prints, set)]))
        want(
          isBeyondOperands(line, sheet, nextStep(line, formOf(line, line.prints, set)), printsAll),
          `prints ${own.text}, its printed operands carry more digits`,
        );
      break;
    }
    case 'root':
      want(
        residualAt(line, sheet, -1) * residualAt(line, sheet, 1) <= 0,
        'no sign change at the printed root',
      );
      break;
    case 'choice':
      for (const condition of line.tried) {
        const sides = conditionSides(condition, sheet);
        if (sides)
          want(standsAsReal(...sides), `prints ${sides[0].printed} against ${sides[1].printed}`);
      }
      break;
    case 'governing': {
      const form = formOf(valued(line.governs), 'display', set);
      const best = sheet.printed(line.governs, form).number;
      want(agrees(best.value, sheet.own(form).number), 'does not print the candidate that governs');
      if (isShort(line.print[form]))
        want(
          isShort(valued(line.governs).print[form]),
          'prints fewer digits than the candidate that governs',
        );
      const sign = line.sense === 'min' ? 1 : -1;
      for (const other of line.candidates)
        want(
          sign * (best.value - sheet.printed(other, form).number.value) <= 0,
          `${other} prints past it`,
        );
      break;
    }
    case 'check': {
      const own = printNumber(line.ratio, line.print.working ?? { dec: 3 });
      const value = reproduced(line, sheet);
      want(agrees(value, own), `prints ratio ${own.text}, its printed operands give ${value}`);
      want(own.value <= 1 === (line.verdict === 'OK'), 'the printed ratio contradicts the verdict');
      want(value <= 1 === (line.verdict === 'OK'), 'the printed operands contradict the verdict');
      break;
    }
    case 'comparison':
      want(
        agrees(
          reproduced(line, sheet),
          printNumber(line.difference * 100, line.print.working ?? { dec: 1 }),
        ),
        'the printed difference does not follow',
      );
      break;
    default:
  }
  return problems;
}
