import { and, count, eq, isNull } from 'drizzle-orm';
import { members } from '#server/db/schema/calculations.ts';
import type { Transaction } from '#server/db/transaction.ts';
import { AppError } from '#server/http/app-error.ts';

/** As many as an input holds (`shared/members`). */
const mostMembers = 500;

/** Throws where a locked calculation cannot take one more member. */
export async function refuseOneTooMany(tx: Transaction, calculationId: string): Promise<void> {
  const [present] = await tx.db
    .select({ members: count() })
    .from(members)
    .where(and(eq(members.calculationId, calculationId), isNull(members.deletedAt)));
  if ((present?.members ?? 0) < mostMembers) return;
  const detail = `A calculation holds at most ${mostMembers} members.`;
  throw new AppError('invalid-request', { detail });
}
