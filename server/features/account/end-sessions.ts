import { sql } from 'drizzle-orm';
import type { Transaction } from '#server/db/transaction.ts';

/** Ends every session of a person. */
export async function endSessionsOf(tx: Transaction, userId: string): Promise<void> {
  await tx.db.execute(sql`delete from sessions where sess -> 'passport' ->> 'user' = ${userId}`);
}
