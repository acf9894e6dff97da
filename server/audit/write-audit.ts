import { audit } from '#server/db/schema/audit.ts';
import type { Transaction } from '#server/db/transaction.ts';
import { canonicalText } from '#shared/calc/hashes.ts';
import type { AuditEvent } from '#shared/contracts/audit-events.ts';

/** Where and by whom something happened. */
export interface AuditScope {
  readonly at: Date;
  readonly actorId: string | null;
  readonly firmId: string | null;
  readonly projectId?: string | null;
  readonly calculationId?: string | null;
  readonly subjectId: string;
}

/** Adds one row to the audit log, in the transaction of the change that it tells of. */
export async function writeAudit(
  tx: Transaction,
  scope: AuditScope,
  event: AuditEvent,
): Promise<void> {
  await tx.db.insert(audit).values({
    at: scope.at,
    firmId: scope.firmId,
    actorId: scope.actorId,
    projectId: scope.projectId ?? null,
    calculationId: scope.calculationId ?? null,
    subjectId: scope.subjectId,
    action: event.action,
    before: event.before ? canonicalText(event.before) : null,
    after: event.after ? canonicalText(event.after) : null,
  });
}
