import type { DimensionName } from '../units/dimension.ts';
import { parseQuantity } from '../units/parse.ts';
import { COLUMNS, type PropertyOf, type TabulatedKind } from './columns.ts';
import channels from './data/us-channels.json' with { type: 'json' };
import rectHss from './data/us-hss-rect.json' with { type: 'json' };
import roundAndPipe from './data/us-hss-round-pipe.json' with { type: 'json' };
import smhp from './data/us-s-m-hp.json' with { type: 'json' };
import wShapes from './data/us-w.json' with { type: 'json' };
import { cleanDesignation, designationKey } from './designation.ts';

export { printedDesignation } from './designation.ts';

/** A published property: base value (N, mm), the text as published, its column in the table. */
export interface Property {
  readonly value: number;
  readonly dimension: DimensionName;
  readonly published: string;
  readonly column: string;
}

/** Where a row stands: the name that look-up lines print, and the publication. */
export interface TableSource {
  readonly name: string;
  readonly title: string;
  readonly publisher: string;
  readonly by: string;
}

interface ShapeOf<K extends TabulatedKind, F extends string> {
  readonly kind: K;
  readonly family: F;
  /** As the table writes it: `W12X79`. */
  readonly designation: string;
  /** Nominal weight in lb/ft, for lists. */
  readonly weight: number;
  readonly table: TableSource;
  readonly properties: Readonly<Record<PropertyOf<K>, Property>>;
  /** What a reader has to know of the row's values, or null. */
  readonly note: string | null;
}

export type WShape = ShapeOf<'i', 'W'>;
export type IShape = WShape | ShapeOf<'i', 'M' | 'S' | 'HP'>;
export type ChannelShape = ShapeOf<'channel', 'C' | 'MC'>;
export type RectHssShape = ShapeOf<'rect-hss', 'HSS'>;
export type RoundShape = ShapeOf<'round', 'round HSS' | 'pipe'>;
export type Shape = IShape | ChannelShape | RectHssShape | RoundShape;
export type Family = Shape['family'];

/** Families in the order of lists. */
export const FAMILIES: readonly Family[] = [
  ...(['W', 'M', 'S', 'HP', 'C', 'MC', 'HSS', 'round HSS', 'pipe'] as const),
];

interface TableData {
  readonly name: string;
  readonly kind: TabulatedKind;
  readonly familyOf: (designation: string) => Family;
  readonly data: {
    readonly title: string;
    readonly publisher: string;
    readonly by: string;
    readonly columns: readonly string[];
    readonly rows: readonly (readonly string[])[];
    readonly row_notes?: Readonly<Record<string, string>>;
  };
}

const letters = (designation: string) => /^[A-Z]+/.exec(designation)?.[0] as Family;
const TABLES: readonly TableData[] = [
  { name: 'W shapes', kind: 'i', familyOf: letters, data: wShapes },
  { name: 'S, M and HP shapes', kind: 'i', familyOf: letters, data: smhp },
  { name: 'Channels', kind: 'channel', familyOf: letters, data: channels },
  { name: 'Rectangular HSS', kind: 'rect-hss', familyOf: () => 'HSS', data: rectHss },
  {
    name: 'Round HSS and pipe',
    kind: 'round',
    familyOf: (d) => (d.startsWith('Pipe') ? 'pipe' : 'round HSS'),
    data: roundAndPipe,
  },
];

/** The names that look-up lines give the tables. */
export const TABLE_NAMES: readonly string[] = TABLES.map(({ name }) => name);

const sourceOf = ({ name, data: { title, publisher, by } }: TableData): TableSource => ({
  ...{ name, title, publisher, by },
});

interface Row {
  readonly designation: string;
  readonly family: Family;
  /** The designation in capitals and, where the table has one, the form of data interchange. */
  readonly names: readonly string[];
  readonly table: TableData;
  readonly cells: readonly string[];
}

const columnOf = ({ data, name }: TableData, column: string): number => {
  const at = data.columns.indexOf(column);
  if (at < 0) throw new Error(`${name} has no column ${column}`);
  return at;
};

// Read at the first look-up, so that starting costs nothing.
let index: { readonly rows: readonly Row[]; readonly byKey: ReadonlyMap<string, Row> } | null =
  null;
function indexed() {
  if (index) return index;
  const rows = TABLES.flatMap((table) => {
    const alias = table.data.columns.indexOf('edi_designation');
    return table.data.rows.map((cells): Row => {
      const designation = cells[0] as string;
      const names = [designation, alias < 0 ? designation : (cells[alias] as string)];
      return {
        ...{ designation, table, cells },
        family: table.familyOf(designation),
        names: [...new Set(names.map((n) => n.toUpperCase()))],
      };
    });
  });
  const byKey = new Map<string, Row>();
  for (const row of rows) for (const name of row.names) byKey.set(designationKey(name), row);
  index = { rows, byKey };
  return index;
}

function readRow({ table, cells, designation, family }: Row): Shape {
  const properties = Object.fromEntries(
    Object.entries(COLUMNS[table.kind]).map(([name, [column, dimension, unit]]) => {
      const published = `${cells[columnOf(table, column)]} ${unit}`.trim();
      const parsed = parseQuantity(published, dimension);
      if (!parsed.ok) throw new Error(`${designation} ${column}: ${parsed.reason}`);
      return [name, { value: parsed.quantity.value, dimension, published, column }];
    }),
  );
  return Object.freeze({
    ...{ kind: table.kind, family, designation, properties },
    weight: Number(cells[columnOf(table, 'weight_lb_ft')]),
    table: sourceOf(table),
    note: table.data.row_notes?.[designation] ?? null,
  }) as Shape;
}

const shapes = new Map<string, Shape>();

/** The shape of that designation in any table, or null. `HSS8X6X.5` is `HSS8X6X1/2`. */
export function findShape(designation: string): Shape | null {
  const row = indexed().byKey.get(designationKey(designation));
  if (!row) return null;
  const known = shapes.get(row.designation);
  if (known) return known;
  const shape = readRow(row);
  shapes.set(row.designation, shape);
  return shape;
}

/** The table's own form of a designation; what no table has, in capitals without spaces. */
export const normalDesignation = (text: string): string =>
  indexed().byKey.get(designationKey(text))?.designation ?? cleanDesignation(text);

/** All designations of a family, in the table's order. */
export const designationsOf = (family: Family): readonly string[] =>
  indexed()
    .rows.filter((row) => row.family === family)
    .map((row) => row.designation);

/** All designations of W shapes, in the table's order (depth, then weight). */
export const W_DESIGNATIONS: readonly string[] = wShapes.rows.map((row) => row[0] as string);

/** Designations that contain what was typed, those that start with it first, at most `limit`. */
export function searchShapes(typed: string, limit = 12): readonly string[] {
  const part = cleanDesignation(typed);
  const { rows } = indexed();
  const starts = (name: string) =>
    name.startsWith(part) || name.replace(/^[A-Z]+/, '').startsWith(part);
  const first = rows.filter(({ names }) => names.some(starts));
  const then = rows.filter(
    ({ names }) => names.some((name) => name.includes(part)) && !names.some(starts),
  );
  return [...first, ...then].slice(0, limit).map((row) => row.designation);
}
