import { placedLines } from '#shared/calc/address.ts';
import type { CalculationRecord } from '#shared/calc/record.ts';
import type { Verification, VerifyProblem } from './problem.ts';

/** Counts the lines that hold something to reproduce, and those of them without a problem. */
export function tally(
  record: CalculationRecord,
  problems: readonly VerifyProblem[],
  notes: readonly string[],
): Verification {
  const place = (memberId: string, address: string): string => `${memberId}\n${address}`;
  const wrong = new Set(
    problems.flatMap((p) => (p.member && p.address ? [place(p.member.id, p.address)] : [])),
  );
  const lines = record.members.flatMap((member) =>
    placedLines(member)
      .filter((p) => p.line.kind !== 'section')
      .map((p) => place(member.id, p.address)),
  );
  const reproduced = lines.filter((line) => !wrong.has(line)).length;
  return { lines: lines.length, reproduced, problems, notes };
}
