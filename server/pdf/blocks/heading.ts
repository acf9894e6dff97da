import type { BlockOf } from '#shared/report/tree.ts';
import { type BlockContext, row } from '../block-context.ts';
import type { Row, Tag } from '../items.ts';
import type { TextStyle } from '../paper.ts';
import { setWords, strong } from './words.ts';

const faces = { face: 'ibm-plex-serif-semibold', strong: 'ibm-plex-serif-semibold' } as const;

const levels = {
  1: { style: { ...faces, size: 17, leading: 21, ink: 'ink' }, before: 20, after: 6 },
  2: { style: { ...faces, size: 12.5, leading: 16, ink: 'ink' }, before: 15, after: 4 },
  3: {
    style: {
      face: 'ibm-plex-sans-semibold',
      strong: 'ibm-plex-sans-semibold',
      size: 11,
      leading: 14,
      ink: 'ink',
    },
    before: 18,
    after: 3,
  },
} as const satisfies Record<1 | 2 | 3, { style: TextStyle; before: number; after: number }>;

export function measureHeading(block: BlockOf<'heading'>, context: BlockContext): Row[] {
  const { style, before, after } = levels[block.level];
  const tag: Tag = { type: `H${block.level}`, parent: context.sect };
  const words = setWords(strong(block.text), style, { x: 0, y: 0, width: context.width }, context);
  const items = [
    { kind: 'bookmark', level: block.level, title: block.text } as const,
    ...words.items,
  ];
  return [row(words.height + after, [{ tag, items }], { before, keep: true })];
}
