import type { Summary } from '#shared/calc/record.ts';
import type { RunSection, SectionSearch } from '#shared/members/find-sections.ts';
import { depthOf, widthOf } from '#shared/members/section-candidates.ts';
import { findShape, type Property } from '#shared/sections/table.ts';
import { printNumber } from '#shared/units/format.ts';

export interface FinderRow {
  readonly designation: string;
  readonly weight: number;
  readonly depth: Property;
  readonly width: Property;
  /** null: the present section, while its inputs cannot be run. */
  readonly summary: Summary | null;
  readonly isPresent: boolean;
  /** Whether it satisfies every check, so that it can be taken. */
  readonly isFound: boolean;
}

/**
 * What was found, by weight, with the present section in its place. A section by sizes has no place
 * in a table of weights and gets no row.
 */
export function finderRows(
  search: SectionSearch | null,
  present: { readonly designation: string; readonly summary: Summary | null },
): readonly FinderRow[] {
  const shape = findShape(present.designation);
  const row = (
    designation: string,
    summary: Summary | null,
    isFound: boolean,
  ): readonly FinderRow[] => {
    const of = findShape(designation);
    if (!of) return [];
    const isPresent = designation === shape?.designation;
    const { weight } = of;
    return [
      { designation, weight, depth: depthOf(of), width: widthOf(of), summary, isPresent, isFound },
    ];
  };
  const found = (search?.found ?? []).flatMap(({ designation, summary }: RunSection) =>
    row(designation, summary, true),
  );
  if (!shape || found.some(({ isPresent }) => isPresent)) return found;
  const own = row(shape.designation, present.summary, false);
  return [...found, ...own].toSorted((a, b) => a.weight - b.weight);
}

/** A published size as the unit set of the calculation reads it. */
export const sizeText = ({ value, published }: Property, units: 'us' | 'si'): string =>
  units === 'us' ? published : `${printNumber(value, { dec: 0 }).text} mm`;

/** How much lighter or heavier than another weight, in the table's lb/ft: `−7`, `+12.4`. */
export function weightAgainst(weight: number, other: number): string {
  const difference = weight - other;
  if (difference === 0) return '0';
  // Published weights have at most two decimals; what is more comes of binary fractions.
  const size = String(Number(Math.abs(difference).toFixed(2)));
  return `${difference < 0 ? '−' : '+'}${size}`;
}
