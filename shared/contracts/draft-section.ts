import { type SectionSizes, sizesName } from '#shared/sections/sizes.ts';
import type { DraftSizes, SizeName } from './draft-parts.ts';
import type { MemberDraft } from './members.ts';

/** The sizes of each shape, in the order of its fields. */
const sizesByShape: Readonly<Record<DraftSizes['shape'], readonly SizeName[]>> = {
  i: ['d', 'bf', 'tf', 'tw'],
  'mono-i': ['d', 'tw', 'bfTop', 'tfTop', 'bfBottom', 'tfBottom'],
  box: ['d', 'B', 'tf', 'tw'],
  tube: ['Ht', 'B', 't', 'Ro'],
  round: ['D', 't'],
};

export const sizesOf = ({ shape }: DraftSizes): readonly SizeName[] => sizesByShape[shape];

/** The one size that may be left out: the outside corner radius is then twice the thickness. */
export const mayBeEmpty = (size: SizeName): boolean => size === 'Ro';

export const hasWall = ({ shape }: DraftSizes): boolean => shape === 'tube' || shape === 'round';

/** Whether it is still open what the thickness of a tube is. */
export const lacksWall = (sizes: DraftSizes): boolean => hasWall(sizes) && sizes.wall === '';

/** The section as it is called: the designation as typed, or shape and sizes as records name them. */
export function sectionTextOf({ section, sizes }: MemberDraft): string {
  if (!sizes) return section.text.trim();
  const texts = sizesOf(sizes).map((name) => [name, { text: sizes[name].trim() || '…' }]);
  return sizesName({ shape: sizes.shape, ...Object.fromEntries(texts) } as SectionSizes);
}
