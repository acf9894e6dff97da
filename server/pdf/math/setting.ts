import { type FaceChange, faceOfClass } from './katex-faces.ts';
import { UnknownLayoutError } from './node-style.ts';

/** What a node inherits: font size in em of the formula's base size, font, alignment in stacks. */
export interface Setting {
  readonly size: number;
  readonly face: Required<FaceChange>;
  readonly align: 'left' | 'center';
}

export const baseSetting: Setting = {
  size: 1,
  face: { family: 'main', bold: false, italic: false },
  align: 'left',
};

/** KaTeX's size1 to size11, in em of size6 (katex.css, `.katex-sizing`). */
const sizes = [0.5, 0.6, 0.7, 0.8, 0.9, 1, 1.2, 1.44, 1.728, 2.074, 2.488];

/** Classes that change the alignment of the stacks inside (katex.css). */
const alignOfClass: Readonly<Record<string, Setting['align']>> = {
  mfrac: 'center',
  'op-limits': 'center',
  'katex-accent': 'center',
  msupsub: 'left',
  'svg-align': 'left',
};

const words = (...lines: string[]): Set<string> => new Set(lines.join(' ').split(' '));

/** Classes without effect on the place of anything: atom kinds and names that only nest. */
const inertClasses = words(
  'katex-display katex katex-html katex-base enclosing text textmd textup mtight',
  'mord mop mbin mrel mopen mclose mpunct minner mspace nobreak allowbreak',
  'sqrt delimcenter op-symbol mult delimsizinginner katex-overline katex-underline',
);

/** Classes that choose another layout (`layout-kinds.ts`) or stand for one of its parts. */
const layoutClasses = words(
  'vlist-t vlist-t2 nulldelimiter katex-strut katex-fix rlap katex-inner katex-vbox',
  'katex-thinbox frac-line overline-line underline-line hide-tail accent-body delimsizing',
);

/** The class names of a node, without KaTeX's empty entries. */
export function classNames(classes: readonly (string | undefined)[]): string[] {
  return classes.flatMap((item) => item?.split(' ') ?? []).filter((item) => item !== '');
}

function sizeFactor(names: readonly string[]): number {
  const level = (pattern: RegExp): number => {
    const found = names.map((name) => pattern.exec(name)?.[1]).find(Boolean);
    const size = sizes[Number(found) - 1];
    if (size === undefined) throw new UnknownLayoutError(`sizing "${names.join(' ')}"`);
    return size;
  };
  return level(/^size(\d+)$/) / level(/^reset-size(\d+)$/);
}

/** The setting within a node of these classes. Throws on a class it doesn't know. */
export function enter(setting: Setting, names: readonly string[]): Setting {
  let { size, face, align } = setting;
  const sized = names.some((name) => name.startsWith('reset-size'));
  if (sized) size *= sizeFactor(names);
  for (const name of names) {
    const change = faceOfClass[name];
    if (change) face = { ...face, ...change };
    if (alignOfClass[name]) align = alignOfClass[name];
    else if (!change && !isKnown(name, names, sized))
      throw new UnknownLayoutError(`class "${name}"`);
  }
  if (names.includes('delimsizing') && !names.includes('mult')) {
    face = { ...face, ...delimiterFace(names) };
  }
  return { size, face, align };
}

function isKnown(name: string, names: readonly string[], sized: boolean): boolean {
  if (inertClasses.has(name) || layoutClasses.has(name)) return true;
  if (/^size\d+$/.test(name)) return sized || names.includes('delimsizing');
  return name === 'katex-sizing' || name === 'fontsize-ensurer' || /^reset-size\d+$/.test(name);
}

function delimiterFace(names: readonly string[]): FaceChange {
  const family = (['size1', 'size2', 'size3', 'size4'] as const).find((name) =>
    names.includes(name),
  );
  if (!family) throw new UnknownLayoutError(`delimiter "${names.join(' ')}"`);
  return { family };
}
