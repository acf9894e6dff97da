import type { Line } from '../calc/line.ts';
import type { CombinationRecord, CoverageRow } from '../calc/record.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { printNumber } from '../units/format.ts';
import type { CombinationRun } from './combination.ts';
import { notReached, type Told } from './limit-state.ts';
import { LIMIT_STATES } from './limit-states.ts';

type Cell = CoverageRow['cells'][number];

/** Nothing silently skipped: every limit state under every combination, with its state and reason. */
export function completenessOf(
  runs: ReadonlyMap<string, CombinationRun>,
  combinations: readonly CombinationRecord[],
  memberLines: readonly Line[],
): CoverageRow[] {
  const halted = memberLines.find(
    (l) => l.kind === 'notice' && (l.key === 'B4/outside' || l.key === 'C2/outside'),
  );
  const stopOf = (record: CombinationRecord): Told | null => {
    if (halted) return { state: 'outside scope', because: halted.title, address: halted.key };
    const tension = record.lines.find((l) => l.key === 'D2/outside');
    return tension
      ? {
          state: 'outside scope',
          because: 'the member is in tension',
          address: `${record.id}:${tension.key}`,
        }
      : null;
  };
  return LIMIT_STATES.map((state) => ({
    id: state.id,
    title: state.title,
    clause: clause(state.clause[0], state.clause[1] ?? null),
    cells: combinations.map((record): Cell => {
      const run = runs.get(record.id);
      const told: Told =
        (state.never ? null : stopOf(record)) ??
        (run ? state.tell({ run, record, memberLines }) : notReached('no run'));
      return {
        combination: record.id,
        state: told.state,
        because: told.because,
        address: told.address ?? null,
        ratio: told.check?.ratio ?? null,
        ratioText: told.check
          ? printNumber(told.check.ratio, told.check.print.working ?? { dec: 3 }).text
          : null,
      };
    }),
  }));
}
