import { describe, expect, it } from 'vitest';
import type { Formula } from '#shared/calc/formula.ts';
import { type Leaf, texOf } from '#shared/expr/tex.ts';
import { textOf } from '#shared/expr/text.ts';
import { type PrintedNumber, printNumber } from '#shared/units/format.ts';
import { render, same, valueOfText } from './printed-formula.ts';
import { valueOfTex } from './tex-reader.ts';

/* Every formula with values put in, read back from what is printed: structural, no expected values. */

const KINDS = {
  negative: [-0.37, -2.5],
  zero: [0],
  large: [3.25e9, -7.5e8],
  small: [4.1e-7, -6.2e-5],
  thousands: [12345.6, -23456],
} as const;
type Kind = keyof typeof KINDS;
const ALL_KINDS = Object.keys(KINDS) as Kind[];
/** One operand as it stands beside a negative one: a minus sign, a power of ten, and both. */
const BESIDE_NEGATIVE: readonly (readonly [Kind, number])[] = [
  ['negative', -2.5],
  ['small', 4.1e-7],
  ['large', -7.5e8],
];
const NEGATIVE = -1.5;

const BASES: readonly ((i: number) => number)[] = [
  (i) => 0.31 + 0.17 * i,
  (i) => 2.3 + 1.7 * i,
  (i) => -(0.21 + 0.13 * i),
  (i) => 0.9 - 0.11 * i,
];

interface Operand {
  readonly printed: PrintedNumber;
  readonly leaf: Leaf;
}
const operands = new Map<number, Operand>();

/** The operand as a view prints it: its printed value, its TeX and text, marked with its line. */
function valueOperand(value: number): Operand {
  const known = operands.get(value);
  if (known) return known;
  const printed = printNumber(value, { sig: 5 });
  const leaf: Leaf = {
    tex: `\\htmlData{ref=c1:H1/ratio}{${printed.tex}}`,
    kind: 'value',
    negative: printed.tex.startsWith('-'),
    power: printed.tex.includes('\\times'),
  };
  operands.set(value, { printed, leaf });
  return { printed, leaf };
}

/** What the last bits of the operands do to a value: the sine of a million turns has no digits. */
const lastBits = (
  formula: Formula,
  operands: Readonly<Record<string, number>>,
  value: number,
): number =>
  Object.entries(operands).reduce((sum, [name, operand]) => {
    const moved = { ...operands, [name]: operand * (1 + 4 * Number.EPSILON) };
    return sum + Math.abs(formula.expression.evaluate(moved) - value);
  }, 0);

/** What reads otherwise than it was computed; null where there is nothing to compute. */
function misread(
  formula: Formula,
  values: readonly number[],
  setting: 'set' | 'read only',
): string[] | null {
  const names = Object.keys(formula.operands);
  const { tree } = formula.expression;
  const of = (name: string): Operand => valueOperand(values[names.indexOf(name)] ?? Number.NaN);
  const tex = texOf(tree, (name) => of(name).leaf);
  if (setting === 'set') render(tex);
  const printed = Object.fromEntries(names.map((n) => [n, of(n).printed.value]));
  const expected = formula.expression.evaluate(printed);
  if (!Number.isFinite(expected)) return null;
  const agrees = (value: number): boolean =>
    same(value, expected) || Math.abs(value - expected) <= lastBits(formula, printed, expected);
  const text = textOf(tree, (name) => of(name).printed.text);
  return [
    { form: tex, read: valueOfTex(tex) },
    { form: text, read: valueOfText(text) },
  ].flatMap(({ form, read }) =>
    agrees(read) ? [] : [`${form}\nreads as ${read}, is ${expected}`],
  );
}

/**
 * Proves it with plain values, with one or every operand of each kind, and negatives in pairs.
 * Pairs are read only: they are made of the same pieces, and the reader refuses what is not whole.
 */
function provenKinds(formula: Formula): ReadonlySet<string> {
  const names = Object.keys(formula.operands);
  const proven = new Set<string>();
  const prove = (
    values: readonly number[],
    covers: readonly string[],
    setting: 'set' | 'read only' = 'set',
  ): void => {
    const faults = misread(formula, values, setting);
    if (faults === null) return;
    expect(faults).toEqual([]);
    for (const covered of covers) proven.add(covered);
  };
  BASES.forEach((base, count) => {
    const plain = names.map((_, i) => base(i));
    if (!proven.has('plain')) prove(plain, ['plain']);
    // Another set of the other operands is for what had no value with the first.
    const wanted = (kind: Kind) =>
      names.flatMap((name, i) =>
        count === 0 || !proven.has(`${name} ${kind}`) ? [{ i, covers: `${name} ${kind}` }] : [],
      );
    for (const kind of ALL_KINDS)
      for (const { i, covers } of wanted(kind))
        for (const value of KINDS[kind]) prove(plain.with(i, value), [covers]);
    if (count === 0)
      for (const kind of ALL_KINDS)
        for (const value of KINDS[kind])
          prove(
            names.map(() => value),
            names.map((name) => `${name} ${kind}`),
          );
    for (const [kind, value] of BESIDE_NEGATIVE)
      for (const { i, covers } of wanted(kind))
        names.forEach((_, j) => {
          if (j !== i) prove(plain.with(i, value).with(j, NEGATIVE), [covers], 'read only');
        });
  });
  return proven;
}

/** Hyperbolic functions have no value at the angles that numbers of these kinds make. */
const overflows = (formula: Formula, unproven: string): boolean =>
  /sinh|cosh|Phi/.test(formula.expression.text) && !unproven.endsWith('negative');

/**
 * A test for each formula. `impossible` holds where an operand of that kind has no value: a root
 * of a negative number, an arc of more than 1.
 */
export function provePrinted(
  formulas: readonly Formula[],
  impossible: Readonly<Record<string, readonly string[]>>,
): void {
  describe('a printed substitution says what was computed', () => {
    for (const formula of formulas)
      it(formula.id, () => {
        const names = Object.keys(formula.operands);
        const proven = provenKinds(formula);
        if (names.length > 0) expect(proven).toContain('plain');
        const unproven = names.flatMap((name) =>
          (['negative', 'large', 'small', 'thousands'] as const)
            .filter((kind) => !proven.has(`${name} ${kind}`))
            .map((kind) => `${name} ${kind}`),
        );
        expect(unproven.filter((u) => !overflows(formula, u))).toEqual(
          impossible[formula.id] ?? [],
        );
      });
  });
}
