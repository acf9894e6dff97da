import type { Trace, TraceStep } from '#shared/report/present-trace.ts';
import type { Block } from '#shared/report/tree.ts';

/*
 * A preview holds one member, so its lines are numbered as if it were the first. They print with
 * the member's own place in the calculation, as in the report.
 */
const placed = (number: string, position: number): string =>
  number.replace(/^\d+(?=\.)/, String(position));

export const numberedBlocks = (blocks: readonly Block[], position: number): Block[] =>
  blocks.map((block) =>
    block.kind === 'line' ? { ...block, number: placed(block.number, position) } : block,
  );

export function numberedTrace(trace: Trace, position: number): Trace {
  const step = (of: TraceStep): TraceStep => ({ ...of, number: placed(of.number, position) });
  return {
    chosen: step(trace.chosen),
    sources: trace.sources.map(step),
    ladder: trace.ladder.map(step),
    usedBy: trace.usedBy.map(step),
  };
}
