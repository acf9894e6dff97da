import { randomUUID } from 'node:crypto';
import { writeAudit } from '#server/audit/write-audit.ts';
import { memberships, users } from '#server/db/schema/people.ts';
import type { Transaction } from '#server/db/transaction.ts';
import type { FirmRole } from '#shared/policy/permissions.ts';

interface NewAccount {
  readonly name: string;
  /** Lower case. */
  readonly email: string;
  readonly firm: { readonly firmId: string; readonly role: FirmRole } | null;
  /** Null where the person sets their password by a one-time link. */
  readonly passwordHash: string | null;
}

/** Adds a person, of a firm or of none; gives their id. */
export async function createAccount(tx: Transaction, account: NewAccount, now: Date) {
  const { name, email, passwordHash, firm } = account;
  const userId = randomUUID();
  await tx.db.insert(users).values({ id: userId, name, email, passwordHash, createdAt: now });
  if (firm) await tx.db.insert(memberships).values({ userId, ...firm });
  await writeAudit(
    tx,
    { at: now, actorId: null, firmId: firm?.firmId ?? null, subjectId: userId },
    { action: 'account.created', after: { role: firm?.role ?? 'guest' } },
  );
  return userId;
}
