import type { GivenValue } from '../calc/quantity.ts';
import { createRecorder } from '../calc/recorder.ts';
import { cleanDesignation } from '../sections/designation.ts';
import type { Section } from '../sections/section.ts';
import { sectionName } from '../sections/section.ts';
import { sizeProblems } from '../sections/size-bounds.ts';
import type { SectionSizes, SectionSizesInput } from '../sections/sizes.ts';
import { findShape } from '../sections/table.ts';
import { axesAlike } from './axes-in-order.ts';
import { type Given, type ReadQuantity, stateOf, TYPED } from './given-values.ts';
import type { Stated } from './resolved.ts';
import { sizedSectionLines } from './sized-section-lines.ts';

type Report = (path: string, message: string) => void;
type Word = Parameters<typeof stateOf<string>>[0];

/** Families of rolled shapes that are in no table here. */
const OTHER_FAMILY = /^(2L|WT|MT|ST|L)\d/;

/**
 * A section by its designation, or by its sizes. `section` is null for a shape of another family
 * (outside scope) and where a problem was reported; paths start with `section`.
 */
export function resolveSection(
  given: Word | SectionSizesInput,
  problem: Report,
  quantity: ReadQuantity,
): { readonly name: Stated<string>; readonly section: Section | null } {
  if (typeof given === 'object' && 'shape' in given) return fromSizes(given, problem, quantity);
  const name = stateOf(given);
  const shape = findShape(name.value);
  if (shape)
    return { name: { ...name, value: shape.designation }, section: { by: 'table', shape } };
  if (!OTHER_FAMILY.test(cleanDesignation(name.value)))
    problem(
      'section',
      `"${name.value}" is in none of the tables of W, M, S, HP, C, MC, HSS and pipe (AISC Shapes Database v15.0); write it like W12X79, C15X33.9, HSS8X6X1/2, HSS6.000X0.375, Pipe8STD, or give its sizes`,
    );
  return { name, section: null };
}

function fromSizes(given: SectionSizesInput, problem: Report, quantity: ReadQuantity) {
  const own = { source: given.source ?? TYPED, confirmed: given.confirmed ?? false };
  let sound = true;
  const report = (size: string, message: string) => {
    sound = false;
    problem(size === '' ? 'section' : `section.${size}`, message);
  };
  const sizes = readSizes(given, (size, value) => {
    const read = quantity(`section.${size}`, value, 'length');
    if (read && !(read.value > 0)) report(size, `is ${read.text}; it must be above zero`);
    // The source and state of the section hold for a size that has none of its own.
    return read && typeof value === 'string' ? { ...read, ...own } : read;
  });
  if (sizes && sound) {
    for (const { size, message } of sizeProblems(sizes)) report(size, message);
    if (sound && !majorFirst(sizes))
      report('', 'has Iy above Ix; x is the major axis: turn the section');
  }
  const section: Section | null = sizes && sound ? { by: 'sizes', sizes } : null;
  return { name: { value: section ? sectionName(section) : 'Section by sizes', ...own }, section };
}

const WORDS: ReadonlySet<string> = new Set(['shape', 'source', 'confirmed', 'wall']);

/** null where a size could not be read. */
function readSizes(
  given: SectionSizesInput,
  read: (size: string, value: Given) => GivenValue | null,
): SectionSizes | null {
  const values = Object.entries(given).flatMap(([name, value]) =>
    WORDS.has(name) || value === undefined ? [] : [[name, read(name, value as Given)] as const],
  );
  if (values.some(([, value]) => value === null)) return null;
  return {
    shape: given.shape,
    ...('wall' in given ? { wall: given.wall } : {}),
    ...(given.shape === 'tube' ? { Ro: null } : {}),
    ...Object.fromEntries(values),
  } as SectionSizes;
}

/** Ix ≥ Iy by the section's own formulas; the wall of a tube, which the steel decides, matters not. */
function majorFirst(sizes: SectionSizes): boolean {
  const steel = { kind: 'own', name: '', Fy: ANY, Fu: null } as const;
  const section = sizedSectionLines(createRecorder(''), sizes, steel);
  return axesAlike(section) || section.Ix.value >= section.Iy.value;
}
const ANY: GivenValue = { value: 1, text: '', source: TYPED, confirmed: false };
