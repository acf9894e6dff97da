import { expect, it } from 'vitest';
import type { Verdict } from './line.ts';
import { worstVerdict } from './verdict.ts';

// FAILED > NOT OK > NOT CHECKED > OK.
const RANKED: readonly Verdict[] = ['OK', 'NOT CHECKED', 'NOT OK', 'FAILED'];

it('the worst verdict is taken, in any order', () => {
  RANKED.forEach((better, i) => {
    RANKED.slice(i).forEach((worse) => {
      expect(worstVerdict([better, worse])).toBe(worse);
      expect(worstVerdict([worse, better])).toBe(worse);
    });
  });
});
it('nothing checked is NOT CHECKED', () => expect(worstVerdict([])).toBe('NOT CHECKED'));
