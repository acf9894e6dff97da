import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { SPECIFICATION } from './parameters.ts';
import { clause } from './writer.ts';

const TABLE = 'Table E7.1';

/** c1 and c2 of Table E7.1 (ANSI/AISC 360-22) for a kind of element. */
const EFFECTIVE_WIDTH = {
  stiffened: { row: '(a) stiffened elements except walls of HSS', c1: '0.18', c2: '1.31' },
  wall: { row: '(b) walls of square and rectangular HSS', c1: '0.20', c2: '1.38' },
  other: { row: '(c) all other elements', c1: '0.22', c2: '1.49' },
} as const;

/** Row of Table E7.1: webs and box plates are stiffened, flanges are others. */
export type ElementCase = keyof typeof EFFECTIVE_WIDTH;
type Column = 'c1' | 'c2';

const place = (entry: (typeof EFFECTIVE_WIDTH)[ElementCase], column: Column) => ({
  published: entry[column],
  table: TABLE,
  row: entry.row,
  column,
  tableSource: SPECIFICATION,
});

/** What Table E7.1 has at a row and a column as they are printed; null where it has no such place. */
export function publishedEffectiveWidth(row: string, column: string) {
  const entry = Object.values(EFFECTIVE_WIDTH).find((e) => e.row === row);
  return entry && (column === 'c1' || column === 'c2') ? place(entry, column) : null;
}

/** c1 and c2 of an element as the lines `E7/<name>/c1` and `E7/<name>/c2`. */
export function effectiveWidthConstants(
  r: Recorder,
  name: string,
  kind: ElementCase,
): { readonly c1: Quantity; readonly c2: Quantity } {
  const entry = EFFECTIVE_WIDTH[kind];
  const read = (column: Column) =>
    r.lookup(
      `E7/${name}/${column}`,
      column,
      'none',
      { value: Number(entry[column]), ...place(entry, column) },
      {
        title: column === 'c1' ? 'Imperfection factor' : 'Effective-width factor',
        clause: clause('E7.1', TABLE),
      },
    );
  return { c1: read('c1'), c2: read('c2') };
}
