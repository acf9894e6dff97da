import { eq } from 'drizzle-orm';
import { members } from '#server/db/schema/calculations.ts';
import type { Transaction } from '#server/db/transaction.ts';
import type { Runs } from '#server/runs/runs.ts';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import { keepFormulaUses } from './keep-formula-uses.ts';
import { draftOf, summaryColumns } from './stored-member.ts';

/** Runs every member of a locked calculation on a basis and keeps what the runs say. */
export async function summariseAgain(
  tx: Transaction,
  runs: Runs,
  calculationId: string,
  basis: BasisDraft,
): Promise<void> {
  const stored = await tx.db.select().from(members).where(eq(members.calculationId, calculationId));
  for (const member of stored) {
    const { summary, uses } = await runs.summarise(basis, member.id, draftOf(member));
    await tx.db.update(members).set(summaryColumns(summary)).where(eq(members.id, member.id));
    await keepFormulaUses(tx, member.id, uses);
  }
}
