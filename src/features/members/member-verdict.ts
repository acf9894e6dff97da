import type { Summary } from '#shared/calc/record.ts';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import type { DraftOfMember } from '#shared/contracts/draft-input.ts';
import type { ProblemPlace } from '#shared/contracts/problems.ts';
import { previewOf } from './preview.ts';

/** What a member's run comes to, or why its inputs are refused. */
export type MemberVerdict =
  | { readonly ok: true; readonly summary: Summary }
  | { readonly ok: false; readonly problems: readonly ProblemPlace[] };

export function memberVerdict(basis: BasisDraft, { id, draft }: DraftOfMember): MemberVerdict {
  const preview = previewOf(basis, id, draft);
  return preview.ok ? { ok: true, summary: preview.record.summary } : preview;
}
