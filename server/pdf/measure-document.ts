import type { Block, DocumentTree } from '#shared/report/tree.ts';
import { anchorOf } from './block-context.ts';
import { memberTitle } from './blocks/sheet-head.ts';
import type { FontSet } from './font-set.ts';
import type { Row, RunningHead, Tag } from './items.ts';
import { measureBlock } from './measure-block.ts';
import type { PaperSize } from './paper.ts';

/** Blocks that open a section of the document's structure. */
const opensSection = (block: Block): boolean =>
  block.kind === 'cover' ||
  block.kind === 'sheetHead' ||
  (block.kind === 'heading' && block.level === 1);

/** Turns the blocks of a document into rows of a page's column. */
export function measureDocument(tree: DocumentTree, paper: PaperSize, fonts: FontSet): Row[] {
  const root: Tag = { type: 'Document', parent: null };
  const anchors = anchorsOf(tree.blocks);
  let sect: Tag = { type: 'Sect', parent: root };
  let member = '';
  let running: RunningHead | null = null;
  return tree.blocks.flatMap((block, index) => {
    if (opensSection(block)) {
      sect = { type: 'Sect', parent: root };
      running = null;
    }
    if (block.kind === 'sheetHead') {
      member = block.member;
      running = { label: 'Member sheet', text: memberTitle(block) };
    }
    const within = member;
    const linkOf = (address: string, of: string = within): string | null =>
      anchors.has(anchorOf(of, address)) ? anchorOf(of, address) : null;
    const width = paper.right - paper.left;
    const rows = measureBlock(block, { fonts, width, sect, linkOf });
    const introduces = block.kind === 'paragraph' && tree.blocks[index + 1]?.kind === 'table';
    return rows.map((row) => ({ ...row, running, keep: row.keep || introduces }));
  });
}

/** The lines that a link can go to. */
const anchorsOf = (blocks: readonly Block[]): ReadonlySet<string> =>
  new Set(
    blocks.flatMap((block) =>
      block.kind === 'line' ? [anchorOf(block.member, block.address)] : [],
    ),
  );
