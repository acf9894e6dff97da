import { eq } from 'drizzle-orm';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { members } from '#server/db/schema/calculations.ts';
import { transaction } from '#server/db/transaction.ts';
import type { Handler } from '#server/http/handler.ts';
import type { members as contracts } from '#shared/contracts/members.ts';
import { keepFormulaUses } from './keep-formula-uses.ts';
import { lockMember } from './lock-member.ts';
import { refuseOneTooMany } from './refuse-one-too-many.ts';
import { draftOf, memberOf, runDraft } from './stored-member.ts';

/** Brings a deleted member back to its place. */
export const restoreMember: Handler<typeof contracts.restoreMember> = async (context) => {
  const { deps, viewer, scope, params } = context;
  return transaction(deps.pool, async (tx) => {
    const { calculationId } = scope;
    const { stored, basis } = await lockMember(tx, calculationId, params.memberId, 'deleted');
    await refuseOneTooMany(tx, calculationId);
    const draft = draftOf(stored);
    // The basis may have changed since.
    const { columns, uses } = await runDraft(deps.runs, basis, stored.id, draft);
    const set = {
      ...columns,
      ...{ deletedAt: null, version: stored.version + 1 },
      ...{ changedBy: viewer.userId, changedAt: deps.now() },
    };
    await tx.db.update(members).set(set).where(eq(members.id, stored.id));
    await keepFormulaUses(tx, stored.id, uses);
    const event = { action: 'member.restored', after: draft } as const;
    await writeAudit(tx, auditScope(context, stored.id), event);
    return memberOf({ ...stored, ...set }, viewer.name);
  });
};
