import type { LineKind } from '#shared/calc/line.ts';

/** What of a record or of its pages is not as it says. */
export interface VerifyProblem {
  /** The member it stands in, or null where it concerns the whole record. */
  readonly member: { readonly id: string; readonly mark: string } | null;
  /** Address of the line within the member, or null where no single line is concerned. */
  readonly address: string | null;
  readonly kind: LineKind | 'record' | 'hash' | 'input' | 'summary' | 'completeness' | 'page';
  /** How it was found. */
  readonly by: 'hash' | 'evaluation' | 'closure' | 'rerun' | 'page';
  /** A sentence without its subject: `is 5353, its operands give 5354`. */
  readonly reason: string;
}

export interface Verification {
  /** Lines that hold something to reproduce: all but the heads of sections. */
  readonly lines: number;
  /** Those of them without a problem. */
  readonly reproduced: number;
  readonly problems: readonly VerifyProblem[];
  /** What was left out and why; not a problem. */
  readonly notes: readonly string[];
}
