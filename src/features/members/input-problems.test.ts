import { describe, expect, it } from 'vitest';
import { firstDraft } from './first-draft.ts';
import { inputProblems } from './input-problems.ts';
import { placeWords } from './place-words.ts';

const draft = firstDraft('C-01');

describe('problems of a member’s input', () => {
  it('are named by the member’s own fields, each once', () => {
    const problems = inputProblems(draft, [
      { path: 'members[0].combinations[0].P', message: 'must be a text with its unit' },
      { path: 'members[0].combinations[0].P', message: 'is empty' },
    ]);
    expect(problems).toEqual([{ path: 'combinations[0].P', message: 'is needed' }]);
  });

  it('say what a source lacks instead of how the value should look', () => {
    const length = {
      text: '22 ft',
      source: { kind: 'drawing', number: 'S-201', revision: '' },
      confirmed: false,
    } as const;
    const problems = inputProblems({ ...draft, length }, [
      { path: 'members[0].length', message: 'must be a text with its unit' },
    ]);
    expect(problems[0]?.message).toBe('Its source lacks the revision of the drawing.');
  });

  it.each([
    ['combinations[1].MxA', 'Combination 2, Major, end A'],
    ['Lcx', 'Buckling Lcx'],
    ['length', 'Length L'],
    ['material.Fy', 'Steel'],
    ['analysis.includesMemberEffect', 'Basis of design'],
  ])('%s reads as %s', (path, words) => {
    expect(placeWords(path)).toBe(words);
  });
});
