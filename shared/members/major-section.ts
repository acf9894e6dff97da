import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import type { LtbClause, LtbLimits } from '../standards/aisc360-22/ltb-range.ts';

/** A segment within the ranges where lateral-torsional buckling reduces the strength. */
export interface BuckledSegment {
  readonly range: 'inelastic' | 'elastic';
  readonly Lb: Quantity;
  readonly Cb: Quantity;
}

/** How a member's segments buckle: the limits written once, and the strength of one segment. */
export interface MajorLtb {
  readonly words: LtbClause;
  readonly limits: LtbLimits;
  readonly strength: (r: Recorder, segment: BuckledSegment) => Quantity;
}

/** Major-axis strength as far as it depends neither on an unbraced length nor on Cb. */
export interface MajorSection {
  /** Plastic moment FyZx, with the limit of its clause; with a slender web (F5) Rpg Fy Sxc. */
  readonly Mp: Quantity;
  /** φb or Ωb. */
  readonly phib: Quantity;
  /** Clause of the strength: `F2` to `F5`, `F7`, `F8`. */
  readonly clause: string;
  /** Key of the governing line without the part: `F2/Mn` (F2 and F3), `F4/Mn`, `F7/x/Mn` … */
  readonly key: string;
  /** Yielding of the section or of its compression flange, which LTB cannot exceed. */
  readonly yielding: Quantity;
  /** Local buckling and tension flange yielding, as far as they apply. */
  readonly others: readonly Quantity[];
  /** null for a section whose bending does not buckle laterally. */
  readonly ltb: MajorLtb | null;
  /** Elements of an I-shape or a channel with a compact web, with their compact limits. */
  readonly elements?: Readonly<Record<'flange' | 'web', ElementLimit>>;
}

/** A width-to-thickness ratio with its compact limit in flexure (Table B4.1b). */
export interface ElementLimit {
  readonly lambda: Quantity;
  readonly lambdap: Quantity;
}
