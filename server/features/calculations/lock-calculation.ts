import { eq } from 'drizzle-orm';
import { calculations } from '#server/db/schema/calculations.ts';
import type { Transaction } from '#server/db/transaction.ts';
import { notFound } from '#server/http/app-error.ts';
import type { BasisDraft } from '#shared/contracts/calculations.ts';

/**
 * Loads a calculation for a change of it or of its members. Such changes wait for one another, so
 * that every member's summary belongs to the present basis.
 */
export async function lockCalculation(tx: Transaction, calculationId: string) {
  const [stored] = await tx.db
    .select()
    .from(calculations)
    .where(eq(calculations.id, calculationId))
    .for('update');
  if (!stored) throw notFound();
  return { ...stored, basis: JSON.parse(stored.basis) as BasisDraft };
}
