import type { Viewer } from '#server/auth/viewer.ts';
import type { Db } from '#server/db/transaction.ts';
import { draftOf } from '#server/features/members/stored-member.ts';
import { notFound } from '#server/http/app-error.ts';
import { visibleCalculations } from './queries.ts';

/** Basis and present members of a calculation that the person may see, for a run of all of it. */
export async function loadForRun(db: Db, viewer: Viewer, calculationId: string) {
  const [found] = await visibleCalculations(db, viewer, { calculationId });
  if (!found) throw notFound();
  return {
    basis: found.basis,
    number: found.stored.number,
    title: found.stored.title,
    revision: found.stored.revision,
    changedBy: found.by,
    project: found.project,
    members: found.members
      .filter(({ member }) => member.deletedAt === null)
      .map(({ member }) => ({ id: member.id, draft: draftOf(member) })),
  };
}
