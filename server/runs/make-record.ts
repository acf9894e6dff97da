import { sealRecord } from '#shared/calc/hashes.ts';
import type { CalculationRecord } from '#shared/calc/record.ts';
import { inputOf } from '#shared/contracts/draft-input.ts';
import { problemsOf } from '#shared/contracts/draft-problems.ts';
import type { ProblemPlace } from '#shared/contracts/problems.ts';
import { parseInput } from '#shared/members/parse-input.ts';
import { runCalculation } from '#shared/members/run.ts';
import type { Drafts } from './tasks.ts';

/** Runs a whole calculation and seals its record, or says why its drafts are no valid input. */
export function makeRecord({
  basis,
  members,
}: Drafts): { record: CalculationRecord } | { problems: ProblemPlace[] } {
  const parsed = parseInput(inputOf(basis, members));
  if (!parsed.ok) return { problems: problemsOf(basis, members) };
  return { record: sealRecord(runCalculation(parsed.input)) };
}
