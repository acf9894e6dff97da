import { and, asc, eq, isNull } from 'drizzle-orm';
import { members } from '#server/db/schema/calculations.ts';
import { users } from '#server/db/schema/people.ts';
import type { Db } from '#server/db/transaction.ts';
import { notFound } from '#server/http/app-error.ts';
import type { Member } from '#shared/contracts/members.ts';
import { memberOf } from './stored-member.ts';

/** Every member of a calculation in its order, deleted ones too, with who changed it last. */
export const storedMembers = (db: Db, calculationId: string) =>
  db
    .select({ member: members, by: users.name })
    .from(members)
    .innerJoin(users, eq(users.id, members.changedBy))
    .where(eq(members.calculationId, calculationId))
    .orderBy(asc(members.position), asc(members.id));

/** A present member of a calculation that the person may see. */
export async function loadMember(db: Db, calculationId: string, memberId: string): Promise<Member> {
  const [found] = await db
    .select({ member: members, by: users.name })
    .from(members)
    .innerJoin(users, eq(users.id, members.changedBy))
    .where(
      and(
        eq(members.id, memberId),
        eq(members.calculationId, calculationId),
        isNull(members.deletedAt),
      ),
    );
  if (!found) throw notFound();
  return memberOf(found.member, found.by);
}
