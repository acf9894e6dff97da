import type { BasisDraft } from '#shared/contracts/calculations.ts';

type Words<T extends string> = readonly { readonly value: T; readonly text: string }[];

export const designWords: Words<BasisDraft['design']> = [
  { value: 'LRFD', text: 'LRFD, load and resistance factors' },
  { value: 'ASD', text: 'ASD, allowable strength' },
];

export const unitWords: Words<BasisDraft['units']> = [
  { value: 'us', text: 'US customary: kip, in, ksi' },
  { value: 'si', text: 'SI: kN, mm, MPa' },
];

export const constantWords: Words<BasisDraft['constants']> = [
  { value: 'us', text: 'E = 29 000 ksi' },
  { value: 'si', text: 'E = 200 000 MPa' },
];

export const methodWords: Words<BasisDraft['analysis']['method']> = [
  { value: 'direct', text: 'direct analysis' },
  { value: 'effective-length', text: 'effective length' },
  { value: 'first-order', text: 'first-order analysis' },
];

export const secondOrderWords: Words<BasisDraft['analysis']['secondOrder']> = [
  { value: 'amplified', text: 'amplified by B1, Appendix 8' },
  { value: 'exact', text: 'exact elastic solution' },
  { value: 'from-analysis', text: 'from the second-order analysis' },
];

const wordFor = <T extends string>(words: Words<T>, value: T) =>
  words.find((word) => word.value === value)?.text ?? value;

const moments: Record<BasisDraft['analysis']['secondOrder'], string> = {
  amplified: 'moments amplified by Appendix 8',
  exact: 'moments by the exact elastic solution',
  'from-analysis': 'moments from a second-order analysis',
};

/** The basis in one line, under a calculation's title. */
export const basisLine = (basis: BasisDraft): string =>
  [
    `ANSI/AISC 360-22, ${basis.design}`,
    wordFor(methodWords, basis.analysis.method),
    moments[basis.analysis.secondOrder],
    basis.units === 'us' ? 'US units' : 'SI units',
  ].join(' · ');

/** What a new calculation begins with; the engineer goes through it on the basis page. */
export const firstBasis: BasisDraft = {
  standard: 'aisc360-22',
  design: 'LRFD',
  units: 'us',
  constants: 'us',
  analysis: {
    method: 'direct',
    secondOrder: 'amplified',
    includesMemberEffect: null,
    sway: 'none',
    swaySource: '',
    notionalLoads: '',
    program: '',
    file: '',
  },
  buildingCode: { name: '', year: '', amendments: '' },
  adoptedEdition: '',
  loadStandard: '',
  assumptions: '',
};
