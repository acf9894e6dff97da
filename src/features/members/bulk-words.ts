import type { ChangeKind, StatedGroup } from './bulk-change.ts';

/** What can be changed, as the list of it reads. */
export const changeWords: Readonly<Record<ChangeKind, string>> = {
  section: 'Section',
  steel: 'Steel',
  ends: 'Ends',
  length: 'Length L',
  Lcx: 'Buckling length Lcx',
  Lcy: 'Buckling length Lcy',
  Lcz: 'Twisting length Lcz',
  Lb: 'Unbraced length Lb',
  Cb: 'Factor Cb',
  sense: 'Sense of the end moments',
  points: 'Points held, as in another member',
  state: 'Sources and state of values',
};

export const statedWords: Readonly<Record<StatedGroup, string>> = {
  section: 'Section',
  ends: 'Ends',
  length: 'Length L',
  ...{ Lcx: 'Lcx', Lcy: 'Lcy', Lcz: 'Lcz', Lb: 'Lb', Cb: 'Cb' },
  forces: 'Forces and loads of every combination',
};
