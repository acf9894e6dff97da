import { addressOf, placedLines } from '../calc/address.ts';
import type { Clause, Condition, Line, LineOf, Side } from '../calc/line.ts';
import type { MemberRecord } from '../calc/record.ts';
import { symbolText } from '../report/symbol-text.ts';
import { symbolTex } from '../standards/library.ts';

/** A constant that a clause gives, or a decision it asks for, as a record met it. */
export interface ClauseFacts {
  readonly clause: Clause;
  readonly constant: ClauseConstant | null;
  readonly decision: ClauseDecision | null;
}

export interface ClauseConstant {
  readonly tex: string;
  readonly text: string;
  readonly published: string;
  readonly title: string;
  /** `Table E7.1, (c) all other elements`. */
  readonly from: string;
}

export interface ClauseDecision {
  readonly title: string;
  /** Each condition in words with what follows from it, in the order in which they are tried. */
  readonly ways: readonly { readonly condition: string; readonly outcome: string }[];
  /** What holds where no condition does. */
  readonly otherwise: string;
}

const RELATIONS: Readonly<Record<Condition['relation'], string>> = {
  ...{ '<': '<', '<=': '≤', '>': '>', '>=': '≥', '=': '=', is: 'is' },
};

/**
 * Constants and decisions of all clauses that a member's record met, one by one. A line holds the
 * conditions tried until one held, so a decision is whole, and given here, only where none did.
 */
export function factsOf(member: Pick<MemberRecord, 'lines' | 'combinations'>): ClauseFacts[] {
  const placed = placedLines(member);
  const lines = new Map(placed.map(({ address, line }) => [address, line]));
  return placed.flatMap(({ line, combination }): ClauseFacts[] => {
    const { clause } = line;
    if (clause === null) return [];
    if (line.kind === 'lookup') return [{ clause, constant: constantOf(line), decision: null }];
    if (line.kind !== 'choice' || line.tried.some(({ holds }) => holds)) return [];
    const at = (ref: string) => lines.get(addressOf(ref, combination));
    return [{ clause, constant: null, decision: decisionOf(line, at) }];
  });
}

function constantOf(line: LineOf<'lookup'>): ClauseConstant {
  const { published, title, table, row } = line;
  const tex = symbolTex(line.symbol, line.clause?.book);
  return { tex, text: symbolText(tex), published, title, from: `${table}, ${row}` };
}

function decisionOf(line: LineOf<'choice'>, at: (ref: string) => Line | undefined): ClauseDecision {
  const words = (side: Side): string => {
    if ('words' in side) return side.words;
    if ('constant' in side) return String(side.constant).replace('-', '−');
    const source = at(side.ref);
    if (!source) throw new Error(`${line.key} refers to ${side.ref}, which is not there`);
    return 'symbol' in source
      ? symbolText(symbolTex(source.symbol, source.clause?.book))
      : source.title;
  };
  return {
    title: line.title,
    ways: line.tried.map(({ left, relation, right, outcome }) => ({
      condition: `${words(left)} ${RELATIONS[relation]} ${words(right)}`,
      outcome,
    })),
    otherwise: line.otherwise,
  };
}
