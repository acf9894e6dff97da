import { eq } from 'drizzle-orm';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { drawings } from '#server/db/schema/projects.ts';
import { transaction } from '#server/db/transaction.ts';
import type { Handler } from '#server/http/handler.ts';
import { refuseTakenNumber } from '#server/http/number-taken.ts';
import type { projects as contracts } from '#shared/contracts/projects.ts';
import { drawingOf, drawingSnapshot } from './drawing-queries.ts';
import { lockDrawing } from './lock-drawing.ts';

export const restoreDrawing: Handler<typeof contracts.restoreDrawing> = async (context) => {
  const { deps, viewer, scope, params } = context;
  const change = transaction(deps.pool, async (tx) => {
    const stored = await lockDrawing(tx, scope.projectId, params.drawingId, 'deleted');
    const set = {
      ...{ deletedAt: null, version: stored.version + 1 },
      ...{ changedBy: viewer.userId, changedAt: deps.now() },
    };
    await tx.db.update(drawings).set(set).where(eq(drawings.id, stored.id));
    const after = drawingSnapshot(stored);
    await writeAudit(tx, auditScope(context, stored.id), { action: 'drawing.restored', after });
    return drawingOf({ ...stored, ...set }, viewer.name);
  });
  return refuseTakenNumber('drawings_number', 'is in the register already', change);
};
