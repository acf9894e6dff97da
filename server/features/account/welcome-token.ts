import { createHash, randomBytes } from 'node:crypto';
import { and, eq, gt, isNull } from 'drizzle-orm';
import { firms, memberships, users, welcomes } from '#server/db/schema/people.ts';
import type { Db, Transaction } from '#server/db/transaction.ts';

const validFor = 72 * 3_600_000;

const hashOf = (token: string) => createHash('sha256').update(token).digest('hex');

/** Makes a one-time token for a person, valid for 72 hours; only its hash is stored. */
export async function makeWelcomeToken(tx: Transaction, userId: string, now: Date) {
  const token = randomBytes(32).toString('base64url');
  const expiresAt = new Date(now.getTime() + validFor);
  await tx.db.insert(welcomes).values({ tokenHash: hashOf(token), userId, expiresAt });
  return token;
}

const usable = (token: string, now: Date) =>
  and(eq(welcomes.tokenHash, hashOf(token)), isNull(welcomes.usedAt), gt(welcomes.expiresAt, now));

/** Whom a token that can still be used is for, or null. */
export async function findWelcome(db: Db, token: string, now: Date) {
  const [found] = await db
    .select({ name: users.name, email: users.email, firm: firms.name })
    .from(welcomes)
    .innerJoin(users, eq(users.id, welcomes.userId))
    .leftJoin(memberships, eq(memberships.userId, users.id))
    .leftJoin(firms, eq(firms.id, memberships.firmId))
    .where(usable(token, now));
  return found ?? null;
}

/** Uses a token up, and every other of the person; gives the person's id, or null where it cannot be used (any more). */
export async function useWelcomeToken(tx: Transaction, token: string, now: Date) {
  const [used] = await tx.db
    .update(welcomes)
    .set({ usedAt: now })
    .where(usable(token, now))
    .returning({ userId: welcomes.userId });
  if (!used) return null;
  await tx.db
    .update(welcomes)
    .set({ usedAt: now })
    .where(and(eq(welcomes.userId, used.userId), isNull(welcomes.usedAt)));
  return used.userId;
}
