import { and, asc, count, eq, inArray } from 'drizzle-orm';
import type { Viewer } from '#server/auth/viewer.ts';
import { calculations } from '#server/db/schema/calculations.ts';
import { grants } from '#server/db/schema/grants.ts';
import { firms, users } from '#server/db/schema/people.ts';
import { projects } from '#server/db/schema/projects.ts';
import type { Db } from '#server/db/transaction.ts';
import { calculationRows } from '#server/features/calculations/queries.ts';
import { notFound } from '#server/http/app-error.ts';
import type { Project, ProjectRow } from '#shared/contracts/projects.ts';
import { can, rolesOn } from '#shared/policy/can.ts';
import { drawingsOf } from './drawing-queries.ts';

/** Whether a person may open a project in their own firm. */
export const mayCreateProject = (viewer: Viewer) =>
  viewer.firm !== null &&
  can(viewer, 'project.create', { kind: 'firm', firmId: viewer.firm.firmId });

const seen = (viewer: Viewer) =>
  viewer.grants
    .filter(({ calculationId }) => calculationId === null)
    .map(({ projectId }) => projectId)
    .filter((projectId) => can(viewer, 'project.view', { kind: 'project', projectId }));

/** The projects that a person may see, by number. */
export async function projectRows(db: Db, viewer: Viewer): Promise<ProjectRow[]> {
  const rows = await db
    .select({ project: projects, firm: firms.name, calculations: count(calculations.id) })
    .from(projects)
    .innerJoin(firms, eq(firms.id, projects.firmId))
    .leftJoin(calculations, eq(calculations.projectId, projects.id))
    .where(inArray(projects.id, seen(viewer)))
    .groupBy(projects.id, firms.id)
    .orderBy(asc(projects.number));
  return rows.map(({ project, ...counted }) => ({
    id: project.id,
    number: project.number,
    title: project.title,
    client: project.client,
    place: project.place,
    roles: [...rolesOn(viewer, { kind: 'project', projectId: project.id })],
    ...counted,
  }));
}

/** One project with its team, calculations and drawings; not found where it may not be seen. */
export async function loadProject(db: Db, viewer: Viewer, projectId: string): Promise<Project> {
  const resource = { kind: 'project', projectId } as const;
  const row = (await projectRows(db, viewer)).find(({ id }) => id === projectId);
  const [stored] = await db
    .select({ version: projects.version })
    .from(projects)
    .where(and(eq(projects.id, projectId), inArray(projects.id, seen(viewer))));
  if (!row || !stored) throw notFound();
  return {
    ...row,
    version: stored.version,
    can: {
      edit: can(viewer, 'project.edit', resource),
      editDrawings: can(viewer, 'drawing.edit', resource),
      createCalculation: can(viewer, 'calculation.create', resource),
    },
    team: await teamOf(db, projectId),
    calculationRows: await calculationRows(db, viewer, { projectId }),
    ...(await drawingsOf(db, projectId)),
  };
}

const teamOf = async (db: Db, projectId: string) => {
  const team = await db
    .select({ name: users.name, roles: grants.roles, calculationId: grants.calculationId })
    .from(grants)
    .innerJoin(users, eq(users.id, grants.userId))
    .where(eq(grants.projectId, projectId))
    .orderBy(asc(users.name));
  return team
    .filter(({ calculationId }) => calculationId === null)
    .map(({ name, roles }) => ({ name, roles }));
};
