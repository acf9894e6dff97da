import { z } from 'zod';
import { line } from './fields.ts';
import {
  type DraftCombination,
  draftCombination,
  type MemberDraft,
  memberDraft,
} from './members.ts';

/** Parts that a draft, or a combination of it, may be without. */
const parts = ['sizes', 'restraints', 'springs', 'charts', 'netSection', 'stiffeners'] as const;
const combinationParts = [
  'design',
  'analysedWith',
  'Vx',
  'Vy',
  'loads',
  'supports',
  'sway',
] as const;

/** What changes in one combination, by its id. */
const combinationPatch = z.object({
  id: line(40).min(1),
  set: draftCombination.omit({ id: true }).partial(),
  drop: z.array(z.enum(combinationParts)),
});

/**
 * What changes in a member's draft: fields that are set, parts that are taken away. Combinations
 * neither come nor go; those that are not named stay as they are.
 */
export const draftPatch = z.object({
  set: memberDraft.omit({ combinations: true }).partial(),
  drop: z.array(z.enum(parts)),
  combinations: z.array(combinationPatch).max(500),
});
export type DraftPatch = z.infer<typeof draftPatch>;

/** The patch that makes one draft of another with the same combinations. */
export function patchBetween(before: MemberDraft, after: MemberDraft): DraftPatch {
  const { combinations: rowsBefore, ...fieldsBefore } = before;
  const { combinations: rowsAfter, ...fieldsAfter } = after;
  return {
    ...difference(fieldsBefore, fieldsAfter, parts),
    combinations: rowsAfter.flatMap((row) => {
      const { id, ...is } = row;
      const { id: _, ...was } = rowsBefore.find((other) => other.id === id) ?? row;
      const changed = difference(was, is, combinationParts);
      return isEmpty(changed) ? [] : [{ id, ...changed }];
    }),
  };
}

/** The draft with a patch. What the patch says of combinations that are not there is left out. */
export function withPatch(draft: MemberDraft, patch: DraftPatch): MemberDraft {
  const rows = new Map(patch.combinations.map((row) => [row.id, row]));
  const combinations = draft.combinations.map((row): DraftCombination => {
    const changed = rows.get(row.id);
    return changed ? patched(row, changed.set, changed.drop) : row;
  });
  return { ...patched(draft, patch.set, patch.drop), combinations };
}

/** Whether a patch changes nothing. */
export const isNoChange = (patch: DraftPatch): boolean =>
  isEmpty(patch) && patch.combinations.length === 0;

interface Difference<T, P extends string> {
  readonly set: Partial<T>;
  readonly drop: P[];
}

const isEmpty = ({ set, drop }: Difference<object, string>): boolean =>
  drop.length === 0 && Object.keys(set).length === 0;

/** JSON values: the same text is the same value, since both sides keep the order of their keys. */
function difference<T extends object, P extends string>(
  before: T,
  after: T,
  droppable: readonly P[],
): { set: Partial<T>; drop: P[] } {
  const changed = Object.entries(after).filter(
    ([key, value]) =>
      value !== undefined && JSON.stringify(value) !== JSON.stringify(before[key as keyof T]),
  );
  return {
    set: Object.fromEntries(changed) as Partial<T>,
    drop: droppable.filter((key) => isGiven(before, key) && !isGiven(after, key)),
  };
}

const isGiven = (whole: object, key: string): boolean =>
  (whole as Readonly<Record<string, unknown>>)[key] !== undefined;

function patched<T extends object>(whole: T, set: object, drop: readonly string[]): T {
  const kept = Object.entries(whole).filter(([key]) => !drop.includes(key));
  return { ...Object.fromEntries(kept), ...set } as T;
}
