import type { Tried } from '#shared/calc/condition.ts';
import type { ParsedExpression } from '#shared/expr/parse.ts';

/** One change of the books. `id` is unique; `at` is the formula, place or key that it changes. */
export interface Mutant {
  readonly id: string;
  readonly kind: MutantKind;
  readonly at: string;
  /** A formula's other text; empty where the mutant is no formula's. */
  readonly text: string;
}
export const MUTANT_KINDS = [
  'formula is 0',
  'formula is its first operand',
  'formula constant ±1 %',
  'relation at its limit',
  'relation reversed',
  'limit in a condition ±1 %',
  'least for greatest',
  'constant of a clause ±1 %',
] as const;
export type MutantKind = (typeof MUTANT_KINDS)[number];

type Relation = Tried['relation'];
type CompareRelation = '<' | '<=' | '>' | '>=';
interface Placed extends Tried {
  readonly site: string;
}

/** `<` for `<=` and so on: another outcome only where both sides are equal. */
const AT_LIMIT: Partial<Record<Relation, Relation>> = {
  ...{ '<': '<=', '<=': '<', '>': '>=', '>=': '>' },
};
/** The other side of the limit. */
const REVERSED: Partial<Record<Relation, Relation>> = {
  ...{ '<': '>', '<=': '>=', '>': '<', '>=': '<=' },
};

/**
 * Stands between the books and their values in a mutation run. It notes what a test touches, so that
 * only tests which a mutant can change are run again, and puts the one active mutant in place.
 *
 * A condition, a choice of the least and a factor are noted by the mutants that would come out
 * otherwise: up to the first such place a run with the mutant is the same run.
 */
export class Switchboard {
  active: Mutant | null = null;
  touched: Set<string> = new Set();
  /** Mutants of conditions, of least and greatest and of factors, met so far. */
  readonly met = new Map<string, Mutant>();

  private offer(kind: MutantKind, at: string, way: string, differs: boolean): boolean {
    const id = `${at} ${way}`;
    if (!this.met.has(id)) this.met.set(id, { id, kind, at, text: '' });
    if (differs) this.touched.add(id);
    return this.active?.id === id;
  }

  /** The expression of a formula, which is the mutant's while that is active. */
  expression(id: string, text: string, parse: (text: string) => ParsedExpression) {
    const own = parse(text);
    const now = (): ParsedExpression =>
      this.active?.at === id && this.active.text !== '' ? parse(this.active.text) : own;
    const touch = (): ParsedExpression => {
      this.touched.add(id);
      return now();
    };
    return {
      get text() {
        return now().text;
      },
      get tree() {
        return now().tree;
      },
      symbols: own.symbols,
      evaluate: (operands: Readonly<Record<string, number>>) => touch().evaluate(operands),
      settle: (operands: Readonly<Record<string, number>>) => touch().settle(operands),
    };
  }

  holds(tried: Tried, plain: (tried: Tried) => boolean): boolean {
    const { site } = tried as Placed;
    const outcome = plain(tried);
    if (site === undefined) return outcome;
    const { relation, left, right } = tried;
    const other = (kind: MutantKind, way: string, otherwise: boolean): boolean =>
      this.offer(kind, site, way, otherwise !== outcome);
    let result = outcome;
    const offer = (kind: MutantKind, way: string, changed: Tried | null) => {
      const otherwise = changed ? plain(changed) : !outcome;
      if (other(kind, way, otherwise)) result = otherwise;
    };
    const [atLimit, reversed] = [AT_LIMIT[relation], REVERSED[relation]];
    if (atLimit)
      offer('relation at its limit', `${relation} is ${atLimit}`, { ...tried, relation: atLimit });
    if (reversed)
      offer('relation reversed', `${relation} is ${reversed}`, { ...tried, relation: reversed });
    else offer('relation reversed', `${relation} is negated`, null);
    for (const factor of [1.01, 0.99]) {
      if (typeof right === 'number' && right !== 0)
        offer('limit in a condition ±1 %', `right ${right} times ${factor}`, {
          ...tried,
          right: right * factor,
        });
      if (typeof left === 'number' && left !== 0)
        offer('limit in a condition ±1 %', `left ${left} times ${factor}`, {
          ...tried,
          left: left * factor,
        });
    }
    return result;
  }

  /** A comparison in plain code. */
  compare(site: string, left: number, relation: CompareRelation, right: number): boolean {
    const of = (r: Relation) =>
      ({ '<': left < right, '<=': left <= right, '>': left > right, '>=': left >= right })[
        r as CompareRelation
      ];
    const outcome = of(relation);
    let result = outcome;
    for (const [kind, others] of [
      ['relation at its limit', AT_LIMIT],
      ['relation reversed', REVERSED],
    ] as const) {
      const other = others[relation] as Relation;
      if (this.offer(kind, site, `is ${other}`, of(other) !== outcome)) result = of(other);
    }
    return result;
  }

  sense(site: string, sense: 'min' | 'max', values: readonly number[]): 'min' | 'max' {
    const differs = values.some((v) => v !== values[0]);
    const swapped = this.offer('least for greatest', site, `${sense} swapped`, differs);
    return swapped ? (sense === 'min' ? 'max' : 'min') : sense;
  }

  constant(name: string, value: number): number {
    const factor = [1.01, 0.99].find((f) =>
      this.offer('constant of a clause ±1 %', name, `times ${f}`, true),
    );
    return value * (factor ?? 1);
  }
}
