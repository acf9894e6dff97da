import { timestamp } from 'drizzle-orm/pg-core';

/** A point in time, with its zone. */
export const moment = (name: string) => timestamp(name, { withTimezone: true, mode: 'date' });
