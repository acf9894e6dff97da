import { row } from '../block-context.ts';
import type { Row } from '../items.ts';

/** An empty row at the top of the next page. */
export const measurePageBreak = (): Row[] => [row(0, [], { breakBefore: true, keep: true })];
