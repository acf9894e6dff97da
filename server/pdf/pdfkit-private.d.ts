/// <reference types="pdfkit" />
/** The members of PDFKit 0.20 used here that its type declarations leave out. */
declare namespace PDFKit {
  /** A font opened from a file: shapes text and adds its glyphs to the embedded subset. */
  interface EmbeddedFont {
    readonly id: string;
    readonly name: string;
    /** 1/1000 em. */
    readonly ascender: number;
    readonly descender: number;
    readonly capHeight: number;
    readonly xHeight: number;
    /** Hexadecimal glyph ids of the subset, and per glyph its advances in 1/1000 em. */
    encode(
      text: string,
      features?: readonly string[],
    ): [string[], { xAdvance: number; xOffset: number; yOffset: number; advanceWidth: number }[]];
    ref(): object;
    readonly font: { hasGlyphForCodePoint(codePoint: number): boolean };
  }

  interface PDFDocument {
    readonly _font: EmbeddedFont;
    /** Called by `end()` once the Info dictionary is written; writes the XMP from `info`. */
    endMetadata(): void;
  }

  interface PDFPage {
    readonly fonts: Record<string, object>;
  }
}

declare namespace PDFKit.Mixins {
  interface PDFAttachmentOptions {
    /** AFRelationship of PDF/A-3. */
    relationship?: 'Data' | 'Source' | 'Supplement' | 'Unspecified';
  }

  interface AnnotationOption {
    /** The structure element that holds the annotation. */
    structParent?: PDFKit.PDFStructureElement;
  }

  interface StructureElementOptions {
    /** Of a table's head cell. */
    scope?: 'Column' | 'Row';
  }
}
