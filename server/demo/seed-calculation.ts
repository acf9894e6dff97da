import { randomUUID } from 'node:crypto';
import { writeAudit } from '#server/audit/write-audit.ts';
import { calculations, members } from '#server/db/schema/calculations.ts';
import type { Transaction } from '#server/db/transaction.ts';
import { keepFormulaUses } from '#server/features/members/keep-formula-uses.ts';
import { runDraft } from '#server/features/members/stored-member.ts';
import type { Runs } from '#server/runs/runs.ts';
import { canonicalText } from '#shared/calc/hashes.ts';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';

export interface SeedPlace {
  readonly firmId: string;
  readonly projectId: string;
  readonly engineerId: string;
  readonly now: Date;
}

interface SeedCalculation {
  readonly number: string;
  readonly title: string;
  readonly revision: string;
  readonly basis: BasisDraft;
  readonly members: readonly MemberDraft[];
}

/** Adds a calculation with its members to the demo's project, as if its engineer had typed it. */
export async function seedCalculation(
  tx: Transaction,
  runs: Runs,
  { firmId, projectId, engineerId, now }: SeedPlace,
  { number, title, revision, basis, members: drafts }: SeedCalculation,
): Promise<void> {
  const calculationId = randomUUID();
  const changed = { version: 1, changedBy: engineerId, changedAt: now };
  const scope = { at: now, actorId: engineerId, firmId, projectId, calculationId };
  const row = { number, title, revision, basis: canonicalText(basis), originatorId: engineerId };
  await tx.db.insert(calculations).values({ id: calculationId, projectId, ...row, ...changed });
  const created = { action: 'calculation.created', after: { number, title, basis } } as const;
  await writeAudit(tx, { ...scope, subjectId: calculationId }, created);
  for (const [index, draft] of drafts.map(withAnalysedSection).entries()) {
    const id = randomUUID();
    const { columns, uses } = await runDraft(runs, basis, id, draft);
    await tx.db
      .insert(members)
      .values({ id, calculationId, position: index + 1, ...columns, ...changed });
    await keepFormulaUses(tx, id, uses);
    const added = { action: 'member.created', after: draft } as const;
    await writeAudit(tx, { ...scope, subjectId: id }, added);
  }
}

/** The demo's forces are of the sections that its members have, unless they say otherwise. */
const withAnalysedSection = (draft: MemberDraft): MemberDraft => ({
  ...draft,
  combinations: draft.combinations.map((row) => ({ analysedWith: draft.section.text, ...row })),
});
