import { asc, eq } from 'drizzle-orm';
import { users } from '#server/db/schema/people.ts';
import { drawings } from '#server/db/schema/projects.ts';
import type { Db } from '#server/db/transaction.ts';
import type { Drawing, Project } from '#shared/contracts/projects.ts';

export type StoredDrawing = typeof drawings.$inferSelect;

/** What the audit log keeps of a drawing. */
export const drawingSnapshot = ({ number, title, revision, status }: StoredDrawing) => ({
  number,
  title,
  revision,
  status,
});

export const drawingOf = (stored: StoredDrawing, changedBy: string): Drawing => ({
  id: stored.id,
  version: stored.version,
  ...drawingSnapshot(stored),
  status: stored.status,
  changedBy,
  changedAt: stored.changedAt.toISOString(),
});

export const deletedDrawingOf = (stored: StoredDrawing, deletedBy: string, deletedAt: Date) => ({
  id: stored.id,
  number: stored.number,
  title: stored.title,
  deletedBy,
  deletedAt: deletedAt.toISOString(),
});

/** The drawing register of a project by number, and what was deleted from it. */
export async function drawingsOf(
  db: Db,
  projectId: string,
): Promise<Pick<Project, 'drawings' | 'deletedDrawings'>> {
  const rows = await db
    .select({ drawing: drawings, by: users.name })
    .from(drawings)
    .innerJoin(users, eq(users.id, drawings.changedBy))
    .where(eq(drawings.projectId, projectId))
    .orderBy(asc(drawings.number));
  return {
    drawings: rows
      .filter(({ drawing }) => drawing.deletedAt === null)
      .map(({ drawing, by }) => drawingOf(drawing, by)),
    deletedDrawings: rows.flatMap(({ drawing, by }) =>
      drawing.deletedAt ? [deletedDrawingOf(drawing, by, drawing.deletedAt)] : [],
    ),
  };
}
