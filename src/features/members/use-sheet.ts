import { useMemo } from 'react';
import type { CalculationRecord } from '#shared/calc/record.ts';
import { memberSheet } from '#shared/report/member-sheet.ts';
import { presentTrace, type Trace } from '#shared/report/present-trace.ts';
import type { Block } from '#shared/report/tree.ts';
import { numberedBlocks, numberedTrace } from './number-lines.ts';

export interface Sheet {
  readonly blocks: readonly Block[];
  /** The combination that is shown. */
  readonly combination: string | undefined;
  readonly trace: Trace | null;
  /** Lines that the chosen one came from. */
  readonly lit: ReadonlySet<string>;
}

const none: ReadonlySet<string> = new Set();

/** A member's sheet under one combination, with the trace of its chosen line. */
export function useSheet(
  record: CalculationRecord | null,
  memberId: string,
  position: number,
  wanted: string | undefined,
  line: string | null,
): Sheet {
  const rows = record?.members[0]?.combinations;
  const combination = rows?.find(({ id }) => id === wanted)?.id ?? rows?.[0]?.id;
  const blocks = useMemo(
    () =>
      record ? numberedBlocks(memberSheet(record, memberId, combination ?? null), position) : [],
    [record, memberId, combination, position],
  );
  const trace = useMemo(() => {
    const found = record && line ? presentTrace(record, memberId, line) : null;
    return found && numberedTrace(found, position);
  }, [record, memberId, line, position]);
  const lit = useMemo(
    () => (trace ? new Set(trace.sources.map(({ address }) => address)) : none),
    [trace],
  );
  return { blocks, combination, trace, lit };
}
