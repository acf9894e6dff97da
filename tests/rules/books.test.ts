import katex from 'katex';
import { all, create, type Unit } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { defineFormula, type Formula } from '#shared/calc/formula.ts';
import { seriesFunction } from '#shared/expr/series-functions.ts';
import { type Leaf, texOf } from '#shared/expr/tex.ts';
import { textOf } from '#shared/expr/text.ts';
import { defineBook } from '#shared/standards/book.ts';
import { BOOKS, symbolTex } from '#shared/standards/library.ts';
import { DIMENSIONS, type DimensionName } from '#shared/units/dimension.ts';
import { printNumber } from '#shared/units/format.ts';
import { UNIT_SETS } from '#shared/units/unit-set.ts';
import { valueOfTex } from './tex-reader.ts';

/* Structural: every formula of every book, as it prints and in its dimensions. */
const formulas: readonly Formula[] = BOOKS.flatMap((b) => [...b.formulas.values()]);

describe('the books', () => {
  it('hold both standards with their formulas', () => {
    expect(BOOKS.map((b) => b.id)).toEqual(['aisc360-22', 'elastic-theory', 'section-properties']);
    expect(formulas.length).toBeGreaterThan(80);
    expect(new Set(formulas.map((f) => f.id)).size).toBe(formulas.length);
  });
  it('refuse a formula whose symbols are not its operands', () => {
    const text = {
      id: 'x',
      clause: 'A',
      title: 'any',
      symbol: 'Pn',
      dimension: 'force',
      expression: 'Fn*Ag',
    } as const;
    expect(() => defineFormula('b', { ...text, operands: { Fn: 'stress' } })).toThrow(/declares/);
    expect(() =>
      defineFormula('b', { ...text, operands: { Fn: 'stress', Ag: 'area', d: 'length' } }),
    ).toThrow(/declares/);
  });
  it('refuse a symbol without an entry, or of another dimension, and an id twice', () => {
    const [book] = BOOKS;
    if (!book) throw new Error('no book');
    const formula = (dimension: 'force' | 'moment', symbol = 'Pn') =>
      defineFormula('b', {
        id: 'x',
        clause: 'A',
        title: 'any',
        symbol,
        dimension,
        expression: 'Fn*Ag',
        operands: { Fn: 'stress', Ag: 'area' },
      });
    const { id, name, title, symbols } = book;
    const define = (...with_: Formula[]) => defineBook({ id, name, title, symbols }, with_);
    expect(define(formula('force')).formulas.size).toBe(1);
    expect(() => define(formula('moment'))).toThrow(/Pn is force, not moment/);
    expect(() => define(formula('force', 'Nothing'))).toThrow(/no symbol Nothing/);
    expect(() => define(formula('force'), formula('force'))).toThrow(/two formulas/);
  });
});

// ---- The printed equation -------------------------------------------------------------------

const rendered = new Set<string>();

/** Sets it with KaTeX, strictly; numbers that differ only in figures are set once. */
function render(tex: string): void {
  const shape = tex.replace(/\d/g, '0');
  if (rendered.has(shape)) return;
  rendered.add(shape);
  katex.renderToString(tex, {
    // The mark of an operand's address is the one extension in use.
    strict: (code: string) => (code === 'htmlExtension' ? 'ignore' : 'error'),
    throwOnError: true,
    trust: true,
  });
}

const KINDS = {
  negative: [-0.37, -2.5],
  zero: [0],
  large: [3.25e9, -7.5e8],
  small: [4.1e-7, -6.2e-5],
  thousands: [12345.6, -23456],
} as const;
type Kind = keyof typeof KINDS;
const BASES: readonly ((i: number) => number)[] = [
  (i) => 0.31 + 0.17 * i,
  (i) => 2.3 + 1.7 * i,
  (i) => -(0.21 + 0.13 * i),
  (i) => 0.9 - 0.11 * i,
];

/** The operand as a view prints it: its printed value, its TeX and text, marked with its line. */
function valueOperand(value: number) {
  const printed = printNumber(value, { sig: 5 });
  const leaf: Leaf = {
    tex: `\\htmlData{ref=c1:H1/ratio}{${printed.tex}}`,
    kind: 'value',
    negative: printed.tex.startsWith('-'),
    power: printed.tex.includes('\\times'),
  };
  return { printed, leaf };
}

const same = (a: number, b: number): boolean =>
  a === b || Math.abs(a - b) <= 1e-9 * Math.max(Math.abs(a), Math.abs(b));

/** The one-line text back to mathjs's syntax. */
const textValue = (text: string): number =>
  Number(
    plainMath.evaluate(
      text
        .replace(/\u2009/g, '')
        .replace(
          /×10([⁻⁰¹²³⁴⁵⁶⁷⁸⁹]+)/g,
          (_, p: string) =>
            `*10^(${[...p].map((d) => (d === '⁻' ? '-' : '⁰¹²³⁴⁵⁶⁷⁸⁹'.indexOf(d))).join('')})`,
        )
        .replace(/−/g, '-')
        .replace(/ · /g, '*')
        .replace(/π/g, 'pi')
        .replace(/√/g, 'sqrt')
        .replace(/arccos/g, 'acos')
        .replace(/arctan/g, 'atan')
        .replace(/Φ([₂₃₄₅])/g, (_, n: string) => `Phi${'₀₁₂₃₄₅'.indexOf(n)}`)
        .replace(/\|([^|]*)\|/g, 'abs($1)'),
    ),
  );
const plainMath = create(all ?? {});
const SERIES = Object.fromEntries(
  [2, 3, 4, 5].map((n) => [`Phi${n}`, (x: number) => seriesFunction(n, x)]),
);
plainMath.import(SERIES);

// Where an operand of that kind has no value: a root of a negative number, an arc of more than 1.
const IMPOSSIBLE: Readonly<Record<string, readonly string[]>> = {
  'aisc360-22/G5-2a': ['lambda negative'],
  'aisc360-22/G5-2b': ['lambda negative'],
  'aisc360-22/B4.1-kc': ['lambdaw negative'],
  'elastic-theory/threshold': ['psi large', 'psi thousands'],
  'section-properties/I-rts': ['Sx negative'],
};

/** Hyperbolic functions have no value at the angles that numbers of these kinds make. */
const overflows = (formula: Formula, unproven: string): boolean =>
  /sinh|cosh|Phi/.test(formula.expression.text) && !unproven.endsWith('negative');

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

describe('a printed substitution says what was computed', () => {
  for (const formula of formulas)
    it(formula.id, () => {
      const names = Object.keys(formula.operands);
      const { tree } = formula.expression;
      const proven = new Set<string>();
      const prove = (values: readonly number[], covers: string) => {
        const operands = values.map(valueOperand);
        const of = (name: string) => operands[names.indexOf(name)] as (typeof operands)[number];
        const tex = texOf(tree, (name) => of(name).leaf);
        render(tex);
        const printed = Object.fromEntries(names.map((n) => [n, of(n).printed.value]));
        const expected = formula.expression.evaluate(printed);
        if (!Number.isFinite(expected)) return;
        const agrees = (value: number): boolean =>
          same(value, expected) ||
          Math.abs(value - expected) <= lastBits(formula, printed, expected);
        const read = valueOfTex(tex);
        expect(agrees(read), `${tex}\nreads as ${read}, is ${expected}`).toBe(true);
        const text = textOf(tree, (name) => of(name).printed.text);
        const line = textValue(text);
        expect(agrees(line), `${text}\nreads as ${line}, is ${expected}`).toBe(true);
        proven.add(covers);
      };
      for (const base of BASES) {
        const plain = names.map((_, i) => base(i));
        if (!proven.has('plain')) prove(plain, 'plain');
        names.forEach((name, i) => {
          for (const kind of Object.keys(KINDS) as Kind[]) {
            // Another set of the other operands is for what had no value with the first.
            if (base !== BASES[0] && proven.has(`${name} ${kind}`)) continue;
            for (const value of KINDS[kind]) {
              prove(plain.with(i, value), `${name} ${kind}`);
              prove(
                names.map(() => value),
                `${name} ${kind}`,
              );
              // And each other operand negative with it.
              names.forEach((_, j) => {
                if (j !== i) prove(plain.with(i, value).with(j, -1.5), `${name} ${kind}`);
              });
            }
          }
        });
      }
      if (names.length > 0) expect(proven).toContain('plain');
      const unproven = names.flatMap((name) =>
        (['negative', 'large', 'small', 'thousands'] as const)
          .filter((kind) => !proven.has(`${name} ${kind}`))
          .map((kind) => `${name} ${kind}`),
      );
      expect(unproven.filter((u) => !overflows(formula, u))).toEqual(IMPOSSIBLE[formula.id] ?? []);
    });
});

describe('a printed equation in symbols', () => {
  for (const formula of formulas)
    it(formula.id, () => {
      const names = Object.keys(formula.operands);
      // Its own symbols set without an error; symbols v₁ … read back to the value.
      render(
        texOf(formula.expression.tree, (name) => ({
          tex: symbolTex(name, formula.book),
          kind: 'symbol',
          negative: false,
          power: false,
        })),
      );
      const tex = texOf(formula.expression.tree, (name) => ({
        tex: `v_{${names.indexOf(name)}}`,
        kind: 'symbol',
        negative: false,
        power: false,
      }));
      const values = names.map((_, i) => 0.31 + 0.17 * i);
      const expected = formula.expression.evaluate(
        Object.fromEntries(names.map((n, i) => [n, values[i] ?? 0])),
      );
      const read = valueOfTex(tex, Object.fromEntries(values.map((v, i) => [`v_{${i}}`, v])));
      expect(same(read, expected), `${tex} reads as ${read}, is ${expected}`).toBe(true);
    });
});

describe('every symbol of the books', () => {
  for (const book of BOOKS)
    it(`${book.id} sets`, () => {
      for (const { tex, meaning } of Object.values(book.symbols)) {
        render(tex);
        expect(meaning.length).toBeGreaterThan(3);
      }
    });
});

// ---- Dimensions -----------------------------------------------------------------------------

const math = create(all ?? {});
math.import(SERIES);
const SYSTEMS = {
  'kip, in': { force: 'kip', length: 'inch' },
  'N, mm': { force: 'N', length: 'mm' },
} as const;

const unitOf = (dimension: DimensionName, system: keyof typeof SYSTEMS): string => {
  const { force, length } = DIMENSIONS[dimension];
  const names = SYSTEMS[system];
  return `${names.force}^${force} ${names.length}^${length}`;
};

// Sizes in N and mm that leave every formula finite.
const SIZES: Readonly<Record<DimensionName, number>> = {
  none: 0.43,
  angle: 0.9,
  length: 870,
  area: 13000,
  modulus: 1.9e6,
  inertia: 3.1e8,
  warping: 4.7e12,
  perLength: 0.0011,
  force: 2.3e5,
  stress: 345,
  moment: 2.1e8,
  rigidity: 6.3e13,
  lineLoad: 14,
  loadSlope: 0.011,
  rotationalStiffness: 3.7e9,
  deflection: 6.3,
};
const sized = (formula: Formula): Record<string, number> =>
  Object.fromEntries(
    Object.entries(formula.operands).map(([name, dimension], i) => [
      name,
      SIZES[dimension] * (1 + 0.13 * i),
    ]),
  );

describe('the dimension of every formula', () => {
  for (const formula of formulas)
    for (const system of Object.keys(SYSTEMS) as (keyof typeof SYSTEMS)[])
      it(`${formula.id} in ${system}`, () => {
        const base = sized(formula);
        const scope: Record<string, Unit | number> = { pi: Math.PI };
        for (const [name, dimension] of Object.entries(formula.operands)) {
          const { force, length } = DIMENSIONS[dimension];
          const value = base[name] ?? 0;
          if (force === 0 && length === 0) scope[name] = value;
          else
            scope[name] = math
              .unit(value, unitOf(dimension, 'N, mm'))
              .to(unitOf(dimension, system));
        }
        const result = math.evaluate(formula.expression.text, scope) as Unit | number;
        const expected = formula.expression.evaluate(base);
        expect(Number.isFinite(expected), `${expected}`).toBe(true);
        const { force, length } = DIMENSIONS[formula.dimension];
        if (force === 0 && length === 0) {
          expect(typeof result).toBe('number');
          expect(same(result as number, expected), `${result}`).toBe(true);
          return;
        }
        // toNumber throws where the dimension is another.
        const inBase = (result as Unit).toNumber(unitOf(formula.dimension, 'N, mm'));
        expect(same(inBase, expected), `${inBase} against ${expected}`).toBe(true);
      });
});

describe('every formula holds in the units that it prints in', () => {
  for (const set of Object.values(UNIT_SETS))
    for (const formula of formulas)
      it(`${formula.id}, ${set.name}, ${formula.prints}`, () => {
        const size = (dimension: DimensionName): number =>
          (
            (formula.prints === 'display' ? set.display[dimension] : undefined) ??
            set.working[dimension]
          ).factor;
        const base = sized(formula);
        const shown = Object.fromEntries(
          Object.entries(formula.operands).map(([name, dimension]) => [
            name,
            (base[name] ?? 0) / size(dimension),
          ]),
        );
        const value = formula.expression.evaluate(shown) * size(formula.dimension);
        const expected = formula.expression.evaluate(base);
        expect(same(value, expected), `${value} against ${expected}`).toBe(true);
      });
});
