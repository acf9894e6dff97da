/** What one marked part of a page says: its glyphs, what they are copied as, what is read aloud. */
export interface Segment {
  /** Number of its page, from 1. */
  readonly page: number;
  /** Text of its glyphs, without spaces. */
  readonly visible: string;
  /** The same by runs of glyphs that stand close together: the labels of a figure. */
  readonly pieces: readonly string[];
  /** Texts that stand in its place when copied (ActualText), without spaces. */
  readonly actual: readonly string[];
  /** Alternative text of its structure element. */
  readonly alt: string | null;
  /** Lowest and highest baseline of its glyphs, points from the foot of the page; null without. */
  readonly baselines: readonly [low: number, high: number] | null;
}

export interface PageText {
  readonly number: number;
  readonly segments: readonly Segment[];
  /** Glyphs of the frame around the page: outside the structure, before its content. */
  readonly frame: string;
  /** Glyphs outside the structure that come after the first content: none on a page as made. */
  readonly loose: string;
  /** Kinds of annotation that are not links. */
  readonly annotations: readonly string[];
}

/** Without spaces of any width, so that line breaks don't matter; one sign for minus. */
export const bare = (text: string): string =>
  text.replace(/[\s\u00ad\u200b\u2060-\u2064]/gu, '').replaceAll('⁻', '−');
