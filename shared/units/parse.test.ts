import { describe, expect, it } from 'vitest';
import type { DimensionName } from './dimension.ts';
import { parseQuantity } from './parse.ts';

// Values by hand: 1 in = 25.4 mm, 1 lbf = 4.4482216152605 N (NIST SP 811, 2008 edition, appendix B).
const read = (text: string, dimension: DimensionName): number => {
  const parsed = parseQuantity(text, dimension);
  if (!parsed.ok) throw new Error(parsed.reason);
  return parsed.quantity.value;
};
const reason = (text: string, dimension: DimensionName): string => {
  const parsed = parseQuantity(text, dimension);
  return parsed.ok ? 'accepted' : parsed.reason;
};

describe('lengths', () => {
  for (const [text, mm] of [
    ['14 ft', 4267.2],
    ['168 in', 4267.2],
    ['168in', 4267.2],
    ['4.2672 m', 4267.2],
    ['4267.2 mm', 4267.2],
    ['426.72 cm', 4267.2],
    ['14 feet', 4267.2],
    ["14'", 4267.2],
    ['14′', 4267.2],
    ['168"', 4267.2],
    ['168 inches', 4267.2],
    // 14·12 + 6.5 = 174.5 in
    ['14 ft 6.5 in', 4432.3],
    ['14\'6.5"', 4432.3],
    ['14\'-6.5"', 4432.3],
    ['14 ft - 6.5 in', 4432.3],
    ['14′ 6.5″', 4432.3],
    // 11·12 + 8 = 140 in
    ['11 ft 8 in', 3556],
    ['0 ft 6 in', 152.4],
    ['-14 ft 6 in', -4419.6],
    // U+2212
    ['\u22124 ft', -1219.2],
    ['+4 ft', 1219.2],
    ['.5 ft', 152.4],
    ['5. ft', 1524],
    ['1e3 mm', 1000],
    ['1.5E-1 m', 150],
    ['  14   ft ', 4267.2],
    ['0 ft', 0],
  ] as const)
    it(`${text} is ${mm} mm`, () => expect(read(text, 'length')).toBeCloseTo(mm, 9));
  it('14 ft, 168 in and 4.2672 m are the very same number', () =>
    expect(
      new Set(['14 ft', '168 in', '4.2672 m', '14 ft 0 in'].map((t) => read(t, 'length'))).size,
    ).toBe(1));
  it('keeps the text as typed', () => {
    const parsed = parseQuantity(' 14.0 ft ', 'length');
    expect(parsed).toMatchObject({ ok: true, quantity: { text: '14.0 ft', unit: { name: 'ft' } } });
  });
});

describe('forces, stresses and moments', () => {
  for (const [text, dimension, base] of [
    ['400 kip', 'force', 1779288.6461042],
    ['400 kips', 'force', 1779288.6461042],
    ['400 k', 'force', 1779288.6461042],
    ['400000 lb', 'force', 1779288.6461042],
    ['1 MN', 'force', 1e6],
    ['50 ksi', 'stress', 344.73786466],
    ['345 MPa', 'stress', 345],
    ['345 N/mm2', 'stress', 345],
    ['345 N/mm²', 'stress', 345],
    ['0.2 GPa', 'stress', 200],
    ['118 kip ft', 'moment', 159986517.2],
    ['118 kip-ft', 'moment', 159986517.2],
    ['118 kip·ft', 'moment', 159986517.2],
    ['118 kip*ft', 'moment', 159986517.2],
    ['118 ft-kips', 'moment', 159986517.2],
    ['1416 kip in', 'moment', 159986517.2],
    ['160 kN m', 'moment', 160e6],
    ['160 kNm', 'moment', 160e6],
    ['-20 kN·m', 'moment', -20e6],
  ] as const)
    it(`${text}`, () => expect(read(text, dimension) / base - 1).toBeCloseTo(0, 8));
  it('a plain number has no unit', () => {
    expect(read('1.14', 'none')).toBe(1.14);
    expect(reason('1.14 ft', 'none')).toMatch(/is a length; a plain number is wanted/);
  });
});

describe('refusals', () => {
  for (const [text, dimension, pattern] of [
    ['', 'length', /^is empty$/],
    ['   ', 'force', /^is empty$/],
    ['ft', 'length', /"ft" does not start with a number/],
    ['fourteen ft', 'length', /does not start with a number/],
    ['Infinity ft', 'length', /does not start with a number/],
    ['NaN', 'none', /does not start with a number/],
    ['1e400 ft', 'length', /1e400 is too large to be a number/],
    ['1e308 ft', 'length', /too large to be a number/],
    ['14', 'length', /needs a unit \(mm, cm, m, in, ft\)/],
    ['14 kip', 'length', /is a force; a length is wanted \(mm, cm, m, in, ft\)/],
    ['14 ft 6 in', 'force', /is not a unit known here/],
    ['14 furlong', 'length', /"furlong" is not a unit known here/],
    ['14 FT', 'length', /"FT" is not a unit known here/],
    ['1,234 kip', 'force', /has a comma in the number/],
    ['14 ft 6', 'length', /not a unit known here/],
    ['14 ft 6 kip', 'length', /not a unit known here/],
    ['1 2 ft', 'length', /not a unit known here/],
    ['1e99999 ft', 'length', /not a unit|too large/],
    ['<script>', 'length', /does not start with a number/],
  ] as const)
    it(`"${text}" as ${dimension}`, () => expect(reason(text, dimension)).toMatch(pattern));
  it('shortens what it repeats', () =>
    expect(reason(`${'x'.repeat(500)} ft`, 'length').length).toBeLessThan(80));
});
