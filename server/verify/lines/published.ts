import type { LineOf } from '#shared/calc/line.ts';
import { createRecorder } from '#shared/calc/recorder.ts';
import { findGrade, MODULI, rowsOf } from '#shared/members/material.ts';
import { findShape, type Property, type Shape, TABLE_NAMES } from '#shared/sections/table.ts';
import { publishedEffectiveWidth } from '#shared/standards/aisc360-22/e7-constants.ts';
import { methodConstant, SPECIFICATION } from '#shared/standards/aisc360-22/parameters.ts';
import type { LineContext } from './line-context.ts';

type Lookup = LineOf<'lookup'>;
/** What a shipped table has at a place. */
export type Published = Pick<Lookup, 'published' | 'row' | 'column' | 'tableSource'>;
type Read = (line: Lookup, context: LineContext) => Published | null;

/** A shape's table: the member's row, the column of the key's last part (`section/Ix`). */
const shape: Read = ({ key, table }, { member }) => {
  const found = findShape(member.section);
  if (!found || found.table.name !== table) return null;
  const property = propertyOf(found, key.slice(key.lastIndexOf('/') + 1));
  return (
    property && {
      published: property.published,
      row: found.designation,
      column: property.column,
      tableSource: `${found.table.title}, ${found.table.publisher}`,
    }
  );
};

const propertyOf = ({ properties }: Shape, name: string): Property | null =>
  Object.hasOwn(properties, name)
    ? ((properties as Readonly<Record<string, Property>>)[name] ?? null)
    : null;

/** The grade's row that the member's own input leads to; any of its rows where that is no input. */
const steel: Read = ({ symbol, row }, { member, constants, input }) => {
  if (symbol !== 'Fy' && symbol !== 'Fu') return null;
  const grade = findGrade(member.material);
  const resolved = input?.steel.kind === 'grade' ? input.steel.steel : null;
  const found = resolved ?? (grade && rowsOf(grade).find((r) => r.row === row));
  if (!found) return null;
  return {
    published: found[constants][symbol],
    row: found.row,
    column: symbol,
    tableSource: found.title,
  };
};

const modulus: Read = ({ symbol }, { constants }) => {
  if (symbol !== 'E' && symbol !== 'G') return null;
  const row = constants === 'us' ? 'US customary' : 'SI';
  const published = MODULI[constants][symbol];
  return { published, row, column: symbol, tableSource: SPECIFICATION };
};

const CONSTANTS: readonly Parameters<typeof methodConstant>[1][] = [
  ...(['compression', 'flexure', 'tensionYielding', 'tensionRupture'] as const),
  ...(['shear', 'shearStockyWeb', 'loadLevel'] as const),
];

/** Constants that clauses give, by clause and symbol: a member may have one under several keys. */
const constant: Read = ({ table, symbol }, { record }) => {
  const r = createRecorder('');
  for (const name of CONSTANTS) methodConstant(r, name, record.design, name);
  const found = r.lines.filter((l): l is Lookup => l.kind === 'lookup');
  return found.find((l) => l.table === table && l.symbol === symbol) ?? null;
};

const TABLES: Readonly<Record<string, Read>> = {
  ...Object.fromEntries(TABLE_NAMES.map((name) => [name, shape])),
  'Steels by grade': steel,
  Symbols: modulus,
  'Table E7.1': ({ row, column }) => publishedEffectiveWidth(row, column),
};

/** What the shipped tables have for a look-up line; null where they have no such place. */
export const publishedFor: Read = (line, context) =>
  (Object.hasOwn(TABLES, line.table) ? TABLES[line.table] : constant)?.(line, context) ?? null;
