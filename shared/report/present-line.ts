import type { PlacedLine } from '../calc/address.ts';
import type { Clause, Line, LineKind, LineOf, ValuedLine } from '../calc/line.ts';
import { printedForms } from '../calc/printed.ts';
import { readForms } from '../figures/read-line.ts';
import { sectionText } from '../figures/section-text.ts';
import { linked, type Step, substitutedStep, symbolicStep, valueLeaf } from './present-formula.ts';
import { choiceSentence, comparisonSentence, governingSentence } from './present-sentence.ts';
import { type Presenter, plain, printedBy, text, usedForm } from './presenter.ts';
import { referenceOf } from './reference-text.ts';
import { sourceLetter, sourceText } from './source-text.ts';
import { symbolText } from './symbol-text.ts';
import type { BlockOf, Inline, LineBlock } from './tree.ts';

type SectionBlock = BlockOf<'lineSection'>;
type Parts = Partial<Omit<LineBlock, 'kind' | 'lineKind' | 'address' | 'member' | 'number'>>;

/** One line of a record as a block of the document: text and TeX, nothing left to compute. */
export function presentLine(p: Presenter, placed: PlacedLine): LineBlock | SectionBlock {
  const { line, address } = placed;
  if (line.kind === 'section') {
    return {
      kind: 'lineSection',
      reference: referenceText(line.clause),
      title: line.title,
      address,
      level: 1,
      folded: false,
      outcome: null,
    };
  }
  const present = PRESENT[line.kind] as (p: Presenter, placed: PlacedLine, line: Line) => Parts;
  return {
    kind: 'line',
    lineKind: line.kind,
    address,
    member: p.member.id,
    number: p.number(address),
    reference: referenceOf(line.clause),
    title: line.title,
    working: [],
    text: line.title,
    sentence: [],
    result: null,
    also: null,
    verdict: null,
    tone: 'plain',
    given: null,
    ...present(p, placed, line),
  };
}

const referenceText = (clause: Clause | null): string => {
  const { clause: name, equation } = referenceOf(clause);
  return equation === '' ? name : `${name}, ${equation}`;
};

/** A statement of at most so many letters fits the column of results. */
const SHORT = 16;

const PRESENT = {
  given: (p, _placed, line) => ({
    ...valued(p, line, []),
    sentence: typedElsewhere(p, line),
    given: {
      letter: sourceLetter(line.source),
      source: sourceText(line.source),
      confirmed: line.confirmed,
    },
  }),
  statement: (_p, _placed, line) => {
    const stated = sectionText(line.statement);
    return {
      text: `${line.title}: ${stated}`,
      ...(stated.length <= SHORT
        ? { result: { value: stated, unit: '' } }
        : { sentence: [text(stated)] }),
      given: {
        letter: sourceLetter(line.source),
        source: sourceText(line.source),
        confirmed: line.confirmed,
      },
    };
  },
  lookup: (p, _placed, line) => ({
    ...valued(p, line, []),
    sentence: [{ kind: 'text', quiet: true, text: tableText(line) }],
  }),
  formula: (p, placed, line) => {
    const symbolic = symbolicStep(p, placed, line);
    return valued(p, line, [symbolic, substitutedStep(p, placed, line)]);
  },
  choice: (p, placed, line) => {
    const sentence = choiceSentence(p, placed, line);
    return { sentence, text: plain(sentence) };
  },
  governing: (p, placed, line) => {
    const sentence = governingSentence(p, placed, line);
    const steps = [candidates(p, placed, line, 'symbol'), candidates(p, placed, line, 'value')];
    return { ...valued(p, line, steps), sentence };
  },
  check: presentCheck,
  comparison: (p, placed, line) => {
    const difference = printedBy(line.difference * 100, line.print.working);
    const sentence = comparisonSentence(p, placed, line);
    return {
      working: [
        `${quotient(p, placed, line.used, line.other, 'symbol').tex}-1`,
        `=${quotient(p, placed, line.used, line.other, 'value').tex}-1`,
      ],
      sentence,
      text: `${quotient(p, placed, line.used, line.other, 'value').text} − 1 = ${difference} %. ${plain(sentence)}`,
      result: { value: difference, unit: '%' },
    };
  },
  root: (p, placed, line) => {
    const [symbolic, substituted] = [
      symbolicStep(p, placed, line),
      substitutedStep(p, placed, line),
    ];
    const whole = valued(p, line, []);
    const symbol = symbolText(p.symbolTex(line, line.symbol));
    return {
      ...whole,
      working: [`${symbolic.tex}=0`, `\\text{with values}\\quad ${substituted.tex}=0`],
      text: `${symbolic.text} = 0; ${substituted.text} = 0; ${whole.text ?? ''}`,
      sentence: [
        text(
          `${symbol} is the root of this equation: its sides change places across the last printed digit.`,
        ),
      ],
    };
  },
  notice: (_p, _placed, line) => ({
    sentence: [text(line.text)],
    text: `${line.severity}: ${line.text}`,
    tone: line.severity,
    verdict:
      line.severity === 'failed'
        ? 'FAILED'
        : line.severity === 'outside scope'
          ? 'NOT CHECKED'
          : null,
  }),
} as const satisfies {
  [K in Exclude<LineKind, 'section'>]: (p: Presenter, placed: PlacedLine, line: LineOf<K>) => Parts;
};

/** `given as 30 ft` where the value prints in other units than it was typed in. */
function typedElsewhere(p: Presenter, line: LineOf<'given'>): readonly Inline[] {
  const { working, display, typed } = printedForms(line, p.set);
  if (typed === null || (working === null && display === null)) return [];
  return [{ kind: 'text', quiet: true, text: `given as ${typed}` }];
}

/** Where a value stands: `W shapes, row W12X79, column Ix`; a clause has no columns. */
const tableText = ({ table, row, column }: LineOf<'lookup'>): string =>
  table.startsWith('Clause ')
    ? `${table}, ${row}`
    : `${table}, row ${row}, column ${columnText(column)}`;

/** A column as the published table heads it: `Ix` for `Ix_in4`, `bf/2tf` for `bf_2tf`. */
const columnText = (column: string): string =>
  column.replace(/_in\d?$/, '').replace(/^(bf|h)_/, '$1/');

/** Symbol, steps and result of a line that carries a value. */
function valued(p: Presenter, line: ValuedLine, steps: readonly Step[]): Parts {
  const tex = p.symbolTex(line, line.symbol);
  const symbol = symbolText(tex);
  // A symbol that is itself the quotient (`P_r/P_c`) is not printed before the quotient again.
  const [first] = steps;
  const same = first !== undefined && bare(first.text) === bare(symbol);
  const shown = (same ? steps.slice(1) : steps).filter(
    (step, index, all) => step.text !== all[index - 1]?.text,
  );
  const [own, other] = readForms(line, p.set);
  const results = [own, other].filter((r) => r !== undefined).map((r) => `${r.value} ${r.unit}`);
  return {
    working: [same ? (first?.tex ?? tex) : tex, ...shown.map((s) => `=${s.tex}`)],
    text: equalities([
      same ? (first?.text ?? symbol) : symbol,
      ...shown.map((s) => s.text),
      ...results,
    ]),
    result: own ?? null,
    also: other ?? null,
  };
}

/** `a = b = c`, without a part that repeats the one before it. */
const equalities = (parts: readonly string[]): string =>
  parts
    .map((part) => part.trim())
    .filter((part, index, all) => part !== all[index - 1])
    .join(' = ');

const bare = (words: string): string => words.replace(/[\s()·]/g, '');

function presentCheck(p: Presenter, placed: PlacedLine, line: LineOf<'check'>): Parts {
  const ratio = printedBy(line.ratio, line.print.working);
  const relation = line.verdict === 'OK' ? ['\\le', '≤'] : ['>', '>'];
  const steps =
    line.capacity === 1
      ? [operand(p, placed, line.demand, 'symbol'), operand(p, placed, line.demand, 'value')]
      : [
          quotient(p, placed, line.demand, line.capacity, 'symbol'),
          quotient(p, placed, line.demand, line.capacity, 'value'),
        ];
  const [symbols, values] = steps as [Step, Step];
  return {
    working: [symbols.tex, `=${values.tex}`, `${relation[0]} 1`],
    text: `${equalities([symbols.text, values.text, ratio])} ${relation[1]} 1, ${line.verdict}`,
    result: { value: ratio, unit: '' },
    verdict: line.verdict,
  };
}

function operand(p: Presenter, placed: PlacedLine, ref: string, as: 'symbol' | 'value'): Step {
  const { line, address } = p.at(ref, placed);
  if (as === 'value') {
    const form = usedForm(p, ref, placed);
    return { tex: `{${valueLeaf(form, address).tex}}`, text: form.number.text };
  }
  const tex = p.symbolTex(line, (line as ValuedLine).symbol);
  return { tex: `{${linked(address, tex)}}`, text: symbolText(tex) };
}

function quotient(
  p: Presenter,
  placed: PlacedLine,
  above: string,
  below: string,
  as: 'symbol' | 'value',
): Step {
  const [a, b] = [operand(p, placed, above, as), operand(p, placed, below, as)];
  return { tex: `\\frac{${a.tex}}{${b.tex}}`, text: `${a.text}/${b.text}` };
}

/** `min(Fex, Fey)` in symbols or values. */
function candidates(
  p: Presenter,
  placed: PlacedLine,
  line: LineOf<'governing'>,
  as: 'symbol' | 'value',
): Step {
  const steps = line.candidates.map((ref) => operand(p, placed, ref, as));
  const [only] = steps;
  if (steps.length === 1 && only) return only;
  return {
    tex: `\\${line.sense}\\left(${steps.map((s) => s.tex).join(',\\;')}\\right)`,
    text: `${line.sense}(${steps.map((s) => s.text).join(', ')})`,
  };
}
