import { type FunctionComponent, memo } from 'react';
import { same } from '#client/lib/same.ts';
import type { Block, BlockKind, BlockOf } from '#shared/report/tree.ts';
import { FigureBlock } from './figure-block.tsx';
import { LineBlock } from './line-block.tsx';
import { LineSectionBlock, SheetHeadBlock, VerdictBlock } from './sheet-blocks.tsx';
import {
  CautionsBlock,
  CoverBlock,
  HeadingBlock,
  ListBlock,
  PageBreakBlock,
  ParagraphBlock,
  TableBlock,
} from './text-blocks.tsx';

type Renderers = { [K in BlockKind]: FunctionComponent<{ block: BlockOf<K> }> };

/** One component per kind of block; leaving one out does not compile. */
const renderers = {
  heading: HeadingBlock,
  paragraph: ParagraphBlock,
  list: ListBlock,
  table: TableBlock,
  cover: CoverBlock,
  sheetHead: SheetHeadBlock,
  verdict: VerdictBlock,
  figure: FigureBlock,
  lineSection: LineSectionBlock,
  line: LineBlock,
  cautions: CautionsBlock,
  pageBreak: PageBreakBlock,
} satisfies Renderers & Record<BlockKind, unknown>;

const OneBlock = memo(function OneBlock({ block }: { block: Block }) {
  const Renderer = renderers[block.kind] as FunctionComponent<{ block: Block }>;
  return <Renderer block={block} />;
}, same);

/** A document tree on the screen. */
export function Blocks({ blocks }: { blocks: readonly Block[] }) {
  return blocks.map((block, index) => <OneBlock key={keyOf(block, index)} block={block} />);
}

const keyOf = (block: Block, index: number): string => {
  if (block.kind === 'line') return `${block.member}/${block.address}`;
  if (block.kind === 'lineSection') return `section/${block.address}/${index}`;
  return `${block.kind}/${index}`;
};
