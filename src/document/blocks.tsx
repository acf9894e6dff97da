import { type FunctionComponent, memo, useMemo } from 'react';
import { same } from '#client/lib/same.ts';
import type { Block, BlockKind, BlockOf } from '#shared/report/tree.ts';
import { FigureBlock } from './figure-block.tsx';
import { LineBlock } from './line-block.tsx';
import { nestSections, type SheetNode } from './section-tree.ts';
import { SheetHeadBlock, VerdictBlock } from './sheet-blocks.tsx';
import { SheetSectionView } from './sheet-section.tsx';
import {
  CautionsBlock,
  CoverBlock,
  HeadingBlock,
  ListBlock,
  PageBreakBlock,
  ParagraphBlock,
  TableBlock,
} from './text-blocks.tsx';

/** The head of a section is drawn with what it holds. */
type DrawnKind = Exclude<BlockKind, 'lineSection'>;
type Renderers = { [K in DrawnKind]: FunctionComponent<{ block: BlockOf<K> }> };

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
  line: LineBlock,
  cautions: CautionsBlock,
  pageBreak: PageBreakBlock,
} satisfies Renderers & Record<DrawnKind, unknown>;

const OneBlock = memo(function OneBlock({ block }: { block: BlockOf<DrawnKind> }) {
  const Renderer = renderers[block.kind] as FunctionComponent<{ block: Block }>;
  return <Renderer block={block} />;
}, same);

/** A document tree on the screen. */
export function Blocks({ blocks }: { blocks: readonly Block[] }) {
  const nodes = useMemo(() => nestSections(blocks), [blocks]);
  return <Nodes nodes={nodes} />;
}

function Nodes({ nodes }: { nodes: readonly SheetNode[] }) {
  return nodes.map((node, index) =>
    node.kind === 'section' ? (
      <SheetSectionView key={`section/${node.head.address}`} head={node.head}>
        <Nodes nodes={node.body} />
      </SheetSectionView>
    ) : (
      <OneBlock key={keyOf(node, index)} block={node} />
    ),
  );
}

const keyOf = (block: Block, index: number): string =>
  block.kind === 'line' ? `${block.member}/${block.address}` : `${block.kind}/${index}`;
