/**
 * What the figures draw: quantities read from a record, each with its value in base units (for the
 * geometry) and its printed form (for the label).
 */
export interface Drawn {
  readonly value: number;
  /** Printed form with unit, as the sheet prints it: `134.4 kip ft`. */
  readonly text: string;
}

export interface NamedDrawn extends Drawn {
  readonly symbol: string;
}

export type Plane = 'major' | 'minor';

/** A place along the member: distance from end A, mm, and how it is said: `at 9.27 ft`, `at end A`. */
export interface Place {
  readonly value: number;
  readonly words: string;
}

export type Hold = 'in-plane' | 'top' | 'bottom' | 'centre' | 'twist';

/** A point between the ends at which the member is held. */
export interface HeldPoint {
  readonly name: string;
  /** Distance from end A. */
  readonly place: Drawn;
  readonly holds: ReadonlySet<Hold>;
  /** What it holds, as the sheet says it. */
  readonly words: string;
}

/** A load between the ends: values are positive where it bends a simply supported member upwards. */
export type LoadDrawing = {
  /** `load 1` */
  readonly name: string;
  /** Where it acts on the section; at the centre in the minor plane. */
  readonly height: 'top' | 'centre' | 'bottom';
  readonly heightWords: string;
} & (
  | { readonly kind: 'point'; readonly force: Drawn; readonly at: Drawn }
  | {
      readonly kind: 'line';
      /** Distances from end A, mm. */
      readonly from: number;
      readonly to: number;
      /** `from 2 ft to 9 ft`; empty over the whole member. */
      readonly reach: string;
      /** Line load where it starts and where it ends; one object for a uniform load. */
      readonly start: Drawn;
      readonly end: Drawn;
    }
);

/** A stretch between two points held in the plane of bending; mm, and moments in the bending sense. */
export interface BayDrawing {
  readonly from: number;
  readonly to: number;
  readonly MA: number;
  readonly MB: number;
  /**
   * Axial parameter kL of the second order, null where none exists or none is wanted; 0 without
   * axial force.
   */
  readonly kL: number | null;
}

/** A moment that has a line and a place in the diagram. */
export interface MomentMark extends Drawn {
  readonly place: Place;
  /** The moments beside it are lower; else they are higher. */
  readonly crest: boolean;
}

/** The moment that a check uses, over the stretch that it is for. */
export interface MomentLevel extends Drawn {
  readonly from: number;
  readonly to: number;
}

/** Shear of first order. */
export interface ShearDrawing {
  /** The largest, as the check uses it. */
  readonly used: Drawn;
  /** It is a given one, not one of the diagram. */
  readonly given: boolean;
  readonly marks: readonly { readonly at: number; readonly value: number; readonly text: string }[];
}

/** Moments of one plane. Values are in the bending sense: equal signs are single curvature. */
export interface PlaneDrawing {
  readonly plane: Plane;
  readonly endA: NamedDrawn;
  readonly endB: NamedDrawn;
  /** Moments over points that hold the member in this plane. */
  readonly supports: readonly MomentMark[];
  readonly loads: readonly LoadDrawing[];
  /** From A to B; none where the moments between the ends are not known. */
  readonly bays: readonly BayDrawing[];
  /** The axial force is tension. */
  readonly tension: boolean;
  /** Moments from lateral translation are on another diagram. */
  readonly swayed: boolean;
  /** Largest second-order moment (in tension: first-order) with its sign, and where it lies. */
  readonly largest: (NamedDrawn & MomentMark) | null;
  /** Other extremes between the ends of bays. */
  readonly extremes: readonly MomentMark[];
  /** The moments that the strength checks use, where they are others, with the sign of the curve. */
  readonly required: readonly MomentLevel[];
  readonly shear: ShearDrawing | null;
}

/** A length cut in pieces between held points, from A to B. */
export interface LengthChain {
  readonly symbol: string;
  readonly pieces: readonly NamedDrawn[];
  /** Index of the piece that governs, where one does. */
  readonly governs: number | null;
  /** What stands at the end of the chain. */
  readonly words: string;
}

export interface MemberDrawing {
  readonly mark: string;
  readonly section: string;
  readonly length: Drawn;
  /** Depth and flange width of the section, mm; null where the record has none. */
  readonly depth: number | null;
  readonly width: number | null;
  /** Buckling and unbraced lengths whose place is not known. */
  readonly lengths: readonly NamedDrawn[];
  /** Those that lie between held points. */
  readonly chains: readonly LengthChain[];
  readonly held: readonly HeldPoint[];
  /** Compression positive. */
  readonly axial: NamedDrawn | null;
  readonly planes: readonly PlaneDrawing[];
}

/** Outline of a section, mm. */
export type SectionDrawing = { readonly section: string } & (
  | {
      readonly form: 'i';
      readonly depth: NamedDrawn;
      readonly top: PlateDrawn;
      readonly bottom: PlateDrawn;
      readonly web: NamedDrawn;
      /** From the top face. */
      readonly centroid: number;
    }
  | {
      readonly form: 'channel';
      readonly depth: NamedDrawn;
      readonly flange: PlateDrawn;
      readonly web: NamedDrawn;
      /** From the back of the web. */
      readonly centroid: number;
    }
  | {
      /** Flange and web thickness are one for a tube of one wall; `radius` outside, 0 for plates. */
      readonly form: 'box';
      readonly depth: NamedDrawn;
      readonly flange: PlateDrawn;
      readonly web: NamedDrawn;
      readonly radius: number;
    }
  | { readonly form: 'round'; readonly diameter: NamedDrawn; readonly wall: NamedDrawn }
);

export interface PlateDrawn {
  readonly width: NamedDrawn;
  readonly thickness: NamedDrawn;
}

/** One combination in the interaction diagram. */
export interface InteractionPoint {
  readonly combination: string;
  /** The segment whose check governs: `2`; null where the member is one. */
  readonly segment: string | null;
  /** Pr/Pc; negative in tension. */
  readonly axial: number;
  /** Mrx/Mcx + Mry/Mcy. */
  readonly moment: number;
  readonly ratio: number;
  readonly ratioText: string;
}
