import type { DraftField, MergeRules } from '#client/lib/draft/merge.ts';
import type { DraftQuantity } from '#shared/contracts/draft-quantity.ts';
import { sectionTextOf } from '#shared/contracts/draft-section.ts';
import {
  actionNames,
  actionOf,
  type DraftCombination,
  lengthNames,
  type MemberDraft,
} from '#shared/contracts/members.ts';
import { actionWords, lengthWords } from './member-fields.ts';
import {
  chartsText,
  loadText,
  netSectionText,
  restraintText,
  springsText,
  supportText,
  swayText,
} from './part-texts.ts';
import { draftSourceText } from './source-words.ts';

const quantityText = (quantity: DraftQuantity): string =>
  quantity.text === ''
    ? ''
    : `${quantity.text} (${draftSourceText(quantity.source)}, ${quantity.confirmed ? 'confirmed' : 'not confirmed'})`;

const field = (id: keyof MemberDraft, label: string, text: string, value: unknown): DraftField => ({
  ...{ id, label, text, value },
});

const combinationText = (row: DraftCombination): string =>
  actionNames
    .filter((action) => actionOf(row, action).text !== '')
    .map((action) => `${actionWords[action].label} ${actionOf(row, action).text}`)
    .join(', ');

/**
 * A member's form as fields. A combination's forces are one field, whole; each of its loads and
 * supports is one, and each restraint: their ids hold the way to them.
 */
export const memberRules: MergeRules<MemberDraft> = {
  fields: (draft) => [
    field('mark', 'Mark', draft.mark, draft.mark),
    field('place', 'Where', draft.place, draft.place),
    field('section', 'Section', quantityText(draft.section), draft.section),
    field('sizes', 'Section by its sizes', draft.sizes ? sectionTextOf(draft) : '', draft.sizes),
    field('material', 'Steel', draft.material, draft.material),
    field('ownSteel', 'Own steel', draft.ownSteel?.name ?? '', draft.ownSteel),
    field('ends', 'Ends', quantityText(draft.ends), draft.ends),
    ...lengthNames.map((name) =>
      field(
        name,
        `${lengthWords[name].label} ${name === 'length' ? 'L' : name}`,
        quantityText(draft[name]),
        draft[name],
      ),
    ),
    field('Cb', 'Cb', quantityText(draft.Cb), draft.Cb),
    field('endMomentSign', 'Sense of end moments', draft.endMomentSign, draft.endMomentSign),
    field('springs', 'End springs', springsText(draft.springs), draft.springs),
    field('charts', 'Alignment chart', chartsText(draft.charts), draft.charts),
    field('netSection', 'Net section', netSectionText(draft.netSection), draft.netSection),
    field('stiffeners', 'Web stiffeners', draft.stiffeners?.text ?? '', draft.stiffeners),
    field(
      'restraints',
      'Held between the ends',
      draft.restraints ? 'described' : 'not described',
      draft.restraints !== undefined,
    ),
    ...(draft.restraints ?? []).map((row) => ({
      ...{ id: `restraints/${row.id}`, label: 'Point held', text: restraintText(row), value: row },
    })),
    ...draft.combinations.flatMap(combinationFields),
  ],
  take: (into, from, id) => {
    const [head = '', row, part, key] = id.split('/');
    if (head === 'restraints') return takeRestraint(into, from, row);
    if (head !== 'combination' || row === undefined) {
      const { [head as keyof MemberDraft]: _, ...rest } = into;
      const value = from[head as keyof MemberDraft];
      return (value === undefined ? rest : { ...rest, [head]: value }) as MemberDraft;
    }
    const theirs = from.combinations.find((other) => other.id === row);
    const mine = into.combinations.find((other) => other.id === row);
    if (part === undefined) {
      return { ...into, combinations: takeRow(into.combinations, forcesOf(theirs, mine), row) };
    }
    if (!mine) return into;
    const taken = takePart(mine, theirs, part, key);
    return { ...into, combinations: takeRow(into.combinations, taken, row) };
  },
};

function combinationFields(row: DraftCombination): DraftField[] {
  const { loads = [], supports = [], sway, ...forces } = row;
  const [id, label] = [`combination/${row.id}`, `Combination ${row.name || row.id}`];
  return [
    { id, label, text: combinationText(row), value: forces },
    ...loads.map((load) => ({
      ...{ id: `${id}/loads/${load.id}`, label: `${label}, load` },
      ...{ text: loadText(load), value: load },
    })),
    ...supports.map((support) => ({
      ...{ id: `${id}/supports/${support.restraint}`, label: `${label}, moments over a restraint` },
      ...{ text: supportText(support), value: support },
    })),
    ...(sway
      ? [{ id: `${id}/sway`, label: `${label}, sway`, text: swayText(sway), value: sway }]
      : []),
  ];
}

/** The forces of one, with the loads, supports and sway that the other has; null where it is gone. */
function forcesOf(
  from: DraftCombination | undefined,
  into: DraftCombination | undefined,
): DraftCombination | null {
  if (!from || !into) return from ?? null;
  const { loads: _loads, supports: _supports, sway: _sway, ...forces } = from;
  const { loads, supports, sway } = into;
  return {
    ...forces,
    ...(loads ? { loads } : {}),
    ...(supports ? { supports } : {}),
    ...(sway ? { sway } : {}),
  };
}

function takePart(
  into: DraftCombination,
  from: DraftCombination | undefined,
  part: string,
  key: string | undefined,
): DraftCombination {
  if (part === 'sway') {
    const { sway: _, ...rest } = into;
    return from?.sway ? { ...rest, sway: from.sway } : rest;
  }
  if (part === 'loads') {
    const load = from?.loads?.find(({ id }) => id === key) ?? null;
    return { ...into, loads: takeRow(into.loads ?? [], load, key) };
  }
  const named = (rows: DraftCombination['supports']) =>
    (rows ?? []).map((support) => ({ ...support, id: support.restraint }));
  const support = named(from?.supports).find(({ id }) => id === key) ?? null;
  return {
    ...into,
    supports: takeRow(named(into.supports), support, key).map(({ id: _, ...row }) => row),
  };
}

/** One point of the other's, or that points are described at all. */
function takeRestraint(into: MemberDraft, from: MemberDraft, id: string | undefined): MemberDraft {
  const { restraints, ...rest } = into;
  if (id === undefined) return from.restraints ? { ...rest, restraints: restraints ?? [] } : rest;
  const row = from.restraints?.find((other) => other.id === id) ?? null;
  return row || restraints ? { ...rest, restraints: takeRow(restraints ?? [], row, id) } : into;
}

/** Puts a row in the place that it has, or last; null takes it away. */
function takeRow<T extends { readonly id: string }>(
  into: readonly T[],
  row: T | null,
  id: string | undefined,
): T[] {
  if (!row) return into.filter((other) => other.id !== id);
  return into.some((other) => other.id === id)
    ? into.map((other) => (other.id === id ? row : other))
    : [...into, row];
}
