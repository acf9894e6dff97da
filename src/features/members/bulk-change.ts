import type { DraftQuantity, DraftSource } from '#shared/contracts/draft-quantity.ts';
import { inSprings, lengthNames, type MemberDraft } from '#shared/contracts/members.ts';
import { normalDesignation } from '#shared/sections/table.ts';
import { withOrder, withoutRestraints } from './edit-restraints.ts';
import { memberRules } from './member-rules.ts';
import { withOtherSection } from './other-section.ts';
import { sourceLack } from './source-words.ts';

/** What can be changed in several members at once, in the order of the list. */
export const changeKinds = [
  ...(['section', 'steel', 'ends', ...lengthNames, 'Cb'] as const),
  ...(['sense', 'points', 'state'] as const),
] as const;
export type ChangeKind = (typeof changeKinds)[number];

/** Values whose source and state are set together; `forces` are those of every combination. */
export const statedNames = ['section', 'ends', ...lengthNames, 'Cb', 'forces'] as const;
export type StatedGroup = (typeof statedNames)[number];

export interface StateChange {
  readonly of: ReadonlySet<StatedGroup>;
  /** null: each value keeps its own. */
  readonly source: DraftSource | null;
  readonly confirmed: boolean;
}

/** One change of several members. `pattern` holds the new value in the field of its kind. */
export interface SeveralChange {
  readonly kind: ChangeKind;
  readonly pattern: MemberDraft;
  /** The member whose points are copied. */
  readonly pointsOf: MemberDraft | null;
  readonly state: StateChange;
}

/** Whether it is said yet what the change is, its source included. */
export function isStated({ kind, pattern, pointsOf, state }: SeveralChange): boolean {
  switch (kind) {
    case 'steel':
      return pattern.ownSteel ? pattern.ownSteel.Fy.trim() !== '' : pattern.material !== '';
    case 'sense':
      return pattern.endMomentSign !== '';
    case 'points':
      return pointsOf !== null;
    case 'state':
      return state.of.size > 0 && sourceLack(state.source ?? undefined) === null;
    default:
      return pattern[kind].text.trim() !== '' && sourceLack(pattern[kind].source) === null;
  }
}

/** A member with the change; it may be none. */
export function withChange(draft: MemberDraft, change: SeveralChange): MemberDraft {
  const { kind, pattern, pointsOf, state } = change;
  switch (kind) {
    case 'section':
      return isSameSection(draft, pattern.section)
        ? { ...draft, section: pattern.section }
        : withOtherSection(draft, pattern.section);
    case 'steel':
      return { ...draft, material: pattern.material, ownSteel: pattern.ownSteel };
    case 'ends':
      return {
        ...{ ...draft, ends: pattern.ends },
        ...(inSprings(pattern) && pattern.springs ? { springs: pattern.springs } : {}),
      };
    case 'sense':
      return { ...draft, endMomentSign: pattern.endMomentSign };
    case 'points':
      return pointsOf ? withPointsOf(draft, pointsOf) : draft;
    case 'state':
      return withState(draft, state);
    default:
      return { ...draft, [kind]: pattern[kind] };
  }
}

const isSameSection = ({ section, sizes }: MemberDraft, { text }: DraftQuantity): boolean =>
  !sizes && normalDesignation(section.text) === normalDesignation(text);

/**
 * The same points as in another member, not confirmed for this one. The moments over its own points
 * go with these: they belong to other places.
 */
function withPointsOf(draft: MemberDraft, { restraints }: MemberDraft): MemberDraft {
  const without = withoutRestraints(draft);
  if (!restraints) return without;
  const copies = restraints.map((row) => ({ ...row, confirmed: false }));
  return withOrder({ ...without, restraints: copies });
}

/** Values that are not given stay without a source. */
function withState(draft: MemberDraft, { of, source, confirmed }: StateChange): MemberDraft {
  const stated = (quantity: DraftQuantity): DraftQuantity =>
    quantity.text.trim() === ''
      ? quantity
      : { ...quantity, ...(source ? { source } : {}), confirmed };
  const fields = (['section', 'ends', ...lengthNames, 'Cb'] as const).filter((name) =>
    of.has(name),
  );
  return {
    ...draft,
    ...Object.fromEntries(fields.map((name) => [name, stated(draft[name])])),
    ...(of.has('section') && draft.sizes
      ? { sizes: { ...draft.sizes, ...(source ? { source } : {}), confirmed } }
      : {}),
    ...(of.has('forces')
      ? { combinations: draft.combinations.map((row) => statedWithin(row, source, confirmed)) }
      : {}),
  };
}

/** Every value within, such as a force, a load or one of a story, with another source and state. */
function statedWithin<T>(within: T, source: DraftSource | null, confirmed: boolean): T {
  const go = (value: unknown): unknown => {
    if (Array.isArray(value)) return value.map(go);
    if (typeof value !== 'object' || value === null) return value;
    if ('text' in value && String(value.text).trim() === '') return value;
    if ('confirmed' in value) return { ...value, ...(source ? { source } : {}), confirmed };
    return Object.fromEntries(Object.entries(value).map(([name, part]) => [name, go(part)]));
  };
  return go(within) as T;
}

/** One field that a change moves, in words. */
export interface FieldChange {
  readonly label: string;
  readonly before: string;
  readonly after: string;
}

/** What differs between two versions of a member, by the fields that people read. */
export function fieldChanges(before: MemberDraft, after: MemberDraft): readonly FieldChange[] {
  const was = new Map(memberRules.fields(before).map((field) => [field.id, field]));
  const is = new Map(memberRules.fields(after).map((field) => [field.id, field]));
  return [...new Set([...was.keys(), ...is.keys()])].flatMap((id) => {
    const [old, now] = [was.get(id), is.get(id)];
    const label = (now ?? old)?.label ?? '';
    const [from, to] = [old?.text ?? '', now?.text ?? ''];
    return from === to ? [] : [{ label, before: from, after: to }];
  });
}
