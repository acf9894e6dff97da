import { describe, expect, it } from 'vitest';
import { merge } from '#client/lib/draft/merge.ts';
import type { DraftLoad } from '#shared/contracts/draft-parts.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';
import { withAction } from './edit-draft.ts';
import { withLoad, withNewLoad, withoutLoad, withSupport, withSway } from './edit-loads.ts';
import { withNewRestraint, withoutRestraints, withRestraint } from './edit-restraints.ts';
import { firstDraft } from './first-draft.ts';
import { memberRules } from './member-rules.ts';

const typed = (text: string) => ({ text, confirmed: false });
const loaded = (draft: MemberDraft, change: Partial<DraftLoad>) =>
  withLoad(withNewLoad(draft, 'c1'), 'c1', 'l1', change);
const base = withRestraint(withNewRestraint(loaded(firstDraft('C-01'), { w: '2 kN/m' })), 'r1', {
  at: '3 m',
  holds: ['centre'],
});

describe('two changes of one member', () => {
  it('go together where they are of different parts, within one combination too', () => {
    const mine = withAction(withRestraint(base, 'r1', { at: '4 m' }), 'c1', 'P', typed('9 kN'));
    const theirs = withSupport(
      withLoad(withSway(base, 'c1', { P: typed('1 kN') }), 'c1', 'l1', { w: '5 kN/m' }),
      'c1',
      'r1',
      { My: typed('3 kN m') },
    );
    const { agreed, clashes } = merge(base, mine, theirs, memberRules);
    expect(clashes).toEqual([]);
    const [row] = agreed.combinations;
    expect(agreed.restraints?.[0]?.at).toBe('4 m');
    expect(row?.P.text).toBe('9 kN');
    expect(row?.loads?.[0]?.w).toBe('5 kN/m');
    expect(row?.supports?.[0]?.My.text).toBe('3 kN m');
    expect(row?.sway?.P.text).toBe('1 kN');
  });

  it('clash by the load that both changed, and either may be taken', () => {
    const mine = withLoad(base, 'c1', 'l1', { w: '3 kN/m' });
    const theirs = withLoad(base, 'c1', 'l1', { kind: 'point', W: '7 kN', at: '1 m' });
    const { clashes, agreed } = merge(base, mine, theirs, memberRules);
    expect(clashes).toEqual([
      {
        id: 'combination/c1/loads/l1',
        label: 'Combination c1, load',
        mine: 'uniform, all along, w 3 kN/m, about x',
        theirs: 'at a point, W 7 kN, at 1 m, about x',
      },
    ]);
    const taken = memberRules.take(agreed, mine, 'combination/c1/loads/l1');
    expect(taken.combinations[0]?.loads?.[0]?.w).toBe('3 kN/m');
    expect(taken.combinations[0]?.loads?.[0]?.kind).toBe('whole');
  });

  it('lose nothing that only one of them took away or added', () => {
    const mine = { ...withoutRestraints(base), stiffeners: typed('500 mm') };
    const theirs = withoutLoad(base, 'c1', 'l1');
    const { agreed, clashes } = merge(base, mine, theirs, memberRules);
    expect(clashes).toEqual([]);
    expect('restraints' in agreed).toBe(false);
    expect(agreed.stiffeners?.text).toBe('500 mm');
    expect(agreed.combinations[0]?.loads ?? []).toEqual([]);
  });

  it('name a point that one changed and the other took away', () => {
    const mine = withRestraint(base, 'r1', { at: '5 m' });
    const { clashes, agreed } = merge(base, mine, withoutRestraints(base), memberRules);
    expect(clashes).toEqual([
      { id: 'restraints/r1', label: 'Point held', mine: '5 m: centre', theirs: null },
    ]);
    const kept = memberRules.take(agreed, mine, 'restraints/r1');
    expect(kept.restraints?.map(({ at }) => at)).toEqual(['5 m']);
  });
});
