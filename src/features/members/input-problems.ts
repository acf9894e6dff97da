import { type DraftValue, valuesOf } from '#shared/contracts/draft-input-values.ts';
import { lacksWall } from '#shared/contracts/draft-section.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';
import type { ProblemPlace } from '#shared/contracts/problems.ts';
import { sourceLack } from './source-words.ts';

/**
 * The problems of one member's input, by the paths of its own fields. A source that lacks
 * something is said as that, and a needed value that is empty as that.
 */
export function inputProblems(
  draft: MemberDraft,
  found: readonly { readonly path: string; readonly message: string }[],
): ProblemPlace[] {
  const values = new Map(valuesOf(draft).map((value) => [value.path, value]));
  const own = found.flatMap(({ path, message }) => {
    const place = placeOf(draft, path.replace(/^members\[0\]\.?/, ''));
    return isAnswered(draft, place)
      ? []
      : [{ path: place, message: said(values.get(place), place, message) }];
  });
  const seen = new Set<string>();
  return own.filter(({ path }) => !seen.has(path) && seen.add(path));
}

/** The field that a problem stands beside: of a row's source its first, of a choice the choice. */
function placeOf(draft: MemberDraft, path: string): string {
  const [, row, direction, axis] = /^combinations\[(\d+)\]\.(sway\.([xy]))\.Pmf$/.exec(path) ?? [];
  const sway = row && draft.combinations[Number(row)]?.sway;
  if (sway && (axis === 'x' || axis === 'y') && sway[axis]?.frames === '')
    return `combinations[${row}].${direction}.frames`;
  if (path === 'section' && draft.sizes && lacksWall(draft.sizes)) return 'section.wall';
  return path.replace(/^(restraints\[\d+\])(?:\.(?:source|confirmed).*)?$/, '$1.at');
}

/** Words to choose from, empty until chosen. */
const choice = /(^section\.wall|\.(sidesway|frames|height|holds))$/;

function said(value: DraftValue | undefined, place: string, message: string): string {
  if (!value) return choice.test(place) ? 'is needed' : message;
  if (value.text.trim() === '') {
    return /^(must be|Invalid|is empty)/.test(message) ? 'is needed' : message;
  }
  return sourceLack(value.source) ?? message;
}

/** Problems that another field answers for, since the form does not ask for the one they name. */
function isAnswered(draft: MemberDraft, path: string): boolean {
  const found = /^combinations\[(\d+)\]\.(?:sway\.([xy])\.(\w+)|supports\[(\d+)\]\.at)/.exec(path);
  if (!found) return false;
  const [, row, axis, name = '', support] = found;
  const combination = draft.combinations[Number(row)];
  if (axis === 'x' || axis === 'y') {
    const critical = combination?.sway?.[axis]?.by === 'critical';
    return critical && ['H', 'height', 'drift'].includes(name);
  }
  const over = combination?.supports?.[Number(support)]?.restraint;
  return (draft.restraints ?? []).some(({ id }) => id === over);
}
