import { bigint, index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import type { AuditAction } from '#shared/contracts/audit-events.ts';
import { moment } from './moment.ts';

/**
 * What happened, in order of `id`. No foreign keys: history outlives its subjects. A trigger
 * refuses every update, delete and truncate. Snapshots are canonical JSON text.
 */
export const audit = pgTable(
  'audit',
  {
    id: bigint('id', { mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
    at: moment('at').notNull(),
    /** Null where a person of no firm acts on themselves. */
    firmId: uuid('firm_id'),
    /** Null for what the machine's keeper does at the command line. */
    actorId: uuid('actor_id'),
    action: text('action').$type<AuditAction>().notNull(),
    projectId: uuid('project_id'),
    calculationId: uuid('calculation_id'),
    subjectId: uuid('subject_id').notNull(),
    before: text('before'),
    after: text('after'),
  },
  (table) => [
    index('audit_firm').on(table.firmId, table.id),
    index('audit_calculation').on(table.calculationId, table.id),
  ],
);
