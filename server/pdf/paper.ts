import type { TextFace } from './font-files.ts';

/** Inks on white paper. */
export const inks = {
  ink: '#1b2025',
  zinc7: '#4b5259',
  zinc5: '#767d84',
  zinc3: '#b9bdc0',
  zinc2: '#d6d8d8',
  zinc1: '#ecebe7',
  oxide: '#8c3322',
  oxide3: '#d9a595',
  oxide2: '#f4e6e0',
  paper: '#ffffff',
} as const;

export type InkName = keyof typeof inks;

/** A way of setting words: faces, size and distance of baselines in points. */
export interface TextStyle {
  readonly face: TextFace;
  readonly strong: TextFace;
  readonly size: number;
  readonly leading: number;
  readonly ink: InkName;
}

const sans = { face: 'ibm-plex-sans-regular', strong: 'ibm-plex-sans-semibold' } as const;
const narrow = {
  face: 'ibm-plex-sans-condensed-regular',
  strong: 'ibm-plex-sans-condensed-semibold',
} as const;
const serif = { face: 'ibm-plex-serif-regular', strong: 'ibm-plex-serif-semibold' } as const;

export const textStyles = {
  prose: { ...serif, size: 9.5, leading: 13.5, ink: 'ink' },
  sentence: { ...serif, size: 9, leading: 12.5, ink: 'ink' },
  title: { ...sans, size: 8.5, leading: 11, ink: 'zinc7' },
  field: { ...sans, size: 9.5, leading: 12.5, ink: 'ink' },
  fact: { ...sans, size: 8.5, leading: 11, ink: 'ink' },
  cell: { ...narrow, size: 8.5, leading: 10.5, ink: 'ink' },
  small: { ...narrow, size: 8, leading: 10, ink: 'zinc7' },
  foot: { ...narrow, size: 6.8, leading: 8.4, ink: 'zinc7' },
  label: { ...narrow, size: 7, leading: 9, ink: 'zinc7' },
} as const satisfies Record<string, TextStyle>;

/** Em size of formulas on a sheet line, points; 1.06 of the text beside them. */
export const mathSize = 10;
/** Formulas within words are larger than them by this. */
export const inlineMath = 1.06;

export const weights = { hair: 0.5, rule: 0.9, strong: 1.3 } as const;

/** The page and the area of its blocks, points from the top left. */
export interface PaperSize {
  readonly name: 'A4' | 'Letter';
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

export const papers: Readonly<Record<PaperSize['name'], PaperSize>> = {
  A4: { name: 'A4', width: 595.28, height: 841.89, left: 56, right: 555, top: 92, bottom: 780 },
  Letter: { name: 'Letter', width: 612, height: 792, left: 60, right: 568, top: 92, bottom: 730 },
};
