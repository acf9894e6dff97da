import { useVersionedDraft, type VersionedDraft } from '#client/lib/draft/use-versioned-draft.ts';
import type { Member, MemberDraft } from '#shared/contracts/members.ts';
import { memberRules } from './member-rules.ts';
import { useUpdateMember } from './mutations.ts';

const storedOf = ({ version, draft, changedBy, changedAt }: Member) => ({
  ...{ version, value: draft, changedBy, changedAt },
});

/** A member's form, which saves itself. */
export function useMemberDraft(
  calculationId: string,
  member: Member,
  editable: boolean,
): VersionedDraft<MemberDraft> {
  const update = useUpdateMember(calculationId, member.id);
  return useVersionedDraft<MemberDraft>({
    key: `member/${member.id}`,
    stored: storedOf(member),
    rules: memberRules,
    editable,
    save: async (version, draft) => storedOf(await update.mutateAsync({ version, draft })),
    readTheirs: (theirs) => storedOf(theirs as Member),
  });
}
