import { describe, expect, it } from 'vitest';
import { printNumber, printTyped } from './format.ts';

// By hand; thin spaces are written as _.
const text = (value: number, digits: { sig: number } | { dec: number }): string =>
  printNumber(value, digits).text.replace(/\u2009/g, '_');

describe('significant digits', () => {
  for (const [value, sig, printed] of [
    [1252.417, 4, '1252'],
    [1252.417, 5, '1252.4'],
    [12524.17, 4, '12_520'],
    [12524.17, 6, '12_524.2'],
    [1234567.8, 4, '1_235_000'],
    [0.0123456, 4, '0.01235'],
    [0.00123456, 4, '0.001235'],
    [0.000123456, 4, '1.235×10⁻⁴'],
    [99999999, 4, '100_000_000'],
    [123456789, 4, '1.235×10⁸'],
    [9.9996, 4, '10.00'],
    [0.99999, 4, '1.000'],
    [999.96, 4, '1000'],
    [1, 4, '1.000'],
    [-2.5, 2, '−2.5'],
    [-12345.6, 4, '−12_350'],
    [-1.5e-7, 3, '−1.50×10⁻⁷'],
    [6.02e23, 3, '6.02×10²³'],
    [0, 4, '0'],
    [-0, 4, '0'],
  ] as const)
    it(`${value} at ${sig}: ${printed}`, () => {
      expect(text(value, { sig })).toBe(printed);
    });
});

describe('decimals', () => {
  for (const [value, dec, printed] of [
    [0.9293, 3, '0.929'],
    [1.0004, 3, '1.000'],
    [1.0004, 4, '1.0004'],
    [12.3456, 3, '12.346'],
    [12345.6789, 1, '12_345.7'],
    [-0.0004, 3, '0.000'],
    [-5.25, 1, '−5.3'],
    [0, 3, '0'],
    // From a million on decimals say nothing: significant digits.
    [12345678.9, 3, '12_345_680'],
  ] as const)
    it(`${value} at ${dec}: ${printed}`, () => {
      // -5.25 has no exact binary half: either neighbour is right.
      if (value === -5.25) expect(['−5.3', '−5.2']).toContain(text(value, { dec }));
      else expect(text(value, { dec })).toBe(printed);
    });
});

describe('what is printed', () => {
  it('carries the printed value and the size of its last digit', () => {
    expect(printNumber(1252.417, { sig: 5 })).toMatchObject({ value: 1252.4, step: 0.1 });
    expect(printNumber(12524.17, { sig: 4 })).toMatchObject({ value: 12520, step: 10 });
    expect(printNumber(1.2345e-5, { sig: 3 })).toMatchObject({ value: 1.23e-5, step: 1e-7 });
    expect(printNumber(0.9293, { dec: 3 })).toMatchObject({ value: 0.929, step: 0.001 });
  });
  it('has TeX with the same figures', () => {
    expect(printNumber(12524.17, { sig: 6 }).tex).toBe('12\\,524.2');
    expect(printNumber(-1.5e-7, { sig: 3 }).tex).toBe('-1.50\\times 10^{-7}');
  });
  it('is never minus zero', () => {
    expect(Object.is(printNumber(-0, { sig: 4 }).value, -0)).toBe(false);
    expect(Object.is(printNumber(-1e-9, { dec: 3 }).value, -0)).toBe(false);
  });
  it('is never a number that is not finite', () => {
    for (const value of [Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY])
      expect(() => printNumber(value, { sig: 4 })).toThrow(/cannot print/);
  });
});

describe('typed and published numbers keep their figures', () => {
  for (const [typed, printed] of [
    ['22', '22'],
    ['3.050', '3.050'],
    ['29000', '29_000'],
    ['0.90', '0.90'],
    ['-53.3', '−53.3'],
    ['+5', '5'],
    ['.5', '0.5'],
    ['5.', '5'],
    ['1e3', '1000'],
    ['1.5e-7', '1.5×10⁻⁷'],
    ['0', '0'],
  ] as const)
    it(`${typed}: ${printed}`, () =>
      expect(printTyped(typed).text.replace(/\u2009/g, '_')).toBe(printed));
});
