import { expect, it } from 'vitest';
import { draftPatch, isNoChange, patchBetween, withPatch } from './draft-patch.ts';
import type { DraftQuantity } from './draft-quantity.ts';
import type { DraftCombination, MemberDraft } from './members.ts';

const typed = (text: string): DraftQuantity => ({ text, confirmed: true });

const row = (id: string, P: string): DraftCombination => ({
  ...{ id, name: id, P: typed(P), MxA: typed(''), MxB: typed('') },
  ...{ MyA: typed(''), MyB: typed(''), MxMax: typed(''), MyMax: typed('') },
});

const before: MemberDraft = {
  ...{ mark: 'C-01', place: '', section: typed('W12X79'), material: 'A992', ownSteel: null },
  ...{ ends: typed('held'), length: typed('22 ft'), endMomentSign: 'bending' },
  ...{ Lcx: typed('22 ft'), Lcy: typed('22 ft'), Lcz: typed('22 ft'), Lb: typed('22 ft') },
  ...{ Cb: typed('1'), stiffeners: typed('30 in') },
  combinations: [row('c1', '310 kip'), row('c2', '268 kip')],
};

it('holds what changed and nothing else', () => {
  const { stiffeners: _, ...rest } = before;
  const after: MemberDraft = {
    ...rest,
    material: 'A36',
    combinations: [row('c1', '310 kip'), { ...row('c2', '268 kip'), analysedWith: 'W12X79' }],
  };
  const patch = patchBetween(before, after);
  expect(patch).toEqual({
    set: { material: 'A36' },
    drop: ['stiffeners'],
    combinations: [{ id: 'c2', set: { analysedWith: 'W12X79' }, drop: [] }],
  });
  expect(draftPatch.parse(patch)).toEqual(patch);
  expect(withPatch(before, patch)).toEqual(after);
});

it('goes back: the patch the other way gives what was there', () => {
  const { stiffeners: _, ...rest } = before;
  const after: MemberDraft = { ...rest, ends: typed('springs') };
  expect(withPatch(after, patchBetween(after, before))).toEqual(before);
});

it('leaves alone what another person changed beside it', () => {
  const patch = patchBetween(before, { ...before, Cb: typed('1.14') });
  const theirs: MemberDraft = {
    ...before,
    place: 'grid 4/B',
    combinations: [row('c1', '320 kip'), row('c3', '1 kip')],
  };
  expect(withPatch(theirs, patch)).toEqual({ ...theirs, Cb: typed('1.14') });
});

it('is no change between equal drafts', () => {
  expect(isNoChange(patchBetween(before, structuredClone(before)))).toBe(true);
  expect(isNoChange(patchBetween(before, { ...before, place: 'x' }))).toBe(false);
});
