import { bigint, index, integer, json, pgTable, text, timestamp } from 'drizzle-orm/pg-core';

/** Columns as connect-pg-simple writes them. */
export const sessions = pgTable(
  'sessions',
  {
    sid: text('sid').primaryKey(),
    sess: json('sess').notNull(),
    expire: timestamp('expire', { precision: 6, withTimezone: true }).notNull(),
  },
  (table) => [index('sessions_expire').on(table.expire)],
);

/** Columns as rate-limiter-flexible writes them. */
export const rateLimits = pgTable('rate_limits', {
  key: text('key').primaryKey(),
  points: integer('points').notNull(),
  expire: bigint('expire', { mode: 'number' }),
});
