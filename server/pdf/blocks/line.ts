import type { Inline, LineBlock } from '#shared/report/tree.ts';
import { anchorOf, type BlockContext, row } from '../block-context.ts';
import { bar, type Item, moveItem, type Part, type Row, stroke, type Tag } from '../items.ts';
import { type InkName, textStyles, weights } from '../paper.ts';
import { factContent, isFact } from './line-fact.ts';
import { lineResult } from './line-result.ts';
import { stepContent } from './line-step.ts';
import { sheetColumns } from './sheet-columns.ts';
import { plain, setWords, strong } from './words.ts';

const padding = { top: 4.5, bottom: 5 };

/** The bar beside a line that isn't plain engineering, and its tint. */
const tones: Readonly<Record<LineBlock['tone'], { bar?: InkName; tint?: InkName; word: string }>> =
  {
    plain: { word: '' },
    note: { bar: 'zinc3', word: 'note' },
    caution: { bar: 'oxide3', word: 'caution' },
    'outside scope': { bar: 'oxide', word: 'outside scope' },
    failed: { bar: 'oxide', tint: 'oxide2', word: 'failed' },
  };

/**
 * One line of a sheet in its three columns: number and clause, title with formula and words,
 * result on the baseline of the formula's end. A row is never split.
 */
export function measureLine(block: LineBlock, context: BlockContext): Row[] {
  const tag: Tag = { type: 'P', parent: context.sect };
  const tone = tones[block.tone];
  const result = lineResult(block, tone.word, isFact(block), context);
  const reference = setReference(block, context);
  const within = { top: padding.top, result };
  const content = isFact(block)
    ? factContent(block, tag, within, context)
    : stepContent(block, tag, within, context);
  const { baseline } = content;
  const height = Math.max(content.foot, reference.foot, baseline + result.depth) + padding.bottom;
  const anchor: Item = { kind: 'anchor', name: anchorOf(block.member, block.address) };
  const parts: Part[] = [
    { tag: null, items: decoration(tone, height, context) },
    { tag, items: [anchor, ...reference.number] },
    { tag, items: reference.source },
    ...content.parts,
    { tag, items: result.items.map((item) => moveItem(item, 0, baseline)) },
  ];
  return [row(height, parts)];
}

function decoration(
  tone: { bar?: InkName; tint?: InkName },
  height: number,
  context: BlockContext,
): Item[] {
  const rule = stroke([0, height], [context.width, height], weights.hair, 'zinc2');
  const tint = tone.tint ? [bar(-7, 0, context.width + 14, height, tone.tint)] : [];
  const mark = tone.bar ? [bar(-7, 0, 2, height, tone.bar)] : [];
  return [...tint, ...mark, rule];
}

function setReference(
  block: LineBlock,
  context: BlockContext,
): { number: readonly Item[]; source: readonly Item[]; foot: number } {
  const { reference } = sheetColumns;
  const number = setWords(
    strong(block.number),
    textStyles.cell,
    { ...reference, y: padding.top },
    context,
  );
  const source = setClause(block.reference, padding.top + number.height, context);
  return {
    number: number.items,
    source: source.items,
    foot: padding.top + number.height + source.height,
  };
}

/** Clause and equation side by side, the equation under the clause where that is too wide. */
function setClause(
  { clause, equation }: LineBlock['reference'],
  y: number,
  context: BlockContext,
): { items: readonly Item[]; height: number } {
  const place = { ...sheetColumns.reference, y };
  const clauseStyle = { ...textStyles.small, ink: 'ink' } as const;
  const quiet = (text: string): Inline[] =>
    text === '' ? [] : [{ kind: 'text', text, quiet: true }];
  const both = [...plain(clause && equation ? `${clause} ` : clause), ...quiet(equation)];
  const beside = setWords(both, clauseStyle, place, context);
  if (beside.height < 2 * clauseStyle.leading * 0.9) return beside;
  const above = setWords(plain(clause), clauseStyle, place, context);
  const below = setWords(quiet(equation), clauseStyle, { ...place, y: y + above.height }, context);
  return { items: [...above.items, ...below.items], height: above.height + below.height };
}
