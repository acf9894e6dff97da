import type { BlockOf } from '#shared/report/tree.ts';
import { type BlockContext, row } from '../block-context.ts';
import { type Row, stroke, type Tag } from '../items.ts';
import { type TextStyle, weights } from '../paper.ts';
import { setWords, strong } from './words.ts';

const faces = { face: 'ibm-plex-serif-semibold', strong: 'ibm-plex-serif-semibold' } as const;

const levels = {
  1: { style: { ...faces, size: 17, leading: 21, ink: 'ink' }, before: 20, after: 6 },
  2: { style: { ...faces, size: 12.5, leading: 16, ink: 'ink' }, before: 15, after: 4 },
  3: {
    style: { ...faces, size: 14, leading: 18, ink: 'ink' },
    before: 26,
    after: 2,
  },
} as const satisfies Record<1 | 2 | 3, { style: TextStyle; before: number; after: number }>;

/**
 * A heading of the third level begins a part of a sheet, whose title is the first: a rule stands
 * over it.
 */
export function measureHeading(block: BlockOf<'heading'>, context: BlockContext): Row[] {
  const { width, sect } = context;
  const { style, before, after } = levels[block.level];
  const ruled = block.level === 3;
  const level = ruled ? 2 : block.level;
  const tag: Tag = { type: `H${level}`, parent: sect };
  const words = setWords(strong(block.text), style, { x: 0, y: ruled ? 8 : 0, width }, context);
  const items = [{ kind: 'bookmark', level, title: block.text } as const, ...words.items];
  const rule = { tag: null, items: [stroke([0, 0], [width, 0], weights.strong, 'ink')] };
  const height = words.height + after + (ruled ? 8 : 0);
  return [row(height, [{ tag, items }, ...(ruled ? [rule] : [])], { before, keep: true })];
}
