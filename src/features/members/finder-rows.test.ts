import { expect, it } from 'vitest';
import type { Summary } from '#shared/calc/record.ts';
import { readLimits } from './finder-criteria.ts';
import { finderRows, weightAgainst } from './finder-rows.ts';

const ok: Summary = { verdict: 'OK', ratio: 0.9, ratioText: '0.900', governing: null };
const found = ['W14X43', 'W12X53'].map((designation) => ({
  ...{ designation, summary: ok, otherSteel: false },
}));
const search = {
  ...{ tried: 2, of: 2, found, nearest: null, obstacle: null, unchecked: 0 },
};
const names = (rows: ReturnType<typeof finderRows>) =>
  rows.map(({ designation, isPresent, isFound }) => [designation, isPresent, isFound]);

it('puts the present section in its place by weight', () => {
  expect(names(finderRows(search, { designation: 'W10X49', summary: null }))).toEqual([
    ['W14X43', false, true],
    ['W10X49', true, false],
    ['W12X53', false, true],
  ]);
});

it('shows the present section once where it is found, and none where it is not in a table', () => {
  expect(names(finderRows(search, { designation: 'W12X53', summary: ok }))).toEqual([
    ['W14X43', false, true],
    ['W12X53', true, true],
  ]);
  expect(finderRows(search, { designation: 'I 12 in', summary: ok })).toHaveLength(2);
});

it('says how much lighter or heavier: 42.05 and 40.03 lb/ft differ by 2.02', () => {
  expect(weightAgainst(40.03, 42.05)).toBe('−2.02');
  expect(weightAgainst(87, 79)).toBe('+8');
  expect(weightAgainst(79, 79)).toBe('0');
});

it('reads limits in any unit of length, and says which cannot be read', () => {
  const none = { minDepth: '', maxDepth: '', minWidth: '', maxWidth: '' };
  expect(readLimits({ ...none, maxDepth: '14 in', minWidth: '250 mm' })).toEqual({
    limits: { minDepth: null, maxDepth: 355.6, minWidth: 250, maxWidth: null },
    problems: {},
  });
  const wrong = readLimits({
    minDepth: '14 in',
    maxDepth: '12 in',
    minWidth: '3 kip',
    maxWidth: '',
  });
  expect(Object.keys(wrong.problems)).toEqual(['minWidth', 'maxDepth']);
});
