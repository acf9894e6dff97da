import type { TextFace } from './font-files.ts';
import type { FontSet, ShapedRun } from './font-set.ts';

/** A part of a text set in one go: offset, rise and font size in em of the text's size. */
export interface TextRun {
  readonly x: number;
  readonly rise: number;
  readonly scale: number;
  readonly shaped: ShapedRun;
}

export interface SetText {
  readonly width: number;
  readonly runs: readonly TextRun[];
  /** The glyphs don't say the text: it needs ActualText. */
  readonly altered: boolean;
}

/** Stands for a character that a face lacks. */
const replacement = '\ufffd';

/** The thin space of IBM Plex is too thin between thousands; em. */
const thinSpace = { character: '\u2009', width: 0.19 };

/** IBM Plex has superscript digits but no superscript minus: a small raised one. */
const superMinus = { character: '⁻', drawn: '−', rise: 0.31, scale: 0.58 };

/**
 * Sets a text in a face. A character that the face lacks becomes the replacement sign, so that
 * nobody's name stops a report; the text itself stays as ActualText.
 */
export function setText(fonts: FontSet, face: TextFace, text: string): SetText {
  const runs: TextRun[] = [];
  let x = 0;
  const add = (part: string, rise: number, scale: number): void => {
    const shaped = fonts.shape(face, part);
    runs.push({ x, rise, scale, shaped });
    x += part === thinSpace.character ? thinSpace.width : shaped.width * scale;
  };
  const drawable = (part: string): string =>
    [...part.replace(/\s(?<![\u00a0\u2009\u202f])/g, ' ')]
      .map((character) => (fonts.has(face, character) ? character : replacement))
      .join('');
  let altered = false;
  for (const [index, part] of text.split(superMinus.character).entries()) {
    if (index > 0) add(superMinus.drawn, superMinus.rise, superMinus.scale);
    const drawn = drawable(part);
    altered ||= index > 0 || drawn !== part;
    for (const run of drawn.split(/(\u2009)/)) if (run !== '') add(run, 0, 1);
  }
  return { width: x, runs, altered };
}
