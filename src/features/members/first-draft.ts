import { notGiven } from '#shared/contracts/draft-quantity.ts';
import type { DraftCombination, MemberDraft } from '#shared/contracts/members.ts';
import { freshId } from './fresh-id.ts';

export const firstCombination = (taken: readonly DraftCombination[]): DraftCombination => ({
  id: freshId('c', taken),
  name: '',
  P: notGiven,
  MxA: notGiven,
  MxB: notGiven,
  MyA: notGiven,
  MyB: notGiven,
  MxMax: notGiven,
  MyMax: notGiven,
});

/** A member nobody has described yet. Lengths have no defaults; Cb is 1 until said otherwise. */
export const firstDraft = (mark: string): MemberDraft => ({
  mark,
  place: '',
  section: notGiven,
  material: 'A992',
  ownSteel: null,
  ends: { text: 'held', confirmed: false },
  length: notGiven,
  Lcx: notGiven,
  Lcy: notGiven,
  Lcz: notGiven,
  Lb: notGiven,
  Cb: notGiven,
  endMomentSign: '',
  combinations: [firstCombination([])],
});

/** The mark that follows the last one: `C-08` after `C-07`. */
export function followingMark(marks: readonly string[]): string {
  const last = marks.at(-1) ?? '';
  const match = /^(.*?)(\d+)$/.exec(last);
  if (!match) return last === '' ? 'C-01' : '';
  const [, head = '', digits = '0'] = match;
  return `${head}${String(Number(digits) + 1).padStart(digits.length, '0')}`;
}
