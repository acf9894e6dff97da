import { eq } from 'drizzle-orm';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { members } from '#server/db/schema/calculations.ts';
import { transaction } from '#server/db/transaction.ts';
import type { Handler } from '#server/http/handler.ts';
import type { members as contracts } from '#shared/contracts/members.ts';
import { lockMember } from './lock-member.ts';
import { deletedMemberRowOf, draftOf } from './stored-member.ts';

/** Takes a member out of its calculation; it can be restored. */
export const deleteMember: Handler<typeof contracts.deleteMember> = async (context) => {
  const { deps, viewer, scope, params } = context;
  const now = deps.now();
  return transaction(deps.pool, async (tx) => {
    const { stored } = await lockMember(tx, scope.calculationId, params.memberId, 'present');
    const set = {
      ...{ deletedAt: now, version: stored.version + 1 },
      ...{ changedBy: viewer.userId, changedAt: now },
    };
    await tx.db.update(members).set(set).where(eq(members.id, stored.id));
    const event = { action: 'member.deleted', before: draftOf(stored) } as const;
    await writeAudit(tx, auditScope(context, stored.id), event);
    return deletedMemberRowOf(stored, viewer.name, now);
  });
};
