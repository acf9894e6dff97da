import type { Block, BlockKind, BlockOf } from '#shared/report/tree.ts';
import type { BlockContext } from './block-context.ts';
import { measureCautions } from './blocks/cautions.ts';
import { measureCover } from './blocks/cover.ts';
import { measureFigure } from './blocks/figure.ts';
import { measureHeading } from './blocks/heading.ts';
import { measureLine } from './blocks/line.ts';
import { measureLineSection } from './blocks/line-section.ts';
import { measureList } from './blocks/list.ts';
import { measurePageBreak } from './blocks/page-break.ts';
import { measureParagraph } from './blocks/paragraph.ts';
import { measureSheetHead } from './blocks/sheet-head.ts';
import { measureTable } from './blocks/table.ts';
import { measureVerdict } from './blocks/verdict.ts';
import type { Row } from './items.ts';

type Measure<K extends BlockKind> = (block: BlockOf<K>, context: BlockContext) => Row[];

/** How each kind of block becomes rows of a page. */
const measures = {
  heading: measureHeading,
  paragraph: measureParagraph,
  list: measureList,
  table: measureTable,
  cover: measureCover,
  sheetHead: measureSheetHead,
  verdict: measureVerdict,
  figure: measureFigure,
  lineSection: measureLineSection,
  line: measureLine,
  cautions: measureCautions,
  pageBreak: measurePageBreak,
} satisfies { [K in BlockKind]: Measure<K> };

export function measureBlock(block: Block, context: BlockContext): Row[] {
  const measure = measures[block.kind] as Measure<BlockKind>;
  return measure(block, context);
}
