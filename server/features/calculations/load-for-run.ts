import { eq } from 'drizzle-orm';
import type { Viewer } from '#server/auth/viewer.ts';
import { firms, users } from '#server/db/schema/people.ts';
import type { Db } from '#server/db/transaction.ts';
import { draftOf } from '#server/features/members/stored-member.ts';
import { notFound } from '#server/http/app-error.ts';
import { visibleCalculations } from './visible-calculations.ts';

/** A calculation that the person may see, with its present members, for a run of all of it. */
export async function loadForRun(db: Db, viewer: Viewer, calculationId: string) {
  const [found] = await visibleCalculations(db, viewer, { calculationId });
  if (!found) throw notFound();
  const { number, title, revision, originatorId } = found.stored;
  const [originator] = await db.select().from(users).where(eq(users.id, originatorId));
  const [firm] = await db.select().from(firms).where(eq(firms.id, found.project.firmId));
  return {
    ...{ number, title, revision, basis: found.basis, project: found.project },
    originator: originator?.name ?? '',
    firm: firm?.name ?? '',
    members: found.members
      .filter(({ member }) => member.deletedAt === null)
      .map(({ member }) => ({ id: member.id, draft: draftOf(member) })),
  };
}

export type LoadedCalculation = Awaited<ReturnType<typeof loadForRun>>;
