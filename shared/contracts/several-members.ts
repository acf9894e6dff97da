import { z } from 'zod';
import { contract, permitted } from './contract.ts';
import { draftPatch } from './draft-patch.ts';
import { id, version } from './fields.ts';

/** As many members as are changed, run and audited in one transaction. */
export const mostChangedAtOnce = 200;

const memberPatch = z.object({ memberId: id, version, patch: draftPatch });
export type MemberPatch = z.infer<typeof memberPatch>;

export const severalMembers = {
  /**
   * Changes several members, all or none. Where one was changed or deleted meanwhile the answer is
   * a conflict: its `theirs` are the `member`s that have another version, each with who changed it;
   * its `problems` say the same in words, also of deleted ones, with the member's id as path.
   */
  changeMembers: contract({
    method: 'POST',
    path: '/api/calculations/:calculationId/member-changes',
    access: permitted('member.edit'),
    params: z.object({ calculationId: id }),
    body: z.object({
      changes: z
        .array(memberPatch)
        .min(1, 'names no member')
        .max(mostChangedAtOnce, `at most ${mostChangedAtOnce} members at once`)
        .refine(
          (all) => new Set(all.map(({ memberId }) => memberId)).size === all.length,
          'names a member twice',
        ),
    }),
    answer: z.object({ changed: z.array(z.object({ memberId: id, version })) }),
  }),
};
