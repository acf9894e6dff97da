import type { LineBlock } from '#shared/report/tree.ts';
import type { BlockContext } from '../block-context.ts';
import type { Part, Tag } from '../items.ts';
import { mathSize, type TextStyle, textStyles } from '../paper.ts';
import type { LineResult } from './line-result.ts';
import { lineWorking } from './line-working.ts';
import { sheetColumns } from './sheet-columns.ts';
import { plain, setWords } from './words.ts';

/** The middle of a sheet's line: what stands in it, how deep it goes, where the result stands. */
export interface LineContent {
  readonly parts: readonly Part[];
  readonly foot: number;
  readonly baseline: number;
}

/** Title, then the formula in its steps, then words: each under the other. */
export function stepContent(
  block: LineBlock,
  tag: Tag,
  { top, result }: { top: number; result: LineResult },
  context: BlockContext,
): LineContent {
  const { x } = sheetColumns.working;
  const { least, gap } = sheetColumns.result;
  const right = context.width - Math.max(result.width, least) - gap;
  const end = result.width > 0 ? right : context.width;
  const title = setWords(
    plain(block.title),
    textStyles.title,
    { x, y: top, width: end - x },
    context,
  );
  const formula = lineWorking(block, title, { top, right, size: mathSize }, context);
  const meetsResult = result.width > 0 && (block.also !== null || title.height === 0);
  const y = formula.foot + (title.height > 0 ? 2 : 0);
  const width = (meetsResult ? right : context.width) - x;
  const words = setWords(block.sentence, sentenceStyle(block), { x, y, width }, context);
  const formulaTag: Tag = { type: 'Formula', parent: tag, alt: block.text };
  return {
    parts: [
      { tag, items: title.items },
      ...(formula.item ? [{ tag: formulaTag, items: [formula.item] }] : []),
      { tag, items: [...formula.links, ...words.items] },
    ],
    foot: words.height > 0 ? y + words.height : formula.foot,
    baseline: formula.baseline ?? title.lastBaseline ?? words.lastBaseline ?? top + 8,
  };
}

function sentenceStyle({ sentence }: LineBlock): TextStyle {
  const isQuiet = sentence.every((part) => part.kind === 'text' && part.quiet);
  return isQuiet ? textStyles.small : textStyles.sentence;
}
