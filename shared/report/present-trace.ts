import { lineGraph } from '../calc/graph.ts';
import type { CalculationRecord } from '../calc/record.ts';
import { openMember } from './open-member.ts';
import { presentLine } from './present-line.ts';
import type { LineBlock } from './tree.ts';

/** One rung of the ladder beside a sheet, or one line that uses the chosen one. */
export interface TraceStep {
  readonly address: string;
  readonly number: string;
  readonly title: string;
  readonly reference: LineBlock['reference'];
  /** The line in symbols, without values: TeX chunks. */
  readonly working: readonly string[];
  readonly result: LineBlock['result'];
  /** A given value ends the ladder; it carries its source and state. */
  readonly given: LineBlock['given'];
  /** The whole line as one line of text. */
  readonly text: string;
}

export interface Trace {
  readonly chosen: TraceStep;
  /** Operands of the line itself. */
  readonly sources: readonly TraceStep[];
  /** All lines below it down to given values, nearest first. */
  readonly ladder: readonly TraceStep[];
  readonly usedBy: readonly TraceStep[];
}

/** The way home of one line of a member; null where the address is not (or no longer) in the record. */
export function presentTrace(
  record: CalculationRecord,
  memberId: string,
  address: string,
): Trace | null {
  const { member, presenter } = openMember(record, memberId);
  const graph = lineGraph(member);
  const step = (at: string): TraceStep[] => {
    const placed = graph.lines.get(at);
    if (!placed) return [];
    const block = presentLine(presenter, placed);
    if (block.kind !== 'line') return [];
    const { number, title, reference, working, result, given, text } = block;
    return [
      { address: at, number, title, reference, working: working.slice(0, 2), result, given, text },
    ];
  };
  const [chosen] = step(address);
  if (!chosen) return null;
  return {
    chosen,
    sources: graph.sources(address).flatMap(step),
    ladder: graph.ladder(address).flatMap(step),
    usedBy: graph.dependents(address).flatMap(step),
  };
}
