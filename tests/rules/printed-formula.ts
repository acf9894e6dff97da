import { __renderToHTMLTree } from 'katex';
import type { EvalFunction } from 'mathjs';
import { all, create } from 'mathjs/number';
import { seriesFunction } from '#shared/expr/series-functions.ts';

/** The functions of the books that mathjs has not. */
export const SERIES: Readonly<Record<string, (x: number) => number>> = Object.fromEntries(
  [2, 3, 4, 5].map((n) => [`Phi${n}`, (x: number) => seriesFunction(n, x)]),
);

export const same = (a: number, b: number): boolean =>
  a === b || Math.abs(a - b) <= 1e-9 * Math.max(Math.abs(a), Math.abs(b));

const rendered = new Set<string>();

/** Sets it with KaTeX, strictly; what differs only in its numbers is set once. */
export function render(tex: string): void {
  const shape = tex.replace(/\d+(?:\\,\d{3})*(?:\.\d+)?/g, '0').replaceAll('0^{-0}', '0^{0}');
  if (rendered.has(shape)) return;
  rendered.add(shape);
  __renderToHTMLTree(tex, {
    displayMode: true,
    // The mark of an operand's address is the one extension in use.
    strict: (code: string) => (code === 'htmlExtension' ? 'ignore' : 'error'),
    throwOnError: true,
    trust: true,
  });
}

const math = create(all ?? {});
math.import({ ...SERIES });
const compiled = new Map<string, EvalFunction>();

const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const PLAIN = '(\\d[\\d\u2009]*(?:\\.\\d+)?)';
const POWER = '(?:×10(⁻?)([⁰¹²³⁴⁵⁶⁷⁸⁹]+))?';
/** A number in brackets of its own is one value, with its sign; elsewhere each mark is read as it binds. */
const BRACKETED = new RegExp(`(?<![\\w√₀-₉])\\((−?)${PLAIN}${POWER}\\)`, 'g');
const BARE = new RegExp(`(?<![\\w.])${PLAIN}${POWER}`, 'g');

const plainValue = (text: string): number => Number(text.replace(/\u2009/g, ''));
const powerValue = (sign: string, exponent: string): number => {
  const digits = [...exponent].map((digit) => SUPERSCRIPTS.indexOf(digit)).join('');
  return Number(`1e${sign === '' ? '' : '-'}${digits}`);
};

/** Value of a formula's one-line text; what differs only in its numbers is parsed once. */
export function valueOfText(text: string): number {
  const numbers: Record<string, number> = {};
  const named = (value: number): string => {
    const name = `n${Object.keys(numbers).length}`;
    numbers[name] = value;
    return name;
  };
  const shape = text
    .replace(BRACKETED, (_, minus: string, plain: string, sign = '', exponent = '') =>
      named((minus === '' ? 1 : -1) * plainValue(plain) * powerValue(sign, exponent || '⁰')),
    )
    .replace(BARE, (_, plain: string, sign = '', exponent = '') =>
      [plainValue(plain), ...(exponent === '' ? [] : [powerValue(sign, exponent)])]
        .map(named)
        .join('*'),
    )
    .replace(/Φ([₂₃₄₅])/g, (_, n: string) => `Phi${'₀₁₂₃₄₅'.indexOf(n)}`)
    .replace(/−/g, '-')
    .replace(/ · /g, '*')
    .replace(/π/g, 'pi')
    .replace(/√/g, 'sqrt')
    .replace(/arccos/g, 'acos')
    .replace(/arctan/g, 'atan')
    .replace(/\|([^|]*)\|/g, 'abs($1)');
  let code = compiled.get(shape);
  if (!code) {
    code = math.compile(shape);
    compiled.set(shape, code);
  }
  return Number(code.evaluate(numbers));
}
