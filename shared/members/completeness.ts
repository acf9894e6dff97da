import type { Line } from '../calc/line.ts';
import type { CombinationRecord, CoverageRow } from '../calc/record.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { printNumber } from '../units/format.ts';
import { notReached, type Told } from './limit-state.ts';
import { LIMIT_STATES } from './limit-states.ts';
import type { CombinationRun } from './member-strengths.ts';

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
  const haltOf = (): Told | null =>
    halted ? { state: 'outside scope', because: halted.title, address: halted.key } : null;
  return LIMIT_STATES.map((state) => ({
    id: state.id,
    title: state.title,
    clause: clause(state.clause[0], state.clause[1] ?? null),
    cells: combinations.flatMap((record): Cell[] => {
      const run = runs.get(record.id);
      const segments = state.bySegment && run ? run.segments : [null];
      return segments.map((segment) => {
        const told: Told =
          (state.never ? null : haltOf()) ??
          (run
            ? state.tell({ run, record, memberLines, segment: segment ?? run.segments[0] ?? null })
            : notReached('no run'));
        return {
          combination: record.id,
          segment,
          state: told.state,
          because: told.because,
          address: told.address ?? null,
          ratio: told.check?.ratio ?? null,
          ratioText: told.check
            ? printNumber(told.check.ratio, told.check.print.working ?? { dec: 3 }).text
            : null,
        };
      });
    }),
  }));
}
