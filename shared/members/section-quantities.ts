import type { Quantity } from '../calc/quantity.ts';

/*
 * A section as the procedure sees it: quantities with their lines, by kind of section. Clauses take
 * single quantities out of it. x is the major axis, y the minor; the top flange is the one that a
 * positive moment about x compresses.
 */
interface Common {
  readonly A: Quantity;
  readonly Ix: Quantity;
  readonly Iy: Quantity;
  readonly Sx: Quantity;
  readonly Sy: Quantity;
  readonly Zx: Quantity;
  readonly Zy: Quantity;
  readonly rx: Quantity;
  readonly ry: Quantity;
  readonly J: Quantity;
}

/** Doubly symmetric I-shape: W, M, S, HP, or three plates of one yield stress. */
export interface ISection extends Common {
  readonly kind: 'i';
  readonly made: 'rolled' | 'built-up';
  readonly d: Quantity;
  readonly bf: Quantity;
  readonly tf: Quantity;
  readonly tw: Quantity;
  /** bf/2tf. */
  readonly lambdaf: Quantity;
  /** h/tw. */
  readonly lambdaw: Quantity;
  readonly Cw: Quantity;
  readonly rts: Quantity;
  readonly ho: Quantity;
}

/** One flange of a singly symmetric I-shape, and what the web shows when it is in compression. */
export interface FlangeOfI {
  readonly b: Quantity;
  readonly t: Quantity;
  /** b/2t. */
  readonly lambda: Quantity;
  /** Second moment of area of the flange about the minor axis of the section. */
  readonly Iyf: Quantity;
  /** Elastic modulus of the section referred to this flange's outer face. */
  readonly S: Quantity;
  /** Twice the distance from the centroid to the inside of this flange; below zero: it lies in it. */
  readonly hc: Quantity;
  /** Twice the distance from the plastic neutral axis to the inside of this flange; below zero: it lies in it. */
  readonly hp: Quantity;
}

/** Singly symmetric built-up I-shape, symmetric about y. Sx is the smaller of both faces. */
export interface MonoISection extends Common {
  readonly kind: 'mono-i';
  readonly made: 'built-up';
  readonly d: Quantity;
  readonly tw: Quantity;
  readonly h: Quantity;
  readonly lambdaw: Quantity;
  readonly Cw: Quantity;
  readonly ho: Quantity;
  readonly top: FlangeOfI;
  readonly bottom: FlangeOfI;
  /** Shear centre from the centroid, along y, positive towards the top flange. */
  readonly yo: Quantity;
}

/** C and MC; x is the axis of symmetry. */
export interface ChannelSection extends Common {
  readonly kind: 'channel';
  readonly d: Quantity;
  readonly bf: Quantity;
  readonly tf: Quantity;
  readonly tw: Quantity;
  /** Centroid from the back of the web. */
  readonly xbar: Quantity;
  /** bf/tf. */
  readonly lambdaf: Quantity;
  readonly lambdaw: Quantity;
  readonly Cw: Quantity;
  readonly rts: Quantity;
  readonly ho: Quantity;
  /** Polar radius of gyration about the shear centre. */
  readonly ro: Quantity;
  /** Flexural constant H of E4-8. */
  readonly H: Quantity;
}

/** Square or rectangular HSS; `b` flats are across x-axis bending's flange, `h` its web. */
export interface RectHssSection extends Common {
  readonly kind: 'rect-hss';
  readonly square: boolean;
  /** Outside width (flange of major-axis bending) and outside height. */
  readonly B: Quantity;
  readonly Ht: Quantity;
  /** Design wall thickness. */
  readonly t: Quantity;
  /** b/t and h/t. */
  readonly lambdab: Quantity;
  readonly lambdah: Quantity;
}

/** Box of four welded plates; flanges between or over the webs, clear widths b and h. */
export interface BoxSection extends Common {
  readonly kind: 'box';
  readonly square: boolean;
  readonly b: Quantity;
  readonly h: Quantity;
  readonly tf: Quantity;
  readonly tw: Quantity;
  /** Outside height. */
  readonly d: Quantity;
  /** b/tf and h/tw. */
  readonly lambdab: Quantity;
  readonly lambdah: Quantity;
}

/** Round HSS and pipe. */
export interface RoundSection extends Common {
  readonly kind: 'round';
  readonly D: Quantity;
  readonly t: Quantity;
  /** D/t. */
  readonly lambdad: Quantity;
}

export type SectionQuantities =
  | ISection
  | MonoISection
  | ChannelSection
  | RectHssSection
  | BoxSection
  | RoundSection;
export type SectionKind = SectionQuantities['kind'];

export interface SteelQuantities {
  readonly E: Quantity;
  readonly G: Quantity;
  readonly Fy: Quantity;
  /** null where the steel's own definition doesn't give it. */
  readonly Fu: Quantity | null;
}
