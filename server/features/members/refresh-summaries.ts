import { eq, ne } from 'drizzle-orm';
import { calculations, members } from '#server/db/schema/calculations.ts';
import type { Deps } from '#server/deps.ts';
import { ENGINE_VERSION } from '#shared/calc/engine.ts';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import { draftOf, summaryColumns } from './stored-member.ts';

/** Runs again what an older engine ran, before anyone reads it in a list. */
export async function refreshSummaries({ db, runs }: Deps): Promise<void> {
  const old = await db
    .select({ member: members, basis: calculations.basis })
    .from(members)
    .innerJoin(calculations, eq(calculations.id, members.calculationId))
    .where(ne(members.summaryEngine, ENGINE_VERSION));
  for (const { member, basis } of old) {
    const summary = await runs.summarise(
      JSON.parse(basis) as BasisDraft,
      member.id,
      draftOf(member),
    );
    await db.update(members).set(summaryColumns(summary)).where(eq(members.id, member.id));
  }
}
