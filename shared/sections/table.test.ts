import { describe, expect, it } from 'vitest';
import { findShape, normalDesignation, searchShapes, W_DESIGNATIONS } from './table.ts';

describe('the table of W shapes', () => {
  it('has all 283, each once, with every property above zero', () => {
    expect(W_DESIGNATIONS).toHaveLength(283);
    expect(new Set(W_DESIGNATIONS).size).toBe(283);
    for (const designation of W_DESIGNATIONS)
      for (const [name, { value }] of Object.entries(findShape(designation)?.properties ?? {}))
        expect(value, `${designation} ${name}`).toBeGreaterThan(0);
  });

  /*
   * As printed in AISC Design Examples v16.0 (2023): W14X99 in H.1A, W18X50 in F.1-1B, W16X31 in E.1E.
   */
  for (const [designation, values] of [
    [
      'W14X99',
      {
        A: '29.1 in²',
        Ix: '1110 in⁴',
        Sx: '157 in³',
        Zx: '173 in³',
        rx: '6.17 in',
        Iy: '402 in⁴',
        Sy: '55.2 in³',
        Zy: '83.6 in³',
        ry: '3.71 in',
        lambdaf: '9.34',
        lambdaw: '23.5',
        J: '5.37 in⁴',
        Cw: '18000 in⁶',
      },
    ],
    [
      'W18X50',
      {
        A: '14.7 in²',
        Sx: '88.9 in³',
        Zx: '101 in³',
        ry: '1.65 in',
        rts: '1.98 in',
        ho: '17.4 in',
        J: '1.24 in⁴',
        lambdaf: '6.57',
        lambdaw: '45.2',
      },
    ],
    ['W16X31', { A: '9.13 in²', ry: '1.17 in', tw: '0.275 in', lambdaf: '6.28', lambdaw: '51.6' }],
  ] as const)
    it(`${designation} as published`, () => {
      const shape = findShape(designation);
      for (const [name, published] of Object.entries(values))
        expect(shape?.properties[name as 'A']?.published, name).toBe(published);
    });

  /*
   * Sections are solid bodies: A·r² = I, S = 2I/d, Z ≥ S, b/t from the dimensions, to the rounding
   * of a table with three figures (by hand: each figure may be off by 0.5 %).
   */
  it('agrees with itself', () => {
    for (const designation of W_DESIGNATIONS) {
      const shape = findShape(designation);
      if (shape?.kind !== 'i') throw new Error(designation);
      const p = shape.properties;
      const near = (a: number, b: number, what: string, share = 0.02) =>
        expect(Math.abs(a / b - 1), `${designation}: ${what}`).toBeLessThan(share);
      near(p.A.value * p.rx.value ** 2, p.Ix.value, 'rx');
      near(p.A.value * p.ry.value ** 2, p.Iy.value, 'ry');
      near((2 * p.Ix.value) / p.d.value, p.Sx.value, 'Sx');
      near((2 * p.Iy.value) / p.bf.value, p.Sy.value, 'Sy');
      near(p.bf.value / 2 / p.tf.value, p.lambdaf.value, 'bf/2tf', 0.03);
      near((p.d.value - 2 * p.kdes.value) / p.tw.value, p.lambdaw.value, 'h/tw', 0.03);
      near(p.d.value - p.tf.value, p.ho.value, 'ho');
      near((p.Iy.value * p.ho.value ** 2) / 4, p.Cw.value, 'Cw', 0.03);
      near(Math.sqrt(Math.sqrt(p.Iy.value * p.Cw.value) / p.Sx.value), p.rts.value, 'rts');
      expect(p.Zx.value / p.Sx.value).toBeGreaterThan(1.05);
      expect(p.Zy.value / p.Sy.value).toBeGreaterThan(1.4);
    }
  });
});

describe('look-up and search', () => {
  for (const typed of ['W12X79', 'w12x79', 'W12×79', 'W 12 X 79', 'w12*79'])
    it(`${typed} is W12X79`, () => expect(findShape(typed)?.designation).toBe('W12X79'));
  it('an unknown one is null', () => {
    expect(findShape('W12X80')).toBeNull();
    expect(findShape('')).toBeNull();
    expect(findShape('__proto__')).toBeNull();
    expect(findShape('constructor')).toBeNull();
  });
  it('normal form', () => expect(normalDesignation(' w 14 × 99 ')).toBe('W14X99'));
  it('finds by any part, starts first, at most as many as asked', () => {
    expect(searchShapes('14X99')[0]).toBe('W14X99');
    expect(searchShapes('w14x9')).toEqual(expect.arrayContaining(['W14X99', 'W14X90']));
    expect(searchShapes('W', 5)).toHaveLength(5);
    expect(searchShapes('', 3)).toHaveLength(3);
    expect(searchShapes('nothing')).toEqual([]);
  });
});
