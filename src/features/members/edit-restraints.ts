import type { DraftRestraint } from '#shared/contracts/draft-parts.ts';
import type { DraftCombination, MemberDraft } from '#shared/contracts/members.ts';
import type { Hold } from '#shared/members/restraint-input.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import { freshId } from './fresh-id.ts';

export const restraintsOf = (draft: MemberDraft): readonly DraftRestraint[] =>
  draft.restraints ?? [];

/** Adds a point of which nothing is said yet. */
export const withNewRestraint = (draft: MemberDraft): MemberDraft => ({
  ...draft,
  restraints: [
    ...restraintsOf(draft),
    { id: freshId('r', restraintsOf(draft)), at: '', holds: [], confirmed: false },
  ],
});

export const withRestraint = (
  draft: MemberDraft,
  id: string,
  change: Partial<DraftRestraint>,
): MemberDraft => ({
  ...draft,
  restraints: restraintsOf(draft).map((row) => (row.id === id ? { ...row, ...change } : row)),
});

/** Another thing held, or one less: what was confirmed was what it held before. */
export const withHold = (draft: MemberDraft, { id, holds }: DraftRestraint, hold: Hold) =>
  withRestraint(draft, id, {
    holds: holds.includes(hold) ? holds.filter((held) => held !== hold) : [...holds, hold],
    confirmed: false,
  });

/** Takes a point away, with the moments over it. */
export const withoutRestraint = (draft: MemberDraft, id: string): MemberDraft => ({
  ...draft,
  restraints: restraintsOf(draft).filter((row) => row.id !== id),
  combinations: draft.combinations.map(({ supports, ...row }) => {
    const left = supports?.filter(({ restraint }) => restraint !== id) ?? [];
    return left.length > 0 ? { ...row, supports: left } : row;
  }),
});

/** Takes all of them away: the lengths are then stated again. */
export const withoutRestraints = (draft: MemberDraft): MemberDraft => {
  const { restraints: _, ...rest } = restraintsOf(draft).reduce(
    (without, { id }) => withoutRestraint(without, id),
    draft,
  );
  return rest;
};

/** Points in the order of their distances from end A; those that cannot be read yet come last. */
export function withOrder(draft: MemberDraft): MemberDraft {
  const rows = restraintsOf(draft);
  const place = ({ at }: DraftRestraint): number => {
    const parsed = parseQuantity(at, 'length');
    return parsed.ok ? parsed.quantity.value : Number.POSITIVE_INFINITY;
  };
  const ordered = rows.toSorted((a, b) => {
    const [first, second] = [place(a), place(b)];
    return first === second ? 0 : first - second;
  });
  return ordered.every((row, index) => row === rows[index])
    ? draft
    : { ...draft, restraints: ordered };
}

/** Whether the forces or loads of a combination bend the member about an axis. */
export const bendsAbout = (row: DraftCombination, axis: 'x' | 'y'): boolean =>
  (['A', 'B', 'Max'] as const).some((end) => row[`M${axis}${end}`].text.trim() !== '') ||
  (row.loads ?? []).some(({ bends }) => bends === axis);

/** Whether a combination bends the member in a plane that a point between the ends holds. */
export const runsOverPoints = (draft: MemberDraft, row: DraftCombination): boolean =>
  restraintsOf(draft).some((point) =>
    (['x', 'y'] as const).some((axis) => holdsAcross(point, axis) && bendsAbout(row, axis)),
  );

/** Whether a restraint supports the member in the plane in which it bends about an axis. */
export const holdsAcross = ({ holds }: DraftRestraint, axis: 'x' | 'y'): boolean =>
  holds.some((hold) => (hold === 'in-plane' ? axis === 'x' : hold !== 'twist' && axis === 'y'));
