import { areEqual } from '../units/equal.ts';
import { type Digits, printNumber } from '../units/format.ts';
import type { UnitSet } from '../units/unit-set.ts';
import { addressOf, type PlacedLine } from './address.ts';
import {
  agrees,
  conditionSides,
  isBeyondOperands,
  isRounded,
  reproduced,
  residualAt,
  type Sheet,
  standsAsReal,
  type Use,
  usesOf,
} from './closure-rules.ts';
import { isValued, type Line, type Print, type ValuedLine } from './line.ts';
import {
  type Form,
  formOf,
  formUnit,
  numberTyped,
  type PrintedForm,
  printForm,
  textGiven,
} from './printed.ts';

export const START_DIGITS = 4;
const START: Digits = { sig: START_DIGITS };
const RATIO: Digits = { dec: 3 };
const PERCENT: Digits = { dec: 1 };
/** A number has 15 digits, of which the last is the rounding of its computation. */
export const MOST_DIGITS = 14;

const more = (d: Digits): Digits => ('sig' in d ? { sig: d.sig + 1 } : { dec: d.dec + 1 });
const count = (d: Digits): number => ('sig' in d ? d.sig : d.dec);

interface Node extends PlacedLine {
  shown: { working: Digits | null; display: Digits | null };
  /** The most digits it may print: fewer where its operands carry no more. */
  most: { working: number; display: number };
  /** The forms as last printed, each with the digits it was printed at. */
  readonly printed: { [F in Form]?: { readonly digits: Digits; readonly form: PrintedForm } };
  /** The lines whose digits it depends on: itself and its operands. */
  readonly depends: Node[];
  /** Steps of the whole closure at which its digits last changed, and at which it was last closed. */
  changed: number;
  closed: number;
}

/**
 * Fixes the printed digits of a member's lines, from the last line to the first: a line never gains
 * digits for its own closure; while it doesn't close, the operand whose rounding moves it most
 * prints one more. Where terms cancel so far that no digits of theirs suffice, the line itself
 * prints only those that they carry. `placed` is in reading order; a line refers only to lines
 * before it.
 */
export function closeLines(placed: readonly PlacedLine[], set: UnitSet): Line[] {
  const nodes: Node[] = placed.map(({ address, combination, line }) => ({
    address,
    combination,
    line,
    shown: { working: null, display: null },
    most: { working: MOST_DIGITS, display: MOST_DIGITS },
    printed: {},
    depends: [],
    changed: 0,
    closed: -1,
  }));
  const byAddress = new Map(nodes.map((n) => [n.address, n]));
  const nodeAt = (ref: string, from: Node): Node => {
    const node = byAddress.get(addressOf(ref, from.combination));
    if (!node) throw new Error(`${from.address} refers to ${ref}, which is not there`);
    return node;
  };
  for (const node of nodes) showOwnForms(node, (ref) => nodeAt(ref, node), set);
  for (const node of nodes) {
    const uses = usesOf(node.line, (r) => nodeAt(r, node).line, set);
    node.depends.push(node, ...uses.map(({ ref }) => nodeAt(ref, node)));
    for (const { ref, form } of uses)
      nodeAt(ref, node).shown[form] ??= firstDigits(nodeAt(ref, node), (r) => nodeAt(r, node));
  }
  // Digits that one line gives an operand may unsettle another line that had closed on its shorter
  // form: passes over the lines so touched repeat until there is none. Digits only grow, and what was
  // taken back for want of more never comes again, so they end.
  const backwards = nodes.toReversed();
  let step = 0;
  for (let before = -1; before !== step; ) {
    before = step;
    for (const node of backwards) {
      if (!node.depends.some(({ changed }) => changed >= node.closed)) continue;
      step += 1;
      closeNode(node, (ref) => nodeAt(ref, node), set, step);
      node.closed = step;
    }
  }
  return nodes.map((n) => ('print' in n.line ? { ...n.line, print: n.shown as Print } : n.line));
}

/** A utilisation, and the one of some that governs, prints decimals. */
const firstDigits = ({ line }: Node, at: (ref: string) => Node): Digits => {
  if (line.kind === 'governing') return firstDigits(at(line.governs), at);
  return line.kind === 'formula' && line.print.working !== null && 'dec' in line.print.working
    ? RATIO
    : START;
};

function showOwnForms(node: Node, at: (ref: string) => Node, set: UnitSet): void {
  const { line, shown } = node;
  if (line.kind === 'check') shown.working = RATIO;
  if (line.kind === 'comparison') shown.working = PERCENT;
  if (!isValued(line)) return;
  if (textGiven(line) !== null) {
    // A table value prints in working units; a given one as typed, beside the form the trade reads
    // where it was typed in a unit of neither form.
    const working =
      line.kind === 'lookup' || numberTyped(line, formUnit(line, 'working', set)) !== null;
    shown[working ? 'working' : formOf(line, 'display', set)] = START;
    return;
  }
  const asked: Form =
    line.kind === 'formula' ? line.prints : line.kind === 'root' ? 'working' : 'display';
  const digits = firstDigits(node, at);
  shown[formOf(line, asked, set)] = digits;
  if (set.display[line.dimension]) shown.display ??= digits;
}

/** A form at the digits that it shows now, printed anew only where these changed. */
function printNow(node: Node, form: Form, set: UnitSet): PrintedForm {
  const digits = node.shown[form] ?? START;
  const last = node.printed[form];
  if (last?.digits === digits) return last.form;
  const now = printForm(node.line as ValuedLine, form, digits, set);
  node.printed[form] = { digits, form: now };
  return now;
}

function closeNode(node: Node, at: (ref: string) => Node, set: UnitSet, step: number): void {
  const { line } = node;
  const sheet: Sheet = {
    set,
    valued: (ref) => at(ref).line as ValuedLine,
    printed: (ref, form) => printNow(at(ref), form, set),
    own: (form) => printNow(node, form, set),
  };
  const raise = (n: Node, form: Form): boolean => {
    const digits = n.shown[form] ?? START;
    if (count(digits) >= n.most[form]) return false;
    n.shown[form] = more(digits);
    n.changed = step;
    return true;
  };
  const lower = (form: Form): boolean => {
    const digits = node.shown[form];
    if (!digits || !('sig' in digits) || digits.sig === 1) return false;
    node.most[form] = digits.sig - 1;
    node.shown[form] = { sig: node.most[form] };
    node.changed = step;
    return true;
  };
  /** Of the rounded ones, those with the fewest digits print one more: 12.967 and 12.97 are one length. */
  const raiseShortest = (uses: readonly Use[]): boolean => {
    const rounded = uses
      .filter((use) => isRounded(use, sheet))
      .map(({ ref, form }) => ({ n: at(ref), form, digits: count(at(ref).shown[form] ?? START) }));
    const fewest = Math.min(...rounded.map(({ digits }) => digits));
    return rounded
      .filter(({ digits }) => digits === fewest)
      .map(({ n, form }) => raise(n, form))
      .includes(true);
  };
  /** One more digit for the operand whose rounding moves the value most; `exact` enters unrounded. */
  const raiseMostMoving = (value: (exact: string | null) => number): boolean => {
    const plain = value(null);
    const ranked = usesOf(line, (ref) => at(ref).line, set)
      .map((use) => ({ use, moves: Math.abs(value(use.ref) - plain) }))
      .filter(({ use }) => isRounded(use, sheet));
    // Operands that print as zero give no value at all: each of them prints more.
    if (ranked.some(({ moves }) => !Number.isFinite(moves)))
      return ranked.map(({ use }) => raise(at(use.ref), use.form)).includes(true);
    return ranked
      .filter(({ moves }) => moves > 0)
      .sort((a, b) => b.moves - a.moves)
      .some(({ use }) => raise(at(use.ref), use.form));
  };

  switch (line.kind) {
    case 'formula':
    case 'governing':
    case 'root': {
      closeForms(node, sheet, raise, lower, set);
      if (line.kind === 'formula') {
        const form = formOf(line, line.prints, set);
        while (!agrees(reproduced(line, sheet), sheet.own(form).number)) {
          if (raiseMostMoving((exact) => reproduced(line, sheet, exact))) continue;
          if (!isBeyondOperands(line, sheet, sheet.own(form).number.step, () => true)) return;
          if (!lower(form)) return;
        }
      } else if (line.kind === 'root') {
        while (residualAt(line, sheet, -1) * residualAt(line, sheet, 1) > 0)
          if (!raiseMostMoving((exact) => residualAt(line, sheet, 0, exact))) return;
      } else closeGoverning(line, node, sheet, { at, raise, lower, raiseShortest }, set);
      return;
    }
    case 'choice':
      for (const condition of line.tried) {
        for (;;) {
          const sides = conditionSides(condition, sheet);
          if (!sides) break;
          const [l, r] = sides;
          if (standsAsReal(l, r)) break;
          if (areEqual(l.real, r.real)) {
            if (!raiseShortest([l, r].flatMap(({ use }) => use ?? []))) break;
            continue;
          }
          const worst = [l, r]
            .filter((s) => s.use !== null && isRounded(s.use, sheet))
            .sort((a, b) => Math.abs(b.printed - b.real) - Math.abs(a.printed - a.real));
          if (!worst.some((s) => s.use && raise(at(s.use.ref), s.use.form))) break;
        }
      }
      return;
    case 'check': {
      while (hidesSide(line.ratio, node.shown.working ?? RATIO))
        node.shown.working = more(node.shown.working ?? RATIO);
      const own = () => printNumber(line.ratio, node.shown.working ?? RATIO);
      while (!agrees(reproduced(line, sheet), own()))
        if (!raiseMostMoving((exact) => reproduced(line, sheet, exact))) return;
      // Printed demand and capacity stand on the side of the limit that the verdict says.
      for (;;) {
        const printed = reproduced(line, sheet);
        if (printed <= 1 === line.ratio <= 1) return;
        if (!raiseMostMoving((exact) => reproduced(line, sheet, exact))) return;
      }
    }
    case 'comparison': {
      const own = () => printNumber(line.difference * 100, node.shown.working ?? PERCENT);
      while (!agrees(reproduced(line, sheet), own()))
        if (!raiseMostMoving((exact) => reproduced(line, sheet, exact))) return;
      return;
    }
    default:
  }
}

/** Rounding must not put a ratio on the other side of its limit, nor on it. */
export const hidesSide = (ratio: number, digits: Digits): boolean => {
  if (count(digits) >= MOST_DIGITS) return false;
  return Math.sign(printNumber(ratio, digits).value - 1) !== Math.sign(ratio - 1);
};

/** The second printed form of a value follows from the first one as printed. */
function closeForms(
  node: Node,
  sheet: Sheet,
  raise: (n: Node, form: Form) => boolean,
  lower: (form: Form) => boolean,
  set: UnitSet,
): void {
  const line = node.line as ValuedLine;
  if (!node.shown.working || !node.shown.display || !set.display[line.dimension]) return;
  const first: Form = line.kind === 'formula' ? formOf(line, line.prints, set) : 'working';
  const second: Form = first === 'working' ? 'display' : 'working';
  const factor = formUnit(line, first, set).factor / formUnit(line, second, set).factor;
  while (!agrees(sheet.own(first).number.value * factor, sheet.own(second).number))
    if (!raise(node, first) && !lower(second)) return;
}

/** The printed extreme is the printed value of the candidate that governs, and no other passes it. */
function closeGoverning(
  line: Extract<Line, { kind: 'governing' }>,
  node: Node,
  sheet: Sheet,
  does: {
    at(ref: string): Node;
    raise(n: Node, form: Form): boolean;
    lower(form: Form): boolean;
    raiseShortest(uses: readonly Use[]): boolean;
  },
  set: UnitSet,
): void {
  const form = formOf(sheet.valued(line.governs), 'display', set);
  const winner = does.at(line.governs);
  const shorter = () => {
    const own = node.shown[form];
    return own !== null && count(winner.shown[form] ?? START) < count(own);
  };
  while (shorter() && isRounded({ ref: line.governs, form }, sheet))
    if (!does.raise(winner, form) && !does.lower(form)) break;
  const sign = line.sense === 'min' ? 1 : -1;
  for (const other of line.candidates) {
    while (
      sign *
        (sheet.printed(line.governs, form).number.value - sheet.printed(other, form).number.value) >
      0
    )
      if (!does.raiseShortest([line.governs, other].map((ref) => ({ ref, form })))) break;
  }
}
