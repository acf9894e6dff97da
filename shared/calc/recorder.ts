import type { DimensionName } from '../units/dimension.ts';
import { conditionOf, holds, type Tried } from './condition.ts';
import type { Formula } from './formula.ts';
import type { Clause, Line, LineOf, Print, Severity, Source, ValuedLine } from './line.ts';
import { type GivenValue, type Quantity, withoutNoise } from './quantity.ts';
import { solveBracketed } from './solve.ts';

/** Ends a run whose formula has no finite value; the notice that says so is already written. */
export class NotComputable extends Error {}

interface Titled {
  readonly title: string;
  readonly clause?: Clause | null;
}

type Operands = Readonly<Record<string, Quantity>>;

const valuesOf = (operands: Operands): Record<string, number> =>
  Object.fromEntries(Object.entries(operands).map(([name, q]) => [name, q.value]));

/** The named operands as a line holds them. */
const operandsOf = (operands: Operands, names: readonly string[]): LineOf<'formula'>['operands'] =>
  Object.fromEntries(
    names.map((name) => {
      const q = operands[name] as Quantity;
      return [name, { ref: q.ref, symbol: q.symbol }];
    }),
  );

const UNPRINTED: Print = { working: null, display: null };

/**
 * The recorder writes typed lines as a procedure runs. It knows kinds of lines, never clauses. Only
 * the quantities it hands out enter formulas, so every number on a sheet has a line.
 */
export type Recorder = ReturnType<typeof writerOf> & {
  /** The same lines, with keys under `name`: `s2` writes `s2/F2/Mn`. */
  readonly within: (name: string) => Recorder;
};

/**
 * A recorder of one scope: '' for member lines, ':' for the lines of one combination. `within`
 * gives one whose keys start with a part of the member (`s2/`), writing to the same lines.
 */
export const createRecorder = (prefix: '' | ':'): Recorder =>
  recorderWithin(prefix, '', [], new Set());

const recorderWithin = (
  prefix: '' | ':',
  part: string,
  lines: Line[],
  keys: Set<string>,
): Recorder => ({
  ...writerOf(prefix, part, lines, keys),
  within: (name) => recorderWithin(prefix, `${part}${name}/`, lines, keys),
});

function writerOf(prefix: '' | ':', part: string, lines: Line[], keys: Set<string>) {
  const add = <L extends Line>(given: L): L => {
    const line: L = part === '' ? given : { ...given, key: part + given.key };
    if (keys.has(line.key)) throw new Error(`two lines with the key ${line.key}`);
    keys.add(line.key);
    Object.freeze(line);
    lines.push(line);
    return line;
  };
  const quantity = (line: ValuedLine): Quantity =>
    Object.freeze({
      ref: prefix + line.key,
      symbol: line.symbol,
      value: line.value,
      dimension: line.dimension,
    });

  const notice = (
    key: string,
    severity: Severity,
    code: string,
    text: string,
    more: Titled,
  ): void => {
    add({
      kind: 'notice',
      key,
      title: more.title,
      clause: more.clause ?? null,
      severity,
      code,
      text,
    });
  };

  return {
    lines: lines as readonly Line[],

    section(key: string, title: string, clause: Clause | null = null): void {
      add({ kind: 'section', key, title, clause });
    },

    given(
      key: string,
      symbol: string,
      dimension: DimensionName,
      given: GivenValue,
      more: Titled,
    ): Quantity {
      const { value, text, source, confirmed } = given;
      return quantity(
        add({
          kind: 'given',
          key,
          title: more.title,
          clause: more.clause ?? null,
          symbol,
          value,
          dimension,
          print: UNPRINTED,
          typed: text,
          source,
          confirmed,
        }),
      );
    },

    statement(key: string, words: string, source: Source, confirmed: boolean, more: Titled): void {
      add({
        kind: 'statement',
        key,
        title: more.title,
        clause: more.clause ?? null,
        statement: words,
        source,
        confirmed,
      });
    },

    lookup(
      key: string,
      symbol: string,
      dimension: DimensionName,
      found: {
        value: number;
        published: string;
        table: string;
        row: string;
        column: string;
        tableSource: string;
      },
      more: Titled,
    ): Quantity {
      return quantity(
        add({
          kind: 'lookup',
          key,
          title: more.title,
          clause: more.clause ?? null,
          symbol,
          dimension,
          print: UNPRINTED,
          ...found,
        }),
      );
    },

    /** One step by a formula of a book. A result that isn't a finite number becomes a failed notice. */
    formula(
      formula: Formula,
      key: string,
      operands: Operands,
      more: { title?: string; symbol?: string } = {},
    ): Quantity {
      const clause: Clause = {
        book: formula.book,
        clause: formula.clause,
        equation: formula.equation,
      };
      const title = more.title ?? formula.title;
      for (const [name, dimension] of Object.entries(formula.operands))
        if (operands[name]?.dimension !== dimension)
          throw new Error(
            `${formula.id}: ${name} is ${operands[name]?.dimension}, not ${dimension}`,
          );
      const value = withoutNoise(formula.expression.settle(valuesOf(operands)), formula.dimension);
      if (!Number.isFinite(value)) {
        notice(
          `${key}/failed`,
          'failed',
          'not-a-number',
          `${title} has no finite value for these inputs.`,
          { title, clause },
        );
        throw new NotComputable(key);
      }
      return quantity(
        add({
          kind: 'formula',
          key,
          title,
          clause,
          symbol: more.symbol ?? formula.symbol,
          value: value === 0 ? 0 : value,
          dimension: formula.dimension,
          print: formula.ratio ? { working: { dec: 3 }, display: null } : UNPRINTED,
          formula: formula.id,
          expression: formula.expression.text,
          operands: operandsOf(operands, Object.keys(formula.operands)),
          prints: formula.prints,
        }),
      );
    },

    /** Tries conditions in order; answers the index of the first that holds, or -1 for otherwise. */
    choice(
      key: string,
      tried: readonly Tried[],
      otherwise: string,
      more: Titled & { because?: string },
    ): number {
      const taken = tried.findIndex(holds);
      const read = taken < 0 ? tried : tried.slice(0, taken + 1);
      add({
        kind: 'choice',
        key,
        title: more.title,
        clause: more.clause ?? null,
        tried: read.map(conditionOf),
        otherwise,
        outcome: taken < 0 ? otherwise : (tried[taken]?.outcome ?? otherwise),
        because: more.because ?? '',
      });
      return taken;
    },

    /** The least or the greatest of candidates; the first of equals governs. */
    governing(
      key: string,
      sense: 'min' | 'max',
      candidates: readonly Quantity[],
      more: Titled & { symbol: string },
    ): Quantity {
      const best = candidates.reduce((a, b) =>
        (sense === 'min' ? b.value < a.value : b.value > a.value) ? b : a,
      );
      return quantity(
        add({
          kind: 'governing',
          key,
          title: more.title,
          clause: more.clause ?? null,
          symbol: more.symbol,
          value: best.value,
          dimension: best.dimension,
          print: UNPRINTED,
          sense,
          candidates: candidates.map((c) => c.ref),
          governs: best.ref,
        }),
      );
    },

    /**
     * Demand against capacity, or a utilisation against 1. OK means the unrounded ratio is at most 1;
     * it is 1 where they are equal.
     */
    check(key: string, demand: Quantity, capacity: Quantity | 1, more: Titled): LineOf<'check'> {
      const ratio = withoutNoise(demand.value / (capacity === 1 ? 1 : capacity.value), 'none');
      if (!Number.isFinite(ratio)) {
        notice(
          `${key}/failed`,
          'failed',
          'no-capacity',
          `${more.title}: the capacity is zero.`,
          more,
        );
        throw new NotComputable(key);
      }
      return add({
        kind: 'check',
        key,
        title: more.title,
        clause: more.clause ?? null,
        demand: demand.ref,
        capacity: capacity === 1 ? 1 : capacity.ref,
        ratio,
        print: UNPRINTED,
        verdict: ratio <= 1 ? 'OK' : 'NOT OK',
      });
    },

    /**
     * The same quantity by another route: by what share of the other it differs. Where the other is
     * zero there is no such share: null, and no line.
     */
    comparison(
      key: string,
      used: Quantity,
      other: Quantity,
      words: string,
      more: Titled,
    ): number | null {
      if (other.value === 0) return null;
      const difference = used.value / other.value - 1;
      add({
        kind: 'comparison',
        key,
        title: more.title,
        clause: more.clause ?? null,
        used: used.ref,
        other: other.ref,
        difference,
        print: UNPRINTED,
        words,
      });
      return difference;
    },

    /**
     * The root of a formula's expression in one of its symbols, inside a bracket at whose ends it
     * has opposite signs. Dimension of the root and its print are those of `unknown`.
     */
    root(
      formula: Formula,
      key: string,
      unknown: { symbol: string; dimension: DimensionName; bracket: readonly [number, number] },
      operands: Operands,
      more: { title?: string } = {},
    ): Quantity {
      const clause: Clause = {
        book: formula.book,
        clause: formula.clause,
        equation: formula.equation,
      };
      const title = more.title ?? formula.title;
      const fixed = valuesOf(operands);
      const at = (x: number) => formula.expression.evaluate({ ...fixed, [unknown.symbol]: x });
      const value = solveBracketed(at, unknown.bracket[0], unknown.bracket[1]);
      if (value === null) {
        notice(`${key}/failed`, 'failed', 'no-root', `${title} has no root between its bounds.`, {
          title,
          clause,
        });
        throw new NotComputable(key);
      }
      return quantity(
        add({
          kind: 'root',
          key,
          title,
          clause,
          symbol: unknown.symbol,
          value,
          dimension: unknown.dimension,
          print: UNPRINTED,
          formula: formula.id,
          expression: formula.expression.text,
          unknown: unknown.symbol,
          operands: operandsOf(operands, Object.keys(operands)),
          bracket: [unknown.bracket[0], unknown.bracket[1]],
          residual: at(value),
        }),
      );
    },

    notice,
  };
}
