import type { ExpectedBlock } from './expected-pages.ts';
import type { Segment } from './page-text.ts';

/** A block with the segments found for it. */
export interface FoundBlock {
  readonly block: ExpectedBlock;
  readonly found: readonly Segment[];
}

/** Scripts of a line's first row may stand this much above its number's baseline, points. */
const ABOVE = 6;

/**
 * Lines of which a part stands in another line's strip of the page: what is written in order must
 * also be seen in order.
 */
export function misplaced(placed: readonly FoundBlock[]): FoundBlock[] {
  return placed.filter(({ block, found }, index) => {
    const [first] = found;
    if (!block.line || !first?.baselines) return false;
    const next = placed[index + 1]?.found.find((s) => s.baselines !== null);
    const top = first.baselines[1] + ABOVE;
    const foot = next?.page === first.page ? (next.baselines?.[1] ?? 0) : 0;
    return found.some(
      ({ page, baselines }) =>
        baselines !== null && (page !== first.page || baselines[1] > top || baselines[0] <= foot),
    );
  });
}
