import type { BasisDraft } from '#shared/contracts/calculations.ts';
import type { DraftQuantity } from '#shared/contracts/draft-quantity.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';

const typed = (text: string): DraftQuantity => ({
  text,
  source: { kind: 'typed' },
  confirmed: true,
});

export const basisDraft: BasisDraft = {
  ...{ standard: 'aisc360-22', design: 'LRFD', units: 'us', constants: 'us' },
  analysis: {
    ...{ method: 'direct', secondOrder: 'exact', includesMemberEffect: null, sway: 'none' },
    ...{ swaySource: 'braced frame', notionalLoads: '', program: '', file: '' },
  },
  buildingCode: { name: '', year: '', amendments: '' },
  ...{ adoptedEdition: '', loadStandard: '', assumptions: '' },
};

/** A braced column that is well within its limit. */
export const memberDraft: MemberDraft = {
  ...{ mark: 'C-01', place: 'grid 1/A', section: typed('W12X79') },
  ...{ material: 'A992', ownSteel: null },
  ...{ ends: typed('held'), length: typed('22 ft'), endMomentSign: 'bending' },
  ...{ Lcx: typed('22 ft'), Lcy: typed('22 ft'), Lcz: typed('22 ft'), Lb: typed('22 ft') },
  Cb: typed(''),
  combinations: [
    {
      ...{ id: 'c1', name: '1.2D + 1.6L', P: typed('310 kip') },
      ...{ MxA: typed('118 kip ft'), MxB: typed('104 kip ft') },
      ...{ MyA: typed('18 kip ft'), MyB: typed('18 kip ft') },
      ...{ MxMax: typed(''), MyMax: typed('') },
    },
  ],
};
