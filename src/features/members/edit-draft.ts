import type {
  ActionName,
  DraftCombination,
  DraftQuantity,
  MemberDraft,
} from '#shared/contracts/members.ts';
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
): MemberDraft => withCombination(draft, id, (row) => ({ ...row, [action]: quantity }));

export const withoutCombination = (draft: MemberDraft, id: string): MemberDraft => ({
  ...draft,
  combinations: draft.combinations.filter((row) => row.id !== id),
});
