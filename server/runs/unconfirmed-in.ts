import { valuesOf } from '#shared/contracts/draft-input-values.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';

/** How many values that are given in a draft are not confirmed, where it cannot be run. */
export const unconfirmedIn = (draft: MemberDraft): number =>
  valuesOf(draft).filter(({ text, confirmed }) => text.trim() !== '' && !confirmed).length;
