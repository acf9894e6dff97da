import type { DraftQuantity } from '#shared/contracts/draft-quantity.ts';
import { sectionTextOf } from '#shared/contracts/draft-section.ts';
import type { ActionName, DraftCombination, MemberDraft } from '#shared/contracts/members.ts';
import { normalDesignation } from '#shared/sections/table.ts';
import type { StatedName } from './member-fields.ts';

/** Typing another value ends its confirmation: what was confirmed was the value before. */
export const withText = (quantity: DraftQuantity, text: string): DraftQuantity => ({
  ...quantity,
  text,
  confirmed: text.trim() === quantity.text.trim() ? quantity.confirmed : false,
});

export const withStated = (
  draft: MemberDraft,
  name: StatedName,
  quantity: DraftQuantity,
): MemberDraft => ({ ...draft, [name]: quantity });

export const withCombination = (
  draft: MemberDraft,
  id: string,
  change: (combination: DraftCombination) => DraftCombination,
): MemberDraft => ({
  ...draft,
  combinations: draft.combinations.map((row) => (row.id === id ? change(row) : row)),
});

export const withAction = (
  draft: MemberDraft,
  id: string,
  action: ActionName,
  quantity: DraftQuantity,
): MemberDraft =>
  withCombination(draft, id, (row) =>
    withForcesOf(sectionTextOf(draft), { ...row, [action]: quantity }),
  );

/** Forces belong to the section they came with; a row that has none yet takes the member's. */
export const withForcesOf = (section: string, row: DraftCombination): DraftCombination =>
  row.analysedWith?.trim() || section.trim() === ''
    ? row
    : { ...row, analysedWith: section.trim() };

/** Says that the forces come from an analysis with the section the member has now. */
export const analysedAgain = (draft: MemberDraft, id: string): MemberDraft =>
  withCombination(draft, id, (row) => ({ ...row, analysedWith: sectionTextOf(draft) }));

/** The section the forces were analysed with, where the member has another one now. */
export function sectionLeft(draft: MemberDraft, row: DraftCombination): string | null {
  const analysed = normalDesignation(row.analysedWith ?? '');
  const now = normalDesignation(sectionTextOf(draft));
  return analysed === '' || now === '' || analysed === now ? null : analysed;
}

export const withoutCombination = (draft: MemberDraft, id: string): MemberDraft => ({
  ...draft,
  combinations: draft.combinations.filter((row) => row.id !== id),
});
