import { asc, eq, inArray, or } from 'drizzle-orm';
import type { Viewer } from '#server/auth/viewer.ts';
import { calculations, members } from '#server/db/schema/calculations.ts';
import { users } from '#server/db/schema/people.ts';
import { projects } from '#server/db/schema/projects.ts';
import type { Db } from '#server/db/transaction.ts';
import type { StoredMember } from '#server/features/members/stored-member.ts';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import { canSee, type Resource, rolesOn } from '#shared/policy/can.ts';

interface StoredMemberBy {
  readonly member: StoredMember;
  readonly by: string;
}

/** Where to look: everywhere that grants reach, in one project, or at one calculation. */
export type Where = { readonly projectId?: string; readonly calculationId?: string };

/** The calculation as what permissions are asked about. */
export const resourceOf = (calculation: { id: string; projectId: string }) =>
  ({
    kind: 'calculation',
    projectId: calculation.projectId,
    calculationId: calculation.id,
  }) as const satisfies Resource;

/** Stored calculations that the person may see, with their members, by project and number. */
export async function visibleCalculations(db: Db, viewer: Viewer, where: Where) {
  const wholeProjects = viewer.grants.filter(({ calculationId }) => calculationId === null);
  const single = viewer.grants.flatMap(({ calculationId }) => calculationId ?? []);
  const rows = await db
    .select({ calculation: calculations, project: projects, by: users.name })
    .from(calculations)
    .innerJoin(projects, eq(projects.id, calculations.projectId))
    .innerJoin(users, eq(users.id, calculations.changedBy))
    .where(
      or(
        inArray(
          calculations.projectId,
          wholeProjects.map(({ projectId }) => projectId),
        ),
        inArray(calculations.id, single),
      ),
    )
    .orderBy(asc(projects.number), asc(calculations.number));
  const seen = rows.filter(
    ({ calculation }) =>
      canSee(viewer, resourceOf(calculation)) &&
      (where.projectId === undefined || calculation.projectId === where.projectId) &&
      (where.calculationId === undefined || calculation.id === where.calculationId),
  );
  const theirMembers = await membersOf(
    db,
    seen.map(({ calculation }) => calculation.id),
  );
  return seen.map(({ calculation, project, by }) => ({
    ...{ stored: calculation, project, by },
    basis: JSON.parse(calculation.basis) as BasisDraft,
    roles: [...rolesOn(viewer, resourceOf(calculation))],
    members: theirMembers.filter(({ member }) => member.calculationId === calculation.id),
  }));
}

export type VisibleCalculation = Awaited<ReturnType<typeof visibleCalculations>>[number];

const membersOf = (db: Db, calculationIds: string[]): Promise<StoredMemberBy[]> =>
  db
    .select({ member: members, by: users.name })
    .from(members)
    .innerJoin(users, eq(users.id, members.changedBy))
    .where(inArray(members.calculationId, calculationIds))
    .orderBy(asc(members.position), asc(members.id));
