import type { members } from '#server/db/schema/calculations.ts';
import type { Runs } from '#server/runs/runs.ts';
import { ENGINE_VERSION } from '#shared/calc/engine.ts';
import { canonicalText } from '#shared/calc/hashes.ts';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import { sectionTextOf } from '#shared/contracts/draft-section.ts';
import type { Member, MemberDraft, MemberRow, MemberSummary } from '#shared/contracts/members.ts';

export type StoredMember = typeof members.$inferSelect;

export const draftOf = (stored: StoredMember) => JSON.parse(stored.draft) as MemberDraft;

export const summaryOf = (stored: StoredMember) => JSON.parse(stored.summary) as MemberSummary;

/** The columns of a run of a draft; the formulas it used stand in a table of their own. */
export const summaryColumns = (summary: MemberSummary) => ({
  summary: JSON.stringify(summary),
  summaryEngine: ENGINE_VERSION,
});

/** Runs a draft: the columns that hold it and its summary, and the formulas that it uses. */
export async function runDraft(
  runs: Runs,
  basis: BasisDraft,
  memberId: string,
  draft: MemberDraft,
) {
  const { summary, uses } = await runs.summarise(basis, memberId, draft);
  return { columns: { draft: canonicalText(draft), ...summaryColumns(summary) }, uses };
}

export function memberOf(stored: StoredMember, changedBy: string): Member {
  return {
    id: stored.id,
    version: stored.version,
    draft: draftOf(stored),
    summary: summaryOf(stored),
    changedBy,
    changedAt: stored.changedAt.toISOString(),
  };
}

export function memberRowOf(stored: StoredMember): MemberRow {
  const draft = draftOf(stored);
  const { mark, place, material, ownSteel, length, combinations } = draft;
  return {
    ...{ id: stored.id, version: stored.version },
    ...{ mark, place, section: sectionTextOf(draft), material: ownSteel?.name ?? material },
    length: length.text,
    combinations: combinations.length,
    summary: summaryOf(stored),
  };
}

export function deletedMemberRowOf(stored: StoredMember, deletedBy: string, deletedAt: Date) {
  const draft = draftOf(stored);
  return {
    id: stored.id,
    mark: draft.mark,
    section: sectionTextOf(draft),
    deletedBy,
    deletedAt: deletedAt.toISOString(),
  };
}
