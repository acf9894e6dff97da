import { describe, expect, it } from 'vitest';
import { solveBracketed } from './solve.ts';

describe('a bracketed root', () => {
  it('is found to the last bit', () => {
    expect(solveBracketed((x) => x * x - 2, 0, 2)).toBeCloseTo(Math.SQRT2, 15);
    expect(solveBracketed((x) => 2 - x * x, 0, 2)).toBeCloseTo(Math.SQRT2, 15);
    expect(solveBracketed((x) => Math.cos(x), 0, 3)).toBeCloseTo(Math.PI / 2, 15);
  });
  it('may lie on an end of the bracket', () => {
    expect(solveBracketed((x) => x, 0, 1)).toBe(0);
    expect(solveBracketed((x) => x - 1, 0, 1)).toBe(1);
  });
  it('ends where the numbers end', () => {
    expect(solveBracketed((x) => x - 1e-300, 0, 1)).toBeCloseTo(1e-300, 310);
    expect(solveBracketed((x) => x - 1e300, -1e305, 1e305)).toBe(1e300);
  });
  it('is null without a change of sign, or where the function has no value', () => {
    expect(solveBracketed((x) => x * x + 1, -1, 1)).toBeNull();
    expect(solveBracketed((x) => 1 / x, 0, 1)).toBeNull();
    expect(solveBracketed((x) => Math.sqrt(x), -1, 1)).toBeNull();
  });
});
