import type { Inline } from '#shared/report/tree.ts';
import type { TextFace } from './font-files.ts';
import type { FontSet } from './font-set.ts';
import type { Item } from './items.ts';
import type { Formula } from './math/formula.ts';
import { setFormula } from './math/set-formula.ts';
import { type InkName, inlineMath, type TextStyle } from './paper.ts';
import { setText } from './text-runs.ts';

/** Finds the anchor of a line from an address in the text, or null where there is none. */
export type LinkOf = (address: string, member?: string) => string | null;

/** A line of words: its items from the left end of its baseline. */
export interface WordLine {
  readonly width: number;
  readonly items: readonly Item[];
  /** Extent above and below the baseline beyond which neighbours must stay. */
  readonly height: number;
  readonly depth: number;
}

interface Word {
  readonly text: string;
  /** Width with and without the space after it. */
  readonly width: number;
  readonly bare: number;
  readonly face: TextFace;
  readonly ink: InkName;
  readonly formula: Formula | null;
  readonly link: string | null;
}

const spaceAfter = /(?<= )/;

/** Breaks inline content into lines no wider than `width` points. */
export function breakWords(
  content: readonly Inline[],
  style: TextStyle,
  width: number,
  fonts: FontSet,
  linkOf: LinkOf,
): WordLine[] {
  const words = content.flatMap((inline) => wordsOf(inline, style, width, fonts, linkOf));
  const lines: Word[][] = [];
  let room = 0;
  let glued = false;
  for (const [index, word] of words.entries()) {
    // Content without a space between two inlines stays on one line.
    // An equals sign goes with the value after it.
    const follower = word.text === '= ' ? (words[index + 1]?.bare ?? 0) : 0;
    const needed = follower > 0 ? word.width + follower : word.bare;
    const fits = needed <= room || (glued && word.formula === null && word.bare < 0.5 * style.size);
    if (lines.length === 0 || !fits) {
      if (word.text === ' ') continue;
      lines.push([]);
      room = width;
    }
    lines.at(-1)?.push(word);
    room -= word.width;
    glued = !word.text.endsWith(' ');
  }
  return lines.map((line) => wordLine(line, style));
}

function wordsOf(
  inline: Inline,
  style: TextStyle,
  width: number,
  fonts: FontSet,
  linkOf: LinkOf,
): Word[] {
  if (inline.kind === 'math') {
    const formula = setFormula(inline.tex, fonts.width, false);
    const size = formula.width * style.size * inlineMath;
    const { face, ink } = style;
    return [{ text: inline.text, width: size, bare: size, face, ink, formula, link: null }];
  }
  const strong = inline.kind === 'text' && inline.strong === true;
  const quiet = inline.kind === 'text' && inline.quiet === true;
  const face = strong ? style.strong : style.face;
  const ink = quiet ? 'zinc7' : style.ink;
  const link = inline.kind === 'value' ? linkOf(inline.address, inline.member) : null;
  const widthOf = (text: string): number => setText(fonts, face, text).width * style.size;
  // A value stays with its unit.
  const parts = inline.kind === 'value' ? [inline.text] : inline.text.split(spaceAfter);
  return parts
    .flatMap((text) => cutToWidth(text, width, widthOf))
    .map((text) => ({
      text,
      width: widthOf(text),
      bare: widthOf(text.trimEnd()),
      face,
      ink,
      formula: null,
      link,
    }));
}

/** Cuts a word that is wider than the whole line. */
function cutToWidth(word: string, width: number, widthOf: (text: string) => number): string[] {
  if (word === '' || widthOf(word.trimEnd()) <= width) return word === '' ? [] : [word];
  const parts: string[] = [];
  let part = '';
  for (const character of word) {
    if (part !== '' && widthOf(part + character) > width) {
      parts.push(part);
      part = '';
    }
    part += character;
  }
  return [...parts, part];
}

function wordLine(words: readonly Word[], style: TextStyle): WordLine {
  const items: Item[] = [];
  let x = 0;
  let [height, depth] = [style.size * 0.8, style.size * 0.25];
  const size = style.size * inlineMath;
  for (const [index, word] of words.entries()) {
    const last = index === words.length - 1;
    const text = last ? word.text.trimEnd() : word.text;
    if (text === '') continue;
    const { face, ink, formula, link } = word;
    const before = items.at(-1);
    if (formula) {
      items.push({ kind: 'formula', x, y: 0, size, ink, lines: [{ dy: 0, formula }], text });
      height = Math.max(height, formula.height * size);
      depth = Math.max(depth, formula.depth * size);
    } else if (before?.kind === 'text' && before.face === face && before.ink === ink && !link) {
      items[items.length - 1] = { ...before, text: before.text + text };
    } else {
      items.push({ kind: 'text', x, y: 0, face, size: style.size, ink, text });
    }
    if (link) {
      const box = { x, y: -style.size * 0.8, width: word.bare, height: style.size };
      items.push({ kind: 'link', ...box, to: link, says: text.trim() });
    }
    x += last ? word.bare : word.width;
  }
  return { width: x, items, height, depth };
}
