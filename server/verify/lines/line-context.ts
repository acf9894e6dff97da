import type { PlacedLine } from '#shared/calc/address.ts';
import type { Formula } from '#shared/calc/formula.ts';
import type { Line, ValuedLine } from '#shared/calc/line.ts';
import type { CalculationRecord, MemberRecord } from '#shared/calc/record.ts';
import type { ResolvedInput, ResolvedMember } from '#shared/members/resolved.ts';

/** What checking a line needs to know of the record around it. */
export interface LineContext {
  readonly record: CalculationRecord;
  readonly member: MemberRecord;
  readonly placed: PlacedLine;
  /** The member in the record's own input, read again; null where that is no input. */
  readonly input: ResolvedMember | null;
  /** The whole of that input. */
  readonly basis: ResolvedInput | null;
  /** Which published set of material constants the input pins. */
  readonly constants: 'us' | 'si';
  /** The line a reference leads to if it has a value and stands before this one. */
  valued(ref: string): ValuedLine | null;
  formulaNamed(id: string): Formula | undefined;
}

/** Reasons why a line is not reproduced; none when it is. */
export type LineCheck<L extends Line> = (line: L, context: LineContext) => Iterable<string>;

/** The words for an operand that isn't there. */
export const missing = (ref: string): string =>
  `refers to ${ref}, which is no value before this line`;
