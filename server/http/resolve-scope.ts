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

type Params = Readonly<Record<string, string>>;

/**
 * Finds what a request acts on and checks the person's right to it. What does not exist and what
 * may not be seen are the same: not found. What is seen but not allowed is not permitted. The
 * scope's ids are the stored ones: the database takes an id in capitals too, grants do not.
 */
export async function resolveScope(
  db: Db,
  viewer: Viewer,
  permission: Permission,
  params: Params,
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
  params: Params,
): Promise<Scope> {
  if (permission in firmPermissions) {
    if (!viewer.firm) throw new AppError('not-permitted');
    return { firmId: viewer.firm.firmId, projectId: null, calculationId: null };
  }
  const found =
    permission in calculationPermissions
      ? await ofCalculation(db, params)
      : await ofProject(db, params);
  if (!found[0]) throw notFound();
  return { calculationId: null, ...found[0] };
}

const ofCalculation = (db: Db, { calculationId = '' }: Params) =>
  db
    .select({ firmId: projects.firmId, projectId: projects.id, calculationId: calculations.id })
    .from(calculations)
    .innerJoin(projects, eq(projects.id, calculations.projectId))
    .where(eq(calculations.id, calculationId));

const ofProject = (db: Db, { projectId = '' }: Params) =>
  db
    .select({ firmId: projects.firmId, projectId: projects.id })
    .from(projects)
    .where(eq(projects.id, projectId));

function resourceOf({ firmId, projectId, calculationId }: Scope): Resource {
  if (projectId === null) return { kind: 'firm', firmId };
  if (calculationId === null) return { kind: 'project', projectId };
  return { kind: 'calculation', projectId, calculationId };
}
