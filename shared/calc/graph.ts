import { addressOf, type PlacedLine, placedLines } from './address.ts';
import type { Line, Side } from './line.ts';
import type { MemberRecord } from './record.ts';

const sideRefs = (side: Side): string[] => ('ref' in side ? [side.ref] : []);

/** References a line makes to the lines it came from, as written in the line. */
export function refsOf(line: Line): string[] {
  switch (line.kind) {
    case 'formula':
    case 'root':
      return Object.values(line.operands).map((o) => o.ref);
    case 'choice':
      return line.tried.flatMap((c) => [...sideRefs(c.left), ...sideRefs(c.right)]);
    case 'governing':
      return line.candidates;
    case 'check':
      return line.capacity === 1 ? [line.demand] : [line.demand, line.capacity];
    case 'comparison':
      return [line.used, line.other];
    case 'given':
    case 'statement':
    case 'lookup':
    case 'notice':
    case 'section':
      return [];
  }
}

/** A member's lines as a graph; addresses are full within the member. */
export interface LineGraph {
  readonly lines: ReadonlyMap<string, PlacedLine>;
  /** What a line came from, in the order its line names them, without repeats. */
  sources(address: string): readonly string[];
  /** The lines that use a line, in reading order. */
  dependents(address: string): readonly string[];
  /** The whole ladder below a line down to given values, nearest first, each line once. */
  ladder(address: string): readonly string[];
}

/** Builds the graph of one member's record; throws if a line refers to one that isn't there before it. */
export function lineGraph(member: Pick<MemberRecord, 'lines' | 'combinations'>): LineGraph {
  const lines = new Map<string, PlacedLine>();
  const sources = new Map<string, string[]>();
  const dependents = new Map<string, string[]>();
  for (const placed of placedLines(member)) {
    if (lines.has(placed.address)) throw new Error(`two lines at ${placed.address}`);
    const from = [...new Set(refsOf(placed.line).map((r) => addressOf(r, placed.combination)))];
    for (const source of from) {
      if (!lines.has(source))
        throw new Error(`${placed.address} refers to ${source}, not before it`);
      dependents.get(source)?.push(placed.address);
    }
    lines.set(placed.address, placed);
    sources.set(placed.address, from);
    dependents.set(placed.address, []);
  }
  const order = new Map([...lines.keys()].map((address, i) => [address, i]));
  const ladder = (address: string): string[] => {
    const seen = new Set<string>();
    const visit = (at: string): void => {
      for (const source of sources.get(at) ?? []) {
        if (seen.has(source)) continue;
        seen.add(source);
        visit(source);
      }
    };
    visit(address);
    return [...seen].sort((a, b) => (order.get(b) ?? 0) - (order.get(a) ?? 0));
  };
  return {
    lines,
    sources: (address) => sources.get(address) ?? [],
    dependents: (address) => dependents.get(address) ?? [],
    ladder,
  };
}
