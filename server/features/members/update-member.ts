import { eq } from 'drizzle-orm';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { members } from '#server/db/schema/calculations.ts';
import { transaction } from '#server/db/transaction.ts';
import { AppError } from '#server/http/app-error.ts';
import type { Handler } from '#server/http/handler.ts';
import { canonicalText } from '#shared/calc/hashes.ts';
import type { members as contracts } from '#shared/contracts/members.ts';
import { keepFormulaUses } from './keep-formula-uses.ts';
import { lockMember } from './lock-member.ts';
import { loadMember } from './queries.ts';
import { draftOf, memberOf, runDraft } from './stored-member.ts';

/**
 * Saves a member's draft, valid or not. Saving what is stored already changes nothing, so that a
 * save whose answer was lost can be sent again.
 */
export const updateMember: Handler<typeof contracts.updateMember> = async (context) => {
  const { deps, viewer, scope, params, body } = context;
  return transaction(deps.pool, async (tx) => {
    const { stored, basis } = await lockMember(tx, scope.calculationId, params.memberId, 'present');
    if (stored.draft === canonicalText(body.draft)) {
      return loadMember(tx.db, scope.calculationId, stored.id);
    }
    if (stored.version !== body.version) {
      const theirs = await loadMember(tx.db, scope.calculationId, stored.id);
      const { changedBy, changedAt } = theirs;
      throw new AppError('conflict', { conflict: { theirs, changedBy, changedAt } });
    }
    const { columns, uses } = await runDraft(deps.runs, basis, stored.id, body.draft);
    const set = {
      ...columns,
      ...{ version: stored.version + 1, changedBy: viewer.userId, changedAt: deps.now() },
    };
    await tx.db.update(members).set(set).where(eq(members.id, stored.id));
    await keepFormulaUses(tx, stored.id, uses);
    const event = {
      action: 'member.updated',
      before: draftOf(stored),
      after: body.draft,
    } as const;
    await writeAudit(tx, auditScope(context, stored.id), event);
    return memberOf({ ...stored, ...set }, viewer.name);
  });
};
