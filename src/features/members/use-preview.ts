import { useEffect, useMemo, useRef, useState } from 'react';
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

/** A run that takes longer than this waits for a pause in the typing. */
const QUICK = 40;
const LONGEST_WAIT = 500;

/**
 * The member's record while typing; an invalid input leaves the last sheet. A member of many
 * combinations is run when the typing pauses, so that it never holds up a keystroke.
 */
export function useLivePreview(basis: BasisDraft, id: string, draft: MemberDraft): LivePreview {
  const [calm, setCalm] = useState(draft);
  const took = useRef(0);
  useEffect(() => {
    const wait = took.current > QUICK ? Math.min(LONGEST_WAIT, 4 * took.current) : 0;
    const timer = window.setTimeout(() => setCalm(draft), wait);
    return () => window.clearTimeout(timer);
  }, [draft]);
  const preview = useMemo(() => {
    const begun = performance.now();
    const made = previewOf(basis, id, calm);
    took.current = performance.now() - begun;
    return made;
  }, [basis, id, calm]);
  const last = useRef<CalculationRecord | null>(null);
  if (preview.ok) last.current = preview.record;
  return useMemo(
    () => ({ record: last.current, problems: preview.ok ? [] : preview.problems }),
    [preview],
  );
}
