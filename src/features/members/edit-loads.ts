import type {
  DraftLoad,
  DraftSupport,
  DraftSway,
  DraftSwayDirection,
} from '#shared/contracts/draft-parts.ts';
import { type DraftQuantity, notGiven } from '#shared/contracts/draft-quantity.ts';
import type { DraftCombination, MemberDraft } from '#shared/contracts/members.ts';
import { withCombination } from './edit-draft.ts';
import { freshId } from './fresh-id.ts';

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

export const withoutLoads = (draft: MemberDraft, row: string): MemberDraft =>
  withCombination(draft, row, ({ loads: _, ...was }) => was);

export const withoutSupports = (draft: MemberDraft, row: string): MemberDraft =>
  withCombination(draft, row, ({ supports: _, ...was }) => was);

export const withoutShears = (draft: MemberDraft, row: string): MemberDraft =>
  withCombination(draft, row, ({ Vx: _x, Vy: _y, ...was }) => was);

export const withSway = (draft: MemberDraft, row: string, sway: DraftSway): MemberDraft =>
  withCombination(draft, row, (was) => ({ ...was, sway }));

export const withoutSway = (draft: MemberDraft, row: string): MemberDraft =>
  withCombination(draft, row, ({ sway: _, ...was }) => was);

export const noSwayAbout: DraftSwayDirection = {
  ...{ by: 'drift', MA: notGiven, MB: notGiven, Pstory: notGiven, PeStory: notGiven },
  ...{ H: notGiven, height: notGiven, drift: notGiven, Pmf: notGiven, frames: '' },
};
