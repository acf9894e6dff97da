import type { BasisDraft } from '#shared/contracts/calculations.ts';
import { type DraftOfMember, inputOf } from '#shared/contracts/draft-input.ts';
import { problemsOfMember } from '#shared/contracts/draft-problems.ts';
import { formulaUses } from '#shared/library/formula-uses.ts';
import { parseInput } from '#shared/members/parse-input.ts';
import { runMember } from '#shared/members/run.ts';
import type { SummarisedMember } from './tasks.ts';
import { unconfirmedIn } from './unconfirmed-in.ts';

/** Runs one member's draft; one that is no valid input is NOT CHECKED, with the reasons. */
export function summariseMember(basis: BasisDraft, member: DraftOfMember): SummarisedMember {
  const parsed = parseInput(inputOf(basis, [member]));
  const resolved = parsed.ok ? parsed.input.members[0] : undefined;
  if (!parsed.ok || !resolved) {
    const summary = {
      ...{ verdict: 'NOT CHECKED' as const, ratio: null, ratioText: null, governing: null },
      unconfirmed: unconfirmedIn(member.draft),
      problems: problemsOfMember(basis, member),
    };
    return { summary, uses: [] };
  }
  const record = runMember(parsed.input, resolved);
  const { unconfirmed } = record;
  return {
    summary: { ...record.summary, unconfirmed, problems: [] },
    uses: formulaUses(record),
  };
}
