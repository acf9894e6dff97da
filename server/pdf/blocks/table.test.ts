import { describe, expect, test } from 'vitest';
import { fillShares } from './table.ts';

describe('widths of a table’s columns', () => {
  test('stay as shared out where every cell fits', () => {
    expect(fillShares([100, 50], [80, 40])).toEqual([100, 50]);
  });

  test('let a column that lacks a little take it from those with room, in all the same width', () => {
    expect(fillShares([100, 50, 50], [60, 60, 40])).toEqual([92, 60, 48]);
  });

  test('never take from a column what it needs', () => {
    expect(fillShares([100, 50], [95, 400])).toEqual([95, 55]);
    expect(fillShares([100, 50], [300, 400])).toEqual([100, 50]);
  });
});
