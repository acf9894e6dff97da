import { randomUUID } from 'node:crypto';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { drawings } from '#server/db/schema/projects.ts';
import { transaction } from '#server/db/transaction.ts';
import type { Handler } from '#server/http/handler.ts';
import { refuseTakenNumber } from '#server/http/number-taken.ts';
import type { projects as contracts } from '#shared/contracts/projects.ts';
import { drawingOf } from './drawing-queries.ts';

export const createDrawing: Handler<typeof contracts.createDrawing> = async (context) => {
  const { deps, viewer, scope, body } = context;
  const row = {
    ...body,
    ...{ id: randomUUID(), projectId: scope.projectId, version: 1, deletedAt: null },
    ...{ changedBy: viewer.userId, changedAt: deps.now() },
  };
  const change = transaction(deps.pool, async (tx) => {
    await tx.db.insert(drawings).values(row);
    await writeAudit(tx, auditScope(context, row.id), { action: 'drawing.created', after: body });
  });
  await refuseTakenNumber('drawings_number', 'is in the register already', change);
  return drawingOf(row, viewer.name);
};
