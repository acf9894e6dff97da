import { describe, expect, it } from 'vitest';
import { parseInput } from '#shared/members/parse-input.ts';
import type { BasisDraft } from './calculations.ts';
import { inputOf } from './draft-input.ts';
import { valuesOf } from './draft-input-values.ts';
import type { DraftLoad, DraftSizes, DraftSwayDirection } from './draft-parts.ts';
import { type DraftQuantity, notGiven } from './draft-quantity.ts';
import { sectionTextOf } from './draft-section.ts';
import { type MemberDraft, memberDraft } from './members.ts';

const typed = (text: string): DraftQuantity => ({ text, confirmed: true });
const stated = { source: { kind: 'typed' }, confirmed: true } as const;

const basis: BasisDraft = {
  ...{ standard: 'aisc360-22', design: 'LRFD', units: 'si', constants: 'si' },
  analysis: {
    ...{ method: 'direct', secondOrder: 'amplified', includesMemberEffect: null, sway: 'B2' },
    ...{ swaySource: '', notionalLoads: '', program: '', file: '' },
    ...{ driftRatio: ' 1.2 ', driftSource: 'frame run 4', provisions: ['H1.3'] },
  },
  buildingCode: { name: '', year: '', amendments: '' },
  ...{ adoptedEdition: '', loadStandard: '', assumptions: '' },
};

const load: DraftLoad = {
  ...{ id: 'l1', kind: 'whole', bends: 'x', height: 'top', confirmed: true },
  ...{ w: '4 kN/m', wFrom: '', wTo: '', W: '9 kN', at: '', from: '1 m', to: '' },
};

const sway: DraftSwayDirection = {
  ...{ by: 'drift', MA: typed('5 kN m'), MB: notGiven, Pstory: typed('900 kN') },
  ...{ PeStory: typed('80 MN'), H: typed('20 kN'), height: typed('4 m'), drift: typed('9 mm') },
  ...{ Pmf: typed('300 kN'), frames: 'braced' },
};

const plain: MemberDraft = {
  ...{ mark: 'C-1', place: '', section: typed('W12X79'), material: 'A992', ownSteel: null },
  ...{ ends: typed('held'), length: typed('6 m'), Lcx: notGiven, Lcy: notGiven, Lcz: notGiven },
  ...{ Lb: notGiven, Cb: notGiven, endMomentSign: 'bending' },
  combinations: [
    {
      ...{ id: 'c1', name: 'gravity', P: typed('400 kN'), MxA: typed('30 kN m'), MxB: notGiven },
      ...{ MyA: notGiven, MyB: notGiven, MxMax: notGiven, MyMax: notGiven },
    },
  ],
};

const full: MemberDraft = {
  ...plain,
  restraints: [{ id: 'r4', at: ' 2 m ', holds: ['centre', 'twist'], confirmed: true }],
  springs: { xA: typed('1 kN m/rad'), xB: notGiven, yA: notGiven, yB: notGiven },
  charts: { y: { sidesway: 'inhibited', GA: typed('10'), GB: typed('1') } },
  netSection: { by: 'An', Ae: typed('1 mm²'), An: typed('9000 mm²'), U: typed('0.9') },
  stiffeners: typed('600 mm'),
  combinations: plain.combinations.map((row) => ({
    ...row,
    Vx: typed('40 kN'),
    loads: [load, { ...load, id: 'l2', kind: 'point', at: '3 m' }],
    supports: [{ restraint: 'r4', Mx: notGiven, My: typed('2 kN m') }],
    sway: { P: typed('15 kN'), x: sway },
  })),
};

describe('the parts of a member that not every member has', () => {
  it('are left out where they are absent, as in drafts stored before there were any', () => {
    const input = inputOf(basis, [{ id: 'm1', draft: memberDraft.parse(plain) }]);
    expect(Object.keys(input.members[0] ?? {})).not.toEqual(
      expect.arrayContaining(['restraints', 'springs', 'charts', 'netSection', 'stiffeners']),
    );
    expect(Object.keys(input.members[0]?.combinations[0] ?? {})).toEqual([
      ...['id', 'name', 'P', 'MxA'],
    ]);
  });

  it('are given with their sources; what their kind has no use for stays in the form', () => {
    const input = inputOf(basis, [{ id: 'm1', draft: full }]);
    expect(input.analysis).toMatchObject({
      sway: 'B2',
      driftRatio: {
        value: '1.2',
        source: { kind: 'typed', note: 'frame run 4' },
        confirmed: true,
      },
      provisions: ['H1.3'],
    });
    const member = input.members[0];
    // The ends are held, so the stiffnesses are not sent.
    expect(member).not.toHaveProperty('springs');
    expect(member).toMatchObject({
      restraints: [{ at: { value: '2 m', ...stated }, holds: ['centre', 'twist'], ...stated }],
      charts: {
        y: {
          sidesway: 'inhibited',
          GA: { value: '10', ...stated },
          GB: { value: '1', ...stated },
        },
      },
      stiffeners: { value: '600 mm', ...stated },
    });
    expect(member?.netSection).toEqual({
      An: { value: '9000 mm²', ...stated },
      U: { value: '0.9', ...stated },
    });
    const row = member?.combinations[0];
    expect(row?.loads).toEqual([
      { kind: 'uniform', bends: 'x', height: 'top', w: { value: '4 kN/m', ...stated } },
      {
        ...{ kind: 'point', bends: 'x', height: 'top' },
        ...{ W: { value: '9 kN', ...stated }, at: { value: '3 m', ...stated } },
      },
    ]);
    expect(row?.supports).toEqual([
      { at: { value: '2 m', ...stated }, My: { value: '2 kN m', ...stated } },
    ]);
    expect(row?.sway?.x).toEqual({
      ...{ MA: { value: '5 kN m', ...stated }, Pstory: { value: '900 kN', ...stated } },
      ...{ H: { value: '20 kN', ...stated }, height: { value: '4 m', ...stated } },
      ...{ drift: { value: '9 mm', ...stated }, RM: 'braced' },
    });
    expect(parseInput(input)).toMatchObject({ ok: true });
  });

  it('name their springs where the ends stand in them', () => {
    const input = inputOf(basis, [{ id: 'm1', draft: { ...full, ends: typed('springs') } }]);
    expect(input.members[0]?.springs).toEqual({ xA: { value: '1 kN m/rad', ...stated } });
  });

  it('ask for both ends of a load over a part, and for one that is needed and empty', () => {
    const draft = {
      ...full,
      combinations: full.combinations.map((row) => ({
        ...row,
        loads: [{ ...load, kind: 'part' as const, w: '' }],
      })),
    };
    const parsed = parseInput(inputOf(basis, [{ id: 'm1', draft }]));
    expect(!parsed.ok && parsed.problems.map(({ path, message }) => [path, message])).toEqual([
      ['members[0].combinations[0].loads[0].to', 'is empty'],
      ['members[0].combinations[0].loads[0].w', 'is empty'],
    ]);
  });

  it('have a place for each text that is sent and none for the others', () => {
    const paths = valuesOf(full).map(({ path }) => path);
    expect(paths).toEqual(
      expect.arrayContaining([
        ...['restraints[0].at', 'charts.y.GA', 'netSection.An', 'stiffeners'],
        ...['combinations[0].loads[1].W', 'combinations[0].supports[0].My'],
        ...['combinations[0].sway.x.drift', 'combinations[0].Vx'],
      ]),
    );
    for (const path of [
      ...['springs.xA', 'netSection.Ae', 'combinations[0].loads[0].from'],
      ...['combinations[0].sway.x.PeStory', 'combinations[0].sway.x.Pmf'],
    ])
      expect(paths).not.toContain(path);
  });
});

describe('a section by its sizes', () => {
  const sizes: DraftSizes = {
    ...{ shape: 'tube', wall: 'nominal', confirmed: true },
    ...{ d: '9 mm', bf: '', tf: '', tw: '', bfTop: '', tfTop: '', bfBottom: '', tfBottom: '' },
    ...{ B: '150 mm', Ht: ' 250 mm', t: '10 mm', Ro: '', D: '' },
  };
  const draft: MemberDraft = { ...full, sizes };

  it('stands in place of the designation, which is kept', () => {
    const input = inputOf(basis, [{ id: 'm1', draft }]);
    expect(input.members[0]).toHaveProperty('section', {
      ...{ shape: 'tube', wall: 'nominal', Ht: '250 mm', B: '150 mm', t: '10 mm', ...stated },
    });
    expect(sectionTextOf(draft)).toBe('Tube 250 mm × 150 mm × 10 mm');
    expect(sectionTextOf(full)).toBe('W12X79');
  });

  it('names the section of its forces without spaces', () => {
    const combinations = draft.combinations.map((row) => ({
      ...row,
      analysedWith: sectionTextOf(draft),
    }));
    const input = inputOf(basis, [{ id: 'm1', draft: { ...draft, combinations } }]);
    expect(input.members[0]?.combinations[0]).toMatchObject({
      analysedWith: 'Tube250mm×150mm×10mm',
    });
  });
});
