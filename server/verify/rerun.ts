import { placedLines } from '#shared/calc/address.ts';
import type { CalculationRecord } from '#shared/calc/record.ts';
import type { ResolvedInput } from '#shared/members/resolved.ts';
import { runCalculation } from '#shared/members/run.ts';

export interface RerunProblem {
  readonly memberId: string | null;
  readonly address: string | null;
  readonly reason: string;
}

/**
 * Numbers of two runs agree within this: the last bits of pow, exp and sin differ between engines
 * of JavaScript, so a run is never compared by hash.
 */
const RELATIVE = 1e-9;
const ABSOLUTE = 1e-12;

/** Runs the book again over the record's own input and compares everything but the hashes. */
export function* rerun(record: CalculationRecord, input: ResolvedInput): Iterable<RerunProblem> {
  const again = runCalculation(input);
  const { members, resultHash: _r, snapshotHash: _s, ...head } = record;
  const { members: ran, resultHash: _ra, snapshotHash: _sa, ...headAgain } = again;
  const whole = (memberId: string | null, said: unknown, found: unknown): RerunProblem[] =>
    differences(said, found, '').map((reason) => ({ memberId, address: null, reason }));
  yield* whole(null, head, headAgain);
  for (const member of members) {
    const same = ran.find((m) => m.id === member.id);
    if (!same) continue;
    const { lines, combinations, ...rest } = member;
    const { lines: _l, combinations: summarised, ...restAgain } = same;
    const labels = (cs: typeof combinations) => cs.map(({ lines: _, ...c }) => c);
    yield* whole(
      member.id,
      { ...rest, combinations: labels(combinations) },
      { ...restAgain, combinations: labels(summarised) },
    );
    const [said, found] = [placedLines(member), placedLines(same)];
    const byAddress = new Map(found.map((p) => [p.address, p.line]));
    for (const { address, line } of said) {
      const other = byAddress.get(address);
      const reasons = other ? differences(line, other, '') : ['run again, it is not there'];
      for (const reason of reasons) yield { memberId: member.id, address, reason };
      byAddress.delete(address);
    }
    for (const address of byAddress.keys())
      yield { memberId: member.id, address, reason: 'is missing: run again, it is there' };
    if (byAddress.size === 0 && said.some((p, i) => p.address !== found[i]?.address))
      yield { memberId: member.id, address: null, reason: 'run again, its lines stand otherwise' };
  }
}

/** Where two pieces of plain data differ, each place as a sentence. */
function differences(said: unknown, again: unknown, path: string): string[] {
  if (typeof said === 'number' && typeof again === 'number') {
    const size = Math.max(Math.abs(said), Math.abs(again));
    if (Math.abs(said - again) <= RELATIVE * size + ABSOLUTE) return [];
  } else if (isData(said) && isData(again) && Array.isArray(said) === Array.isArray(again)) {
    const keys = new Set([...Object.keys(said), ...Object.keys(again)]);
    return [...keys].flatMap((key) =>
      differences(said[key], again[key], path === '' ? key : `${path}.${key}`),
    );
  } else if (said === again) return [];
  return [`${path} is ${shown(said)}, run again ${shown(again)}`];
}

const isData = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null;

const shown = (value: unknown): string => {
  const text = JSON.stringify(value) ?? 'absent';
  return text.length > 80 ? `${text.slice(0, 80)}…` : text;
};
