import { index, integer, pgTable, text, unique, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import { moment } from './moment.ts';
import { users } from './people.ts';
import { projects } from './projects.ts';

/** `basis` is canonical JSON text, never jsonb, which rewrites numbers. */
export const calculations = pgTable(
  'calculations',
  {
    id: uuid('id').primaryKey(),
    projectId: uuid('project_id')
      .notNull()
      .references(() => projects.id),
    number: text('number').notNull(),
    title: text('title').notNull(),
    revision: text('revision').notNull(),
    basis: text('basis').notNull(),
    originatorId: uuid('originator_id')
      .notNull()
      .references(() => users.id),
    version: integer('version').notNull(),
    changedBy: uuid('changed_by')
      .notNull()
      .references(() => users.id),
    changedAt: moment('changed_at').notNull(),
  },
  (table) => [
    uniqueIndex('calculations_number').on(table.projectId, table.number),
    unique('calculations_project').on(table.id, table.projectId),
  ],
);

/**
 * `draft` is the form as typed, canonical JSON text. `summary` is the server's run of it, kept for
 * lists and made again when the engine that made it is not the present one.
 */
export const members = pgTable(
  'members',
  {
    id: uuid('id').primaryKey(),
    calculationId: uuid('calculation_id')
      .notNull()
      .references(() => calculations.id),
    position: integer('position').notNull(),
    draft: text('draft').notNull(),
    summary: text('summary').notNull(),
    summaryEngine: text('summary_engine').notNull(),
    version: integer('version').notNull(),
    changedBy: uuid('changed_by')
      .notNull()
      .references(() => users.id),
    changedAt: moment('changed_at').notNull(),
    deletedAt: moment('deleted_at'),
  },
  (table) => [index('members_calculation').on(table.calculationId, table.position)],
);
