import { actionNames, type DraftQuantity, type MemberDraft } from '#shared/contracts/members.ts';
import type { ProblemPlace } from '#shared/contracts/problems.ts';
import { sourceLack } from './source-words.ts';

const statedNames = ['section', 'ends', 'length', 'Lcx', 'Lcy', 'Lcz', 'Lb', 'Cb'] as const;

/**
 * The problems of one member's input, by the paths of its own fields. A source that lacks
 * something is said as that, and a needed value that is empty as that.
 */
export function inputProblems(
  draft: MemberDraft,
  found: readonly { readonly path: string; readonly message: string }[],
): ProblemPlace[] {
  const stated = quantitiesOf(draft);
  const own = found.map(({ path, message }) => {
    const place = path.replace(/^members\[0\]\.?/, '');
    const quantity = stated.get(place);
    const lack = quantity && quantity.text.trim() !== '' ? sourceLack(quantity.source) : null;
    if (lack) return { path: place, message: lack };
    if (quantity?.text.trim() === '' && /^(must be|Invalid)/.test(message)) {
      return { path: place, message: 'is needed' };
    }
    return { path: place, message };
  });
  const seen = new Set<string>();
  return own.filter(({ path }) => !seen.has(path) && seen.add(path));
}

function quantitiesOf(draft: MemberDraft): ReadonlyMap<string, DraftQuantity> {
  return new Map<string, DraftQuantity>([
    ...statedNames.map((name) => [name, draft[name]] as const),
    ...draft.combinations.flatMap((row, index) =>
      actionNames.map((action) => [`combinations[${index}].${action}`, row[action]] as const),
    ),
  ]);
}
