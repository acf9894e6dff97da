import { eq } from 'drizzle-orm';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { members } from '#server/db/schema/calculations.ts';
import { transaction } from '#server/db/transaction.ts';
import { lockCalculation } from '#server/features/calculations/lock-calculation.ts';
import { AppError } from '#server/http/app-error.ts';
import type { Handler } from '#server/http/handler.ts';
import type { members as contracts } from '#shared/contracts/members.ts';
import { storedMembers } from './queries.ts';

/** Puts all present members into a new order; refused where a member came or went meanwhile. */
export const reorderMembers: Handler<typeof contracts.reorderMembers> = async (context) => {
  const { deps, scope, body } = context;
  const { memberIds } = body;
  await transaction(deps.pool, async (tx) => {
    await lockCalculation(tx, scope.calculationId);
    const all = await storedMembers(tx.db, scope.calculationId);
    const present = all.filter(({ member }) => member.deletedAt === null);
    const before = present.map(({ member }) => member.id);
    if ([...before].sort().join() !== [...memberIds].sort().join()) throw movedOn(all, before);
    if (before.join() === memberIds.join()) return;
    for (const [index, id] of memberIds.entries()) {
      await tx.db
        .update(members)
        .set({ position: index + 1 })
        .where(eq(members.id, id));
    }
    const event = { action: 'members.reordered', before, after: memberIds } as const;
    await writeAudit(tx, auditScope(context, scope.calculationId), event);
  });
  return { memberIds };
};

/** The conflict of an order that is not of the present members. */
function movedOn(all: Awaited<ReturnType<typeof storedMembers>>, present: string[]): AppError {
  const [first, ...rest] = all;
  if (!first) return new AppError('invalid-request', { detail: 'There are no members to order.' });
  const last = rest.reduce((a, b) => (b.member.changedAt > a.member.changedAt ? b : a), first);
  return new AppError('conflict', {
    conflict: {
      theirs: { memberIds: present },
      changedBy: last.by,
      changedAt: last.member.changedAt.toISOString(),
    },
  });
}
