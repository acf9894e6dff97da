import { placedLines } from '../calc/address.ts';
import type { MemberRecord } from '../calc/record.ts';

/** That a member's record uses a formula: where first, in how many lines and combinations. */
export interface FormulaUse {
  /** `aisc360-22/E3-2`. */
  readonly formula: string;
  /** Address of the first line within the member: `E3/Fn`, `c1:H1/ratio`. */
  readonly address: string;
  readonly lines: number;
  /** Combinations with a line of the formula; 0 where it stands in member lines only. */
  readonly combinations: number;
}

/** The formulas that a member's record uses, in the order in which it first does. */
export function formulaUses(member: Pick<MemberRecord, 'lines' | 'combinations'>): FormulaUse[] {
  const found = new Map<string, { address: string; lines: number; combinations: Set<string> }>();
  for (const { address, combination, line } of placedLines(member)) {
    if (line.kind !== 'formula' && line.kind !== 'root') continue;
    const use = found.get(line.formula) ?? { address, lines: 0, combinations: new Set() };
    use.lines += 1;
    if (combination !== null) use.combinations.add(combination);
    found.set(line.formula, use);
  }
  return [...found].map(([formula, { address, lines, combinations }]) => ({
    ...{ formula, address, lines, combinations: combinations.size },
  }));
}
