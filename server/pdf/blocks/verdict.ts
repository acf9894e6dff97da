import type { BlockOf } from '#shared/report/tree.ts';
import { type BlockContext, row } from '../block-context.ts';
import { bar, type Item, type Row, stroke, type Tag } from '../items.ts';
import { type InkName, textStyles, weights } from '../paper.ts';
import { plain, setWords, textAt } from './words.ts';

/** Width of the words on what governs, points. */
const governsWidth = 150;
const termInks: readonly InkName[] = ['ink', 'oxide', 'oxide3', 'zinc5'];
const narrow = 'ibm-plex-sans-condensed-regular';

export const verdictInk = (verdict: string): InkName => (verdict === 'OK' ? 'ink' : 'oxide');

/** The verdict and its ratio, large, the terms of the interaction as a bar, what governs. */
export function measureVerdict(block: BlockOf<'verdict'>, context: BlockContext): Row[] {
  const tag: Tag = { type: 'P', parent: context.sect };
  const ink = verdictInk(block.verdict);
  const word = textAt(context, block.verdict, {
    x: 0,
    y: 30,
    face: 'ibm-plex-sans-semibold',
    size: block.ratioText === null ? 15 : 9,
    ink,
  });
  const ratio = textAt(context, block.ratioText ?? '', {
    x: word.width + 7,
    y: 30,
    face: 'ibm-plex-sans-semibold',
    size: 23,
    ink,
  });
  const left = ratio.x + ratio.width + 22;
  const beside = { x: left, y: 16, width: context.width - left };
  const column = {
    x: context.width - governsWidth,
    y: 11,
    width: governsWidth,
    align: 'right',
  } as const;
  const governs =
    block.ratioText === null
      ? setWords(plain(block.governs), textStyles.sentence, beside, context)
      : setWords(
          plain(block.governs === '' ? '' : `governs ${block.governs}`),
          textStyles.small,
          column,
          context,
        );
  const under = { ...column, y: column.y + governs.height };
  const combination = setWords(
    plain(block.ratioText === null ? '' : block.combination),
    textStyles.small,
    under,
    context,
  );
  const end = column.x - 20;
  const height = Math.max(46, governs.height + combination.height + 20);
  const drawn =
    block.terms.length > 0 ? termBar(block, left, end, context) : { words: [], bars: [] };
  const target = block.address === null ? null : context.linkOf(block.address);
  const links: Item[] = target
    ? [{ kind: 'link', x: 0, y: 10, width: left - 22, height: 24, to: target, says: block.verdict }]
    : [];
  const rule = stroke([0, height], [context.width, height], weights.hair, 'zinc3');
  const parts = [
    { tag: null, items: [...drawn.bars, rule] },
    { tag, items: [word, ratio, ...drawn.words, ...governs.items, ...combination.items, ...links] },
  ];
  return [row(height, parts, { keep: true })];
}

/** Terms side by side, to scale against the limit's tick; the legend under them. */
function termBar(
  block: BlockOf<'verdict'>,
  left: number,
  end: number,
  context: BlockContext,
): { words: Item[]; bars: Item[] } {
  const limit = Number.parseFloat(block.limit);
  const sum = block.terms.reduce((total, term) => total + Math.max(term.value, 0), 0);
  const scale = (end - left) / Math.max(sum, limit);
  const bars: Item[] = [bar(left, 14, end - left, 7, 'zinc1')];
  const words: Item[] = [];
  let [x, legend] = [left, left];
  for (const [index, term] of block.terms.entries()) {
    const ink = termInks[Math.min(index, termInks.length - 1)] ?? 'zinc5';
    const length = Math.max(term.value, 0) * scale;
    bars.push(bar(x, 14, length, 7, ink), bar(legend, 27.5, 5.5, 5.5, ink));
    x += length;
    const text = `${term.label} ${term.text}`;
    const said = textAt(context, text, { x: legend + 8, y: 33, face: narrow, size: 8, ink: 'ink' });
    words.push(said);
    legend += said.width + 19;
  }
  const tick = left + limit * scale;
  bars.push(stroke([tick, 11], [tick, 24], weights.strong, 'ink'));
  const place = { x: Math.max(tick, legend), y: 33, face: narrow, size: 8, ink: 'zinc7' } as const;
  words.push(textAt(context, `limit ${block.limit}`, { ...place, end: 'right' }));
  return { words, bars };
}
