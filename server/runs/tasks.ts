import type { CalculationRecord } from '#shared/calc/record.ts';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import type { DraftOfMember } from '#shared/contracts/draft-input.ts';
import type { MemberSummary } from '#shared/contracts/members.ts';
import type { ProblemPlace } from '#shared/contracts/problems.ts';
import type { FormulaUse } from '#shared/library/formula-uses.ts';
import type { DocumentData } from '#shared/report/document-data.ts';
import type { DocumentTree } from '#shared/report/tree.ts';

/** What a run starts from: the forms of a calculation. */
export interface Drafts {
  readonly basis: BasisDraft;
  readonly members: readonly DraftOfMember[];
}

export interface ReportDocument {
  readonly tree: DocumentTree;
  readonly resultHash: string;
  readonly snapshotHash: string;
}

/** What is kept of a member's run. */
export interface SummarisedMember {
  readonly summary: MemberSummary;
  readonly uses: readonly FormulaUse[];
}

type Refused = { readonly problems: ProblemPlace[] };

/** What is computed away from the web process's own thread, by task. */
export interface Tasks {
  /** Each member on its own, in their order. */
  readonly summaries: { readonly given: Drafts; readonly made: SummarisedMember[] };
  readonly record: {
    readonly given: Drafts;
    readonly made: { readonly record: CalculationRecord } | Refused;
  };
  /** The report's document tree, with the hashes of its record. */
  readonly document: {
    readonly given: { readonly drafts: Drafts; readonly document: DocumentData };
    readonly made: ReportDocument | Refused;
  };
  readonly report: {
    readonly given: {
      readonly drafts: Drafts;
      readonly document: DocumentData;
      readonly date: Date;
    };
    readonly made: { readonly pdf: Uint8Array } | Refused;
  };
}

export type TaskName = keyof Tasks;
export type Order = { [Name in TaskName]: { task: Name; given: Tasks[Name]['given'] } }[TaskName];
