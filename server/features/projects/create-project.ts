import { randomUUID } from 'node:crypto';
import { auditScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { loadViewer } from '#server/auth/viewer.ts';
import { grants } from '#server/db/schema/grants.ts';
import { projects } from '#server/db/schema/projects.ts';
import { transaction } from '#server/db/transaction.ts';
import { notFound } from '#server/http/app-error.ts';
import type { Handler } from '#server/http/handler.ts';
import { refuseTakenNumber } from '#server/http/number-taken.ts';
import type { projects as contracts } from '#shared/contracts/projects.ts';
import { loadProject } from './queries.ts';

/** Opens a project in the person's firm and makes them its engineer. */
export const createProject: Handler<typeof contracts.createProject> = async (context) => {
  const { deps, viewer, scope, body } = context;
  const projectId = randomUUID();
  const { userId } = viewer;
  const change = transaction(deps.pool, async (tx) => {
    await tx.db.insert(projects).values({
      ...body,
      ...{ id: projectId, firmId: scope.firmId, version: 1 },
      ...{ changedBy: userId, changedAt: deps.now() },
    });
    const grantId = randomUUID();
    await tx.db.insert(grants).values({ id: grantId, userId, projectId, roles: ['engineer'] });
    const audited = auditScope({ ...context, scope: { ...scope, projectId } }, projectId);
    await writeAudit(tx, audited, { action: 'project.created', after: body });
    await writeAudit(
      tx,
      { ...audited, subjectId: grantId },
      { action: 'grant.given', after: { userId, roles: ['engineer'] } },
    );
  });
  await refuseTakenNumber('projects_number', 'is the number of another project', change);
  const now = await loadViewer(deps.db, userId);
  if (!now) throw notFound();
  return loadProject(deps.db, now, projectId);
};
