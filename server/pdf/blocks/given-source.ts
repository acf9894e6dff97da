import type { LineBlock } from '#shared/report/tree.ts';
import type { BlockContext } from '../block-context.ts';
import { circlePath } from '../circle-path.ts';
import type { Item } from '../items.ts';
import { type InkName, textStyles } from '../paper.ts';
import { plain, setWords, strong, textAt } from './words.ts';

const radius = 4.2;

/**
 * Where a given value comes from: its letter in a ring (dashed and in oxide for an assumption),
 * the source, and whether it is confirmed.
 */
export function givenSource(
  block: LineBlock,
  { x, y, width }: { x: number; y: number; width: number },
  context: BlockContext,
): { items: readonly Item[]; foot: number } {
  if (!block.given) return { items: [], foot: y };
  const { letter, source, confirmed } = block.given;
  const ink: InkName = letter === 'A' || !confirmed ? 'oxide' : 'zinc7';
  const style = { ...textStyles.small, ink };
  const indent = 2 * radius + 5;
  const state = confirmed ? plain(' · confirmed') : strong(' · not confirmed');
  const place = { x: x + indent, y: y + 0.8, width: width - indent };
  const words = setWords([...plain(source), ...state], style, place, context);
  const middle = (words.firstBaseline ?? y) - 2.8;
  const face = 'ibm-plex-sans-condensed-semibold';
  const sign = textAt(context, letter, { x: 0, y: middle + 2.3, face, size: 6.4, ink });
  const ring: Item = {
    kind: 'path',
    path: circlePath([x + radius, middle], radius),
    stroke: { ink, width: 0.7, ...(letter === 'A' ? { dash: [1.6, 1.2] } : {}) },
  };
  return {
    items: [ring, { ...sign, x: x + radius - sign.width / 2 }, ...words.items],
    foot: y + 0.8 + words.height,
  };
}
