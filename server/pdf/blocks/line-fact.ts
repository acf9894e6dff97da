import type { LineBlock } from '#shared/report/tree.ts';
import type { BlockContext } from '../block-context.ts';
import { type Item, moveItem, type Part, type Tag } from '../items.ts';
import { breakFormula } from '../math/break-formula.ts';
import { mathSize, textStyles } from '../paper.ts';
import { givenSource } from './given-source.ts';
import type { LineResult } from './line-result.ts';
import type { LineContent } from './line-step.ts';
import { sheetColumns } from './sheet-columns.ts';
import { plain, setWords } from './words.ts';

const symbolGap = 7;

/** Lines that state a fact and compute nothing. */
export const isFact = ({ lineKind }: LineBlock): boolean =>
  lineKind === 'given' || lineKind === 'statement' || lineKind === 'lookup';

/** Title and symbol at the left, what is stated and where it comes from beside them. */
export function factContent(
  block: LineBlock,
  tag: Tag,
  { top, result }: { top: number; result: LineResult },
  context: BlockContext,
): LineContent {
  const { working, source } = sheetColumns;
  const right = context.width - result.width - (result.width > 0 ? sheetColumns.result.gap : 0);
  const symbol = breakFormula(block.working, context.fonts.width, { width: 99, indent: 0 })[0];
  const symbolWidth = symbol ? symbol.width * mathSize + symbolGap : 0;
  const title = setWords(
    plain(block.title),
    textStyles.title,
    { x: working.x, y: top, width: source.x - working.x - symbolWidth - symbolGap },
    context,
  );
  const baseline = title.lastBaseline ?? top + 8;
  const parts: Part[] = [{ tag, items: title.items }];
  if (symbol) {
    const place = { x: working.x + title.lastWidth + symbolGap, y: baseline, size: mathSize };
    const lines = [{ dy: 0, formula: symbol }];
    const item: Item = { kind: 'formula', ...place, ink: 'ink', lines, text: block.text };
    parts.push({ tag: { type: 'Formula', parent: tag, alt: block.text }, items: [item] });
  }
  const width = right - source.x;
  const stated = setWords(
    block.sentence,
    block.lineKind === 'lookup' ? textStyles.small : textStyles.fact,
    { x: source.x, y: top, width },
    context,
  );
  const drop = (title.firstBaseline ?? baseline) - (stated.firstBaseline ?? baseline);
  parts.push({ tag, items: stated.items.map((item) => moveItem(item, 0, drop)) });
  const under = top + (stated.height > 0 ? stated.height + drop : 0);
  const from = givenSource(block, { x: source.x, y: under, width }, context);
  parts.push({ tag, items: from.items });
  const symbolFoot = symbol ? baseline + symbol.depth * mathSize : 0;
  return { parts, foot: Math.max(top + title.height, symbolFoot, under, from.foot), baseline };
}
