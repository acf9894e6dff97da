import { lineGraph } from '../calc/graph.ts';
import type { Clause, Line } from '../calc/line.ts';
import type { MemberRecord } from '../calc/record.ts';
import { parseExpression } from '../expr/parse.ts';
import { parseInput } from '../members/parse-input.ts';
import { runMember } from '../members/run.ts';
import {
  type Expected,
  PUBLISHED_CASES,
  PUBLISHED_EQUATIONS,
  PUBLISHED_TABLES,
  type PublishedCase,
  type PublishedEquation,
  type PublishedSource,
  publishedInput,
  tableInput,
} from '../published-cases/published-cases.ts';
import { formulaNamed } from '../standards/library.ts';
import { parseQuantity } from '../units/parse.ts';
import { fromBase, unitNamed } from '../units/unit.ts';
import { type ClauseFacts, factsOf } from './clause-facts.ts';

type Design = 'LRFD' | 'ASD';

/** A value that a publication prints, with what this program computes from the same inputs. */
export interface PublishedValue {
  readonly source: PublishedSource;
  /** `E.1A`, or the table: `Manual Table 3-2, W18×50`. */
  readonly example: string;
  readonly what: string;
  /** null where the value is of no design method. */
  readonly design: Design | null;
  readonly unit: string;
  /** As the source prints it. */
  readonly printed: string;
  /** What this program computes, in `unit`, not rounded. */
  readonly computed: number;
  /** Why the last printed digits differ, in words, where they do and the reason is known. */
  readonly rounding: string | null;
  /** The clause of the line that is compared. */
  readonly clause: Clause | null;
  /** Formula of that line, where it is one, then those of the lines it follows from. */
  readonly formulas: readonly string[];
}

/** What one run of a publication's input gives. */
export interface PublishedRun {
  readonly values: readonly PublishedValue[];
  readonly facts: readonly ClauseFacts[];
}

/** All publications, one call for each run: a run takes some milliseconds. */
export const PUBLISHED_RUNS: readonly (() => PublishedRun)[] = [
  ...PUBLISHED_CASES.flatMap((data) =>
    designsOf(data).map((design, index) => () => runCase(data, design, index === 0)),
  ),
  ...PUBLISHED_TABLES.strengths.flatMap((row) =>
    (['LRFD', 'ASD'] as const).map((design) => () => runStrength(row, design)),
  ),
  ...PUBLISHED_TABLES.limits.map((row) => () => runLimits(row)),
  ...PUBLISHED_EQUATIONS.map(({ source, formulas }) => () => ({
    values: formulas.flatMap((row) => equationValue(source, row)),
    facts: [],
  })),
];

function designsOf(data: PublishedCase): Design[] {
  return (['LRFD', 'ASD'] as const).filter((design) => publishedInput(data, design) !== null);
}

/** A member of an input that has to be valid: it is ours. */
function memberOf(input: unknown): MemberRecord {
  const parsed = parseInput(input);
  const member = parsed.ok ? parsed.input.members[0] : undefined;
  if (!parsed.ok || !member) throw new Error('a published case is no valid input');
  return runMember(parsed.input, member);
}

/** What neither method changes is taken from the first run only. */
function runCase(data: PublishedCase, design: Design, first: boolean): PublishedRun {
  const member = memberOf(publishedInput(data, design));
  const values = data.expected
    .filter(({ method }) => method === design || (first && method === 'nominal'))
    .map((expected) => ({
      ...{ source: data.source, example: data.source.example, what: expected.what },
      design: expected.method === 'nominal' ? null : expected.method,
      ...{ unit: expected.unit, printed: expected.printed },
      rounding: expected.explained ? roundedOnTheWay(expected.explained.by) : null,
      ...compare(member, expected),
    }));
  return { values, facts: factsOf(member) };
}

type Strength = (typeof PUBLISHED_TABLES.strengths)[number];

function runStrength(row: Strength, design: Design): PublishedRun {
  const member = memberOf(tableInput(row, design));
  const line = `F1/${row.axis}/Mc`;
  const value: PublishedValue = {
    source: PUBLISHED_TABLES.source,
    ...tableRow(row.table, row.section, `available flexural strength about ${row.axis}`, row.Lb),
    ...{ design, unit: 'kip ft', printed: row[design].printed, rounding: row.reading ?? null },
    ...compare(member, { line, unit: 'kip ft' }),
  };
  return { values: [value], facts: factsOf(member) };
}

type Limits = (typeof PUBLISHED_TABLES.limits)[number];

function runLimits(row: Limits): PublishedRun {
  const member = memberOf(tableInput({ section: row.section, axis: 'x', Lb: '20 ft' }, 'LRFD'));
  const names = { Lp: 'limit of yielding', Lr: 'limit of inelastic buckling' } as const;
  const values = (['Lp', 'Lr'] as const).map(
    (name): PublishedValue => ({
      source: PUBLISHED_TABLES.source,
      ...tableRow(row.table, row.section, names[name]),
      ...{ design: null, unit: 'ft', printed: row[name].printed, rounding: null },
      ...compare(member, { line: `F2/${name}`, unit: 'ft' }),
    }),
  );
  return { values, facts: factsOf(member) };
}

const tableRow = (table: string, section: string, what: string, Lb?: string) => ({
  example: `${table}, ${section.replace('X', '×')}`,
  what: Lb ? `${what}, Lb = ${Lb}` : what,
});

const roundedOnTheWay = (by: string): string => `the source goes on with ${by}`;

/** The compared value of a member's line, and what the line follows from. */
function compare(
  member: MemberRecord,
  {
    line: address,
    unit,
    derive,
    lineUnit,
  }: Pick<Expected, 'line' | 'unit' | 'derive' | 'lineUnit'>,
) {
  const graph = lineGraph(member);
  const placed = graph.lines.get(address);
  if (!placed) throw new Error(`a published case compares ${address}, which is not there`);
  const { line } = placed;
  const base = lineValue(line);
  const computed =
    derive === undefined
      ? fromBase(base, unitNamed(unit))
      : parseExpression(derive).evaluate({ x: fromBase(base, unitNamed(lineUnit ?? '')) });
  const ladder = [address, ...graph.ladder(address)].flatMap((at) => {
    const one = graph.lines.get(at)?.line;
    return one?.kind === 'formula' || one?.kind === 'root' ? [one.formula] : [];
  });
  return { computed, clause: line.clause, formulas: [...new Set(ladder)] };
}

function lineValue(line: Line): number {
  if ('value' in line) return line.value;
  if (line.kind === 'check') return line.ratio;
  throw new Error(`a published case compares ${line.key}, which has no value`);
}

/** Of a single equation with its printed operands; nothing where the source prints no number. */
function equationValue(source: PublishedSource, row: PublishedEquation): PublishedValue[] {
  const formula = formulaNamed(row.formula);
  if (!formula) throw new Error(`a published case uses ${row.formula}, which is not there`);
  if (row.printed === null) return [];
  const operands = Object.entries(row.operands).map(([name, text]) => {
    const parsed = parseQuantity(text, formula.operands[name] ?? 'none');
    if (!parsed.ok) throw new Error(`${row.formula}: ${name} = ${text} ${parsed.reason}`);
    return [name, parsed.quantity.value] as const;
  });
  const { book, clause, equation } = formula;
  const { what, unit, printed, explained } = row;
  const value = formula.expression.evaluate(Object.fromEntries(operands));
  return [
    {
      ...{ source, example: row.example, what, design: null, unit },
      ...{ printed, computed: fromBase(value, unitNamed(unit)) },
      rounding: explained ? roundedOnTheWay(explained.by) : null,
      ...{ clause: { book, clause, equation }, formulas: [formula.id] },
    },
  ];
}
