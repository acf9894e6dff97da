import { eq } from 'drizzle-orm';
import { memberFormulaUses } from '#server/db/schema/formula-uses.ts';
import type { Transaction } from '#server/db/transaction.ts';
import type { FormulaUse } from '#shared/library/formula-uses.ts';

/** Puts the formulas of a member's newest run in place of those of the run before. */
export async function keepFormulaUses(
  tx: Transaction,
  memberId: string,
  uses: readonly FormulaUse[],
): Promise<void> {
  await tx.db.delete(memberFormulaUses).where(eq(memberFormulaUses.memberId, memberId));
  if (uses.length === 0) return;
  await tx.db.insert(memberFormulaUses).values(uses.map((use) => ({ memberId, ...use })));
}
