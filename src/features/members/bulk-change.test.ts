import { describe, expect, it } from 'vitest';
import { type DraftQuantity, notGiven } from '#shared/contracts/draft-quantity.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';
import { fieldChanges, isStated, type SeveralChange, withChange } from './bulk-change.ts';
import { firstDraft } from './first-draft.ts';
import { analysedForces, withOtherSection } from './other-section.ts';

const confirmed = (text: string): DraftQuantity => ({
  text,
  source: { kind: 'drawing', number: 'S-201', revision: 'C' },
  confirmed: true,
});

const [row] = firstDraft('').combinations;
if (!row) throw new Error('no combination');

const column: MemberDraft = {
  ...firstDraft('C-01'),
  ...{ section: confirmed('W12X79'), length: confirmed('22 ft'), Lcx: confirmed('22 ft') },
  combinations: [
    { ...row, id: 'c1', name: 'a', P: confirmed('310 kip') },
    { ...row, id: 'c2', name: 'b', P: confirmed('268 kip'), analysedWith: 'W12X65' },
    { ...row, id: 'c3', name: 'empty' },
  ],
};

const change = (kind: SeveralChange['kind'], more: Partial<SeveralChange> = {}): SeveralChange => ({
  ...{ kind, pattern: firstDraft(''), pointsOf: null },
  state: { of: new Set(), source: null, confirmed: true },
  ...more,
});
const to = (kind: SeveralChange['kind'], pattern: Partial<MemberDraft>) =>
  change(kind, { pattern: { ...firstDraft(''), ...pattern } });

describe('another section', () => {
  const found: DraftQuantity = { text: 'W14X90', confirmed: false };

  it('leaves forces those of the section they were analysed with', () => {
    const { section, combinations } = withOtherSection(column, found);
    expect(section).toEqual(found);
    // What was not said is said now; what was said stays; an empty row has nothing to say.
    expect(combinations.map(({ analysedWith }) => analysedWith)).toEqual([
      ...['W12X79', 'W12X65', undefined],
    ]);
    expect(combinations[0]?.P).toEqual(confirmed('310 kip'));
    expect(analysedForces(column)).toEqual({ combinations: 2, sections: ['W12X79', 'W12X65'] });
  });

  it('opens what was given for the section before, and takes its sizes away', () => {
    const net: MemberDraft = {
      ...column,
      netSection: { by: 'An', Ae: notGiven, An: confirmed('20 in²'), U: confirmed('0.9') },
      charts: { y: { sidesway: 'inhibited', GA: confirmed('1.2'), GB: confirmed('10') } },
    };
    const after = withOtherSection(net, found);
    expect(after.netSection).toMatchObject({ An: { text: '20 in²', confirmed: false } });
    expect(after.netSection?.U.confirmed).toBe(false);
    expect(after.charts?.y?.GA).toMatchObject({ text: '1.2', confirmed: false });
    expect(after.charts).not.toHaveProperty('x');
  });

  it('that is the same keeps what belongs to it', () => {
    const same = to('section', { section: { text: 'w12 x 79', confirmed: true } });
    const after = withChange(column, same);
    expect(after.section.text).toBe('w12 x 79');
    expect(after.combinations).toEqual(column.combinations);
  });
});

describe('a change of several members', () => {
  it.each([
    ['steel', { material: 'A36' }],
    ['Lcy', { Lcy: confirmed('11 ft') }],
    ['Cb', { Cb: confirmed('1.14') }],
    ['ends', { ends: { text: 'held', confirmed: true } }],
    ['sense', { endMomentSign: 'joint' }],
  ] as const)('of %s changes that and nothing else', (kind, pattern) => {
    const one = to(kind, pattern);
    expect(isStated(one)).toBe(true);
    expect(withChange(column, one)).toEqual({ ...column, ...pattern });
  });

  it('is not stated while its value is empty', () => {
    for (const kind of ['section', 'length', 'Cb', 'sense', 'points', 'state'] as const) {
      expect(isStated(change(kind)), kind).toBe(false);
    }
    expect(isStated(to('steel', { material: '' }))).toBe(false);
    const source = { kind: 'drawing' as const, number: '', revision: 'C' };
    expect(isStated(to('Lb', { Lb: { text: '9 ft', source, confirmed: true } }))).toBe(false);
    const state = { of: new Set(['Lb'] as const), source, confirmed: true };
    expect(isStated(change('state', { state }))).toBe(false);
  });

  it('copies points unconfirmed, and lets moments over other points go', () => {
    const point = { holds: ['twist' as const], confirmed: true };
    const pointsOf: MemberDraft = {
      ...column,
      restraints: [{ ...point, id: 'r1', at: '11 ft' }],
    };
    const supports = [{ restraint: 'r1', Mx: confirmed('8 kip ft'), My: notGiven }];
    const held: MemberDraft = {
      ...column,
      restraints: [{ ...point, id: 'r1', at: '5 ft' }],
      combinations: [{ ...row, supports }],
    };
    const after = withChange(held, change('points', { pointsOf }));
    expect(after.restraints).toEqual([
      { id: 'r1', at: '11 ft', holds: ['twist'], confirmed: false },
    ]);
    expect(after.combinations[0]).not.toHaveProperty('supports');
    expect(withChange(held, change('points', { pointsOf: column }))).not.toHaveProperty(
      'restraints',
    );
  });

  it('sets source and state of given values only, forces and loads with them', () => {
    const source = { kind: 'file' as const, file: 'hall.csv' };
    const load = {
      ...{ id: 'l1', kind: 'whole' as const, bends: 'x' as const, height: '' as const },
      ...{ w: '1 kip/ft', wFrom: '', wTo: '', W: '', at: '', from: '', to: '', confirmed: false },
    };
    const loaded: MemberDraft = { ...column, combinations: [{ ...row, loads: [load] }] };
    const of = new Set(['Lcx', 'Lcy', 'forces'] as const);
    const after = withChange(loaded, change('state', { state: { of, source, confirmed: false } }));
    expect(after.Lcx).toEqual({ text: '22 ft', source, confirmed: false });
    expect(after.Lcy).toEqual(notGiven);
    expect(after.length).toEqual(column.length);
    expect(after.combinations[0]?.P).toEqual(notGiven);
    expect(after.combinations[0]?.loads).toEqual([{ ...load, source, confirmed: false }]);
    const kept = change('state', {
      state: { of: new Set(['Lcx']), source: null, confirmed: false },
    });
    expect(withChange(column, kept).Lcx).toEqual({ ...column.Lcx, confirmed: false });
  });

  it('reads as fields before and after', () => {
    const after = withChange(column, to('steel', { material: 'A36' }));
    expect(fieldChanges(column, after)).toEqual([{ label: 'Steel', before: 'A992', after: 'A36' }]);
  });
});
