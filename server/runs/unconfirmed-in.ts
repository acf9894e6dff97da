import { actionNames, lengthNames, type MemberDraft } from '#shared/contracts/members.ts';

/** How many values that are given in a draft are not confirmed, where it cannot be run. */
export function unconfirmedIn(draft: MemberDraft): number {
  const values = [
    ...lengthNames.map((name) => draft[name]),
    ...[draft.section, draft.ends, draft.Cb],
    ...draft.combinations.flatMap((row) => actionNames.map((name) => row[name])),
  ];
  return values.filter(({ text, confirmed }) => text.trim() !== '' && !confirmed).length;
}
