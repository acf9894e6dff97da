import { ne } from 'drizzle-orm';
import { members } from '#server/db/schema/calculations.ts';
import { transaction } from '#server/db/transaction.ts';
import type { Deps } from '#server/deps.ts';
import { lockCalculation } from '#server/features/calculations/lock-calculation.ts';
import { ENGINE_VERSION } from '#shared/calc/engine.ts';
import { summariseAgain } from './summarise-again.ts';

/**
 * Runs again what an older engine ran, before anyone reads it in a list. Another process may serve
 * meanwhile: a calculation is locked, so that no summary is of a draft that has changed since.
 */
export async function refreshSummaries({ db, pool, runs }: Deps): Promise<void> {
  const old = await db
    .selectDistinct({ calculationId: members.calculationId })
    .from(members)
    .where(ne(members.summaryEngine, ENGINE_VERSION));
  for (const { calculationId } of old) {
    await transaction(pool, async (tx) => {
      const { basis } = await lockCalculation(tx, calculationId);
      await summariseAgain(tx, runs, calculationId, basis);
    });
  }
}
