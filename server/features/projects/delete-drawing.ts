import { eq } from 'drizzle-orm';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { drawings } from '#server/db/schema/projects.ts';
import { transaction } from '#server/db/transaction.ts';
import type { Handler } from '#server/http/handler.ts';
import type { projects as contracts } from '#shared/contracts/projects.ts';
import { deletedDrawingOf, drawingSnapshot } from './drawing-queries.ts';
import { lockDrawing } from './lock-drawing.ts';

export const deleteDrawing: Handler<typeof contracts.deleteDrawing> = async (context) => {
  const { deps, viewer, scope, params } = context;
  const now = deps.now();
  return transaction(deps.pool, async (tx) => {
    const stored = await lockDrawing(tx, scope.projectId, params.drawingId, 'present');
    await tx.db
      .update(drawings)
      .set({
        ...{ deletedAt: now, version: stored.version + 1 },
        ...{ changedBy: viewer.userId, changedAt: now },
      })
      .where(eq(drawings.id, stored.id));
    const before = drawingSnapshot(stored);
    await writeAudit(tx, auditScope(context, stored.id), { action: 'drawing.deleted', before });
    return deletedDrawingOf(stored, viewer.name, now);
  });
};
