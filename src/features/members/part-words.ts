import type { LoadText } from '#shared/contracts/draft-input-parts.ts';
import type {
  DraftChart,
  DraftLoad,
  DraftSizes,
  DraftSwayDirection,
  SizeName,
  SpringName,
  SwayName,
} from '#shared/contracts/draft-parts.ts';
import type { LoadHeight } from '#shared/members/load-input.ts';
import type { Hold } from '#shared/members/restraint-input.ts';
import { type FieldWords, words } from './member-fields.ts';

interface Word<T extends string> {
  readonly value: T;
  readonly text: string;
  readonly about: string;
}

/** What a point may hold, from one face of the section to the other. */
export const holdWords: readonly Word<Hold>[] = [
  { value: 'in-plane', text: 'in plane', about: 'Movement in the plane of major-axis bending' },
  {
    value: 'top',
    text: 'top',
    about: 'Sideways movement of the top flange, which a positive moment about x compresses',
  },
  { value: 'centre', text: 'centre', about: 'Sideways movement at the shear centre' },
  { value: 'bottom', text: 'bottom', about: 'Sideways movement of the bottom flange' },
  { value: 'twist', text: 'twist', about: 'Rotation about the member’s own axis' },
];

export const holdText = (hold: Hold): string =>
  holdWords.find(({ value }) => value === hold)?.text ?? hold;

export const sizedShapeWords: Readonly<Record<DraftSizes['shape'], string>> = {
  i: 'welded I',
  'mono-i': 'welded I, unequal',
  box: 'welded box',
  tube: 'rectangular tube',
  round: 'round tube',
};

export const sizeWords: Readonly<Record<SizeName, FieldWords>> = {
  d: words('Depth', 'd', 'd', 'Overall depth.'),
  bf: words('Flange width', 'b_f', 'b f', 'Both flanges.'),
  tf: words('Flange', 't_f', 't f', 'Thickness of the flanges.'),
  tw: words('Web', 't_w', 't w', 'Thickness of the web, or of each web of a box.'),
  bfTop: words(
    'Top, width',
    'b',
    'b f top',
    'The flange that a positive moment compresses.',
    false,
  ),
  tfTop: words(
    'Top, thickness',
    't',
    't f top',
    'The flange that a positive moment compresses.',
    false,
  ),
  bfBottom: words('Bottom, width', 'b', 'b f bottom', 'The other flange.', false),
  tfBottom: words('Bottom, thickness', 't', 't f bottom', 'The other flange.', false),
  B: words('Width', 'B', 'B', 'Outside width.'),
  Ht: words('Height', 'H', 'H', 'Outside height, not less than the width.'),
  t: words('Wall', 't', 't', 'Thickness of the wall.'),
  Ro: words('Corner radius', 'R', 'R', 'Outside; empty is twice the wall thickness.', false),
  D: words('Diameter', 'D', 'D', 'Outside diameter.'),
};

export const wallWords: Readonly<Record<DraftSizes['wall'], string>> = {
  '': 'choose',
  nominal: 'nominal',
  design: 'design (B4.2)',
};

export const heightWords: readonly Word<LoadHeight>[] = [
  { value: 'top', text: 'top', about: 'On the flange that a positive moment compresses' },
  { value: 'centre', text: 'centre', about: 'At the shear centre' },
  { value: 'bottom', text: 'bottom', about: 'On the other flange' },
];

export const loadKindWords: Readonly<Record<DraftLoad['kind'], string>> = {
  whole: 'uniform, all along',
  part: 'uniform, over a part',
  varying: 'varying',
  point: 'at a point',
};

export const loadWords: Readonly<Record<LoadText, FieldWords>> = {
  w: words('Load', 'w', 'w', 'Load per length; positive bends as gravity does on two supports.'),
  wFrom: words('Where it starts', 'w', 'w at the start', 'Load per length where it starts.', false),
  wTo: words('Where it ends', 'w', 'w at the end', 'Load per length where it ends.', false),
  W: words('Load', 'W', 'W', 'Positive bends as gravity does on two supports.'),
  at: words('From end A', 'z', 'to the load', 'Distance of the load from end A.', false),
  from: words('Starts, from A', 'z', '', 'Distance from end A.', false),
  to: words('Ends, from A', 'z', '', 'Distance from end A.', false),
};

export const springWords: Readonly<Record<SpringName, FieldWords>> = {
  xA: words(
    'Spring, major, A',
    'k',
    '',
    'Against rotation about x at end A; empty is a pin.',
    false,
  ),
  xB: words(
    'Spring, major, B',
    'k',
    '',
    'Against rotation about x at end B; empty is a pin.',
    false,
  ),
  yA: words(
    'Spring, minor, A',
    'k',
    '',
    'Against rotation about y at end A; empty is a pin.',
    false,
  ),
  yB: words(
    'Spring, minor, B',
    'k',
    '',
    'Against rotation about y at end B; empty is a pin.',
    false,
  ),
};

export const chartWords: Readonly<Record<'GA' | 'GB', FieldWords>> = {
  GA: words('Joint A', 'G_A', 'G A', 'Columns over girders, ΣEI/L; in practice 10 for a pin.'),
  GB: words('Joint B', 'G_B', 'G B', 'Columns over girders, ΣEI/L; in practice 1 if fixed.'),
};

export const sideswayWords: Readonly<Record<DraftChart['sidesway'], string>> = {
  '': 'choose',
  inhibited: 'held',
  uninhibited: 'free to sway',
};

export const netSectionWords: Readonly<Record<'Ae' | 'An' | 'U', FieldWords>> = {
  Ae: words('Effective area', 'A_e', 'A e', 'Effective net area, An times U (D3).'),
  An: words('Net area', 'A_n', 'A n', 'Net area at the holes (B4.3).'),
  U: words('Shear lag', 'U', 'U', 'Shear lag factor, at most 1 (Table D3.1).'),
};

export const stiffenerWords = words(
  'Clear distance',
  'a',
  'a',
  'Between transverse stiffeners of the web (G2.1).',
);

export const swayAxialWords = words(
  'Axial',
  'P_{lt}',
  'P l t',
  'Axial force from lateral translation; compression is positive.',
);

export const frameWords: Readonly<Record<DraftSwayDirection['frames'], string>> = {
  '': 'choose',
  share: 'carry a part of it',
  braced: 'none: braced',
  'lower bound': 'not known: 0.85',
};

export const swayWords: Readonly<Record<SwayName, FieldWords>> = {
  MA: words('Moment, end A', 'M', 'M A', 'From lateral translation.', false),
  MB: words('Moment, end B', 'M', 'M B', 'From lateral translation.', false),
  Pstory: words('Load', 'P_{story}', 'P story', 'All vertical load that the story carries.'),
  PeStory: words('Critical', 'P_{e,story}', 'P e story', 'Elastic critical load of the story.'),
  H: words('Shear', 'H', 'H', 'Shear of the story, of the forces that the drift is of.'),
  height: words('Height', 'L', 'L', 'Height of the story.'),
  drift: words('Drift', '\\Delta_H', 'delta H', 'First-order drift between the floors.'),
  Pmf: words('On frames', 'P_{mf}', 'P m f', 'Load on columns of moment frames (A-8-8).'),
};
