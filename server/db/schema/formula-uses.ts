import { index, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { members } from './calculations.ts';

/** Which formulas of the books a member's run used, written with its summary. */
export const memberFormulaUses = pgTable(
  'member_formula_uses',
  {
    memberId: uuid('member_id')
      .notNull()
      .references(() => members.id),
    /** Id of the formula in its book: `aisc360-22/E3-2`. */
    formula: text('formula').notNull(),
    /** Address of the first line that uses it, within the member. */
    address: text('address').notNull(),
    lines: integer('lines').notNull(),
    combinations: integer('combinations').notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.memberId, table.formula] }),
    index('member_formula_uses_formula').on(table.formula),
  ],
);
