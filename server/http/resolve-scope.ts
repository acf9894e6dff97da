import { eq } from 'drizzle-orm';
import type { Viewer } from '#server/auth/viewer.ts';
import { calculations } from '#server/db/schema/calculations.ts';
import { projects } from '#server/db/schema/projects.ts';
import type { Db } from '#server/db/transaction.ts';
import { can, canSee, type Resource } from '#shared/policy/can.ts';
import {
  calculationPermissions,
  firmPermissions,
  type Permission,
} from '#shared/policy/permissions.ts';
import { AppError, notFound } from './app-error.ts';

interface Scope {
  readonly firmId: string;
  readonly projectId: string | null;
  readonly calculationId: string | null;
}

/**
 * Finds what a request acts on and checks the person's right to it. What does not exist and what
 * may not be seen are the same: not found. What is seen but not allowed is not permitted.
 */
export async function resolveScope(
  db: Db,
  viewer: Viewer,
  permission: Permission,
  params: Readonly<Record<string, string>>,
): Promise<Scope> {
  const scope = await findScope(db, viewer, permission, params);
  const resource = resourceOf(scope);
  if (!canSee(viewer, resource)) throw notFound();
  if (!can(viewer, permission, resource)) throw new AppError('not-permitted');
  return scope;
}

async function findScope(
  db: Db,
  viewer: Viewer,
  permission: Permission,
  params: Readonly<Record<string, string>>,
): Promise<Scope> {
  if (permission in firmPermissions) {
    if (!viewer.firm) throw new AppError('not-permitted');
    return { firmId: viewer.firm.firmId, projectId: null, calculationId: null };
  }
  const { projectId = '', calculationId = '' } = params;
  const found =
    permission in calculationPermissions
      ? await db
          .select({ firmId: projects.firmId, projectId: projects.id })
          .from(calculations)
          .innerJoin(projects, eq(projects.id, calculations.projectId))
          .where(eq(calculations.id, calculationId))
      : await db
          .select({ firmId: projects.firmId, projectId: projects.id })
          .from(projects)
          .where(eq(projects.id, projectId));
  if (!found[0]) throw notFound();
  return { ...found[0], calculationId: calculationId || null };
}

function resourceOf({ firmId, projectId, calculationId }: Scope): Resource {
  if (projectId === null) return { kind: 'firm', firmId };
  if (calculationId === null) return { kind: 'project', projectId };
  return { kind: 'calculation', projectId, calculationId };
}
