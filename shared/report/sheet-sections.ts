import { addressOf, type PlacedLine } from '../calc/address.ts';
import { refsOf } from '../calc/graph.ts';
import { isValued, type Line, type LineOf, VERDICTS } from '../calc/line.ts';
import { readForms } from '../figures/read-line.ts';
import { presentLine } from './present-line.ts';
import { capital, small } from './present-sentence.ts';
import { type Presenter, printedBy, strong, text } from './presenter.ts';
import { symbolText } from './symbol-text.ts';
import type { Block, BlockOf, Inline } from './tree.ts';

type SectionBlock = BlockOf<'lineSection'>;

/** Parts of a member that have sections of their own: segments, bays, the flange in compression. */
const PART = /^(?:s\d+|bay\d+|top|bottom)$/;

/** `s2/top` and `F4` of `s2/top/F4`. */
function splitKey(key: string): { part: string; rest: string } {
  const words = key.split('/');
  const count = words.findIndex((word) => !PART.test(word));
  const parts = count < 0 ? words.length : count;
  return { part: words.slice(0, parts).join('/'), rest: words.slice(parts).join('/') };
}

interface Section {
  readonly placed: PlacedLine;
  readonly part: string;
  readonly level: number;
  /** Index of the section's own line, and of the first line behind it and what it holds. */
  readonly from: number;
  readonly to: number;
}

/**
 * The lines of a member (`combination` null) or of one combination as blocks. Sections of a segment,
 * a bay or a flange stand within the section they are parts of. `way` are the lines that what
 * governs comes from: a part that none of them is in starts folded.
 */
export function sectionedLines(
  p: Presenter,
  combination: string | null,
  way: ReadonlySet<string>,
): Block[] {
  const lines = p.placed.filter((placed) => placed.combination === combination);
  const sections = new Map(sectionsOf(lines).map((section) => [section.from, section]));
  return lines.map((placed, index) => {
    const block = presentLine(p, placed);
    const section = sections.get(index);
    if (block.kind !== 'lineSection' || !section) return block;
    // Of a section with bays the one counts that governs; without parts the last line is its end.
    const parted = [...sections.values()].some(
      ({ from }) => from > section.from && from < section.to,
    );
    const inWay = ({ address }: PlacedLine): boolean => parted && way.has(address);
    const held = lines
      .slice(section.from + 1, section.to)
      .filter(({ line }) => line.kind !== 'section');
    return {
      ...block,
      title: titleOf(block.title, section),
      level: Math.min(section.level, 3) as SectionBlock['level'],
      folded: startsFolded(section, held, way),
      outcome: outcomeOf(p, placed.line, held, inWay),
    };
  });
}

function sectionsOf(lines: readonly PlacedLine[]): Section[] {
  const open: { part: string; rest: string; head: boolean }[] = [];
  const found: { placed: PlacedLine; part: string; level: number; from: number }[] = [];
  lines.forEach((placed, from) => {
    if (placed.line.kind !== 'section') return;
    const { part, rest } = splitKey(placed.line.key);
    const holds = (outer: (typeof open)[number]): boolean =>
      outer.part === ''
        ? part !== '' && outer.rest === rest
        : outer.head && (part === outer.part || part.startsWith(`${outer.part}/`));
    for (let last = open.at(-1); last && !holds(last); last = open.at(-1)) open.pop();
    open.push({ part, rest, head: open.every((outer) => outer.part !== part) });
    found.push({ placed, part, level: open.length, from });
  });
  return found.map((section, index) => ({
    ...section,
    to: found.slice(index + 1).find((next) => next.level <= section.level)?.from ?? lines.length,
  }));
}

/** A bay's or segment's own section says which, also where it does not stand under its head. */
function titleOf(title: string, { part, level }: Section): string {
  const named = /^(s|bay)(\d+)$/.exec(part);
  if (level > 1 || !named) return title;
  const name = `${named[1] === 's' ? 'Segment' : 'Bay'} ${named[2]}`;
  return title.startsWith(name) ? title : `${name}: ${small(title)}`;
}

const KNOWN = new Set<Line['kind']>(['lookup', 'given', 'statement']);

/**
 * Folded at first: looked-up properties and constants, parts that do not lead to what governs, and
 * what stands there for information or comparison.
 */
function startsFolded(
  { placed, part }: Section,
  held: readonly PlacedLine[],
  way: ReadonlySet<string>,
): boolean {
  const { rest } = splitKey(placed.line.key);
  if (rest === 'section' || rest.startsWith('L/') || rest === 'theory/H1') return true;
  if (part !== '') return !held.some(({ address }) => way.has(address));
  return held.some(({ line }) => line.kind === 'lookup') && held.every(isKnown);
}

const isKnown = ({ line }: PlacedLine): boolean => KNOWN.has(line.kind);

/** What a section comes to in one line: what fails or is not checked, its worst check, its value. */
function outcomeOf(
  p: Presenter,
  { key, title }: Line,
  held: readonly PlacedLine[],
  inWay: (placed: PlacedLine) => boolean,
): SectionBlock['outcome'] {
  const { rest } = splitKey(key);
  const content = (...runs: Inline[]) => ({ content: runs, over: false });
  const hindrance = ['failed', 'outside scope']
    .map((severity) => held.find(({ line }) => noticeOf(line)?.severity === severity))
    .find((found) => found !== undefined);
  if (hindrance) {
    const word = noticeOf(hindrance.line)?.severity === 'failed' ? 'FAILED' : 'NOT CHECKED';
    return { content: [text(`${hindrance.line.title} `), strong(word)], over: true };
  }
  const [worst] = held.filter(isCheck).sort((a, b) => rankOf(b.line) - rankOf(a.line));
  if (worst) {
    const { line, address } = worst;
    const ratio = printedBy(line.ratio, line.print.working);
    return {
      content: [
        ...(line.title === title ? [] : [text(`${line.title} `)]),
        ...(line.verdict === 'OK' ? [] : [strong(`${line.verdict} `)]),
        { kind: 'value', text: ratio, address },
      ],
      over: line.verdict !== 'OK',
    };
  }
  if (held.every(isKnown) || rest === 'section') {
    const first = held.filter(({ line }) => isValued(line)).slice(0, 3);
    return first.length === 0
      ? null
      : content(
          ...first.flatMap((placed, index) => [
            ...(index === 0 ? [] : [text(', ')]),
            ...linkedValue(p, placed),
          ]),
        );
  }
  const choices = held.flatMap(({ line }) => (line.kind === 'choice' ? [line.outcome] : []));
  const valued = held.filter(({ line }) => isValued(line));
  const computed = valued.filter((placed) => !isKnown(placed));
  const last = computed.filter(inWay).at(-1) ?? computed.at(-1) ?? valued.at(-1);
  if (choices.length > 0 && (CLASSIFIES.test(rest) || !last)) {
    const [first = '', ...others] = choices.slice(-2);
    return content(text([capital(first), ...others].join(', ')));
  }
  return last ? content(...linkedValue(p, last)) : null;
}

/** Sections that end in what something is, not in how much. */
const CLASSIFIES = /^(?:B4|F13|F1\/restraints)/;

const noticeOf = (line: Line): LineOf<'notice'> | null => (line.kind === 'notice' ? line : null);

const isCheck = (placed: PlacedLine): placed is PlacedLine & { line: LineOf<'check'> } =>
  placed.line.kind === 'check';

const rankOf = ({ verdict, ratio }: LineOf<'check'>): number =>
  1e6 * VERDICTS.indexOf(verdict) + ratio;

/** `Pc = 331.4 kip`, the value as a link to its line. */
function linkedValue(p: Presenter, { line, address }: PlacedLine): Inline[] {
  if (!isValued(line)) return [];
  const tex = p.symbolTex(line, line.symbol);
  // A table's value in the units of the sheet; others as they are read.
  const own = readForms(line, p.set).at(line.kind === 'lookup' ? -1 : 0);
  return [
    { kind: 'math', tex, text: symbolText(tex) },
    text(' = '),
    { kind: 'value', text: [own?.value, own?.unit].filter(Boolean).join(' '), address },
  ];
}

/** A line and all it comes from, of candidates only those that govern; empty without an address. */
export function governingWay(p: Presenter, address: string | null): ReadonlySet<string> {
  const byAddress = new Map(p.placed.map((placed) => [placed.address, placed]));
  const seen = new Set<string>();
  const visit = (at: string): void => {
    const placed = byAddress.get(at);
    if (!placed || seen.has(at)) return;
    seen.add(at);
    const { line, combination } = placed;
    const refs = line.kind === 'governing' ? [line.governs] : refsOf(line);
    for (const ref of refs) visit(addressOf(ref, combination));
  };
  if (address !== null) visit(address);
  return seen;
}
