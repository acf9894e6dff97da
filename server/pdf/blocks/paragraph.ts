import type { BlockOf, Inline } from '#shared/report/tree.ts';
import { type BlockContext, row } from '../block-context.ts';
import { breakWords } from '../inline-lines.ts';
import { moveItem, type Part, type Row, type Tag } from '../items.ts';
import { type TextStyle, textStyles } from '../paper.ts';
import { baselines } from './words.ts';

/** A paragraph as one row a line, so that it may go on on the next page, but by two lines or more. */
export function paragraphRows(
  content: readonly Inline[],
  style: TextStyle,
  { x, width, before }: { x: number; width: number; before: number },
  tag: Tag,
  context: BlockContext,
): Row[] {
  const lines = breakWords(content, style, width, context.fonts, context.linkOf);
  const places = baselines(lines, style);
  return lines.map((line, index) => {
    const top = index === 0 ? 0 : (places[index - 1] ?? 0) + style.leading * 0.24;
    const baseline = (places[index] ?? 0) - top;
    const part: Part = { tag, items: line.items.map((item) => moveItem(item, x, baseline)) };
    const keep = index === 0 ? lines.length > 1 : index === lines.length - 2;
    const below = Math.max(style.leading * 0.24, index === lines.length - 1 ? line.depth : 0);
    return row(baseline + below, [part], { keep, before: index === 0 ? before : 0 });
  });
}

export function measureParagraph(block: BlockOf<'paragraph'>, context: BlockContext): Row[] {
  const tag: Tag = { type: 'P', parent: context.sect };
  const place = { x: 0, width: Math.min(context.width, 430), before: 6 };
  return paragraphRows(block.content, textStyles.prose, place, tag, context);
}
