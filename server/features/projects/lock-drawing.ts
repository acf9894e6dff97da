import { and, eq, isNotNull, isNull } from 'drizzle-orm';
import { drawings } from '#server/db/schema/projects.ts';
import type { Transaction } from '#server/db/transaction.ts';
import { notFound } from '#server/http/app-error.ts';
import type { StoredDrawing } from './drawing-queries.ts';

/** Loads a drawing of a project for a change; not found where it is not there in that state. */
export async function lockDrawing(
  tx: Transaction,
  projectId: string,
  drawingId: string,
  state: 'present' | 'deleted',
): Promise<StoredDrawing> {
  const [stored] = await tx.db
    .select()
    .from(drawings)
    .where(
      and(
        eq(drawings.id, drawingId),
        eq(drawings.projectId, projectId),
        state === 'present' ? isNull(drawings.deletedAt) : isNotNull(drawings.deletedAt),
      ),
    )
    .for('update');
  if (!stored) throw notFound();
  return stored;
}
