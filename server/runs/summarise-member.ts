import type { BasisDraft } from '#shared/contracts/calculations.ts';
import { type DraftOfMember, inputOf } from '#shared/contracts/draft-input.ts';
import { problemsOfMember } from '#shared/contracts/draft-problems.ts';
import type { MemberSummary } from '#shared/contracts/members.ts';
import { parseInput } from '#shared/members/parse-input.ts';
import { runMember } from '#shared/members/run.ts';
import { unconfirmedIn } from './unconfirmed-in.ts';

/** Runs one member's draft; one that is no valid input is NOT CHECKED, with the reasons. */
export function summariseMember(basis: BasisDraft, member: DraftOfMember): MemberSummary {
  const parsed = parseInput(inputOf(basis, [member]));
  const resolved = parsed.ok ? parsed.input.members[0] : undefined;
  if (!parsed.ok || !resolved) {
    return {
      ...{ verdict: 'NOT CHECKED', ratio: null, ratioText: null, governing: null },
      unconfirmed: unconfirmedIn(member.draft),
      problems: problemsOfMember(basis, member),
    };
  }
  const { summary, unconfirmed } = runMember(parsed.input, resolved);
  return { ...summary, unconfirmed, problems: [] };
}
