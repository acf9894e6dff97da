import { sql } from 'drizzle-orm';
import { check, index, pgTable, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import type { FirmRole } from '#shared/policy/permissions.ts';
import { moment } from './moment.ts';

export const firms = pgTable('firms', {
  id: uuid('id').primaryKey(),
  name: text('name').notNull(),
  createdAt: moment('created_at').notNull(),
});

/** A person. Without a password hash nobody can sign in as them yet. */
export const users = pgTable(
  'users',
  {
    id: uuid('id').primaryKey(),
    /** Lower case. */
    email: text('email').notNull(),
    name: text('name').notNull(),
    passwordHash: text('password_hash'),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [uniqueIndex('users_email').on(table.email)],
);

/** A person belongs to one firm or to none. */
export const memberships = pgTable(
  'memberships',
  {
    userId: uuid('user_id')
      .primaryKey()
      .references(() => users.id),
    firmId: uuid('firm_id')
      .notNull()
      .references(() => firms.id),
    role: text('role').$type<FirmRole>().notNull(),
  },
  (table) => [
    index('memberships_firm').on(table.firmId),
    check('memberships_role', sql`${table.role} in ('administrator', 'originator', 'member')`),
  ],
);

/** One-time links: only the SHA-256 of the token is kept. */
export const welcomes = pgTable('welcomes', {
  tokenHash: text('token_hash').primaryKey(),
  userId: uuid('user_id')
    .notNull()
    .references(() => users.id),
  expiresAt: moment('expires_at').notNull(),
  usedAt: moment('used_at'),
});
