import { eq } from 'drizzle-orm';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { users } from '#server/db/schema/people.ts';
import { drawings } from '#server/db/schema/projects.ts';
import { transaction } from '#server/db/transaction.ts';
import { AppError } from '#server/http/app-error.ts';
import type { Handler } from '#server/http/handler.ts';
import { refuseTakenNumber } from '#server/http/number-taken.ts';
import { canonicalText } from '#shared/calc/hashes.ts';
import type { projects as contracts } from '#shared/contracts/projects.ts';
import { drawingOf, drawingSnapshot } from './drawing-queries.ts';
import { lockDrawing } from './lock-drawing.ts';

/** Saves a row of the drawing register. Saving what is stored already changes nothing. */
export const updateDrawing: Handler<typeof contracts.updateDrawing> = async (context) => {
  const { deps, viewer, scope, params, body } = context;
  const { version, ...after } = body;
  const change = transaction(deps.pool, async (tx) => {
    const stored = await lockDrawing(tx, scope.projectId, params.drawingId, 'present');
    const [by] = await tx.db.select().from(users).where(eq(users.id, stored.changedBy));
    const changedBy = by?.name ?? '';
    const before = drawingSnapshot(stored);
    const theirs = drawingOf(stored, changedBy);
    if (canonicalText(before) === canonicalText(after)) return theirs;
    if (stored.version !== version) {
      const { changedAt } = theirs;
      throw new AppError('conflict', { conflict: { theirs, changedBy, changedAt } });
    }
    const set = {
      ...after,
      ...{ version: version + 1, changedBy: viewer.userId, changedAt: deps.now() },
    };
    await tx.db.update(drawings).set(set).where(eq(drawings.id, stored.id));
    const event = { action: 'drawing.updated', before, after } as const;
    await writeAudit(tx, auditScope(context, stored.id), event);
    return drawingOf({ ...stored, ...set }, viewer.name);
  });
  return refuseTakenNumber('drawings_number', 'is in the register already', change);
};
