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

/** Moments of one plane. Values are in the bending sense: equal signs are single curvature. */
export interface PlaneDrawing {
  readonly plane: Plane;
  readonly endA: NamedDrawn;
  readonly endB: NamedDrawn;
  /** Axial parameter kL of the exact solution, null where none exists or none is wanted. */
  readonly kL: number | null;
  /** Largest second-order moment, signed like the larger end moment, and where it lies. */
  readonly largest: (NamedDrawn & { readonly place: Place }) | null;
  /** The moment the strength check uses, signed like the larger end moment, where it is another. */
  readonly required: NamedDrawn | null;
}

export interface MemberDrawing {
  readonly mark: string;
  readonly section: string;
  readonly length: Drawn;
  /** Depth and flange width of the section, mm; null where the record has none. */
  readonly depth: number | null;
  readonly width: number | null;
  /** Buckling and unbraced lengths. */
  readonly lengths: readonly NamedDrawn[];
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
  /** Pr/Pc. */
  readonly axial: number;
  /** Mrx/Mcx + Mry/Mcy. */
  readonly moment: number;
  readonly ratio: number;
  readonly ratioText: string;
}
