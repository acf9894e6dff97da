import type { Viewer } from '#server/auth/viewer.ts';
import type { Db } from '#server/db/transaction.ts';
import {
  deletedMemberRowOf,
  draftOf,
  memberRowOf,
} from '#server/features/members/stored-member.ts';
import { notFound } from '#server/http/app-error.ts';
import type { Calculation } from '#shared/contracts/calculations.ts';
import { problemsOf } from '#shared/contracts/draft-problems.ts';
import { can, canSee } from '#shared/policy/can.ts';
import { rowOf } from './calculation-row.ts';
import { resourceOf, visibleCalculations, type Where } from './visible-calculations.ts';

export async function calculationRows(db: Db, viewer: Viewer, where: Where) {
  return (await visibleCalculations(db, viewer, where)).map(rowOf);
}

/** One calculation with its members; not found where the person may not see it. */
export async function loadCalculation(
  db: Db,
  viewer: Viewer,
  calculationId: string,
): Promise<Calculation> {
  const [found] = await visibleCalculations(db, viewer, { calculationId });
  if (!found) throw notFound();
  const { projectId } = found.stored;
  const present = found.members
    .map(({ member }) => member)
    .filter(({ deletedAt }) => deletedAt === null);
  return {
    ...rowOf(found),
    version: found.stored.version,
    basis: found.basis,
    projectVisible: canSee(viewer, { kind: 'project', projectId }),
    can: { edit: can(viewer, 'member.edit', resourceOf(found.stored)) },
    memberRows: present.map(memberRowOf),
    problems: problemsOf(
      found.basis,
      present.map((member) => ({ id: member.id, draft: draftOf(member) })),
    ),
    deletedMembers: found.members.flatMap(({ member, by }) =>
      member.deletedAt ? [deletedMemberRowOf(member, by, member.deletedAt)] : [],
    ),
  };
}
