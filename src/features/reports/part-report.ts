import type { Block, BlockOf } from '#shared/report/tree.ts';

/** A member's sheet in a report: its head, its verdict, and all its blocks. */
export interface ReportSheet {
  readonly head: BlockOf<'sheetHead'>;
  readonly verdict: BlockOf<'verdict'> | undefined;
  readonly blocks: readonly Block[];
}

/** The part of a report before the sheets, and each sheet by itself. */
export function partReport(blocks: readonly Block[]): {
  readonly front: readonly Block[];
  readonly sheets: readonly ReportSheet[];
} {
  const starts = blocks.flatMap((block, index) => (block.kind === 'sheetHead' ? [index] : []));
  const sheets = starts.map((start, index): ReportSheet => {
    const own = blocks.slice(start, starts[index + 1]);
    return {
      head: own[0] as BlockOf<'sheetHead'>,
      verdict: own.find((block): block is BlockOf<'verdict'> => block.kind === 'verdict'),
      blocks: own,
    };
  });
  return { front: blocks.slice(0, starts[0] ?? blocks.length), sheets };
}
