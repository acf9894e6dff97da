import type { DimensionName } from '../units/dimension.ts';
import { parseQuantity } from '../units/parse.ts';
import wShapes from './data/us-w.json' with { type: 'json' };

/** A published property: base value (N, mm), the text as published, its column in the table. */
export interface Property {
  readonly value: number;
  readonly dimension: DimensionName;
  readonly published: string;
  readonly column: string;
}

const COLUMNS = {
  A: ['A_in2', 'area', 'in²'],
  d: ['d_in', 'length', 'in'],
  bf: ['bf_in', 'length', 'in'],
  tw: ['tw_in', 'length', 'in'],
  tf: ['tf_in', 'length', 'in'],
  kdes: ['kdes_in', 'length', 'in'],
  lambdaf: ['bf_2tf', 'none', ''],
  lambdaw: ['h_tw', 'none', ''],
  Ix: ['Ix_in4', 'inertia', 'in⁴'],
  Sx: ['Sx_in3', 'modulus', 'in³'],
  Zx: ['Zx_in3', 'modulus', 'in³'],
  rx: ['rx_in', 'length', 'in'],
  Iy: ['Iy_in4', 'inertia', 'in⁴'],
  Sy: ['Sy_in3', 'modulus', 'in³'],
  Zy: ['Zy_in3', 'modulus', 'in³'],
  ry: ['ry_in', 'length', 'in'],
  J: ['J_in4', 'inertia', 'in⁴'],
  Cw: ['Cw_in6', 'warping', 'in⁶'],
  rts: ['rts_in', 'length', 'in'],
  ho: ['ho_in', 'length', 'in'],
} as const satisfies Record<string, readonly [column: string, DimensionName, unit: string]>;

export type PropertyName = keyof typeof COLUMNS;
export const PROPERTY_NAMES = Object.keys(COLUMNS) as readonly PropertyName[];

export interface WShape {
  readonly family: 'W';
  /** As the table writes it: `W12X79`. */
  readonly designation: string;
  /** Nominal weight in lb/ft, for lists. */
  readonly weight: number;
  readonly properties: Readonly<Record<PropertyName, Property>>;
}

export const W_TABLE = {
  title: wShapes.title,
  publisher: wShapes.publisher,
  by: wShapes.by,
  count: wShapes.rows.length,
} as const;

const column = (name: string): number => {
  const at = wShapes.columns.indexOf(name);
  if (at < 0) throw new Error(`the table has no column ${name}`);
  return at;
};

const property = (row: readonly string[], name: PropertyName): Property => {
  const [header, dimension, unit] = COLUMNS[name];
  const published = `${row[column(header)]} ${unit}`.trim();
  const parsed = parseQuantity(published, dimension);
  if (!parsed.ok) throw new Error(`${row[0]} ${header}: ${parsed.reason}`);
  return { value: parsed.quantity.value, dimension, published, column: header };
};

const rows: ReadonlyMap<string, readonly string[]> = new Map(
  wShapes.rows.map((row) => [row[0] as string, row]),
);
const shapes = new Map<string, WShape>();

/** `w12×79`, `W 12 X 79` → `W12X79`. */
export const normalDesignation = (text: string): string =>
  text.toUpperCase().replace(/\s+/g, '').replace(/[×*]/g, 'X');

/** All designations, in the table's order (depth, then weight). */
export const W_DESIGNATIONS: readonly string[] = [...rows.keys()];

/** The shape of that designation, or null where the table has none. */
export function findShape(designation: string): WShape | null {
  const name = normalDesignation(designation);
  const known = shapes.get(name);
  if (known) return known;
  const row = rows.get(name);
  if (!row) return null;
  const shape: WShape = Object.freeze({
    family: 'W' as const,
    designation: name,
    weight: Number(row[column('weight_lb_ft')]),
    properties: Object.fromEntries(PROPERTY_NAMES.map((p) => [p, property(row, p)])) as Record<
      PropertyName,
      Property
    >,
  });
  shapes.set(name, shape);
  return shape;
}

/** Designations that contain what was typed, those that start with it first, at most `limit`. */
export function searchShapes(typed: string, limit = 12): readonly string[] {
  const part = normalDesignation(typed);
  if (part === '') return W_DESIGNATIONS.slice(0, limit);
  const starts = W_DESIGNATIONS.filter((d) => d.startsWith(part) || d.slice(1).startsWith(part));
  const contains = W_DESIGNATIONS.filter((d) => d.includes(part) && !starts.includes(d));
  return [...starts, ...contains].slice(0, limit);
}

/** A designation as it is set in print: `W12×79`. */
export const printedDesignation = (designation: string): string => designation.replace(/X/g, '×');
