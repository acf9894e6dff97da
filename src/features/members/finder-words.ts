import type { SearchFamily } from '#shared/members/section-candidates.ts';

/** Kinds of sections as a list names them, and one of them in a sentence. */
export const familyWords: Readonly<
  Record<SearchFamily, { readonly title: string; readonly many: string }>
> = {
  W: { title: 'W shapes', many: 'W shapes' },
  M: { title: 'M shapes', many: 'M shapes' },
  S: { title: 'S shapes', many: 'S shapes' },
  HP: { title: 'HP shapes', many: 'HP shapes' },
  C: { title: 'C channels', many: 'C channels' },
  MC: { title: 'MC channels', many: 'MC channels' },
  'rectangular HSS': { title: 'Rectangular HSS', many: 'rectangular HSS' },
  'square HSS': { title: 'Square HSS', many: 'square HSS' },
  'round HSS': { title: 'Round HSS', many: 'round HSS' },
  pipe: { title: 'Pipe', many: 'pipes' },
};
