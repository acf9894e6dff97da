import type { MathFace } from './katex-faces.ts';
import type { Segment } from './svg-path.ts';

/**
 * A measured formula: positioned pieces, ready to draw at any size. Lengths are in em of the
 * formula's base size; x grows to the right from the formula's left edge, y downwards from its
 * baseline.
 */
export interface Formula {
  readonly width: number;
  /** Above and below the baseline. */
  readonly height: number;
  readonly depth: number;
  readonly pieces: readonly Piece[];
}

export type Piece = GlyphRun | Rule | Outline | Mark;

export interface GlyphRun {
  readonly kind: 'glyphs';
  readonly x: number;
  readonly y: number;
  readonly face: MathFace;
  readonly size: number;
  readonly text: string;
  readonly width: number;
}

/** A filled bar; y is its upper edge. */
export interface Rule {
  readonly kind: 'rule';
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly thickness: number;
}

/** A filled outline (radical, tall delimiter), its segments relative to x and y. */
export interface Outline {
  readonly kind: 'outline';
  readonly x: number;
  readonly y: number;
  readonly path: readonly Segment[];
}

/** The box of a `\htmlData` group: draws nothing, carries its attributes (`data-…`). */
export interface Mark {
  readonly kind: 'mark';
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
  readonly depth: number;
  readonly attributes: Readonly<Record<string, string>>;
}

/** The same pieces moved by dx, dy. */
export function movePieces(pieces: readonly Piece[], dx: number, dy: number): Piece[] {
  return pieces.map((piece) => ({ ...piece, x: piece.x + dx, y: piece.y + dy }));
}
