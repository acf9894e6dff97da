import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { availableFlexure } from '../standards/aisc360-22/f1.ts';
import { type LtbRange, ltbRangeOf } from '../standards/aisc360-22/ltb-range.ts';
import type { Design } from '../standards/aisc360-22/parameters.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { axesInOrder } from './axes-in-order.ts';
import { majorClosed, majorRound } from './major-closed.ts';
import { majorChannel, majorI } from './major-i.ts';
import { majorMonoI } from './major-mono-i.ts';
import type { MajorSection } from './major-section.ts';
import type { SectionQuantities, SteelQuantities } from './section-quantities.ts';

export type { MajorSection } from './major-section.ts';

export interface SegmentRange {
  /** False in the yielding range, held continuously, or where there is no such buckling. */
  readonly needsCb: boolean;
  readonly range: LtbRange | null;
  readonly Lb: Quantity;
}

/**
 * Classes of the elements and every strength of F2 to F5, F7, F8 that needs no unbraced length.
 * `compressed` names the flange in compression, which matters for a singly symmetric I-shape only.
 * `longest` is the member's longest unbraced length: null or zero writes no limits, Lr is written
 * only where it exceeds Lp. `phib` is φb or Ωb. Answers null after an outside-scope notice.
 */
export function majorSection(
  r: Recorder,
  steel: SteelQuantities,
  section: SectionQuantities,
  compressed: 'top' | 'bottom',
  longest: Quantity | null,
  phib: Quantity,
): MajorSection | null {
  if (!axesInOrder(r, 'x', section)) return null;
  switch (section.kind) {
    case 'i':
      return majorI(r, steel, section, longest, phib);
    case 'mono-i':
      return majorMonoI(r, steel, section, compressed, longest, phib);
    case 'channel':
      return majorChannel(r, steel, section, longest, phib);
    case 'rect-hss':
    case 'box':
      return majorClosed(r, steel, section, longest, phib);
    case 'round':
      return majorRound(r, steel, section, phib);
  }
}

/**
 * The range of lateral-torsional buckling of a segment of length `Lb`, as a choice line; no line
 * where the section has no such buckling. `Lb` is at most the `longest` of `majorSection`.
 */
export function ltbRange(r: Recorder, m: MajorSection, Lb: Quantity): SegmentRange {
  if (!m.ltb) return { needsCb: false, range: null, Lb };
  const range = ltbRangeOf(r, m.ltb.words, m.ltb.limits, Lb);
  return { needsCb: range === 'inelastic' || range === 'elastic', range, Lb };
}

/**
 * Mn of a segment, the least of its limit states, and its Mc = φb Mn or Mn/Ωb. `Cb` is used only
 * where the range needs it; throws where it is then missing.
 */
export function availableMajor(
  r: Recorder,
  design: Design,
  m: MajorSection,
  segment: SegmentRange,
  Cb: Quantity | null,
): Quantity {
  const { range, Lb } = segment;
  let LTB: Quantity | null = null;
  if (m.ltb && (range === 'inelastic' || range === 'elastic')) {
    if (!Cb) throw new Error(`${m.key}: Cb is missing`);
    LTB = m.ltb.strength(r, { range, Lb, Cb });
  }
  const Mn = r.governing(m.key, 'min', [LTB ?? m.yielding, ...m.others], {
    title: 'Nominal flexural strength, major axis',
    symbol: 'Mnx',
    clause: clause(m.clause),
  });
  return availableFlexure(r, 'x', design, m.phib, Mn);
}

/** Available strength in yielding, φb Mp or Mp/Ωb, that H1.3 takes in the plane. Key `${at}/Mc`. */
export const availableYielding = (
  r: Recorder,
  at: string,
  design: Design,
  m: MajorSection,
): Quantity => availableFlexure(r, 'x', design, m.phib, m.Mp, { at, what: 'yielding strength' });
