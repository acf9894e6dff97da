import { readFileSync } from 'node:fs';
import { placedLines } from '#shared/calc/address.ts';
import { sealRecord } from '#shared/calc/hashes.ts';
import type { Line, LineKind, LineOf } from '#shared/calc/line.ts';
import type { CalculationRecord, MemberRecord } from '#shared/calc/record.ts';
import { parseInput } from '#shared/members/parse-input.ts';
import { runCalculation } from '#shared/members/run.ts';

/**
 * A calculation whose record has every kind of line that the books make, and every verdict; `P` is
 * the axial force of its first combination.
 */
export function everyKind(P = '150 kip'): CalculationRecord {
  const file = new URL('./every-kind.json', import.meta.url);
  const parsed = parseInput(JSON.parse(readFileSync(file, 'utf8').replace('150 kip', P)));
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  return sealRecord(runCalculation(parsed.input));
}

type Loose<T> = { -readonly [K in keyof T]: T[K] };

/** A copy of a record, changed and sealed again, so that its hashes agree with the change. */
export function resealed(
  record: CalculationRecord,
  change: (copy: Loose<CalculationRecord>) => void,
): CalculationRecord {
  const copy = JSON.parse(JSON.stringify(record)) as Loose<CalculationRecord>;
  change(copy);
  return sealRecord(copy);
}

export function memberOf(record: CalculationRecord, mark: string): MemberRecord {
  const member = record.members.find((m) => m.mark === mark);
  if (!member) throw new Error(`no member ${mark}`);
  return member;
}

/** The line of a copy at an address, to change in place. */
export function lineAt<K extends LineKind>(
  record: CalculationRecord,
  mark: string,
  address: string,
  kind: K,
): Loose<LineOf<K>> {
  const placed = placedLines(memberOf(record, mark)).find((p) => p.address === address);
  const line: Line | undefined = placed?.line;
  if (line?.kind !== kind) throw new Error(`no ${kind} line ${address} in ${mark}`);
  return line as LineOf<K>;
}
