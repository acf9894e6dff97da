import { useDeferredValue, useMemo, useRef } from 'react';
import type { CalculationRecord } from '#shared/calc/record.ts';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';
import type { ProblemPlace } from '#shared/contracts/problems.ts';
import { previewOf } from './preview.ts';

export interface LivePreview {
  /** The record of the last valid inputs; null until there were any. */
  readonly record: CalculationRecord | null;
  /** What is wrong with the present inputs; the record is then of earlier ones. */
  readonly problems: readonly ProblemPlace[];
}

/** The member's record while typing: typing comes first, an invalid input leaves the last sheet. */
export function useLivePreview(basis: BasisDraft, id: string, draft: MemberDraft): LivePreview {
  const calm = useDeferredValue(draft);
  const preview = useMemo(() => previewOf(basis, id, calm), [basis, id, calm]);
  const last = useRef<CalculationRecord | null>(null);
  if (preview.ok) last.current = preview.record;
  return useMemo(
    () => ({ record: last.current, problems: preview.ok ? [] : preview.problems }),
    [preview],
  );
}
