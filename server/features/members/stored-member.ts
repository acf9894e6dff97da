import { canonicalText } from '#server/db/canonical-text.ts';
import type { members } from '#server/db/schema/calculations.ts';
import { ENGINE_VERSION } from '#shared/calc/engine.ts';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import type { Member, MemberDraft, MemberRow, MemberSummary } from '#shared/contracts/members.ts';
import { summariseMember } from './summarise-member.ts';

export type StoredMember = typeof members.$inferSelect;

export const draftOf = (stored: StoredMember) => JSON.parse(stored.draft) as MemberDraft;

/** The stored summary, or a new one where an older engine made the stored one. */
export function summaryOf(stored: StoredMember, basis: BasisDraft): MemberSummary {
  if (stored.summaryEngine === ENGINE_VERSION) return JSON.parse(stored.summary) as MemberSummary;
  return summariseMember(basis, stored.id, draftOf(stored));
}

/** The columns that hold a draft and the run of it. */
export function draftColumns(basis: BasisDraft, memberId: string, draft: MemberDraft) {
  return {
    draft: canonicalText(draft),
    summary: JSON.stringify(summariseMember(basis, memberId, draft)),
    summaryEngine: ENGINE_VERSION,
  };
}

export function memberOf(stored: StoredMember, basis: BasisDraft, changedBy: string): Member {
  return {
    id: stored.id,
    version: stored.version,
    draft: draftOf(stored),
    summary: summaryOf(stored, basis),
    changedBy,
    changedAt: stored.changedAt.toISOString(),
  };
}

export function memberRowOf(stored: StoredMember, basis: BasisDraft): MemberRow {
  const { mark, place, section, material, ownSteel, length, combinations } = draftOf(stored);
  return {
    ...{ id: stored.id, version: stored.version },
    ...{ mark, place, section: section.text, material: ownSteel?.name ?? material },
    length: length.text,
    combinations: combinations.length,
    summary: summaryOf(stored, basis),
  };
}

export function deletedMemberRowOf(stored: StoredMember, deletedBy: string, deletedAt: Date) {
  const { mark, section } = draftOf(stored);
  return {
    id: stored.id,
    mark,
    section: section.text,
    deletedBy,
    deletedAt: deletedAt.toISOString(),
  };
}
