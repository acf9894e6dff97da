import type { LineOf } from '#shared/calc/line.ts';
import { createRecorder } from '#shared/calc/recorder.ts';
import { findSteel, MODULI } from '#shared/members/material.ts';
import { findShape, type PropertyName, W_TABLE } from '#shared/sections/table.ts';
import {
  effectiveWidthConstants,
  methodConstant,
  SPECIFICATION,
} from '#shared/standards/aisc360-22/parameters.ts';
import type { LineContext } from './line-context.ts';

type Lookup = LineOf<'lookup'>;
/** What a shipped table has at a place. */
export type Published = Pick<Lookup, 'published' | 'row' | 'column' | 'tableSource'>;
type Read = (line: Lookup, context: LineContext) => Published | null;

/** The shape table: the member's row, the column of the symbol. */
const shape: Read = ({ symbol }, { member }) => {
  const found = findShape(member.section);
  const property = found?.properties[symbol as PropertyName];
  if (!found || !property) return null;
  return {
    published: property.published,
    row: found.designation,
    column: property.column,
    tableSource: `${W_TABLE.title}, ${W_TABLE.publisher}`,
  };
};

const steel: Read = ({ symbol }, { member, constants }) => {
  const found = findSteel(member.material);
  if (!found || (symbol !== 'Fy' && symbol !== 'Fu')) return null;
  const published = found[constants][symbol];
  return { published, row: found.key, column: symbol, tableSource: found.title };
};

const modulus: Read = ({ symbol }, { constants }) => {
  if (symbol !== 'E' && symbol !== 'G') return null;
  const row = constants === 'us' ? 'US customary' : 'SI';
  const published = MODULI[constants][symbol];
  return { published, row, column: symbol, tableSource: SPECIFICATION };
};

/** Constants that clauses give, read by the key of the line they print as. */
function constantsOf(design: 'LRFD' | 'ASD'): ReadonlyMap<string, Lookup> {
  const r = createRecorder('');
  methodConstant(r, 'compression', design);
  methodConstant(r, 'flexure', design);
  methodConstant(r, 'loadLevel', design);
  effectiveWidthConstants(r, 'web');
  effectiveWidthConstants(r, 'flange');
  return new Map(r.lines.flatMap((l) => (l.kind === 'lookup' ? [[l.key, l]] : [])));
}

const constant: Read = ({ key, table }, { record }) => {
  const found = constantsOf(record.design).get(key);
  return found && found.table === table ? found : null;
};

const TABLES: Readonly<Record<string, Read>> = {
  'W shapes': shape,
  'Steels by grade': steel,
  Symbols: modulus,
};

/** What the shipped tables have for a look-up line; null where they have no such place. */
export const publishedFor: Read = (line, context) =>
  (Object.hasOwn(TABLES, line.table) ? TABLES[line.table] : constant)?.(line, context) ?? null;
