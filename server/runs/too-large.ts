import type { ProblemPlace } from '#shared/contracts/problems.ts';
import type { Drafts } from './tasks.ts';

/** Of all members together: a record of about 30 MB, a report of some minutes. */
export const mostCombinations = 1000;

/** Why a calculation is too large to be recorded while someone waits, or null. */
export function tooLarge({ members }: Drafts): { problems: ProblemPlace[] } | null {
  const all = members.reduce((sum, { draft }) => sum + draft.combinations.length, 0);
  if (all <= mostCombinations) return null;
  const message = `hold ${all} combinations; at most ${mostCombinations} are recorded here at once`;
  return { problems: [{ path: 'members', message }] };
}
