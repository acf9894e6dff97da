import type { DraftLoad, DraftRestraint, DraftSupport } from '#shared/contracts/draft-parts.ts';
import { type DraftQuantity, notGiven } from '#shared/contracts/draft-quantity.ts';
import type { DraftCombination, MemberDraft } from '#shared/contracts/members.ts';
import type { Hold } from '#shared/members/restraint-input.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import { withCombination } from './edit-draft.ts';

/** An id for a row; it stays with the row wherever that is moved. */
export function freshId(letter: string, taken: readonly { readonly id: string }[]): string {
  const numbers = taken.map(({ id }) =>
    id.startsWith(letter) && /^\d+$/.test(id.slice(1)) ? Number(id.slice(1)) : 0,
  );
  return `${letter}${Math.max(0, ...numbers) + 1}`;
}

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
  combinations: draft.combinations.map((row) =>
    row.supports
      ? { ...row, supports: row.supports.filter(({ restraint }) => restraint !== id) }
      : row,
  ),
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

/** A load of which only its axis is said. */
const firstLoad = (id: string, kind: DraftLoad['kind']): DraftLoad => ({
  ...{ id, kind, bends: 'x', height: '', confirmed: false },
  ...{ w: '', wFrom: '', wTo: '', W: '', at: '', from: '', to: '' },
});

export const withNewLoad = (draft: MemberDraft, row: string): MemberDraft =>
  withCombination(draft, row, (was) => ({
    ...was,
    loads: [...(was.loads ?? []), firstLoad(freshId('l', was.loads ?? []), 'whole')],
  }));

export const withLoad = (
  draft: MemberDraft,
  row: string,
  id: string,
  change: Partial<DraftLoad>,
): MemberDraft =>
  withCombination(draft, row, (was) => ({
    ...was,
    loads: (was.loads ?? []).map((load) => (load.id === id ? { ...load, ...change } : load)),
  }));

/** The last load takes the part with it. */
export const withoutLoad = (draft: MemberDraft, row: string, id: string): MemberDraft =>
  withCombination(draft, row, ({ loads, ...was }) => {
    const left = (loads ?? []).filter((load) => load.id !== id);
    return left.length > 0 ? { ...was, loads: left } : was;
  });

/** The same loads as in another combination, not confirmed for this one. */
export const withLoadsOf = (draft: MemberDraft, row: string, from: DraftCombination): MemberDraft =>
  withCombination(draft, row, (was) => ({
    ...was,
    loads: (from.loads ?? []).map((load) => ({ ...load, confirmed: false })),
  }));

const noMoments = (restraint: string): DraftSupport => ({
  ...{ restraint, Mx: notGiven, My: notGiven },
});

/** A moment over a restraint; a support of which nothing is given is none. */
export const withSupport = (
  draft: MemberDraft,
  row: string,
  restraint: string,
  change: Partial<Record<'Mx' | 'My', DraftQuantity>>,
): MemberDraft =>
  withCombination(draft, row, (was) => {
    const all = was.supports ?? [];
    const there = all.find((support) => support.restraint === restraint);
    const next = { ...(there ?? noMoments(restraint)), ...change };
    const empty = next.Mx.text.trim() === '' && next.My.text.trim() === '';
    const others = all.filter((support) => support !== there);
    return {
      ...was,
      supports: empty
        ? others
        : there
          ? all.map((support) => (support === there ? next : support))
          : [...all, next],
    };
  });

/** Whether a restraint supports the member in the plane in which it bends about an axis. */
export const holdsAcross = ({ holds }: DraftRestraint, axis: 'x' | 'y'): boolean =>
  holds.some((hold) => (hold === 'in-plane' ? axis === 'x' : hold !== 'twist' && axis === 'y'));
