import { canonicalText } from '#shared/calc/hashes.ts';
import type { CalculationRecord } from '#shared/calc/record.ts';
import { parseInput } from '#shared/members/parse-input.ts';
import type { ParsedInput, ResolvedInput } from '#shared/members/resolved.ts';

/** The record's own input read again; null, with reasons, where it is no input. */
export function readInput(record: CalculationRecord): {
  readonly input: ResolvedInput | null;
  readonly reasons: readonly string[];
} {
  const parsed: ParsedInput = parseInput(record.input);
  return parsed.ok
    ? { input: parsed.input, reasons: headReasons(record, parsed.input) }
    : { input: null, reasons: parsed.problems.map((p) => `input ${p.path} ${p.message}`) };
}

/** What stands above the lines is what the input says. */
function headReasons(record: CalculationRecord, input: ResolvedInput): string[] {
  const found: string[] = [];
  const same = (what: string, said: unknown, given: unknown): void => {
    const [a, b] = [canonicalText(said), canonicalText(given)];
    if (a !== b) found.push(`${what} is ${a}, but the input says ${b}`);
  };
  same('the standard', record.standard, input.source.standard);
  same('the design method', record.design, input.design);
  same('the unit set', record.units, input.units);
  same('the analysis', record.analysis, input.analysis);
  const labels = (
    members: readonly {
      id: string;
      mark: string;
      combinations: readonly { id: string; name: string }[];
    }[],
  ) =>
    members.map((m) => ({
      id: m.id,
      mark: m.mark,
      combinations: m.combinations.map((c) => ({ id: c.id, name: c.name })),
    }));
  same('the list of members and combinations', labels(record.members), labels(input.members));
  for (const member of record.members) {
    const given = input.members.find((m) => m.id === member.id);
    if (!given) continue;
    same(`the section of ${member.mark}`, member.section, given.section.value);
    const { steel } = given;
    const material = steel.kind === 'grade' ? steel.steel.key : steel.name;
    same(`the material of ${member.mark}`, member.material, material);
  }
  return found;
}
