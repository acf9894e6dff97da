import type { LineBlock } from '#shared/report/tree.ts';
import { anchorOf, type BlockContext, row } from '../block-context.ts';
import { bar, type Item, moveItem, type Part, type Row, stroke, type Tag } from '../items.ts';
import { type InkName, mathSize, type TextStyle, textStyles, weights } from '../paper.ts';
import { givenSource } from './given-source.ts';
import { lineResult } from './line-result.ts';
import { lineWorking } from './line-working.ts';
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
  // Words stated in place of a value stand in the working column.
  const isStatement = block.lineKind === 'statement';
  const result = lineResult(isStatement ? { ...block, result: null } : block, tone.word, context);
  const { working } = sheetColumns;
  const right =
    context.width - Math.max(result.width, sheetColumns.result.least) - sheetColumns.result.gap;
  const title = setWords(
    plain(block.title),
    textStyles.title,
    { x: working.x, y: padding.top, width: (result.width > 0 ? right : context.width) - working.x },
    context,
  );
  const formula = lineWorking(block, title, { top: padding.top, right, size: mathSize }, context);
  const meetsResult = result.width > 0 && (block.also !== null || title.height === 0);
  const stated = isStatement && block.result ? strong(block.result.value) : [];
  const words = setWords(
    [...stated, ...block.sentence],
    wordStyle(block, isStatement),
    {
      x: working.x,
      y: formula.foot + (block.title === '' && block.working.length === 0 ? 0 : 2),
      width: (meetsResult ? right : context.width) - working.x,
    },
    context,
  );
  const wordsFoot = words.height > 0 ? formula.foot + 2 + words.height : formula.foot;
  const source = givenSource(block, wordsFoot, context);
  const baseline = formula.baseline ?? title.lastBaseline ?? words.lastBaseline ?? padding.top + 8;
  const reference = setReference(block, context);
  const height = Math.max(source.foot, reference.foot, baseline + result.depth) + padding.bottom;
  const anchor: Item = { kind: 'anchor', name: anchorOf(block.member, block.address) };
  const parts: Part[] = [
    { tag: null, items: decoration(tone, height, context) },
    { tag, items: [anchor, ...reference.number] },
    { tag, items: reference.source },
    { tag, items: title.items },
    ...(formula.item
      ? [{ tag: { type: 'Formula', parent: tag, alt: block.text } as const, items: [formula.item] }]
      : []),
    {
      tag,
      items: [...formula.links, ...words.items, ...source.items],
    },
    { tag, items: result.items.map((item) => moveItem(item, 0, baseline)) },
  ];
  return [row(height, parts)];
}

function wordStyle({ sentence }: LineBlock, isStatement: boolean): TextStyle {
  if (isStatement) return { ...textStyles.field, size: 9 };
  const isQuiet = sentence.every((part) => part.kind === 'text' && part.quiet);
  return isQuiet ? textStyles.small : textStyles.sentence;
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
  const { clause, equation } = block.reference;
  const source = setWords(
    [
      ...plain(clause === '' || equation === '' ? clause : `${clause} `),
      ...(equation === '' ? [] : [{ kind: 'text', text: equation, quiet: true } as const]),
    ],
    { ...textStyles.small, ink: 'ink' },
    { ...reference, y: padding.top + number.height },
    context,
  );
  return {
    number: number.items,
    source: source.items,
    foot: padding.top + number.height + source.height,
  };
}
