import { randomUUID } from 'node:crypto';
import { eq, max } from 'drizzle-orm';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { members } from '#server/db/schema/calculations.ts';
import { transaction } from '#server/db/transaction.ts';
import { lockCalculation } from '#server/features/calculations/lock-calculation.ts';
import type { Handler } from '#server/http/handler.ts';
import type { members as contracts } from '#shared/contracts/members.ts';
import { keepFormulaUses } from './keep-formula-uses.ts';
import { refuseOneTooMany } from './refuse-one-too-many.ts';
import { memberOf, runDraft } from './stored-member.ts';

/** Adds a member at the end. */
export const createMember: Handler<typeof contracts.createMember> = async (context) => {
  const { deps, viewer, scope, body } = context;
  const id = randomUUID();
  return transaction(deps.pool, async (tx) => {
    const { basis } = await lockCalculation(tx, scope.calculationId);
    await refuseOneTooMany(tx, scope.calculationId);
    const [last] = await tx.db
      .select({ position: max(members.position) })
      .from(members)
      .where(eq(members.calculationId, scope.calculationId));
    const { columns, uses } = await runDraft(deps.runs, basis, id, body.draft);
    const row = {
      ...{ id, calculationId: scope.calculationId, position: (last?.position ?? 0) + 1 },
      ...columns,
      ...{ version: 1, changedBy: viewer.userId, changedAt: deps.now(), deletedAt: null },
    };
    await tx.db.insert(members).values(row);
    await keepFormulaUses(tx, id, uses);
    const event = { action: 'member.created', after: body.draft } as const;
    await writeAudit(tx, auditScope(context, id), event);
    return memberOf(row, viewer.name);
  });
};
