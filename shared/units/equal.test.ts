import { describe, expect, it } from 'vitest';
import { areEqual } from './equal.ts';

describe('two values are one number', () => {
  it('where conversion and computation alone differ', () => {
    expect(areEqual(0.1 + 0.2, 0.3)).toBe(true);
    expect(areEqual(3657.6, 3657.6000000000004)).toBe(true);
    expect(areEqual(-1, -1 - 1e-13)).toBe(true);
    expect(areEqual(0, 0)).toBe(true);
  });
  it('and two where 12 digits tell them apart', () => {
    expect(areEqual(9.99999999999, 9.99999999998)).toBe(false);
    expect(areEqual(1, 1.00000000001)).toBe(false);
    expect(areEqual(1e-300, 0)).toBe(false);
    expect(areEqual(1, -1)).toBe(false);
  });
});
