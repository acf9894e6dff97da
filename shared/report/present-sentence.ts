import type { PlacedLine } from '../calc/address.ts';
import type { Condition, LineOf, Side } from '../calc/line.ts';
import { withUnit } from '../figures/read-line.ts';
import { type Presenter, printedBy, strong, symbolAndValue, text, usedForm } from './presenter.ts';
import type { Inline } from './tree.ts';

type Relation = Condition['relation'];

/** A relation in words where it holds, and where it doesn't for a left side below or above. */
const WORDS: Record<
  Relation,
  { readonly holds: string; readonly below: string; readonly above: string }
> = {
  '<': { holds: 'is less than', below: 'is less than', above: 'exceeds' },
  '<=': { holds: 'does not exceed', below: 'does not exceed', above: 'exceeds' },
  '>': { holds: 'exceeds', below: 'does not exceed', above: 'exceeds' },
  '>=': { holds: 'is not less than', below: 'is less than', above: 'is not less than' },
  '=': { holds: 'equals', below: 'is less than', above: 'exceeds' },
  is: { holds: 'is', below: 'is not', above: 'is not' },
};

/** **The maximum lies in the span**, because ψ = 0.8814 exceeds cos kL = 0.3753. */
export function choiceSentence(p: Presenter, placed: PlacedLine, line: LineOf<'choice'>): Inline[] {
  // Of conditions on the same two sides the last one tried says the most.
  const last = new Map(line.tried.map((c) => [JSON.stringify([c.left, c.right]), c]));
  const said = [...last.values()];
  const reasons = said.flatMap((condition, index): Inline[] => [
    ...(index === 0 ? [] : [text(index === said.length - 1 ? ' and ' : ', ')]),
    ...conditionWords(p, placed, condition),
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
  const words = WORDS[relation];
  const way = Math.sign(sideValue(p, placed, left) - sideValue(p, placed, right));
  const said = way === 0 ? 'equals' : holds ? words.holds : way < 0 ? words.below : words.above;
  return [...sideWords(p, placed, left), text(` ${said} `), ...sideWords(p, placed, right)];
}

/** Not a number where the side is words. */
const sideValue = (p: Presenter, placed: PlacedLine, side: Side): number => {
  if ('constant' in side) return side.constant;
  const line = 'ref' in side ? p.at(side.ref, placed).line : null;
  return line && 'value' in line ? line.value : Number.NaN;
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
    return [strong(`Governs: ${small(winner.line.title)}`), text('; nothing else applies.')];
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

/** How far and which way a comparison differs: `2.5 % below`, `equal to`, `within 0.1 % of`. */
export function differenceWords(line: LineOf<'comparison'>): string {
  if (line.difference === 0) return 'equal to';
  const size = printedBy(Math.abs(line.difference) * 100, line.print.working);
  if (Number(size) === 0) return 'within 0.1 % of';
  return `${size} % ${line.difference < 0 ? 'below' : 'above'}`;
}

/** The words of a comparison with its two values and its difference put in. */
export function comparisonSentence(
  p: Presenter,
  placed: PlacedLine,
  line: LineOf<'comparison'>,
): Inline[] {
  const value = (ref: string): Inline => ({
    kind: 'value',
    text: withUnit(usedForm(p, ref, placed)),
    address: p.at(ref, placed).address,
  });
  return line.words.split(/(\{(?:used|other|difference)\})/).flatMap((part): Inline[] => {
    if (part === '{used}') return [value(line.used)];
    if (part === '{other}') return [value(line.other)];
    if (part === '{difference}') return [strong(differenceWords(line))];
    return part === '' ? [] : [text(part)];
  });
}

export const capital = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

/** A title inside a sentence: its first letter small unless it is a name (`E3`, `Cb`). */
export const small = (words: string): string =>
  /^[A-Z][a-z-]+(\s|,|$)/.test(words) ? words.charAt(0).toLowerCase() + words.slice(1) : words;
