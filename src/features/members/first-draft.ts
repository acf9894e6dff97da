import type { DraftQuantity } from '#shared/contracts/draft-quantity.ts';
import type { DraftCombination, MemberDraft } from '#shared/contracts/members.ts';

/** A quantity nobody has given yet. */
const notGiven: DraftQuantity = { text: '', confirmed: false };

/** An id for a row of forces; it stays with the row whatever it is called. */
function freshCombinationId(taken: readonly { id: string }[]): string {
  const numbers = taken.map(({ id }) => Number(/^c(\d+)$/.exec(id)?.[1] ?? 0));
  return `c${Math.max(0, ...numbers) + 1}`;
}

export const firstCombination = (taken: readonly DraftCombination[]): DraftCombination => ({
  id: freshCombinationId(taken),
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
