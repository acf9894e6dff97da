import { describe, expect, it } from 'vitest';
import { parseExpression } from './parse.ts';

describe('a formula text', () => {
  it('names its symbols in order, once, without π', () => {
    expect(parseExpression('pi^2*E/(Lc/r)^2+E').symbols).toEqual(['E', 'Lc', 'r']);
  });
  it('has no constants and no units of its own: every letter is a symbol', () => {
    const names = [
      'E',
      'e',
      'i',
      'phi',
      'tau',
      'A',
      'J',
      'K',
      'L',
      'h',
      'b',
      'T',
      'V',
      'N',
      'm',
      'c',
      'kip',
    ];
    for (const name of names) {
      const parsed = parseExpression(`2*${name}`);
      expect(parsed.symbols).toEqual([name]);
      expect(parsed.evaluate({ [name]: 21 })).toBe(42);
      expect(() => parsed.evaluate({})).toThrow();
    }
  });
  it('keeps constants as written', () => {
    const { tree } = parseExpression('0.70*E');
    expect(tree).toMatchObject({
      kind: 'binary',
      left: { kind: 'number', text: '0.70', value: 0.7 },
    });
  });
  // By hand.
  for (const [text, operands, value] of [
    ['0.658^(Fy/Fe)*Fy', { Fy: 50, Fe: 50 }, 32.9],
    ['-M', { M: 3 }, -3],
    ['-x^2', { x: 3 }, -9],
    ['2^3^2', {}, 512],
    ['a-b-c', { a: 1, b: 2, c: 3 }, -4],
    ['a/b/c', { a: 12, b: 3, c: 2 }, 2],
    ['abs(M)', { M: -7 }, 7],
    ['sqrt(a^2+b^2)', { a: 3, b: 4 }, 5],
    // Digits: OEIS A073742, A073743, A073744, A003881.
    ['sinh(a)', { a: 1 }, 1.1752011936438014],
    ['cosh(a)', { a: 1 }, 1.5430806348152437],
    ['tanh(a)', { a: 1 }, 0.7615941559557649],
    ['atan(a)', { a: 1 }, Math.PI / 4],
    ['Phi2(a)', { a: -1 }, 0.5430806348152438],
    ['atan2(y,x)', { y: 1, x: -1 }, (3 * Math.PI) / 4],
    ['acos(psi)', { psi: -0.5 }, (2 * Math.PI) / 3],
    ['pi', {}, Math.PI],
  ] as const)
    it(`${text} = ${value}`, () => {
      expect(parseExpression(text).evaluate(operands)).toBeCloseTo(value, 12);
    });
  it('has no value where there is none', () => {
    expect(parseExpression('sqrt(x)').evaluate({ x: -1 })).toBeNaN();
    expect(parseExpression('1/x').evaluate({ x: 0 })).toBe(Number.POSITIVE_INFINITY);
  });
});

describe('what a formula text may not hold', () => {
  for (const [text, why] of [
    ['2 Fy', /implicit multiplication/],
    ['a < b', /operator|RelationalNode|ConditionalNode/],
    ['a > b ? a : b', /ConditionalNode/],
    ['max(a,b)', /function max/],
    ['log(a)', /function log/],
    ['x = 3', /AssignmentNode/],
    ['[1,2]', /ArrayNode/],
    ['a.b', /AccessorNode/],
    ['"text"', /./],
    ['a;b', /BlockNode/],
    ['f(x) = x', /FunctionAssignmentNode/],
    ['5 %', /./],
    ['a!', /operator/],
    ['(a', /./],
  ] as const)
    it(text, () => expect(() => parseExpression(text)).toThrow(why));

  it('settles a sum that cancels all but its last bits at zero', () => {
    const sum = parseExpression('a*b-(c+d)');
    const third = { a: 0.1, b: 3, c: 0.1, d: 0.2 };
    expect(sum.evaluate({ ...third, d: 0.2 + 4 * Number.EPSILON })).not.toBe(0);
    expect(sum.settle({ ...third, d: 0.2 + 4 * Number.EPSILON })).toBe(0);
    expect(sum.settle({ ...third, d: 0.2 + 1e-12 })).toBe(
      sum.evaluate({ ...third, d: 0.2 + 1e-12 }),
    );
    // A multiple of such a sum and its size too.
    const nearly = { a: 1, b: 0.3, c: 0.1 + 0.2 };
    expect(parseExpression('a*(b-c)').evaluate(nearly)).not.toBe(0);
    for (const multiple of ['a*(b-c)', '(b-c)/a', '(b-c)*a', '-(b-c)', 'abs(b-c)/a'])
      expect(Math.abs(parseExpression(multiple).settle(nearly))).toBe(0);
    // No sum, a sum under another function, or no value: nothing settles.
    expect(parseExpression('a/b').settle({ a: 1, b: 0 })).toBe(Infinity);
    expect(parseExpression('a+sqrt((b-c)^2)').settle(nearly)).toBe(1);
    expect(parseExpression('sin(b-c)').settle(nearly)).not.toBe(0);
  });
});
