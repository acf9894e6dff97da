import type { DraftField, MergeRules } from '#client/lib/draft/merge.ts';
import {
  actionNames,
  type DraftCombination,
  type DraftQuantity,
  lengthNames,
  type MemberDraft,
} from '#shared/contracts/members.ts';
import { actionWords, lengthWords } from './member-fields.ts';
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
    .filter((action) => row[action].text !== '')
    .map((action) => `${actionWords[action].label} ${row[action].text}`)
    .join(', ');

const rowPrefix = 'combination/';

/** A member's form as fields; a combination is one field, whole. */
export const memberRules: MergeRules<MemberDraft> = {
  fields: (draft) => [
    field('mark', 'Mark', draft.mark, draft.mark),
    field('place', 'Where', draft.place, draft.place),
    field('section', 'Section', quantityText(draft.section), draft.section),
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
    ...draft.combinations.map((row) => ({
      id: `${rowPrefix}${row.id}`,
      label: `Combination ${row.name || row.id}`,
      text: combinationText(row),
      value: row,
    })),
  ],
  take: (into, from, id) => {
    if (!id.startsWith(rowPrefix)) {
      const name = id as keyof MemberDraft;
      return { ...into, [name]: from[name] };
    }
    return { ...into, combinations: takeRow(into.combinations, from.combinations, id) };
  },
};

function takeRow(
  into: readonly DraftCombination[],
  from: readonly DraftCombination[],
  id: string,
): DraftCombination[] {
  const wanted = (row: DraftCombination) => `${rowPrefix}${row.id}` === id;
  const row = from.find(wanted);
  if (!row) return into.filter((other) => !wanted(other));
  return into.some(wanted) ? into.map((other) => (wanted(other) ? row : other)) : [...into, row];
}
