import type { LineBlock } from '#shared/report/tree.ts';
import { anchorOf, type BlockContext } from '../block-context.ts';
import type { Item, ItemOf } from '../items.ts';
import { breakFormula } from '../math/break-formula.ts';
import type { Formula } from '../math/formula.ts';
import { sheetColumns } from './sheet-columns.ts';
import type { WordBlock } from './words.ts';

/** The set formula of a line, points from the row's top. */
export interface Working {
  readonly item: ItemOf<'formula'> | null;
  readonly links: readonly Item[];
  /** Of its last line. */
  readonly baseline: number | null;
  readonly foot: number;
}

const gaps = { title: 3, line: 5 };
/** A later line of a formula goes in by this, em. */
const indent = 1.5;

/**
 * Sets a line's working under its title: on as many lines as it needs, smaller where one part is
 * wider than the column.
 */
export function lineWorking(
  block: LineBlock,
  title: WordBlock,
  place: { top: number; right: number; size: number },
  context: BlockContext,
): Working {
  const foot = place.top + title.height;
  if (block.working.length === 0) return { item: null, links: [], baseline: null, foot };
  const { x } = sheetColumns.working;
  const room = place.right - x;
  const broken = breakFormula(block.working, context.fonts.width, {
    width: room / place.size,
    indent,
  });
  const widest = Math.max(...broken.map((line) => line.width));
  const size = Math.min(place.size, room / widest);
  const first = foot + (title.height > 0 ? gaps.title : 0) + (broken[0]?.height ?? 0) * size;
  return placed(block, broken, { x, y: first, size }, foot);
}

function placed(
  block: LineBlock,
  formulas: readonly Formula[],
  { x, y, size }: { x: number; y: number; size: number },
  titleFoot: number,
): Working {
  let dy = 0;
  const lines = formulas.map((formula, index) => {
    const above = formulas[index - 1];
    if (above) dy += (above.depth + formula.height) * size + gaps.line;
    return { dy, formula };
  });
  const links = lines.flatMap(({ dy: offset, formula }) =>
    formula.pieces.flatMap((piece): Item[] => {
      const address = piece.kind === 'mark' ? piece.attributes['data-ref'] : undefined;
      if (piece.kind !== 'mark' || address === undefined) return [];
      return [
        {
          kind: 'link',
          x: x + piece.x * size,
          y: y + offset - piece.height * size,
          width: piece.width * size,
          height: (piece.height + piece.depth) * size,
          to: anchorOf(block.member, address),
          says: address,
        },
      ];
    }),
  );
  const depth = (formulas.at(-1)?.depth ?? 0) * size;
  return {
    item: { kind: 'formula', x, y, size, ink: 'ink', lines, text: block.text },
    links,
    baseline: y + dy,
    foot: Math.max(titleFoot, y + dy + depth),
  };
}
