import {
  type ActionName,
  actionNames,
  type LengthName,
  lengthNames,
} from '#shared/contracts/members.ts';
import { actionWords, lengthWords } from './member-fields.ts';

const others: Readonly<Record<string, string>> = {
  mark: 'Mark',
  section: 'Section',
  material: 'Steel',
  ends: 'Ends',
  Cb: 'Cb',
  endMomentSign: 'Equal signs',
  name: 'Name',
  design: 'Load level',
  combinations: 'Combinations',
};

/** A problem's path in words: `combinations[1].MxA` is `Combination 2, Major, end A`. */
export function placeWords(path: string): string {
  const row = /^combinations\[(\d+)\]\.?(\w*)/.exec(path);
  if (row) {
    const [, index = '0', field = ''] = row;
    return [`Combination ${Number(index) + 1}`, fieldWords(field)].filter(Boolean).join(', ');
  }
  if (path.startsWith('analysis') || path.startsWith('constants')) return 'Basis of design';
  const [head = ''] = path.split(/[.[]/);
  return fieldWords(head);
}

function fieldWords(field: string): string {
  if (actionNames.includes(field as ActionName)) return actionWords[field as ActionName].label;
  if (lengthNames.includes(field as LengthName)) {
    return `${lengthWords[field as LengthName].label} ${field === 'length' ? 'L' : field}`;
  }
  return others[field] ?? field;
}
