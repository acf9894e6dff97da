import {
  designationsOf,
  type Family,
  findShape,
  type Property,
  type Shape,
} from '../sections/table.ts';

/** Kinds of sections that can be searched, in the order of lists. */
export const SEARCH_FAMILIES = [
  ...(['W', 'M', 'S', 'HP', 'C', 'MC'] as const),
  ...(['rectangular HSS', 'square HSS', 'round HSS', 'pipe'] as const),
] as const;
export type SearchFamily = (typeof SEARCH_FAMILIES)[number];

/** The kind of a shape of the tables. */
export function searchFamilyOf(shape: Shape): SearchFamily {
  if (shape.kind !== 'rect-hss') return shape.family;
  return shape.properties.Ht.value === shape.properties.B.value ? 'square HSS' : 'rectangular HSS';
}

/** Overall depth as published: d, Ht or the outside diameter. */
export function depthOf(shape: Shape): Property {
  switch (shape.kind) {
    case 'i':
    case 'channel':
      return shape.properties.d;
    case 'rect-hss':
      return shape.properties.Ht;
    case 'round':
      return shape.properties.D;
  }
}

/** Overall width as published: bf, B or the outside diameter. */
export function widthOf(shape: Shape): Property {
  switch (shape.kind) {
    case 'i':
    case 'channel':
      return shape.properties.bf;
    case 'rect-hss':
      return shape.properties.B;
    case 'round':
      return shape.properties.D;
  }
}

/** Limits in mm, each inclusive; null: none. */
export interface SizeLimits {
  readonly minDepth: number | null;
  readonly maxDepth: number | null;
  readonly minWidth: number | null;
  readonly maxWidth: number | null;
}

export const NO_LIMITS: SizeLimits = {
  ...{ minDepth: null, maxDepth: null, minWidth: null, maxWidth: null },
};

// A typed 14.7 in and the table's are the same number; only its last bits may differ by the unit.
const SAME = 1e-9;

const within = (value: number, least: number | null, most: number | null): boolean =>
  (least === null || value >= least * (1 - SAME)) && (most === null || value <= most * (1 + SAME));

/**
 * All shapes of a kind that keep to the limits, the lightest first by published weight; of equal
 * weight in the table's order.
 */
export function candidatesOf(family: SearchFamily, limits: SizeLimits): readonly Shape[] {
  const table: Family = family === 'rectangular HSS' || family === 'square HSS' ? 'HSS' : family;
  return designationsOf(table)
    .flatMap((designation) => findShape(designation) ?? [])
    .filter(
      (shape) =>
        searchFamilyOf(shape) === family &&
        within(depthOf(shape).value, limits.minDepth, limits.maxDepth) &&
        within(widthOf(shape).value, limits.minWidth, limits.maxWidth),
    )
    .toSorted((a, b) => a.weight - b.weight);
}
