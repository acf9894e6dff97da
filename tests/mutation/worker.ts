import { register } from 'node:module';
import { Switchboard } from './switchboard.ts';

/*
 * One process of a mutation run. It runs all tests once, sends what mutants there are, then runs the
 * mutants it is asked for, one by one.
 */
export interface Outcome {
  readonly id: string;
  readonly killer: string | null;
  /** Tests that reach it and would come out otherwise, as far as they were run. */
  readonly seen: number;
}

const board = new Switchboard();
(globalThis as unknown as { mutationBoard: Switchboard }).mutationBoard = board;
register('./rewrite-sources.mjs', import.meta.url);

const { runBaseline, runMutant } = await import('./units.ts');
const { mutantsOf } = await import('./formula-mutants.ts');
const { BOOKS } = await import('#shared/standards/library.ts');

const { units, failing } = await runBaseline(board, process.argv[2] ?? '');
const formulas = BOOKS.flatMap((book) => [...book.formulas.values()]);
const mutants = [...formulas.flatMap(mutantsOf), ...board.met.values()];
const byId = new Map(mutants.map((m) => [m.id, m]));

process.on('message', async (id: string) => {
  const mutant = byId.get(id);
  if (!mutant) throw new Error(`no mutant ${id}`);
  const outcome: Outcome = { id, ...(await runMutant(board, units, mutant)) };
  process.send?.(outcome);
});
process.send?.({
  mutants,
  failing,
  tests: units.reduce((sum, u) => sum + u.tests.size, 0),
});
