import { sql } from 'drizzle-orm';
import { check, foreignKey, index, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import type { Role } from '#shared/policy/permissions.ts';
import { calculations } from './calculations.ts';
import { users } from './people.ts';
import { projects } from './projects.ts';

/**
 * What a person may do in a project, or in one calculation of it. One grant never makes anyone
 * engineer and reviewer at once.
 */
export const grants = pgTable(
  'grants',
  {
    id: uuid('id').primaryKey(),
    userId: uuid('user_id')
      .notNull()
      .references(() => users.id),
    projectId: uuid('project_id')
      .notNull()
      .references(() => projects.id),
    calculationId: uuid('calculation_id'),
    roles: text('roles').array().$type<Role[]>().notNull(),
  },
  (table) => [
    unique('grants_once').on(table.userId, table.projectId, table.calculationId).nullsNotDistinct(),
    foreignKey({
      columns: [table.calculationId, table.projectId],
      foreignColumns: [calculations.id, calculations.projectId],
    }),
    index('grants_project').on(table.projectId),
    check(
      'grants_roles',
      sql`cardinality(${table.roles}) > 0 and ${table.roles} <@ array['engineer', 'reviewer', 'issuer', 'reader']`,
    ),
    check('grants_independent', sql`not ${table.roles} @> array['engineer', 'reviewer']`),
  ],
);
