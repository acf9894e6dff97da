import type { PlacedLine } from '../calc/address.ts';
import type { Condition, LineOf, Side } from '../calc/line.ts';
import { withUnit } from '../figures/read-line.ts';
import { type Presenter, plain, strong, symbolAndValue, text, usedForm } from './presenter.ts';
import type { Inline } from './tree.ts';

type Relation = Condition['relation'];

/** A relation in words, as it is when it holds and when it doesn't. */
const WORDS: Record<Relation, readonly [holds: string, not: string]> = {
  '<': ['is less than', 'is not less than'],
  '<=': ['does not exceed', 'exceeds'],
  '>': ['exceeds', 'does not exceed'],
  '>=': ['is not less than', 'is less than'],
  '=': ['equals', 'does not equal'],
  is: ['is', 'is not'],
};

/** **The maximum lies in the span**, because ψ = 0.8814 exceeds cos kL = 0.3753. */
export function choiceSentence(p: Presenter, placed: PlacedLine, line: LineOf<'choice'>): Inline[] {
  const all = line.tried.map((condition) => conditionWords(p, placed, condition));
  // Two conditions that fail on equal values read alike: said once.
  const said = new Map(all.map((words) => [plain(words), words]));
  const reasons = [...said.values()].flatMap((words, index): Inline[] => [
    ...(index === 0 ? [] : [text(index === said.size - 1 ? ' and ' : ', ')]),
    ...words,
  ]);
  return [
    strong(capital(line.outcome)),
    text(', because '),
    ...reasons,
    text(line.because === '' ? '.' : `. ${line.because}`),
  ];
}

function conditionWords(p: Presenter, placed: PlacedLine, condition: Condition): Inline[] {
  const { left, relation, right, holds } = condition;
  const words = isEqual(p, placed, left, right) ? 'equals' : WORDS[relation][holds ? 0 : 1];
  return [...sideWords(p, placed, left), text(` ${words} `), ...sideWords(p, placed, right)];
}

const isEqual = (p: Presenter, placed: PlacedLine, left: Side, right: Side): boolean => {
  const value = (side: Side): number | null => {
    if ('words' in side) return null;
    if ('constant' in side) return side.constant;
    const { line } = p.at(side.ref, placed);
    return 'value' in line ? line.value : null;
  };
  const found = value(left);
  return found !== null && found === value(right);
};

const sideWords = (p: Presenter, placed: PlacedLine, side: Side): Inline[] => {
  if ('ref' in side) return symbolAndValue(p, side.ref, placed);
  return [text('words' in side ? side.words : String(side.constant).replace('-', '−'))];
};

/** **Governs: flexural buckling about y**, the smallest of … */
export function governingSentence(
  p: Presenter,
  placed: PlacedLine,
  line: LineOf<'governing'>,
): Inline[] {
  const winner = p.at(line.governs, placed);
  const others = line.candidates.filter((ref) => ref !== line.governs);
  if (others.length === 0)
    return [strong(`Governs: ${small(winner.line.title)}`), text(', the only one.')];
  const extreme = line.sense === 'min' ? 'smaller' : 'larger';
  const superlative = line.sense === 'min' ? 'smallest' : 'largest';
  const rest = others.flatMap((ref, index): Inline[] => [
    ...(index === 0 ? [] : [text(index === others.length - 1 ? ' and ' : ', ')]),
    ...symbolAndValue(p, ref, placed),
  ]);
  const winning = 'value' in winner.line ? winner.line.value : null;
  const equal = others.some((ref) => {
    const { line: other } = p.at(ref, placed);
    return 'value' in other && other.value === winning;
  });
  const words = equal
    ? ', not passed by '
    : others.length === 1
      ? `, ${extreme} than `
      : `, the ${superlative}, against `;
  return [
    strong(`Governs: ${small(winner.line.title)}`),
    text(' with '),
    ...symbolAndValue(p, line.governs, placed),
    text(words),
    ...rest,
    text('.'),
  ];
}

/** The words of a comparison with its two values and its difference put in. */
export function comparisonSentence(
  p: Presenter,
  placed: PlacedLine,
  line: LineOf<'comparison'>,
  difference: string,
): Inline[] {
  const value = (ref: string): Inline => ({
    kind: 'value',
    text: withUnit(usedForm(p, ref, placed)),
    address: p.at(ref, placed).address,
  });
  return line.words.split(/(\{(?:used|other|difference)\})/).flatMap((part): Inline[] => {
    if (part === '{used}') return [value(line.used)];
    if (part === '{other}') return [value(line.other)];
    if (part === '{difference}') return [strong(difference)];
    return part === '' ? [] : [text(part)];
  });
}

export const capital = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

/** A title inside a sentence: its first letter small unless it is a name (`E3`, `Cb`). */
export const small = (words: string): string =>
  /^[A-Z][a-z]+(\s|,|$)/.test(words) ? words.charAt(0).toLowerCase() + words.slice(1) : words;
