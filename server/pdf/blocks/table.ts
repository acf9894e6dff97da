import type { BlockOf, TableCell } from '#shared/report/tree.ts';
import { type BlockContext, row } from '../block-context.ts';
import { breakWords } from '../inline-lines.ts';
import { type Part, type Row, stroke, type Tag } from '../items.ts';
import { type InkName, type TextStyle, textStyles, weights } from '../paper.ts';
import { setWords, strong } from './words.ts';

const gap = 14;
const padding = 3.5;

const inkOfTone: Readonly<Record<NonNullable<TableCell['tone']>, InkName>> = {
  plain: 'ink',
  quiet: 'zinc7',
  over: 'oxide',
  strong: 'ink',
};

interface Column {
  readonly x: number;
  readonly width: number;
}

/** Columns by their shares; one too narrow for its longest cell takes room that others don't use. */
function columnsOf(block: BlockOf<'table'>, context: BlockContext): Column[] {
  const sum = block.widths.reduce((a, b) => a + b, 0);
  const room = context.width - gap * (block.widths.length - 1);
  const shares = block.widths.map((share) => (room * share) / sum);
  const wanted = shares.map((_, index) => naturalWidth(block, index, context));
  let x = 0;
  return fillShares(shares, wanted).map((width) => {
    const column = { x, width };
    x += width + gap;
    return column;
  });
}

/** Width of a column's longest cell on one line. */
function naturalWidth(block: BlockOf<'table'>, index: number, context: BlockContext): number {
  const cells = [block.head, ...block.rows].map((cells, row) => {
    const cell = cells[index];
    if (!cell) return 0;
    const style = cellStyle(cell, row === 0);
    const lines = breakWords(cell.content, style, 1e6, context.fonts, context.linkOf);
    return Math.max(0, ...lines.map((line) => line.width));
  });
  // A hair more, so that rounding never breaks the longest cell.
  return Math.max(0, ...cells) + 0.01;
}

/** Gives slack to the columns that lack least first. */
export function fillShares(shares: readonly number[], wanted: readonly number[]): number[] {
  const widths = [...shares];
  const lackOf = (index: number): number => (wanted[index] ?? 0) - (shares[index] ?? 0);
  const lacking = widths.map((_, index) => index).filter((index) => lackOf(index) > 0);
  for (const index of lacking.sort((a, b) => lackOf(a) - lackOf(b))) {
    const slack = widths.map((width, at) => Math.max(0, width - (wanted[at] ?? 0)));
    const total = slack.reduce((a, b) => a + b, 0);
    const taken = Math.min(lackOf(index), total);
    if (taken <= 0) break;
    slack.forEach((part, at) => {
      widths[at] = (widths[at] ?? 0) - (taken * part) / total;
    });
    widths[index] = (widths[index] ?? 0) + taken;
  }
  return widths;
}

function cellStyle(cell: TableCell, isHead: boolean): TextStyle {
  const tone = cell.tone ?? 'plain';
  const ink = isHead ? 'zinc7' : inkOfTone[tone];
  const { cell: base } = textStyles;
  const face = isHead || tone === 'strong' || tone === 'over' ? base.strong : base.face;
  return { ...base, face, ink };
}

function tableRow(
  cells: readonly TableCell[],
  columns: readonly Column[],
  table: Tag,
  isHead: boolean,
  context: BlockContext,
): Row {
  const parent: Tag = { type: 'TR', parent: table };
  let height = 0;
  const parts = columns.map((column, index): Part => {
    const cell = cells[index] ?? { content: [] };
    const place = { ...column, y: padding, align: cell.align ?? 'left' };
    const words = setWords(cell.content, cellStyle(cell, isHead), place, context);
    height = Math.max(height, words.height);
    const tag: Tag = isHead ? { type: 'TH', parent, scope: 'Column' } : { type: 'TD', parent };
    return { tag, items: words.items };
  });
  const foot = height + 2 * padding;
  const [weight, ink] = isHead
    ? ([weights.rule, 'ink'] as const)
    : ([weights.hair, 'zinc2'] as const);
  const rule = stroke([0, foot], [context.width, foot], weight, ink);
  return row(foot, [...parts, { tag: null, items: [rule] }], { keep: isHead });
}

export function measureTable(block: BlockOf<'table'>, context: BlockContext): Row[] {
  const table: Tag = { type: 'Table', parent: context.sect };
  const columns = columnsOf(block, context);
  const rows: Row[] = [];
  if (block.caption !== '') {
    const tag: Tag = { type: 'Caption', parent: table };
    const words = setWords(
      strong(block.caption),
      textStyles.cell,
      { x: 0, y: 0, width: context.width },
      context,
    );
    rows.push(row(words.height + 1, [{ tag, items: words.items }], { before: 10, keep: true }));
  }
  const head = tableRow(block.head, columns, table, true, context);
  rows.push({ ...head, before: rows.length > 0 ? 0 : 10 });
  const body = block.rows.map((cells) => tableRow(cells, columns, table, false, context));
  return [...rows, ...body.map((r, at) => ({ ...r, keep: keeps(at, body), repeated: [head] }))];
}

/** A table no higher than this is not divided, points. */
const wholeUpTo = 240;

/** Of a divided table no single row stands alone at the foot or the top of a page. */
function keeps(at: number, body: readonly Row[]): boolean {
  if (at === body.length - 1) return false;
  const height = body.reduce((sum, each) => sum + each.height, 0);
  return height <= wholeUpTo || at === 0 || at === body.length - 2;
}
