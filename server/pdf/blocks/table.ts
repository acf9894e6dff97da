import type { BlockOf, TableCell } from '#shared/report/tree.ts';
import { type BlockContext, row } from '../block-context.ts';
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

function columnsOf(widths: readonly number[], total: number): Column[] {
  const sum = widths.reduce((a, b) => a + b, 0);
  const room = total - gap * (widths.length - 1);
  let x = 0;
  return widths.map((share) => {
    const column = { x, width: (room * share) / sum };
    x += column.width + gap;
    return column;
  });
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
  const columns = columnsOf(block.widths, context.width);
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
  for (const cells of block.rows) {
    rows.push({ ...tableRow(cells, columns, table, false, context), repeated: [head] });
  }
  return rows;
}
