import type { DimensionName } from '../units/dimension.ts';

type Columns = Readonly<Record<string, readonly [column: string, DimensionName, unit: string]>>;

/** Axes, area, torsion: every table has them under one name. */
const COMMON = {
  Ix: ['Ix_in4', 'inertia', 'in⁴'],
  Sx: ['Sx_in3', 'modulus', 'in³'],
  Zx: ['Zx_in3', 'modulus', 'in³'],
  rx: ['rx_in', 'length', 'in'],
  Iy: ['Iy_in4', 'inertia', 'in⁴'],
  Sy: ['Sy_in3', 'modulus', 'in³'],
  Zy: ['Zy_in3', 'modulus', 'in³'],
  ry: ['ry_in', 'length', 'in'],
  J: ['J_in4', 'inertia', 'in⁴'],
} as const satisfies Columns;
const AREA = { A: ['A_in2', 'area', 'in²'] } as const satisfies Columns;
const FLANGED = {
  d: ['d_in', 'length', 'in'],
  bf: ['bf_in', 'length', 'in'],
  tw: ['tw_in', 'length', 'in'],
  tf: ['tf_in', 'length', 'in'],
} as const satisfies Columns;
const OPEN = {
  Cw: ['Cw_in6', 'warping', 'in⁶'],
  rts: ['rts_in', 'length', 'in'],
  ho: ['ho_in', 'length', 'in'],
} as const satisfies Columns;

/** Properties of each kind of shape in the order they print, with their column, dimension and unit. */
export const COLUMNS = {
  i: {
    ...AREA,
    ...FLANGED,
    kdes: ['kdes_in', 'length', 'in'],
    lambdaf: ['bf_2tf', 'none', ''],
    lambdaw: ['h_tw', 'none', ''],
    ...COMMON,
    ...OPEN,
  },
  channel: {
    ...AREA,
    ...FLANGED,
    xbar: ['x_in', 'length', 'in'],
    lambdaf: ['b_t', 'none', ''],
    lambdaw: ['h_tw', 'none', ''],
    ...COMMON,
    ...OPEN,
    ro: ['ro_in', 'length', 'in'],
    H: ['H', 'none', ''],
  },
  'rect-hss': {
    ...AREA,
    Ht: ['Ht_in', 'length', 'in'],
    B: ['B_in', 'length', 'in'],
    t: ['tdes_in', 'length', 'in'],
    lambdab: ['b_tdes', 'none', ''],
    lambdah: ['h_tdes', 'none', ''],
    ...COMMON,
  },
  round: {
    ...AREA,
    D: ['OD_in', 'length', 'in'],
    t: ['tdes_in', 'length', 'in'],
    lambdad: ['D_t', 'none', ''],
    ...COMMON,
  },
} as const satisfies Readonly<Record<string, Columns>>;

export type TabulatedKind = keyof typeof COLUMNS;
export type PropertyOf<K extends TabulatedKind> = keyof (typeof COLUMNS)[K] & string;
/** A property of any kind of shape. */
export type AnyProperty = { [K in TabulatedKind]: PropertyOf<K> }[TabulatedKind];
