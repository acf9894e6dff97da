import type { PageFrame } from '#shared/report/tree.ts';
import type { BlockContext } from './block-context.ts';
import { plain, setWords, textAt } from './blocks/words.ts';
import { type Item, type ItemOf, linePath, type RunningHead, stroke } from './items.ts';
import { type PaperSize, textStyles, weights } from './paper.ts';

const regular = 'ibm-plex-sans-condensed-regular';
const semibold = 'ibm-plex-sans-condensed-semibold';

/** Heights from the top of the page, and above its foot, points. */
const rows = { firm: 38, cells: 46, strong: 75, foot: 50 };
const cellPadding = 9;

export interface SheetNumber {
  readonly sheet: number;
  readonly of: number;
}

/** What every page repeats around its blocks, points from the page's corner. */
export function frameItems(
  frame: PageFrame,
  running: RunningHead | null,
  { sheet, of }: SheetNumber,
  paper: PaperSize,
  context: BlockContext,
): Item[] {
  const cells: readonly (readonly [string, string])[] = [
    ['Calculation', frame.calculation],
    ['Revision', frame.revision],
    ['Date', frame.date],
    ['By', frame.originator],
    ['Check', frame.checker],
    ['Sheet', `${sheet} of ${of}`],
  ];
  return [
    ...firmRow(frame, paper, context),
    ...titleRow(cells, running ?? { label: 'Calculation of', text: frame.title }, paper, context),
    ...footRow(frame, paper, context),
  ];
}

function firmRow(frame: PageFrame, paper: PaperSize, context: BlockContext): Item[] {
  const place = { y: rows.firm, size: 8, ink: 'ink' } as const;
  const firm = textAt(context, frame.firm, { ...place, x: paper.left, face: semibold });
  const x = paper.left + firm.width + (frame.firm === '' ? 0 : 10);
  const project = textAt(context, frame.project, { ...place, x, face: regular, ink: 'zinc7' });
  const end = { x: paper.right, y: rows.firm };
  const marking = frame.marking === null ? [] : markingItems(frame.marking, end, context);
  return [firm, project, ...marking];
}

/** The marking in a box whose right end is at x, its text on the baseline y. */
function markingItems(
  marking: string,
  { x, y }: { x: number; y: number },
  context: BlockContext,
): Item[] {
  const place = { x: x - 6, y, face: semibold, size: 8.5, ink: 'oxide', end: 'right' } as const;
  const text = textAt(context, marking, place);
  const [left, top, bottom] = [text.x - 6, y - 9.5, y + 4];
  const corners = [
    [left, top],
    [x, top],
    [x, bottom],
    [left, bottom],
  ] as const;
  return [
    {
      kind: 'path',
      path: [...linePath(corners), { op: 'close' }],
      stroke: { ink: 'oxide', width: 0.9 },
    },
    text,
  ];
}

function titleRow(
  cells: readonly (readonly [string, string])[],
  title: RunningHead,
  paper: PaperSize,
  context: BlockContext,
): Item[] {
  const items: Item[] = [
    stroke([paper.left, rows.cells], [paper.right, rows.cells], weights.hair, 'zinc3'),
    stroke([paper.left, rows.strong], [paper.right, rows.strong], weights.strong, 'ink'),
  ];
  let x = paper.right;
  for (const [index, [label, value]] of [...cells.entries()].reverse()) {
    const last = index === cells.length - 1;
    const said = [cellText(label, false, context), cellText(value, true, context)];
    const width = Math.max(22, ...said.map((text) => text.width)) + cellPadding * (last ? 1 : 2);
    x -= width;
    items.push(stroke([x, rows.cells], [x, rows.strong], weights.hair, 'zinc3'));
    items.push(...said.map((text) => ({ ...text, x: x + cellPadding })));
  }
  const label = { ...cellText(title.label, false, context), x: paper.left };
  const room = x - paper.left - cellPadding;
  return [...items, label, { ...fitted(title.text, room, context), x: paper.left }];
}

const cellText = (text: string, strong: boolean, context: BlockContext) =>
  textAt(context, text, {
    x: 0,
    y: rows.cells + (strong ? 22 : 10.5),
    face: strong ? semibold : regular,
    size: strong ? 9.5 : 7,
    ink: strong ? 'ink' : 'zinc7',
  });

/** A text cut to a width, with an ellipsis. */
function fitted(text: string, room: number, context: BlockContext): ItemOf<'text'> {
  let kept = text;
  while (kept !== '' && cellText(kept === text ? text : `${kept}…`, true, context).width > room) {
    kept = [...kept].slice(0, -1).join('');
  }
  return cellText(kept === text ? text : `${kept.trimEnd()}…`, true, context);
}

function footRow(frame: PageFrame, paper: PaperSize, context: BlockContext): Item[] {
  const y = paper.height - rows.foot;
  const end = { x: paper.right, y: y + 15 };
  const marking = frame.marking === null ? [] : markingItems(frame.marking, end, context);
  const box = marking[0]?.kind === 'path' ? marking[0].path[0] : undefined;
  const right = box?.op === 'move' ? box.x - 14 : paper.right;
  const place = { x: paper.left, y: y + 4, width: right - paper.left };
  const foot = setWords(plain(frame.foot), textStyles.foot, place, context);
  return [
    stroke([paper.left, y], [paper.right, y], weights.hair, 'zinc3'),
    ...foot.items,
    ...marking,
  ];
}
