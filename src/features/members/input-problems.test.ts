import { describe, expect, it } from 'vitest';
import { notGiven } from '#shared/contracts/draft-quantity.ts';
import { noSwayAbout, withSupport, withSway } from './edit-loads.ts';
import { noSizes } from './edit-parts.ts';
import { withNewRestraint, withRestraint } from './edit-restraints.ts';
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

  it('of a choice not made stand beside the choice, and those it answers for go', () => {
    const sizes = { ...noSizes, shape: 'tube' as const };
    const sway = { P: notGiven, x: noSwayAbout, y: { ...noSwayAbout, by: 'critical' as const } };
    const described = withSway({ ...draft, sizes }, 'c1', sway);
    const at = 'members[0].combinations[0].sway';
    const problems = inputProblems(described, [
      { path: 'members[0].section', message: 'Invalid input' },
      { path: `${at}.x.Pmf`, message: 'is needed for R_M' },
      { path: `${at}.y.H`, message: 'is needed where PeStory is not given' },
      { path: `${at}.y.PeStory`, message: 'is empty' },
    ]);
    expect(problems).toEqual([
      { path: 'section.wall', message: 'is needed' },
      { path: 'combinations[0].sway.x.frames', message: 'is needed' },
      { path: 'combinations[0].sway.y.PeStory', message: 'is needed' },
    ]);
  });

  it('of a point stand beside its distance, those of its source too', () => {
    const source = { kind: 'drawing', number: 'S-201', revision: '' } as const;
    const held = withRestraint(withNewRestraint(draft), 'r1', { at: '3 m', source });
    const problems = inputProblems(held, [
      { path: 'members[0].restraints[0].at', message: 'must be a text with its unit' },
      { path: 'members[0].restraints[0].source.revision', message: 'Too small' },
      { path: 'members[0].restraints[0].holds', message: 'needs at least one of' },
    ]);
    expect(problems).toEqual([
      { path: 'restraints[0].at', message: 'Its source lacks the revision of the drawing.' },
      { path: 'restraints[0].holds', message: 'is needed' },
    ]);
  });

  it('of a moment whose point is gone are told; those of a point that is there are its own', () => {
    const moment = { My: { text: '2 kN m', confirmed: false } };
    const over = withSupport(withNewRestraint(draft), 'c1', 'r1', moment);
    const found = [{ path: 'members[0].combinations[0].supports[0].at', message: 'is empty' }];
    expect(inputProblems(over, found)).toEqual([]);
    expect(inputProblems({ ...over, restraints: [] }, found)).toHaveLength(1);
  });

  it.each([
    ['combinations[1].MxA', 'Combination 2, Major, end A'],
    ['Lcx', 'Buckling Lcx'],
    ['length', 'Length L'],
    ['material.Fy', 'Steel'],
    ['analysis.includesMemberEffect', 'Basis of design'],
    ['restraints[1].at', 'Point r2, distance from end A'],
    ['restraints[0].holds', 'Point r1, what it holds'],
    ['combinations[0].loads[1].W', 'Combination 1, load 2, load W'],
    ['combinations[0].loads[0].height', 'Combination 1, load 1, where on the section'],
    ['combinations[2].supports[0].My', 'Combination 3, moment over a restraint, minor'],
    ['combinations[0].sway.P', 'Combination 1, sway, axial P l t'],
    ['combinations[0].sway.x.drift', 'Combination 1, sway about x, drift delta H'],
    ['combinations[0].Vx', 'Combination 1, Shear, major'],
    ['charts.y.GA', 'Alignment chart about y, joint A G A'],
    ['springs.xB', 'Ends, spring, major, B'],
    ['netSection.U', 'Net section, shear lag U'],
    ['stiffeners', 'Web stiffeners, clear distance a'],
    ['section.tf', 'Section, flange t f'],
  ])('%s reads as %s', (path, words) => {
    expect(placeWords(path)).toBe(words);
  });
});
