import type { BlockOf } from '#shared/report/tree.ts';
import { type BlockContext, row } from '../block-context.ts';
import { type Row, stroke, type Tag } from '../items.ts';
import { weights } from '../paper.ts';
import { textAt } from './words.ts';

export const memberTitle = (block: BlockOf<'sheetHead'>): string =>
  [block.mark, block.section, block.material].filter((part) => part !== '').join(' · ');

/** The head of a member's sheet, on a new page. */
export function measureSheetHead(block: BlockOf<'sheetHead'>, context: BlockContext): Row[] {
  const tag: Tag = { type: 'H1', parent: context.sect };
  const place = { x: 0, y: 22, size: 20, ink: 'ink' } as const;
  const mark = textAt(context, block.mark, { ...place, face: 'ibm-plex-serif-semibold' });
  const about = [block.section, block.material].filter((part) => part !== '').join(' · ');
  const rest = textAt(context, about, {
    ...place,
    x: mark.width + 12,
    face: 'ibm-plex-sans-medium',
    size: 11,
  });
  const bookmark = { kind: 'bookmark', level: 1, title: memberTitle(block) } as const;
  const rule = stroke([0, 31], [context.width, 31], weights.rule, 'ink');
  const parts = [
    { tag, items: [bookmark, mark] },
    { tag, items: [rest] },
    { tag: null, items: [rule] },
  ];
  return [row(32, parts, { keep: true, breakBefore: true })];
}
