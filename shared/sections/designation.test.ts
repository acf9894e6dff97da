import { describe, expect, it } from 'vitest';
import { cleanDesignation, designationKey, printedDesignation } from './designation.ts';
import { designationsOf, FAMILIES, findShape, normalDesignation, searchShapes } from './table.ts';

describe('designations', () => {
  it.each([
    ['w12×79', 'W12X79'],
    ['C 15 x 33.9', 'C15X33.9'],
    ['mc18*58', 'MC18X58'],
    ['hss8x6x1/2', 'HSS8X6X1/2'],
    ['HSS8X6X.500', 'HSS8X6X1/2'],
    ['HSS 8 × 6 × 0.5', 'HSS8X6X1/2'],
    ['HSS6X.375', 'HSS6.000X0.375'],
    ['HSS6.000X0.375', 'HSS6.000X0.375'],
    ['PIPE8STD', 'Pipe8STD'],
    ['Pipe 8 Std.', 'Pipe8STD'],
    ['Pipe 8 x-Strong', 'Pipe8XS'],
    ['Pipe 8 xx-strong', 'Pipe8XXS'],
    ['Pipe 2-1/2 XXS', 'Pipe2-1/2XXS'],
  ])('%s is the row %s', (typed, row) => {
    expect(findShape(typed)?.designation).toBe(row);
    expect(normalDesignation(typed)).toBe(row);
  });
  it('keeps what no table has, in capitals', () =>
    expect(normalDesignation('2l 4x4x1/2')).toBe('2L4X4X1/2'));
  it('reads numbers alike however they are written', () => {
    expect(designationKey('HSS10.000X0.250')).toBe(designationKey('hss10.0 x .25'));
    expect(designationKey('W10X100')).toBe('W10X100');
    expect(cleanDesignation(' Pipe 12 X-Strong ')).toBe('PIPE12XS');
  });
  it.each([
    ['W12X79', 'W12×79'],
    ['HSS8X6X1/2', 'HSS8×6×1/2'],
    ['HSS3-1/2X3-1/2X3/8', 'HSS3-1/2×3-1/2×3/8'],
    ['Pipe8XS', 'Pipe 8 XS'],
    ['Pipe1-1/2XXS', 'Pipe 1-1/2 XXS'],
    ['Box 20 in × 12 in', 'Box 20 in × 12 in'],
  ])('%s prints as %s', (designation, printed) =>
    expect(printedDesignation(designation)).toBe(printed),
  );
  it('leads from each printed form back to its row, and from no two rows to one', () => {
    const all = FAMILIES.flatMap(designationsOf);
    expect(new Set(all.map(designationKey)).size).toBe(all.length);
    for (const d of all) expect(findShape(printedDesignation(d))?.designation).toBe(d);
  });
  it('finds by part, families in order', () => {
    expect(searchShapes('12x53')).toEqual(['W12X53', 'HP12X53']);
    expect(searchShapes('pipe 8')).toEqual(['Pipe8STD', 'Pipe8XS', 'Pipe8XXS']);
    expect(searchShapes('8x6x.5')[0]).toBe('HSS8X6X1/2');
  });
});
