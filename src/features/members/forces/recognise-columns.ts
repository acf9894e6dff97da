import type { ActionName } from '#shared/contracts/members.ts';
import { UNITS } from '#shared/units/unit.ts';

/** What a column of a pasted table holds; `leave` is a column that is not taken over. */
export type ColumnUse = 'name' | ActionName | 'leave';

export interface Column {
  readonly header: string;
  readonly use: ColumnUse;
  /** Unit of its numbers that come without one, from its header or the row below it. */
  readonly unit: string | null;
}

const ends = (axis: 'x' | 'y', word: 'major' | 'minor', end: 'a' | 'b', number: 1 | 2) => {
  const place = end === 'a' ? 'start' : 'end';
  return [
    ...['m', 'mu', 'mr', 'ma'].flatMap((m) => [`${m}${axis}${end}`, `${m}${axis}${number}`]),
    ...[`${word}${end}`, `${word}end${end}`, `m${word}${end}`, `m${axis}end${end}`],
    ...[`m${axis}at${end}`, `m${axis}${place}`, `${word}${place}`],
  ];
};

const largest = (axis: 'x' | 'y', word: 'major' | 'minor') => [
  ...[`m${axis}max`, `mu${axis}max`, `mr${axis}max`, `${word}max`, `${word}largest`],
  ...[`m${axis}largest`, `m${axis}span`, `${word}span`],
];

/** Named by the axis that the load bends about, as the moments are. */
const shears = (axis: 'x' | 'y', word: 'major' | 'minor') => [
  ...[`v${axis}`, `vu${axis}`, `vr${axis}`, `va${axis}`, `v${axis}max`],
  ...[`shear${axis}`, `shear${word}`, `${word}shear`],
];

const spellings: Readonly<Record<Exclude<ColumnUse, 'leave'>, readonly string[]>> = {
  name: ['name', 'combination', 'combo', 'loadcombination', 'loadcombo', 'case', 'loadcase', 'lc'],
  P: ['p', 'pu', 'pa', 'pr', 'n', 'axial', 'axialforce', 'axialp', 'compression'],
  MxA: ends('x', 'major', 'a', 1),
  MxB: ends('x', 'major', 'b', 2),
  MyA: ends('y', 'minor', 'a', 1),
  MyB: ends('y', 'minor', 'b', 2),
  MxMax: largest('x', 'major'),
  MyMax: largest('y', 'minor'),
  Vx: shears('x', 'major'),
  Vy: shears('y', 'minor'),
};

const uses = new Map(
  Object.entries(spellings).flatMap(([use, names]) =>
    names.map((name) => [name, use as ColumnUse] as const),
  ),
);

const plain = (text: string): string => text.toLowerCase().replace(/[^\p{L}\p{N}]/gu, '');

const aliases: Readonly<Record<string, string>> = {
  kips: 'kip',
  knm: 'kN m',
  kn: 'kN',
  kipft: 'kip ft',
  kipin: 'kip in',
  kft: 'kip ft',
  nm: 'N m',
  n: 'N',
  kip: 'kip',
  lbf: 'lbf',
};

/** A unit as headers write it: `kip-ft`, `(kN·m)`. */
function unitIn(text: string): string | null {
  const bare = text.trim();
  if (UNITS.has(bare) && bare !== '') return bare;
  const known = aliases[bare.toLowerCase().replace(/[\s.·⋅*-]/g, '')];
  return known ?? null;
}

function columnOf(header: string): Column {
  const bracketed = /^(.*?)[([]([^)\]]*)[)\]]\s*$/.exec(header);
  const comma = /^(.*),\s*([^,]+)$/.exec(header);
  const [, name = header, tail = ''] = bracketed ?? comma ?? [];
  const unit = unitIn(tail);
  const use = uses.get(plain(unit ? name : header)) ?? uses.get(plain(name)) ?? 'leave';
  return { header, use, unit };
}

/** Whether a row reads as a header: some of its cells name what we know, none is a number. */
export const isHeader = (row: readonly string[]): boolean =>
  row.some((cell) => columnOf(cell).use !== 'leave') && !row.some(isNumber);

const isNumber = (cell: string): boolean => /^[+\-\u2212]?[\d.,]+(e[+-]?\d+)?$/i.test(cell.trim());

/** A row that only holds units, under the header. */
export const isUnitRow = (row: readonly string[]): boolean => {
  const filled = row.filter((cell) => cell !== '');
  return filled.length > 0 && filled.every((cell) => unitIn(cell.replace(/[()[\]]/g, '')) !== null);
};

/** Guesses what each column holds; of two columns for one use the first takes it. */
export function recogniseColumns(
  header: readonly string[],
  units: readonly string[] | null,
): Column[] {
  const taken = new Set<ColumnUse>();
  return header.map((cell, index) => {
    const column = columnOf(cell);
    const below = units?.[index];
    const unit = column.unit ?? (below ? unitIn(below.replace(/[()[\]]/g, '')) : null);
    const use = taken.has(column.use) ? 'leave' : column.use;
    if (use !== 'leave') taken.add(use);
    return { header: cell, use, unit };
  });
}
