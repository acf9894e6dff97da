import type { Line, LineOf } from '#shared/calc/line.ts';
import type { CalculationRecord, MemberRecord } from '#shared/calc/record.ts';
import { firstMember, linesOf, recordOf } from '../reference/run-input.ts';
import { inputOf, type Member } from './member.ts';

/** A run of a member. */
export interface Run {
  readonly member: Member;
  readonly input: unknown;
  readonly record: CalculationRecord;
  readonly of: MemberRecord;
  readonly lines: ReadonlyMap<string, Line>;
}

export function run(member: Member): Run {
  const input = inputOf(member);
  const record = recordOf(input);
  const of = firstMember(record);
  return { member, input, record, of, lines: linesOf(of) };
}

/** The value of a line in N and mm; null where it is not written. */
export function valueIn({ lines }: Run, address: string): number | null {
  const line = lines.get(address);
  return line && 'value' in line ? line.value : null;
}

/** The lines of a kind with their addresses. */
export const linesOfKind = <K extends Line['kind']>({ lines }: Run, kind: K) =>
  [...lines].flatMap(([address, line]) =>
    line.kind === kind ? [{ address, line: line as LineOf<K> }] : [],
  );

/** What a line refers to, from its own address. */
export const addressAt = (ref: string, address: string): string =>
  ref.startsWith(':') ? `${address.split(':')[0]}${ref}` : ref;

/** A check with its demand and capacity. */
export interface Checked {
  readonly key: string;
  readonly ratio: number;
  readonly demand: number;
  readonly capacity: number;
}

export const checksOf = (r: Run): readonly Checked[] =>
  linesOfKind(r, 'check').map(({ address, line }) => ({
    key: address,
    ratio: line.ratio,
    demand: valueIn(r, addressAt(line.demand, address)) as number,
    capacity: line.capacity === 1 ? 1 : (valueIn(r, addressAt(line.capacity, address)) as number),
  }));
