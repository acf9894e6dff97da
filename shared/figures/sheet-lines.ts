import { isValued, type Line, type ValuedLine } from '../calc/line.ts';
import type { CombinationRecord, MemberRecord } from '../calc/record.ts';
import type { UnitSet } from '../units/unit-set.ts';

/** The lines of a member, and of one combination of it, as the figures look for them. */
export interface SheetLines {
  readonly set: UnitSet;
  /** The first line of the combination, else of the member, with a symbol. */
  readonly bySymbol: (symbol: string) => ValuedLine | undefined;
  readonly byKey: (key: string) => ValuedLine | undefined;
  /** By a reference as it stands inside a line of the combination. */
  readonly byRef: (ref: string) => ValuedLine | undefined;
  /** A line of any kind. */
  readonly any: (key: string) => Line | undefined;
  /** Keys of the combination's lines. */
  readonly keys: readonly string[];
}

export function sheetLines(
  member: MemberRecord,
  combination: CombinationRecord | null,
  set: UnitSet,
): SheetLines {
  const own = combination?.lines ?? [];
  const all = new Map<string, Line>();
  for (const line of [...own, ...member.lines]) if (!all.has(line.key)) all.set(line.key, line);
  const valued = [...own, ...member.lines].filter(isValued);
  const byKey = (key: string): ValuedLine | undefined => {
    const line = all.get(key);
    return line && isValued(line) ? line : undefined;
  };
  return {
    set,
    bySymbol: (symbol) => valued.find((line) => line.symbol === symbol),
    byKey,
    byRef: (ref) => byKey(ref.replace(/^:/, '')),
    any: (key) => all.get(key),
    keys: own.map((line) => line.key),
  };
}

/** The reference that a formula takes under a name. */
export const operandRef = (line: ValuedLine | undefined, name: string): string | undefined =>
  line?.kind === 'formula' || line?.kind === 'root' ? line.operands[name]?.ref : undefined;

/** The line that governs in the end, through lines that pick one of others. */
export function governingLine(lines: SheetLines, line: ValuedLine): ValuedLine {
  if (line.kind !== 'governing') return line;
  const next = lines.byRef(line.governs);
  return next ? governingLine(lines, next) : line;
}
