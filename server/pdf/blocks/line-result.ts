import type { LineBlock } from '#shared/report/tree.ts';
import type { BlockContext } from '../block-context.ts';
import type { Item } from '../items.ts';
import type { InkName } from '../paper.ts';
import { verdictInk } from './verdict.ts';
import { textAt } from './words.ts';

/** The third column, its items from the line's result baseline. */
export interface LineResult {
  readonly items: readonly Item[];
  readonly width: number;
  /** Below the baseline, points. */
  readonly depth: number;
}

const gap = { unit: 3, verdict: 6 };

/**
 * Value and unit at the right edge, a verdict's word before it; the other printed form below, or
 * after it where the line is to stay one line high.
 */
export function lineResult(
  block: LineBlock,
  toneWord: string,
  inOneLine: boolean,
  context: BlockContext,
): LineResult {
  const items: Item[] = [];
  let x = context.width;
  const put = (
    text: string,
    face: 'ibm-plex-sans-regular' | 'ibm-plex-sans-semibold' | 'ibm-plex-sans-condensed-semibold',
    size: number,
    ink: InkName,
    space: number,
  ): void => {
    if (text === '') return;
    if (items.length > 0) x -= space;
    const item = textAt(context, text, { x, y: 0, face, size, ink, end: 'right' });
    items.unshift(item);
    x -= item.width;
  };
  const ink = block.verdict ? verdictInk(block.verdict) : 'ink';
  const also = block.also ? `= ${block.also.value} ${block.also.unit}`.trimEnd() : '';
  if (inOneLine) put(also, 'ibm-plex-sans-regular', 8.5, 'zinc7', 0);
  if (block.result) {
    put(block.result.unit, 'ibm-plex-sans-regular', 8.5, 'zinc7', gap.unit);
    put(block.result.value, 'ibm-plex-sans-semibold', 10, ink, gap.unit);
  }
  if (block.verdict) put(block.verdict, 'ibm-plex-sans-condensed-semibold', 8.5, ink, gap.verdict);
  const toneInk = block.tone === 'note' ? 'zinc7' : 'oxide';
  if (items.length === 0) put(toneWord, 'ibm-plex-sans-condensed-semibold', 8.5, toneInk, 0);
  const width = context.width - x;
  if (inOneLine || also === '') return { items, width, depth: items.length > 0 ? 2.5 : 0 };
  const under = textAt(context, also, {
    x: context.width,
    y: 11,
    face: 'ibm-plex-sans-regular',
    size: 8.5,
    ink: 'zinc7',
    end: 'right',
  });
  return { items: [...items, under], width: Math.max(width, under.width), depth: 13.5 };
}
