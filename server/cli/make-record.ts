import { sealRecord } from '#shared/calc/hashes.ts';
import type { CalculationRecord } from '#shared/calc/record.ts';
import { parseInput } from '#shared/members/parse-input.ts';
import { runCalculation } from '#shared/members/run.ts';
import { readJson } from './read-file.ts';
import { UsageError } from './usage-error.ts';

/** Runs an INPUT.json and seals its record. Throws a UsageError that lists every path and reason. */
export async function makeRecord(path: string): Promise<CalculationRecord> {
  const json = await readJson(path).catch((error: unknown) => {
    if (error instanceof UsageError) throw new UsageError(`${path}: ${error.message}`);
    throw error;
  });
  const parsed = parseInput(json);
  if (parsed.ok) return sealRecord(runCalculation(parsed.input));
  throw new UsageError(
    parsed.problems.map((p) => `${p.path === '' ? path : p.path}: ${p.message}`).join('\n'),
  );
}
