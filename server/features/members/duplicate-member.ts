import { randomUUID } from 'node:crypto';
import { and, eq, gt, sql } from 'drizzle-orm';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { members } from '#server/db/schema/calculations.ts';
import { transaction } from '#server/db/transaction.ts';
import type { Handler } from '#server/http/handler.ts';
import type { members as contracts } from '#shared/contracts/members.ts';
import { copyOfMark } from './copy-of-mark.ts';
import { keepFormulaUses } from './keep-formula-uses.ts';
import { lockMember } from './lock-member.ts';
import { storedMembers } from './queries.ts';
import { refuseOneTooMany } from './refuse-one-too-many.ts';
import { draftOf, memberOf, runDraft } from './stored-member.ts';

/** Adds a copy of a member right after it, under a mark that is free. */
export const duplicateMember: Handler<typeof contracts.duplicateMember> = async (context) => {
  const { deps, viewer, scope, params } = context;
  const { calculationId } = scope;
  const id = randomUUID();
  return transaction(deps.pool, async (tx) => {
    const { stored, basis } = await lockMember(tx, calculationId, params.memberId, 'present');
    await refuseOneTooMany(tx, calculationId);
    const all = await storedMembers(tx.db, calculationId);
    const marks = all.map(({ member }) => draftOf(member).mark);
    const original = draftOf(stored);
    const draft = { ...original, mark: copyOfMark(original.mark, marks) };
    await tx.db
      .update(members)
      .set({ position: sql`${members.position} + 1` })
      .where(and(eq(members.calculationId, calculationId), gt(members.position, stored.position)));
    const { columns, uses } = await runDraft(deps.runs, basis, id, draft);
    const row = {
      ...{ id, calculationId, position: stored.position + 1 },
      ...columns,
      ...{ version: 1, changedBy: viewer.userId, changedAt: deps.now(), deletedAt: null },
    };
    await tx.db.insert(members).values(row);
    await keepFormulaUses(tx, id, uses);
    await writeAudit(tx, auditScope(context, id), { action: 'member.duplicated', after: draft });
    return memberOf(row, viewer.name);
  });
};
