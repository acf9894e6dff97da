import { randomUUID } from 'node:crypto';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { calculations } from '#server/db/schema/calculations.ts';
import { transaction } from '#server/db/transaction.ts';
import type { Handler } from '#server/http/handler.ts';
import { refuseTakenNumber } from '#server/http/number-taken.ts';
import { canonicalText } from '#shared/calc/hashes.ts';
import type { calculations as contracts } from '#shared/contracts/calculations.ts';
import { loadCalculation } from './queries.ts';

/** Opens a calculation in a project, at its first revision. */
export const createCalculation: Handler<typeof contracts.createCalculation> = async (context) => {
  const { deps, viewer, scope, body } = context;
  const calculationId = randomUUID();
  const change = transaction(deps.pool, async (tx) => {
    await tx.db.insert(calculations).values({
      ...{ id: calculationId, projectId: scope.projectId, revision: 'A', version: 1 },
      ...{ number: body.number, title: body.title, basis: canonicalText(body.basis) },
      ...{ originatorId: viewer.userId, changedBy: viewer.userId, changedAt: deps.now() },
    });
    const audited = { ...context, scope: { ...scope, calculationId } };
    const event = { action: 'calculation.created', after: body } as const;
    await writeAudit(tx, auditScope(audited, calculationId), event);
  });
  await refuseTakenNumber(
    'calculations_number',
    'is the number of another calculation of the project',
    change,
  );
  return loadCalculation(deps.db, viewer, calculationId);
};
