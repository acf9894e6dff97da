import type { BlockOf } from '#shared/report/tree.ts';
import type { BlockContext } from '../block-context.ts';
import { bar, type Row, type Tag } from '../items.ts';
import { textStyles } from '../paper.ts';
import { paragraphRows } from './paragraph.ts';
import { plain } from './words.ts';

/** What a reader has to know before using the calculation. */
export function measureCautions(block: BlockOf<'cautions'>, context: BlockContext): Row[] {
  const list: Tag = { type: 'L', parent: context.sect };
  return block.items.flatMap((item, index) => {
    const tag: Tag = { type: 'LBody', parent: { type: 'LI', parent: list } };
    const place = { x: 12, width: Math.min(context.width, 430) - 12, before: index === 0 ? 8 : 6 };
    const rows = paragraphRows(plain(item), textStyles.sentence, place, tag, context);
    return rows.map((row) => ({
      ...row,
      keep: index < block.items.length - 1,
      parts: [...row.parts, { tag: null, items: [bar(0, 0, 1.5, row.height, 'oxide')] }],
    }));
  });
}
