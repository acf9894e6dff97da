import type { BlockOf } from '#shared/report/tree.ts';
import type { BlockContext } from '../block-context.ts';
import type { Item, Row, Tag } from '../items.ts';
import { textStyles } from '../paper.ts';
import { paragraphRows } from './paragraph.ts';
import { textAt } from './words.ts';

const indent = 16;

export function measureList(block: BlockOf<'list'>, context: BlockContext): Row[] {
  const style = textStyles.prose;
  const list: Tag = { type: 'L', parent: context.sect };
  return block.items.flatMap((content, index) => {
    const body: Tag = { type: 'LBody', parent: { type: 'LI', parent: list } };
    const place = { x: indent, width: Math.min(context.width, 430) - indent, before: 4 };
    const [first, ...others] = paragraphRows(content, style, place, body, context);
    if (!first) return [];
    const sign = textAt(context, block.ordered ? `${index + 1}.` : '–', {
      x: 2,
      y: style.leading * 0.76,
      face: style.face,
      size: style.size,
      ink: 'zinc7',
    });
    const [part, ...parts] = first.parts;
    const items: Item[] = [sign, ...(part?.items ?? [])];
    return [{ ...first, parts: [{ tag: body, items }, ...parts] }, ...others];
  });
}
