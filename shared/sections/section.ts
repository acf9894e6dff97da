import type { SectionSizes } from './sizes.ts';
import { sizesName } from './sizes.ts';
import type { Shape } from './table.ts';

/** A member's section: a row of a table, or sizes of its own. */
export type Section =
  | { readonly by: 'table'; readonly shape: Shape }
  | { readonly by: 'sizes'; readonly sizes: SectionSizes };

/** What the section is called: `W12X79`, `Box 20 in × 12 in × 1 in × 0.5 in`. */
export const sectionName = (section: Section): string =>
  section.by === 'table' ? section.shape.designation : sizesName(section.sizes);
