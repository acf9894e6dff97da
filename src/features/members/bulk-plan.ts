import { sectionName } from '#client/document/section-name.ts';
import { count } from '#client/lib/count.ts';
import { type DraftPatch, isNoChange, patchBetween } from '#shared/contracts/draft-patch.ts';
import type { Member, MemberDraft } from '#shared/contracts/members.ts';
import {
  type FieldChange,
  fieldChanges,
  isStated,
  type SeveralChange,
  withChange,
} from './bulk-change.ts';
import { sectionLeft } from './edit-draft.ts';

/** What a change comes to in one member. */
export interface PlannedChange {
  readonly member: Member;
  readonly after: MemberDraft;
  readonly patch: DraftPatch;
  readonly isNone: boolean;
  readonly changes: readonly FieldChange[];
  /** What the change brings with it. */
  readonly remarks: readonly string[];
}

/** The change in each member; all stay as they are while it is not said yet what it is. */
export const plannedChanges = (
  members: readonly Member[],
  change: SeveralChange,
): readonly PlannedChange[] =>
  members.map((member) => {
    const before = member.draft;
    const after = isStated(change) ? withChange(before, change) : before;
    const patch = patchBetween(before, after);
    return {
      ...{ member, after, patch, isNone: isNoChange(patch) },
      changes: fieldChanges(before, after),
      remarks: remarksOf(before, after, change),
    };
  });

function remarksOf(before: MemberDraft, after: MemberDraft, { kind, state }: SeveralChange) {
  if (kind === 'section') return forcesLeft(before, after);
  if (kind === 'state' && state.of.has('forces'))
    return [`Forces and loads of ${count(after.combinations.length, 'combination')}`];
  return [];
}

/** Forces that are of another section than the member has after the change. */
function forcesLeft(before: MemberDraft, after: MemberDraft): string[] {
  const left = after.combinations.flatMap((row) => sectionLeft(after, row) ?? []);
  const was = before.combinations.filter((row) => sectionLeft(before, row) !== null).length;
  if (left.length === 0 || (left.length === was && before.section.text === after.section.text))
    return [];
  const of = [...new Set(left)].map(sectionName).join(', ');
  return [
    `The forces of ${count(left.length, 'combination')} were analysed with ${of}: not confirmed until the analysis is run again.`,
  ];
}
