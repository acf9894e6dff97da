import { eq } from 'drizzle-orm';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { users } from '#server/db/schema/people.ts';
import { projects } from '#server/db/schema/projects.ts';
import { transaction } from '#server/db/transaction.ts';
import { AppError, notFound } from '#server/http/app-error.ts';
import type { Handler } from '#server/http/handler.ts';
import { refuseTakenNumber } from '#server/http/number-taken.ts';
import { canonicalText } from '#shared/calc/hashes.ts';
import type { projects as contracts } from '#shared/contracts/projects.ts';
import { loadProject } from './queries.ts';

/** Saves a project's fields. Saving what is stored already changes nothing. */
export const updateProject: Handler<typeof contracts.updateProject> = async (context) => {
  const { deps, viewer, scope, body } = context;
  const { version, ...after } = body;
  const change = transaction(deps.pool, async (tx) => {
    const [found] = await tx.db
      .select({ project: projects, by: users.name })
      .from(projects)
      .innerJoin(users, eq(users.id, projects.changedBy))
      .where(eq(projects.id, scope.projectId))
      .for('update', { of: projects });
    if (!found) throw notFound();
    const { number, title, client, place } = found.project;
    const before = { number, title, client, place };
    if (canonicalText(before) === canonicalText(after)) return;
    if (found.project.version !== version) {
      throw new AppError('conflict', {
        conflict: {
          theirs: await loadProject(tx.db, viewer, scope.projectId),
          changedBy: found.by,
          changedAt: found.project.changedAt.toISOString(),
        },
      });
    }
    await tx.db
      .update(projects)
      .set({ ...after, version: version + 1, changedBy: viewer.userId, changedAt: deps.now() })
      .where(eq(projects.id, scope.projectId));
    const event = { action: 'project.updated', before, after } as const;
    await writeAudit(tx, auditScope(context, scope.projectId), event);
  });
  await refuseTakenNumber('projects_number', 'is the number of another project', change);
  return loadProject(deps.db, viewer, scope.projectId);
};
