import type { Inline } from '#shared/report/tree.ts';
import type { BlockContext } from '../block-context.ts';
import type { TextFace } from '../font-files.ts';
import { breakWords, type WordLine } from '../inline-lines.ts';
import { type Item, type ItemOf, moveItem } from '../items.ts';
import type { InkName, TextStyle } from '../paper.ts';
import { setText } from '../text-runs.ts';

/** Words on lines, placed: the items and the height they take. */
export interface WordBlock {
  readonly items: readonly Item[];
  readonly height: number;
  /** Of the first and last line, from the top; null without words. */
  readonly firstBaseline: number | null;
  readonly lastBaseline: number | null;
  readonly lastWidth: number;
}

export const plain = (text: string): Inline[] => (text === '' ? [] : [{ kind: 'text', text }]);
export const strong = (text: string): Inline[] => [{ kind: 'text', text, strong: true }];

/** Where each line's baseline stands; lines with tall formulas push their neighbours away. */
export function baselines(lines: readonly WordLine[], style: TextStyle): number[] {
  const places: number[] = [];
  let foot = 0;
  for (const [index, line] of lines.entries()) {
    const usual = index === 0 ? style.leading * 0.76 : (places.at(-1) ?? 0) + style.leading;
    places.push(Math.max(usual, foot + line.height + (index === 0 ? 0 : 1)));
    foot = (places.at(-1) ?? 0) + line.depth;
  }
  return places;
}

/** Sets inline content in a column whose left top is x, y. */
export function setWords(
  content: readonly Inline[],
  style: TextStyle,
  {
    x,
    y,
    width,
    align = 'left',
  }: { x: number; y: number; width: number; align?: 'left' | 'right' },
  context: BlockContext,
): WordBlock {
  const lines = breakWords(content, style, width, context.fonts, context.linkOf);
  const places = baselines(lines, style);
  const items = lines.flatMap((line, index) => {
    const dx = align === 'right' ? width - line.width : 0;
    return line.items.map((item) => moveItem(item, x + dx, y + (places[index] ?? 0)));
  });
  const [first, last] = [places[0], places.at(-1)];
  const below = Math.max(style.leading * 0.24, lines.at(-1)?.depth ?? 0);
  return {
    items,
    height: last === undefined ? 0 : last + below,
    firstBaseline: first === undefined ? null : y + first,
    lastBaseline: last === undefined ? null : y + last,
    lastWidth: lines.at(-1)?.width ?? 0,
  };
}

/** One run of text on a given baseline; `right` sets its right end at x. */
export function textAt(
  context: BlockContext,
  text: string,
  place: {
    x: number;
    y: number;
    face: TextFace;
    size: number;
    ink: InkName;
    end?: 'left' | 'right';
  },
): ItemOf<'text'> & { readonly width: number } {
  const { y, face, size, ink, end = 'left' } = place;
  const width = setText(context.fonts, face, text).width * size;
  const x = end === 'right' ? place.x - width : place.x;
  return { kind: 'text', x, y, face, size, ink, text, width };
}
