import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import {
  availableMajor,
  ltbRange,
  type MajorSection,
  majorSection,
  type SegmentRange,
} from './major-flexure.ts';
import type { SectionQuantities, SteelQuantities } from './section-quantities.ts';

export type Side = 'top' | 'bottom';

/** Major-axis strength by the flange in compression; both are one but for singly symmetric shapes. */
export interface MajorStrengths {
  readonly top: MajorSection | null;
  readonly bottom: MajorSection | null;
  /** Strength that depends neither on a segment nor on a diagram. */
  readonly fixed: Quantity | null;
  /** The range of an unbraced length that is stated for the whole member. */
  readonly range: SegmentRange | null;
  readonly sided: boolean;
}

/** Member lines of major-axis flexure for the flanges that some combination compresses. */
export function majorStrengths(
  r: Recorder,
  steel: SteelQuantities,
  section: SectionQuantities,
  longest: Quantity | null,
  phib: Quantity,
): MajorStrengths {
  if (section.kind !== 'mono-i') {
    const both = majorSection(r, steel, section, 'top', longest, phib);
    return { top: both, bottom: both, fixed: null, range: null, sided: false };
  }
  const side = (compressed: Side): MajorSection | null => {
    const rs = r.within(compressed);
    rs.section('F', `The ${compressed} flange in compression`, clause('F1'));
    return majorSection(rs, steel, section, compressed, longest, phib);
  };
  return { top: side('top'), bottom: side('bottom'), fixed: null, range: null, sided: true };
}

/**
 * Available strength of one segment for the flanges that its moments compress; the lower of both
 * where they compress both. `Cb` is asked for only where lateral-torsional buckling needs it and
 * may answer null, after a notice, where that buckling cannot be checked.
 */
export function segmentStrength(
  r: Recorder,
  design: 'LRFD' | 'ASD',
  major: MajorStrengths,
  sides: readonly Side[],
  Lb: Quantity,
  Cb: () => Quantity | null,
): Quantity | null {
  let factor: Quantity | null | undefined;
  const strengths = sides.map((side) => {
    const m = major[side];
    if (!m) return null;
    const rs = major.sided ? r.within(side) : r;
    const range = major.range ?? ltbRange(rs, m, Lb);
    if (range.needsCb && factor === undefined) factor = Cb();
    if (range.needsCb && !factor) return null;
    rs.section(
      'F',
      `Major-axis flexural strength${major.sided ? `, ${side} flange in compression` : ''}`,
      clause(m.clause),
    );
    return availableMajor(rs, design, m, range, factor ?? null);
  });
  if (strengths.some((s) => s === null)) return null;
  const found = strengths.filter((s) => s !== null);
  const [only] = found;
  if (found.length <= 1) return only ?? null;
  return r.governing('F1/x/Mc', 'min', found, {
    title: 'Available flexural strength for moments of both signs',
    symbol: 'Mcx',
    clause: clause('F1'),
  });
}

/** The range of an unbraced length stated for the whole member, once for all combinations. */
export function withStatedLength(
  r: Recorder,
  major: MajorStrengths,
  Lb: Quantity | null,
): MajorStrengths {
  if (major.sided || !major.top || !Lb) return major;
  return { ...major, range: ltbRange(r, major.top, Lb) };
}

/** The strength where it is the same under every combination: Cb given, or not needed. */
export function fixedStrength(
  r: Recorder,
  design: 'LRFD' | 'ASD',
  major: MajorStrengths,
  Cb: Quantity | null,
): MajorStrengths {
  const { top, range } = major;
  if (!top || !range || (range.needsCb && !Cb)) return major;
  return { ...major, fixed: availableMajor(r, design, top, range, Cb) };
}
