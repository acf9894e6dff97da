import { describe, expect, it } from 'vitest';
import { evaluatePrecisely, reproduces, symbolsIn } from './evaluate-precisely.ts';

// Digits of constants: OEIS A002193 (sqrt 2), A049469 (sin 1), A049470 (cos 1), A049471 (tan 1),
// A019670 (pi/3), A002388 (pi squared), A003881 (pi/4),
// A073742 (sinh 1), A073743 (cosh 1), A073744 (tanh 1).
const constants: readonly (readonly [string, Readonly<Record<string, number>>, string])[] = [
  ['sqrt(a)', { a: 2 }, '1.4142135623730950488'],
  ['a^0.5', { a: 2 }, '1.4142135623730950488'],
  ['sin(a)', { a: 1 }, '0.84147098480789650665'],
  ['cos(a)', { a: 1 }, '0.5403023058681397174'],
  ['tan(a)', { a: 1 }, '1.5574077246549022305'],
  ['acos(a)', { a: 0.5 }, '1.0471975511965977462'],
  ['pi^2', {}, '9.8696044010893586188'],
  ['atan2(a,b)', { a: 1, b: 1 }, '0.78539816339744830962'],
  ['abs(a)', { a: -3 }, '3'],
  ['sinh(a)', { a: 1 }, '1.1752011936438014569'],
  ['cosh(a)', { a: 1 }, '1.5430806348152437785'],
  ['tanh(a)', { a: 1 }, '0.7615941559557648881'],
  ['atan(a)', { a: 1 }, '0.78539816339744830962'],
  // 1 − cos 1, 1 − sin 1, cos 1 − 1/2, sin 1 − 5/6; cosh 1 − 1.
  ['Phi2(a)', { a: 1 }, '0.4596976941318602826'],
  ['Phi3(a)', { a: 1 }, '0.15852901519210349335'],
  ['Phi4(a)', { a: 1 }, '0.0403023058681397174'],
  ['Phi5(a)', { a: 1 }, '0.00813765147456317332'],
  ['Phi2(a)', { a: -1 }, '0.5430806348152437785'],
  // (cosh 20 − 1)/400, (1/6 − (1 − sin(20)/20)/400)/400 to 22 digits by python3's mpmath.
  ['Phi2(a)', { a: -400 }, '606456.4917622378500378'],
  ['Phi5(a)', { a: 400 }, '0.0004107019620575190503087'],
  ['-a', { a: 3 }, '-3'],
];

describe('the second evaluator', () => {
  it.each(constants)('%s', (expression, operands, value) => {
    expect(evaluatePrecisely(expression, operands)).toBe(Number(value));
  });

  it('has no value of a series without end', () => {
    expect(evaluatePrecisely('Phi3(a/b)', { a: 0, b: 0 })).toBeNaN();
  });

  it.each(['E', 'A', 'J', 'K', 'L', 'h', 'b', 'T', 'V', 'phi', 'tau', 'e', 'i'])(
    'has no meaning of its own for %s',
    (name) => {
      expect(evaluatePrecisely(name, { [name]: 7 })).toBe(7);
      expect(() => evaluatePrecisely(name, {})).toThrow(name);
    },
  );

  it('has no value where there is none', () => {
    expect(reproduces('sqrt(a)', { a: -1 }, 1)).toBe(false);
    expect(reproduces('1/a', { a: 0 }, 1)).toBe(false);
    expect(reproduces('acos(a)', { a: 2 }, 0)).toBe(false);
  });

  it('asks for nine digits', () => {
    expect(reproduces('a*b', { a: 3, b: 7 }, 21 * (1 + 5e-10))).toBe(true);
    expect(reproduces('a*b', { a: 3, b: 7 }, 21 * (1 + 2e-9))).toBe(false);
  });

  it('asks for twelve digits of the largest term where terms cancel', () => {
    // 1 − 0.999999999 = 1e-9: a share of 1e-12 of the term 1 is a thousandth of the result.
    expect(reproduces('1-a', { a: 0.999999999 }, 1e-9 + 5e-13)).toBe(true);
    expect(reproduces('1-a', { a: 0.999999999 }, 1e-9 + 2e-12)).toBe(false);
    // The same below a fraction: 1/1e-9 is a thousandth uncertain too.
    expect(reproduces('b/(1-a)', { a: 0.999999999, b: 1 }, 1e9 * (1 + 5e-4))).toBe(true);
    expect(reproduces('b/(1-a)', { a: 0.999999999, b: 1 }, 1e9 * (1 + 2e-3))).toBe(false);
  });

  it('is no milder where nothing cancels', () => {
    expect(reproduces('1-a', { a: 0.5 }, 0.5 * (1 + 2e-9))).toBe(false);
    expect(reproduces('a+b', { a: 1e6, b: 1 }, 1000001 * (1 + 2e-9))).toBe(false);
  });

  it('takes operands as the doubles they are, where the last bit of one counts', () => {
    // arccos(1 − x) = √(2x) (1 + x/12 + …) by its series; x = 2⁻³⁰ is exact in binary only.
    const x = 2 ** -30;
    expect(reproduces('acos(a)', { a: 1 - x }, Math.sqrt(2 * x) * (1 + x / 12))).toBe(true);
  });

  it('names the symbols of an expression', () => {
    expect([...symbolsIn('pi^2*E/(Lc/r)^2+sqrt(E)')]).toEqual(['E', 'Lc', 'r']);
  });
});
