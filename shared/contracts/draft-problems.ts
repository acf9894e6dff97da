import { parseInput } from '#shared/members/parse-input.ts';
import type { BasisDraft } from './calculations.ts';
import { type DraftOfMember, inputOf } from './draft-input.ts';
import type { ProblemPlace } from './problems.ts';

/** Why the forms of a calculation are no valid input; members are named by mark in the paths. */
export function problemsOf(basis: BasisDraft, members: readonly DraftOfMember[]): ProblemPlace[] {
  const marked = (path: string) =>
    path.replace(/^members\[(\d+)\]/, (whole, index: string) => {
      const mark = members[Number(index)]?.draft.mark;
      return mark ? `members[${mark}]` : whole;
    });
  return problemsIn(basis, members).map(({ path, message }) => ({ path: marked(path), message }));
}

/** The same for one member's form: paths are those of its own fields (`combinations[0].P`). */
export function problemsOfMember(basis: BasisDraft, member: DraftOfMember): ProblemPlace[] {
  return problemsIn(basis, [member]).map(({ path, message }) => ({
    path: path.replace(/^members\[0\]\./, ''),
    message,
  }));
}

function problemsIn(basis: BasisDraft, members: readonly DraftOfMember[]) {
  const parsed = parseInput(inputOf(basis, members));
  return parsed.ok ? [] : parsed.problems;
}
