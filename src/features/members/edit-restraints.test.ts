import { describe, expect, it } from 'vitest';
import { notGiven } from '#shared/contracts/draft-quantity.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';
import { withSupport } from './edit-loads.ts';
import {
  runsOverPoints,
  withHold,
  withNewRestraint,
  withOrder,
  withoutRestraint,
  withoutRestraints,
  withRestraint,
} from './edit-restraints.ts';
import { firstDraft } from './first-draft.ts';

const places = (draft: MemberDraft) => draft.restraints?.map(({ at }) => at);

/** A member held at these distances from end A. */
const heldAt = (...distances: string[]): MemberDraft =>
  distances.reduce<MemberDraft>((draft, at, index) => {
    const next = withNewRestraint(draft);
    return withRestraint(next, next.restraints?.[index]?.id ?? '', { at });
  }, firstDraft('C-01'));

describe('points held between the ends', () => {
  it('are put in order by their distances in any unit; what cannot be read comes last', () => {
    // 3 m = 9.84 ft, 100 in = 8.33 ft, 4 ft 6 in.
    const ordered = withOrder(heldAt('lots', '3 m', '12 ft', '100 in', '4 ft 6 in'));
    expect(places(ordered)).toEqual(['4 ft 6 in', '100 in', '3 m', '12 ft', 'lots']);
  });

  it('stay the same draft where they are in order already', () => {
    const draft = heldAt('2 m', '3 m', '');
    expect(withOrder(draft)).toBe(draft);
  });

  it('have ids of their own, also after one was deleted', () => {
    const draft = withNewRestraint(withoutRestraint(heldAt('2 m', '3 m', '4 m'), 'r2'));
    expect(draft.restraints?.map(({ id }) => id)).toEqual(['r1', 'r3', 'r4']);
  });

  it('are not confirmed any more when they hold something else', () => {
    const draft = withRestraint(heldAt('2 m'), 'r1', { confirmed: true });
    const [row] = draft.restraints ?? [];
    if (!row) throw new Error('no point');
    expect(withHold(draft, row, 'twist').restraints).toEqual([
      { id: 'r1', at: '2 m', holds: ['twist'], confirmed: false },
    ]);
  });

  it('take the moments over them along, one or all', () => {
    const moment = { text: '8 kN m', confirmed: true };
    const over = (id: string, draft: MemberDraft) => withSupport(draft, 'c1', id, { My: moment });
    const draft = over('r2', over('r1', heldAt('2 m', '3 m')));
    const left = withoutRestraint(draft, 'r1');
    expect(left.combinations[0]?.supports).toEqual([{ restraint: 'r2', Mx: notGiven, My: moment }]);
    const none = withoutRestraints(draft);
    expect('restraints' in none).toBe(false);
    expect('supports' in (none.combinations[0] ?? {})).toBe(false);
  });

  it('ask for moments only in a plane that they hold and that the combination bends', () => {
    const [row] = firstDraft('C-01').combinations;
    if (!row) throw new Error('no combination');
    const sideways = withRestraint(heldAt('2 m'), 'r1', { holds: ['top'] });
    const bent = { ...row, MxA: { text: '10 kN m', confirmed: false } };
    expect(runsOverPoints(sideways, bent)).toBe(false);
    expect(runsOverPoints(sideways, { ...row, MyB: bent.MxA })).toBe(true);
    expect(runsOverPoints(withRestraint(sideways, 'r1', { holds: ['in-plane'] }), bent)).toBe(true);
    expect(runsOverPoints(withRestraint(sideways, 'r1', { holds: ['twist'] }), bent)).toBe(false);
  });
});
