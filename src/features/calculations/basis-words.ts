import type { BasisDraft } from '#shared/contracts/calculations.ts';
import type { Provision } from '#shared/members/input.ts';

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

export const swayWords: Words<BasisDraft['analysis']['sway']> = [
  { value: 'none', text: 'no: held against it' },
  { value: 'B2', text: 'yes: amplified by B2, Appendix 8' },
];

export const provisionWords: readonly {
  readonly value: Provision;
  readonly text: string;
  readonly about: string;
}[] = [
  {
    value: 'H1.3',
    text: 'Out-of-plane check apart where bending is about the major axis alone',
    about: 'H1.3, for doubly symmetric rolled compact members; the ordinary check stays beside it.',
  },
  {
    value: 'H2',
    text: 'Stresses added at the points of the section',
    about: 'H2, beside H1.1.',
  },
  {
    value: 'H1.2-Cb',
    text: 'Axial tension raises Cb',
    about: 'H1.2, for doubly symmetric members in tension.',
  },
  {
    value: 'C2.3-taub',
    text: 'τb = 1, with further notional loads in the analysis',
    about: 'C2.3(c): 0.001 of the gravity load at each level, beside those of C2.2b.',
  },
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
    ...(basis.analysis.sway === 'B2' ? ['sway by B2'] : []),
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
