import { printTable } from '../bench/print-table.ts';
import { EQUIVALENT } from './equivalent.ts';
import { MUTANT_KINDS, type Mutant } from './switchboard.ts';

/** A mutant with the test that fails on it, or null. */
export interface Result extends Mutant {
  readonly killer: string | null;
  readonly seen: number;
}

/** Why a mutant computes the same, or null. */
const equivalence = ({ id, kind }: Mutant): string | null =>
  EQUIVALENT.find(
    ({ mutants, kinds = ['relation at its limit'] }) => kinds.includes(kind) && mutants.test(id),
  )?.reason ?? null;

const percent = (part: number, whole: number): string =>
  whole === 0 ? '' : `${((100 * part) / whole).toFixed(1)} %`;

/** Prints the score by kind and by book, then every survivor without a reason. */
export function printResult(
  results: readonly Result[],
  baseline: { readonly tests: number; readonly failing: readonly string[] },
): void {
  const row = (name: string, of: readonly Result[]): string[] => {
    const killed = of.filter((r) => r.killer !== null).length;
    const same = of.filter((r) => r.killer === null && equivalence(r) !== null).length;
    const counts = [of.length, killed, same, of.length - killed - same];
    return [name, ...counts.map(String), percent(killed, of.length - same)];
  };
  const head = ['', 'mutants', 'found', 'equivalent', 'survive', 'score'];
  const books = ['aisc360-22', 'elastic-theory', 'section-properties'];
  const ofFormulas = results.filter((r) => r.text !== '');
  printTable(`${baseline.tests} tests`, head, [
    ...MUTANT_KINDS.map((kind) =>
      row(
        kind,
        results.filter((r) => r.kind === kind),
      ),
    ),
    row('all', results),
  ]);
  printTable('formulas by book', head, [
    ...books.map((book) =>
      row(
        book,
        ofFormulas.filter((r) => r.at.startsWith(`${book}/`)),
      ),
    ),
    row('all', ofFormulas),
  ]);
  const survivors = results.filter((r) => r.killer === null && equivalence(r) === null);
  printTable(
    'survivors',
    ['mutant', 'tests that reach it'],
    survivors.map(({ id, seen }) => [id, String(seen)]),
  );
  for (const text of baseline.failing)
    process.stdout.write(`\nleft out, since it fails without a mutant: ${text}\n`);
}
