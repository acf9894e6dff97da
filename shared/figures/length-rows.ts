import { chainEnds } from './chain-ends.ts';
import type { LengthChain, MemberDrawing, NamedDrawn } from './drawing.ts';
import { LEFT, WIDTH } from './frame.ts';
import { boxOf, type Label, REAL } from './place-labels.ts';
import type { Point, Shape } from './scene.ts';
import { label, PENS, segment, textWidth } from './shapes.ts';

const ROW = 15;
const ORDER = ['L', 'Lcx', 'Lcy', 'Lcz', 'Lb'];
const GOVERNS = { ink: 'oxide', width: 2 } as const;

interface Row extends Omit<LengthChain, 'symbol'> {
  readonly symbols: readonly string[];
}

/**
 * Lengths as dimension lines to scale: those between held points in place, the others from end A.
 * Rows that measure the same pieces are one.
 */
export function lengthRows(drawing: MemberDrawing, along: (mm: number) => number, top: number) {
  const shapes: Shape[] = [];
  let y = top;
  for (const row of rowsOf(drawing)) {
    y += ROW;
    const ends = chainEnds(row.pieces);
    const end = along(ends.at(-1) ?? 0);
    shapes.push(
      ...row.pieces.flatMap((piece, i) =>
        pieceShapes(
          row.pieces.length > 1 ? piece.text : '',
          [along(ends[i] ?? 0), along(ends[i + 1] ?? 0)],
          y - 4,
          row.governs === i,
        ),
      ),
      ...ends.map((z) => segment([along(z), y - 8], [along(z), y], PENS.rule)),
      label(row.symbols.join(', '), [LEFT - 10, y], { anchor: 'end', within: LEFT - 12 }),
      label(row.words, [end + 8, y], { within: WIDTH - end - 10 }),
    );
  }
  return { shapes, end: y + 10 };
}

function rowsOf({ length, lengths, chains }: MemberDrawing): Row[] {
  const single = (l: NamedDrawn): LengthChain => ({
    symbol: l.symbol,
    pieces: [l],
    governs: null,
    words: l.text,
  });
  const all = [...[{ symbol: 'L', ...length }, ...lengths].map(single), ...chains].sort(
    (a, b) => ORDER.indexOf(a.symbol) - ORDER.indexOf(b.symbol),
  );
  const rows = new Map<string, Row>();
  for (const { symbol, ...chain } of all) {
    // The segment that governs is said at a row of its own.
    const key = `${chain.pieces.map((p) => p.value).join(' ')}${chain.governs ?? ''}`;
    rows.set(key, { ...chain, symbols: [...(rows.get(key)?.symbols ?? []), symbol] });
  }
  return [...rows.values()];
}

/** One dimension line; its text breaks it where there is room. */
function pieceShapes(
  text: string,
  [from, to]: readonly [number, number],
  y: number,
  governs: boolean,
): Shape[] {
  const line = segment([from, y], [to, y], governs ? GOVERNS : PENS.rule);
  const size = [11, 9.5].find((s) => REAL * textWidth(text, s) <= to - from - 6);
  if (text === '' || size === undefined) return [line];
  const said = {
    ...label(text, [(from + to) / 2, y + 4], {
      anchor: 'middle',
      ...(governs ? { weight: 600 } : {}),
    }),
    size,
  } as Label;
  const { left, right } = boxOf(said);
  const points: Point[] = [
    [left, y - 5],
    [right, y - 5],
    [right, y + 5],
    [left, y + 5],
  ];
  return [line, { kind: 'area', points, fill: 'paper' }, said];
}
