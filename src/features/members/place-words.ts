import type { LoadText } from '#shared/contracts/draft-input-parts.ts';
import {
  type ActionName,
  actionNames,
  type LengthName,
  lengthNames,
} from '#shared/contracts/members.ts';
import { actionWords, type FieldWords, lengthWords } from './member-fields.ts';
import {
  chartWords,
  loadWords,
  netSectionWords,
  sizeWords,
  springWords,
  stiffenerWords,
  swayAxialWords,
  swayWords,
} from './part-words.ts';

const others: Readonly<Record<string, string>> = {
  mark: 'Mark',
  section: 'Section',
  wall: 'what the wall is',
  frames: 'what moment frames carry',
  material: 'Steel',
  ends: 'Ends',
  Cb: 'Cb',
  endMomentSign: 'Equal signs',
  name: 'Name',
  design: 'Load level',
  combinations: 'Combinations',
  restraints: 'Held between the ends',
  holds: 'what it holds',
  height: 'where on the section',
  sidesway: 'whether the story is held',
};

/** A problem's path in words: `combinations[1].MxA` is `Combination 2, Major, end A`. */
export function placeWords(path: string): string {
  const row = /^combinations\[(\d+)\]\.?(.*)/.exec(path);
  if (row) {
    const [, index = '0', rest = ''] = row;
    const words = rest === '' ? '' : /[.[]/.test(rest) ? partWords(rest) : fieldWords(rest);
    return [`Combination ${Number(index) + 1}`, words].filter(Boolean).join(', ');
  }
  if (path.startsWith('analysis') || path.startsWith('constants')) return 'Basis of design';
  return /^(section\.|restraints\[|springs\.|charts\.|netSection\.|stiffeners)/.test(path)
    ? partWords(path)
    : fieldWords(path.split(/[.[]/)[0] ?? '');
}

/** Places within the parts that not every member has. */
function partWords(path: string): string {
  const [head = '', index = '', ...names] = path.split(/[.[\]]+/);
  const number = Number(index) + 1;
  const field = names[0] ?? '';
  switch (head) {
    case 'restraints':
      return `Point r${number}, ${field === 'at' ? 'distance from end A' : fieldWords(field)}`;
    case 'loads':
      return `load ${number}, ${field in loadWords ? named(loadWords[field as LoadText]) : fieldWords(field)}`;
    case 'supports':
      return `moment over a restraint, ${field === 'My' ? 'minor' : 'major'}`;
    case 'sway':
      return index === 'P'
        ? `sway, ${named(swayAxialWords)}`
        : `sway about ${index}, ${wordsFrom(swayWords, field)}`;
    case 'section':
      return `Section, ${wordsFrom(sizeWords, index)}`;
    case 'springs':
      return `Ends, ${wordsFrom(springWords, index)}`;
    case 'charts':
      return `Alignment chart about ${index}, ${wordsFrom(chartWords, field)}`;
    case 'netSection':
      return `Net section, ${wordsFrom(netSectionWords, index)}`;
    default:
      return `Web stiffeners, ${named(stiffenerWords)}`;
  }
}

const named = ({ label, spoken }: FieldWords): string =>
  `${label} ${spoken}`.trim().replace(/^./, (first) => first.toLowerCase());

const wordsFrom = (of: Readonly<Record<string, FieldWords>>, name: string): string => {
  const found = of[name];
  return found ? named(found) : fieldWords(name);
};

function fieldWords(field: string): string {
  if (actionNames.includes(field as ActionName)) return actionWords[field as ActionName].label;
  if (lengthNames.includes(field as LengthName)) {
    return `${lengthWords[field as LengthName].label} ${field === 'length' ? 'L' : field}`;
  }
  return others[field] ?? field;
}
