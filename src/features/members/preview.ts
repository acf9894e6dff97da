import type { CalculationRecord } from '#shared/calc/record.ts';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import { inputOf } from '#shared/contracts/draft-input.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';
import type { ProblemPlace } from '#shared/contracts/problems.ts';
import { parseInput } from '#shared/members/parse-input.ts';
import { runCalculation } from '#shared/members/run.ts';
import { inputProblems } from './input-problems.ts';

/** A run of one member in the browser (it carries no hash), or what hinders it. */
export type Preview =
  | { readonly ok: true; readonly record: CalculationRecord }
  | { readonly ok: false; readonly problems: readonly ProblemPlace[] };

export function previewOf(basis: BasisDraft, id: string, draft: MemberDraft): Preview {
  const parsed = parseInput(inputOf(basis, [{ id, draft }]));
  if (!parsed.ok) return { ok: false, problems: inputProblems(draft, parsed.problems) };
  return { ok: true, record: runCalculation(parsed.input) };
}
