import type { Point } from '#shared/figures/scene.ts';
import type { TextFace } from './font-files.ts';
import type { Formula } from './math/formula.ts';
import type { Segment } from './math/svg-path.ts';
import type { InkName } from './paper.ts';

/** What a measured row holds: things to paint, placed in points from the row's top left. */
export type Item =
  | {
      readonly kind: 'text';
      readonly x: number;
      /** Baseline. */
      readonly y: number;
      readonly face: TextFace;
      readonly size: number;
      readonly ink: InkName;
      readonly text: string;
    }
  | {
      readonly kind: 'formula';
      readonly x: number;
      readonly y: number;
      readonly size: number;
      readonly ink: InkName;
      /** Its lines, each at its own offset from x, y. */
      readonly lines: readonly { readonly dy: number; readonly formula: Formula }[];
      /** What extraction finds in its place. */
      readonly text: string;
    }
  | {
      readonly kind: 'path';
      readonly path: readonly Segment[];
      readonly fill?: InkName;
      readonly stroke?: {
        readonly ink: InkName;
        readonly width: number;
        readonly dash?: readonly number[];
      };
    }
  | {
      readonly kind: 'link';
      readonly x: number;
      readonly y: number;
      readonly width: number;
      readonly height: number;
      readonly to: string;
      readonly says: string;
    }
  /** A place that links go to. */
  | { readonly kind: 'anchor'; readonly name: string }
  | { readonly kind: 'bookmark'; readonly level: number; readonly title: string };

export type ItemOf<K extends Item['kind']> = Extract<Item, { kind: K }>;

/** A node of the document's logical structure; rows that share a node share its element. */
export interface Tag {
  readonly type:
    | 'Document'
    | 'Sect'
    | 'H1'
    | 'H2'
    | 'H3'
    | 'H4'
    | 'H5'
    | 'P'
    | 'L'
    | 'LI'
    | 'LBody'
    | 'Table'
    | 'TR'
    | 'TH'
    | 'TD'
    | 'Caption'
    | 'Formula'
    | 'Figure'
    | 'Link';
  readonly parent: Tag | null;
  readonly alt?: string;
  readonly scope?: 'Column' | 'Row';
}

/** Items that say one thing together; `null` is decoration, outside the structure. */
export interface Part {
  readonly tag: Tag | null;
  readonly items: readonly Item[];
}

/** A strip of the page that is never split. */
export interface Row {
  readonly height: number;
  /** Space above it, dropped at the top of a page. */
  readonly before: number;
  /** Stays on the page of the next row. */
  readonly keep: boolean;
  readonly parts: readonly Part[];
  /** Begins a new page. */
  readonly breakBefore?: boolean;
  /** Rows repeated above this one where it begins a page (a table's head). */
  readonly repeated?: readonly Row[];
  /** What the page's head says while this row is the first on the page. */
  readonly running?: RunningHead | null;
}

export interface RunningHead {
  readonly label: string;
  readonly text: string;
}

export const linePath = (points: readonly Point[]): Segment[] =>
  points.map(([x, y], index) => ({ op: index === 0 ? 'move' : 'line', x, y }));

/** A straight line. */
export function stroke(from: Point, to: Point, width: number, ink: InkName): ItemOf<'path'> {
  return { kind: 'path', path: linePath([from, to]), stroke: { ink, width } };
}

/** A filled rectangle. */
export function bar(
  x: number,
  y: number,
  width: number,
  height: number,
  fill: InkName,
): ItemOf<'path'> {
  const corners: Point[] = [
    [x, y],
    [x + width, y],
    [x + width, y + height],
    [x, y + height],
  ];
  return { kind: 'path', path: [...linePath(corners), { op: 'close' }], fill };
}

/** The same item moved by dx, dy. */
export function moveItem(item: Item, dx: number, dy: number): Item {
  if (item.kind === 'anchor' || item.kind === 'bookmark') return item;
  if (item.kind !== 'path') return { ...item, x: item.x + dx, y: item.y + dy };
  return { ...item, path: item.path.map((segment) => moveSegment(segment, dx, dy)) };
}

function moveSegment(segment: Segment, dx: number, dy: number): Segment {
  if (segment.op === 'close') return segment;
  const end = { x: segment.x + dx, y: segment.y + dy };
  if (segment.op !== 'curve') return { ...segment, ...end };
  const { x1, y1, x2, y2 } = segment;
  return { op: 'curve', x1: x1 + dx, y1: y1 + dy, x2: x2 + dx, y2: y2 + dy, ...end };
}
