import { expect, it } from 'vitest';
import type { BasisDraft } from './calculations.ts';
import { inputOf } from './draft-input.ts';
import { problemsOf, problemsOfMember } from './draft-problems.ts';
import type { DraftQuantity } from './draft-quantity.ts';
import type { MemberDraft } from './members.ts';

const none: DraftQuantity = { text: '', confirmed: false };
const typed = (text: string): DraftQuantity => ({ text, confirmed: true });

const basis: BasisDraft = {
  ...{ standard: 'aisc360-22', design: 'ASD', units: 'si', constants: 'us' },
  analysis: {
    ...{ method: 'direct', secondOrder: 'exact', includesMemberEffect: null, sway: 'none' },
    ...{ swaySource: 'S-1', notionalLoads: '', program: '', file: '' },
  },
  buildingCode: { name: '', year: '', amendments: '' },
  ...{ adoptedEdition: '', loadStandard: '', assumptions: '' },
};

const draft: MemberDraft = {
  ...{ mark: 'C-1', place: 'grid 1', section: typed('W12X79'), material: 'A992', ownSteel: null },
  ...{ ends: typed('held'), length: typed(' 4 m '), Lcx: none, Lcy: none, Lcz: none, Lb: none },
  ...{ Cb: none, endMomentSign: '' },
  combinations: [
    {
      ...{ id: 'c1', name: 'D + L', design: 'ASD', P: none, MxA: none, MxB: none },
      ...{ MyA: typed('1 kN m'), MyB: none, MxMax: none, MyMax: none },
    },
  ],
};

it('gives what is typed and leaves out what is empty', () => {
  const source = { kind: 'typed' };
  expect(inputOf(basis, [{ id: 'm1', draft }])).toEqual({
    ...{ format: 1, standard: 'aisc360-22', design: 'ASD', units: 'si', constants: 'us' },
    analysis: {
      method: 'direct',
      secondOrder: 'exact',
      sway: { value: 'none', source: { kind: 'typed', note: 'S-1' }, confirmed: true },
    },
    members: [
      {
        ...{ id: 'm1', mark: 'C-1', material: 'A992' },
        section: { value: 'W12X79', source, confirmed: true },
        ends: { value: 'held', source, confirmed: true },
        length: { value: '4 m', source, confirmed: true },
        combinations: [
          {
            ...{ id: 'c1', name: 'D + L', design: 'ASD' },
            MyA: { value: '1 kN m', source, confirmed: true },
          },
        ],
      },
    ],
  });
});

it('gives a steel of the user, and a row number as a number', () => {
  const source = { kind: 'file', file: 'mill.csv', row: '7' } as const;
  const ownSteel = { name: 'Old steel', Fy: '220 MPa', Fu: '', source, confirmed: false };
  const input = inputOf(basis, [{ id: 'm1', draft: { ...draft, ownSteel } }]);
  expect(input.members[0]?.material).toEqual({
    ...{ name: 'Old steel', Fy: '220 MPa', confirmed: false },
    source: { kind: 'file', file: 'mill.csv', row: 7 },
  });
  const wordy = { ...ownSteel, source: { ...source, row: 'seven' } };
  const other = inputOf(basis, [{ id: 'm1', draft: { ...draft, ownSteel: wordy } }]);
  expect(other.members[0]?.material).toMatchObject({ source: { kind: 'file', file: 'mill.csv' } });
});

it('names a problem by the field of the form, or by the mark within the whole', () => {
  const member = { id: 'm1', draft };
  expect(problemsOfMember(basis, member).map(({ path }) => path)).toEqual(['combinations[0].P']);
  const problems = problemsOf(basis, [member]);
  expect(problems.map(({ path }) => path)).toEqual(['members[C-1].combinations[0].P']);
});
