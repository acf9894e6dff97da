import type { ActionName, LengthName } from '#shared/contracts/members.ts';

/** Fields of a member that are quantities or words with a source. */
export type StatedName = LengthName | 'section' | 'ends' | 'Cb';

export interface FieldWords {
  readonly label: string;
  readonly tex: string;
  /** What a screen reader says in place of the symbol. */
  readonly spoken: string;
  readonly about: string;
  /** Whether the symbol stands beside the label in the margin. */
  readonly shown: boolean;
}

export const words = (
  label: string,
  tex: string,
  spoken: string,
  about: string,
  shown = true,
): FieldWords => ({ label, tex, spoken, about, shown });

export const lengthWords: Readonly<Record<LengthName, FieldWords>> = {
  length: words('Length', 'L', 'L', 'Between the held ends.'),
  Lcx: words('Buckling', 'L_{cx}', 'L c x', 'Effective length about the major axis x.'),
  Lcy: words('Buckling', 'L_{cy}', 'L c y', 'Effective length about the minor axis y.'),
  Lcz: words('Twisting', 'L_{cz}', 'L c z', 'Effective length for torsional buckling.'),
  Lb: words(
    'Unbraced',
    'L_b',
    'L b',
    'Between braces of the compression flange or against twist; 0 ft where it is held all along.',
  ),
};

export const CbWords = words('Factor', 'C_b', 'C b', 'A number, auto, or empty for 1.0.');

export const actionWords: Readonly<Record<ActionName, FieldWords>> = {
  P: words('Axial', 'P', 'P', 'Compression is positive.'),
  MxA: words('Major, end A', 'M_{xA}', 'M x A', 'Moment about x at end A.', false),
  MxB: words('Major, end B', 'M_{xB}', 'M x B', 'Moment about x at end B.', false),
  MyA: words('Minor, end A', 'M_{yA}', 'M y A', 'Moment about y at end A.', false),
  MyB: words('Minor, end B', 'M_{yB}', 'M y B', 'Moment about y at end B.', false),
  MxMax: words(
    'Major, largest',
    'M_{x,max}',
    'M x max',
    'Largest moment about x from the analysis, anywhere along the member.',
    false,
  ),
  MyMax: words(
    'Minor, largest',
    'M_{y,max}',
    'M y max',
    'Largest moment about y from the analysis, anywhere along the member.',
    false,
  ),
  Vx: words(
    'Shear, major',
    'V_x',
    'V x',
    'Largest shear force from the analysis that goes with bending about x.',
    false,
  ),
  Vy: words(
    'Shear, minor',
    'V_y',
    'V y',
    'Largest shear force from the analysis that goes with bending about y.',
    false,
  ),
};

/** Id of the control of a field, by the path that problems carry (`combinations[0].P`). */
export const controlId = (path: string): string => `input-${path.replace(/[^A-Za-z0-9]+/g, '-')}`;
