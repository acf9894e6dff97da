import { placedLines } from '#shared/calc/address.ts';
import type { Line } from '#shared/calc/line.ts';
import type { CalculationRecord, MemberRecord } from '#shared/calc/record.ts';
import { parseInput } from '#shared/members/parse-input.ts';
import { runCalculation } from '#shared/members/run.ts';

/** The record of an INPUT.json that has to be valid. */
export function recordOf(input: unknown): CalculationRecord {
  const parsed = parseInput(input);
  if (!parsed.ok) throw new Error(parsed.problems.map((p) => `${p.path}: ${p.message}`).join('\n'));
  return runCalculation(parsed.input);
}

/** The first member of a record. */
export function firstMember(record: CalculationRecord): MemberRecord {
  const [member] = record.members;
  if (!member) throw new Error('the record has no member');
  return member;
}

/** All lines of a member by address. */
export const linesOf = (member: MemberRecord): ReadonlyMap<string, Line> =>
  new Map(placedLines(member).map((p) => [p.address, p.line]));

/** Value of a line in N and mm: its value, or a check's ratio; throws where there is none. */
export function valueAt(member: MemberRecord, address: string): number {
  const line = linesOf(member).get(address);
  if (line && 'value' in line) return line.value;
  if (line?.kind === 'check') return line.ratio;
  throw new Error(`no value at ${address}`);
}
