import { describe, expect, it } from 'vitest';
import { parseExpression } from './parse.ts';
import { type Leaf, texOf } from './tex.ts';
import { textOf } from './text.ts';

// How engineers write it by hand; every formula of the books is read back in tests/rules/books.test.ts.
const value = (tex: string): Leaf => ({
  tex,
  kind: 'value',
  negative: tex.startsWith('-'),
  power: tex.includes('\\times'),
});
const symbols = (text: string): string =>
  texOf(parseExpression(text).tree, (name) => ({
    tex: name,
    kind: 'symbol',
    negative: false,
    power: false,
  }));
const substituted = (text: string, values: Record<string, string>): string =>
  texOf(parseExpression(text).tree, (name) => value(values[name] ?? '?'));

describe('symbols', () => {
  for (const [text, tex] of [
    ['Fn*Ag', '{Fn}\\,{Ag}'],
    ['a-(b-c)', '{a}-({b}-{c})'],
    ['a-(b+c)', '{a}-({b}+{c})'],
    ['(a+b)*c', '({a}+{b})\\,{c}'],
    ['(a*b)^2', '({a}\\,{b})^{{2}}'],
    ['a/b', '\\frac{{a}}{{b}}'],
    ['-psi', '-{psi}'],
    ['-(a+b)', '-({a}+{b})'],
    ['0.658^(a/b)*a', '{0.658}^{{a}/{b}}\\,{a}'],
    ['sin(a/2)^2', '\\sin^{{2}}({a}/{2})'],
    ['atan(a)', '\\arctan {a}'],
    ['b*sinh(a)', '{b}\\,\\sinh {a}'],
    ['b*Phi3(a)', '{b}\\,\\Phi_{3}({a})'],
  ] as const)
    it(text, () => expect(symbols(text)).toBe(tex));
});

describe('negative and ×10ⁿ values', () => {
  const big = '3.2\\times 10^{9}';
  for (const [text, values, tex] of [
    ['a*b', { a: '2', b: '-3' }, '{2}({-3})'],
    ['a-b', { a: '2', b: '-3' }, '{2}-({-3})'],
    ['a+b', { a: '-2', b: '-3' }, '{-2}+({-3})'],
    ['a^2', { a: '-3' }, '({-3})^{{2}}'],
    ['a^2', { a: big }, `({${big}})^{{2}}`],
    ['-a', { a: '-3' }, '-({-3})'],
    ['0.9*a', { a: '5' }, '{0.9}\\,({5})'],
    ['a*b^2', { a: '2', b: '3' }, '{2}\\,({3}^{{2}})'],
    ['a*b^2', { a: '2', b: '-3' }, '{2}\\,({-3})^{{2}}'],
    ['a/b', { a: '-3', b: big }, `\\frac{{-3}}{{${big}}}`],
  ] as const)
    it(`${text} at ${JSON.stringify(values)}`, () => expect(substituted(text, values)).toBe(tex));
});

describe('one line of text', () => {
  const line = (text: string, values: Record<string, string>): string =>
    textOf(parseExpression(text).tree, (name) => values[name] ?? name);
  for (const [text, values, printed] of [
    ['0.658^(Fy/Fe)*Fy', {}, '0.658^(Fy/Fe) · Fy'],
    ['pi^2*E', {}, 'π^2 · E'],
    ['a-(b-c)', {}, 'a − (b − c)'],
    ['a/(b*c)', {}, 'a/(b · c)'],
    ['sqrt(a)', {}, '√(a)'],
    ['abs(M)', {}, '|M|'],
    ['b*Phi3(-(k*l)^2)', {}, 'b · Φ₃(−(k · l)^2)'],
    ['atan(a)+b', {}, 'arctan(a) + b'],
    ['a*b', { a: '−2', b: '3×10⁹' }, '(−2) · (3×10⁹)'],
  ] as const)
    it(text, () => expect(line(text, values)).toBe(printed));
});
