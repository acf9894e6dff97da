import type { BlockOf } from '#shared/report/tree.ts';
import { type BlockContext, row } from '../block-context.ts';
import { bar, type Item, type Row, stroke, type Tag } from '../items.ts';
import { type TextStyle, textStyles, weights } from '../paper.ts';
import { plain, setWords } from './words.ts';

const styles = {
  project: { ...textStyles.field, size: 11, leading: 15, ink: 'zinc7' },
  number: { ...textStyles.field, face: 'ibm-plex-sans-semibold', size: 12, leading: 16 },
  title: { ...textStyles.prose, face: 'ibm-plex-serif-semibold', size: 27, leading: 33 },
} as const satisfies Record<string, TextStyle>;

/** Above the title, and between the two columns of fields, points. */
const space = { above: 96, fields: 26 };

/** The title sheet: what the calculation is, then its fields in two columns, then its notices. */
export function measureCover(block: BlockOf<'cover'>, context: BlockContext): Row[] {
  const { width, sect } = context;
  const bookmark: Item = { kind: 'bookmark', level: 1, title: block.title };
  const headings = (
    [
      ['project', block.project, 'P'],
      ['number', block.number, 'P'],
      ['title', block.title, 'H1'],
    ] as const
  ).map(([name, text, type], index) => {
    const y = index === 0 ? space.above : 0;
    const words = setWords(plain(text), styles[name], { x: 0, y, width }, context);
    const items = type === 'H1' ? [bookmark, ...words.items] : words.items;
    return row(y + words.height + 2, [{ tag: { type, parent: sect }, items }], { keep: true });
  });
  const rule = stroke([0, 0], [width, 0], weights.strong, 'ink');
  return [
    ...headings,
    row(1, [{ tag: null, items: [rule] }], { before: 12, keep: true }),
    ...fieldRows(block.fields, context),
    ...block.notices.map((notice, index) => noticeRow(notice, index === 0 ? 22 : 5, context)),
    ...block.cautions.map((caution, index) => cautionRow(caution, index === 0 ? 22 : 4, context)),
  ];
}

type Field = BlockOf<'cover'>['fields'][number];

function fieldRows(fields: readonly Field[], context: BlockContext): Row[] {
  const columnWidth = (context.width - space.fields) / 2;
  const table: Tag = { type: 'Table', parent: context.sect };
  const rows: Row[] = [];
  for (let index = 0; index < fields.length; index += 2) {
    const pair = fields.slice(index, index + 2);
    const tableRow: Tag = { type: 'TR', parent: table };
    let height = 0;
    const parts = pair.flatMap((field, column) => {
      const x = column * (columnWidth + space.fields);
      const label = setWords(
        plain(field.label),
        textStyles.label,
        { x, y: 5, width: columnWidth },
        context,
      );
      const value = setWords(
        plain(field.value),
        fieldStyle(field),
        { x, y: 5 + label.height, width: columnWidth },
        context,
      );
      height = Math.max(height, label.height + value.height);
      const rule = stroke([x, 0], [x + columnWidth, 0], weights.hair, 'zinc2');
      return [
        { tag: { type: 'TH', parent: tableRow, scope: 'Row' } as const, items: label.items },
        { tag: { type: 'TD', parent: tableRow } as const, items: value.items },
        { tag: null, items: index === 0 ? [] : [rule] },
      ];
    });
    rows.push(
      row(
        height + 9,
        parts.filter((part) => part.items.length > 0),
      ),
    );
  }
  return rows;
}

const hashStyle: TextStyle = {
  ...textStyles.field,
  face: 'ibm-plex-mono-regular',
  // 64 digits on one line of a column of Letter or A4.
  size: 6.1,
  leading: 11,
};

function fieldStyle({ value, tone }: Field): TextStyle {
  if (/^[0-9a-f]{40,}$/.test(value)) return hashStyle;
  return { ...textStyles.field, ink: tone === 'over' ? 'oxide' : 'ink' };
}

function noticeRow(notice: string, before: number, context: BlockContext): Row {
  const tag: Tag = { type: 'P', parent: context.sect };
  const place = { x: 10, y: 1, width: context.width - 10 };
  const words = setWords(plain(notice), textStyles.field, place, context);
  const height = words.height + 2;
  const mark = bar(0, 0, 2, height, 'oxide');
  return row(
    height,
    [
      { tag: null, items: [mark] },
      { tag, items: words.items },
    ],
    { before },
  );
}

const cautionStyle: TextStyle = { ...textStyles.sentence, ink: 'zinc7' };

function cautionRow(caution: string, before: number, context: BlockContext): Row {
  const tag: Tag = { type: 'P', parent: context.sect };
  const place = { x: 0, y: 0, width: Math.min(context.width, 430) };
  const words = setWords(plain(caution), cautionStyle, place, context);
  return row(words.height, [{ tag, items: words.items }], { before });
}
