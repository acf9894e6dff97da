import { type Face, fontFile } from './font-files.ts';

/** A shaped run of text: its width in em of its font size and its text-showing operator. */
export interface ShapedRun {
  readonly width: number;
  /** `[<0001 0002> -20 <0003>] TJ`, kerning in it. */
  readonly operator: string;
}

interface OpenFace {
  readonly font: PDFKit.EmbeddedFont;
  readonly runs: Map<string, ShapedRun>;
}

/**
 * The fonts of one PDF document. Shapes each run once; drawing writes the kept operator, which is
 * some hundred times faster than PDFKit's own text call for single glyphs.
 */
export class FontSet {
  readonly #faces = new Map<Face, OpenFace>();
  readonly #doc: PDFKit.PDFDocument;

  constructor(doc: PDFKit.PDFDocument) {
    this.#doc = doc;
  }

  #open(face: Face): OpenFace {
    const known = this.#faces.get(face);
    if (known) return known;
    this.#doc.font(fontFile(face));
    const opened: OpenFace = { font: this.#doc._font, runs: new Map() };
    this.#faces.set(face, opened);
    return opened;
  }

  /** Whether a face has a glyph for a character. */
  has(face: Face, character: string): boolean {
    return this.#open(face).font.font.hasGlyphForCodePoint(character.codePointAt(0) ?? 0);
  }

  /** Shapes a run. Throws if the face has no glyph for a character of it. */
  shape(face: Face, text: string): ShapedRun {
    const { font, runs } = this.#open(face);
    const known = runs.get(text);
    if (known) return known;
    const missing = [...text].find((character) => !this.has(face, character));
    if (missing) throw new Error(`no glyph for "${missing}" of "${text}" in ${face}`);
    const run = shapedRun(...font.encode(text));
    runs.set(text, run);
    return run;
  }

  /** Width of a run, em. */
  width = (face: Face, text: string): number => this.shape(face, text).width;

  /** The resource name of a face on the current page. */
  use(face: Face): string {
    const { font } = this.#open(face);
    this.#doc.page.fonts[font.id] ??= font.ref();
    return font.id;
  }
}

function shapedRun(
  glyphs: readonly string[],
  positions: readonly { xAdvance: number; advanceWidth: number }[],
): ShapedRun {
  let width = 0;
  let operator = '[<';
  for (const [index, glyph] of glyphs.entries()) {
    const { xAdvance, advanceWidth } = positions[index] ?? { xAdvance: 0, advanceWidth: 0 };
    width += xAdvance;
    operator += glyph;
    const kern = Math.round(advanceWidth - xAdvance);
    if (kern !== 0 && index < glyphs.length - 1) operator += `> ${kern} <`;
  }
  return { width: width / 1000, operator: `${operator}>] TJ` };
}
