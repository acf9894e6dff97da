import { eq } from 'drizzle-orm';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { calculations } from '#server/db/schema/calculations.ts';
import { users } from '#server/db/schema/people.ts';
import { transaction } from '#server/db/transaction.ts';
import { summariseAgain } from '#server/features/members/summarise-again.ts';
import { AppError } from '#server/http/app-error.ts';
import type { Handler } from '#server/http/handler.ts';
import { refuseTakenNumber } from '#server/http/number-taken.ts';
import { canonicalText } from '#shared/calc/hashes.ts';
import type { calculations as contracts } from '#shared/contracts/calculations.ts';
import { lockCalculation } from './lock-calculation.ts';
import { loadCalculation } from './queries.ts';

/** Saves number, title and basis; every member is run again on the new basis. */
export const updateCalculation: Handler<typeof contracts.updateCalculation> = async (context) => {
  const { deps, viewer, scope, body } = context;
  const { version, ...after } = body;
  const { calculationId } = scope;
  const change = transaction(deps.pool, async (tx) => {
    const { number, title, basis, ...stored } = await lockCalculation(tx, calculationId);
    const before = { number, title, basis };
    if (canonicalText(before) === canonicalText(after)) return;
    if (stored.version !== version) {
      const [by] = await tx.db.select().from(users).where(eq(users.id, stored.changedBy));
      const theirs = await loadCalculation(tx.db, viewer, calculationId);
      const changedAt = stored.changedAt.toISOString();
      const conflict = { theirs, changedBy: by?.name ?? '', changedAt };
      throw new AppError('conflict', { conflict });
    }
    await tx.db
      .update(calculations)
      .set({
        ...{ number: after.number, title: after.title, basis: canonicalText(after.basis) },
        ...{ version: version + 1, changedBy: viewer.userId, changedAt: deps.now() },
      })
      .where(eq(calculations.id, calculationId));
    await summariseAgain(tx, deps.runs, calculationId, after.basis);
    const event = { action: 'calculation.updated', before, after } as const;
    await writeAudit(tx, auditScope(context, calculationId), event);
  });
  await refuseTakenNumber(
    'calculations_number',
    'is the number of another calculation of the project',
    change,
  );
  return loadCalculation(deps.db, viewer, calculationId);
};
