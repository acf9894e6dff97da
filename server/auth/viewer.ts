import { eq } from 'drizzle-orm';
import { grants } from '#server/db/schema/grants.ts';
import { firms, memberships, users } from '#server/db/schema/people.ts';
import type { Db } from '#server/db/transaction.ts';
import type { Actor } from '#shared/policy/can.ts';

/** The signed-in person: who they are, and what decides their rights. */
export interface Viewer extends Actor {
  readonly name: string;
  readonly email: string;
  readonly firmName: string | null;
}

/** Loads a person with firm and grants, or null where there is no such person. */
export async function loadViewer(db: Db, userId: string): Promise<Viewer | null> {
  const [row] = await db
    .select({ user: users, membership: memberships, firmName: firms.name })
    .from(users)
    .leftJoin(memberships, eq(memberships.userId, users.id))
    .leftJoin(firms, eq(firms.id, memberships.firmId))
    .where(eq(users.id, userId));
  if (!row) return null;
  const held = await db
    .select({
      projectId: grants.projectId,
      calculationId: grants.calculationId,
      roles: grants.roles,
    })
    .from(grants)
    .where(eq(grants.userId, userId));
  return {
    userId,
    name: row.user.name,
    email: row.user.email,
    firm: row.membership && { firmId: row.membership.firmId, role: row.membership.role },
    firmName: row.firmName,
    grants: held,
  };
}
