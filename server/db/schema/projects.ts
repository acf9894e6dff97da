import { sql } from 'drizzle-orm';
import { integer, pgTable, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import type { Drawing } from '#shared/contracts/projects.ts';
import { moment } from './moment.ts';
import { firms, users } from './people.ts';

export const projects = pgTable(
  'projects',
  {
    id: uuid('id').primaryKey(),
    firmId: uuid('firm_id')
      .notNull()
      .references(() => firms.id),
    number: text('number').notNull(),
    title: text('title').notNull(),
    client: text('client').notNull(),
    place: text('place').notNull(),
    version: integer('version').notNull(),
    changedBy: uuid('changed_by')
      .notNull()
      .references(() => users.id),
    changedAt: moment('changed_at').notNull(),
  },
  (table) => [uniqueIndex('projects_number').on(table.firmId, table.number)],
);

export const drawings = pgTable(
  'drawings',
  {
    id: uuid('id').primaryKey(),
    projectId: uuid('project_id')
      .notNull()
      .references(() => projects.id),
    number: text('number').notNull(),
    title: text('title').notNull(),
    revision: text('revision').notNull(),
    status: text('status').$type<Drawing['status']>().notNull(),
    version: integer('version').notNull(),
    changedBy: uuid('changed_by')
      .notNull()
      .references(() => users.id),
    changedAt: moment('changed_at').notNull(),
    deletedAt: moment('deleted_at'),
  },
  (table) => [
    uniqueIndex('drawings_number')
      .on(table.projectId, table.number)
      .where(sql`${table.deletedAt} is null`),
  ],
);
