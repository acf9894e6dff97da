import { randomUUID } from 'node:crypto';
import { writeAudit } from '#server/audit/write-audit.ts';
import { firms } from '#server/db/schema/people.ts';
import type { Transaction } from '#server/db/transaction.ts';

/** Adds a firm; gives its id. */
export async function createFirm(tx: Transaction, name: string, now: Date): Promise<string> {
  const firmId = randomUUID();
  await tx.db.insert(firms).values({ id: firmId, name, createdAt: now });
  await writeAudit(
    tx,
    { at: now, actorId: null, firmId, subjectId: firmId },
    { action: 'firm.created', after: { name } },
  );
  return firmId;
}
