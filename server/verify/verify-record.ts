import { addressOf, type PlacedLine, placedLines } from '#shared/calc/address.ts';
import { closureProblems } from '#shared/calc/closure-problems.ts';
import { ENGINE_VERSION } from '#shared/calc/engine.ts';
import type { Formula } from '#shared/calc/formula.ts';
import { canonicalText, hashesOf } from '#shared/calc/hashes.ts';
import { isValued } from '#shared/calc/line.ts';
import { type CalculationRecord, type MemberRecord, recordSchema } from '#shared/calc/record.ts';
import type { ResolvedInput } from '#shared/members/resolved.ts';
import { formulaNamed } from '#shared/standards/library.ts';
import { UNIT_SETS } from '#shared/units/unit-set.ts';
import { checkCompleteness } from './check-completeness.ts';
import { readInput } from './check-input.ts';
import { checkSummaries } from './check-summaries.ts';
import { checkLine } from './lines/check-line.ts';
import type { Verification, VerifyProblem } from './problem.ts';
import { rerun } from './rerun.ts';
import { tally } from './tally.ts';

/** A record read from JSON; throws a NotARecord where the data is none. */
export class NotARecord extends Error {}

/** Reads a record without changing it: its hashes are those of the data as it stands. */
export function readRecord(json: unknown): CalculationRecord {
  const read = recordSchema.safeParse(json);
  if (!read.success) {
    const [first] = read.error.issues;
    throw new NotARecord(`${first?.path.join('.') || 'the data'}: ${first?.message}`);
  }
  return json as CalculationRecord;
}

export interface VerifyOptions {
  /** Where formula lines find their formulas; the shipped books unless told otherwise. */
  readonly formulaNamed?: (id: string) => Formula | undefined;
}

/** Verifies a record by itself: hashes, every line, verdicts, closure, and the run again. */
export function verifyRecord(record: CalculationRecord, options: VerifyOptions = {}): Verification {
  const { input, reasons } = readInput(record);
  const notes: string[] = [];
  const problems: VerifyProblem[] = [
    ...hashProblems(record),
    ...unknownFields(record),
    ...reasons.map((reason) => ofRecord('input', 'evaluation', reason)),
    ...record.members.flatMap((member) =>
      memberProblems(record, member, input, options.formulaNamed ?? formulaNamed),
    ),
    ...[...checkSummaries(record)].map(
      ({ member, reason }): VerifyProblem => ({
        ...ofRecord('summary', 'evaluation', reason),
        member: member && named(member),
      }),
    ),
  ];
  if (record.program.engine !== ENGINE_VERSION)
    notes.push(
      `not run again: the record is of engine ${record.program.engine}, this is ${ENGINE_VERSION}`,
    );
  else if (input) problems.push(...rerunProblems(record, input));
  return tally(record, problems, notes);
}

const named = ({ id, mark }: MemberRecord) => ({ id, mark });

export const ofRecord = (
  kind: VerifyProblem['kind'],
  by: VerifyProblem['by'],
  reason: string,
): VerifyProblem => ({ member: null, address: null, kind, by, reason });

function hashProblems(record: CalculationRecord): VerifyProblem[] {
  const { resultHash, snapshotHash } = hashesOf(record);
  const problem = (what: string, said: string | null): VerifyProblem =>
    ofRecord(
      'hash',
      'hash',
      said === null ? `carries no ${what}` : `its ${what} is not that of what it holds`,
    );
  return [
    ...(record.resultHash === resultHash ? [] : [problem('resultHash', record.resultHash)]),
    ...(record.snapshotHash === snapshotHash ? [] : [problem('snapshotHash', record.snapshotHash)]),
  ];
}

/** Nothing rides along that the format doesn't know. */
function unknownFields(record: CalculationRecord): VerifyProblem[] {
  const known = canonicalText(recordSchema.parse(record)) === canonicalText(record);
  return known ? [] : [ofRecord('record', 'evaluation', 'holds fields that the format lacks')];
}

function memberProblems(
  record: CalculationRecord,
  member: MemberRecord,
  input: ResolvedInput | null,
  formulas: (id: string) => Formula | undefined,
): VerifyProblem[] {
  const placed = placedLines(member);
  const before = new Map<string, PlacedLine>();
  const problem = (
    at: { address: string | null; kind: VerifyProblem['kind'] },
    by: VerifyProblem['by'],
    reason: string,
  ): VerifyProblem => ({ member: named(member), ...at, by, reason });
  const found = placed.flatMap((p) => {
    const at = { address: p.address, kind: p.line.kind };
    const reasons = checkLine({
      record,
      member,
      placed: p,
      input: input?.members.find((m) => m.id === member.id) ?? null,
      basis: input,
      constants: input?.constants ?? record.units,
      valued: (ref) => {
        const line = before.get(addressOf(ref, p.combination))?.line;
        return line && isValued(line) ? line : null;
      },
      formulaNamed: formulas,
    });
    const own = [...reasons].map((reason) => problem(at, 'evaluation', reason));
    if (before.has(p.address))
      own.push(problem(at, 'evaluation', 'stands at the address of another line'));
    before.set(p.address, p);
    return own;
  });
  const coverage = [...checkCompleteness(member)].map(({ address, reason }) =>
    problem({ address, kind: 'completeness' }, 'evaluation', reason),
  );
  return [...found, ...coverage, ...closureOf(placed, record, problem, found.length === 0)];
}

/** What is printed follows from what is printed. */
function closureOf(
  placed: readonly PlacedLine[],
  record: CalculationRecord,
  problem: (
    at: { address: string | null; kind: VerifyProblem['kind'] },
    by: VerifyProblem['by'],
    reason: string,
  ) => VerifyProblem,
  sound: boolean,
): VerifyProblem[] {
  try {
    const kinds = new Map(placed.map((p) => [p.address, p.line.kind]));
    return closureProblems(placed, UNIT_SETS[record.units]).map(({ address, reason }) =>
      problem({ address, kind: kinds.get(address) ?? 'record' }, 'closure', reason),
    );
  } catch (error) {
    // Lines that don't hold together have been named; what they print can't be traced.
    if (!sound) return [];
    const reason = error instanceof Error ? error.message : String(error);
    return [problem({ address: null, kind: 'record' }, 'closure', reason)];
  }
}

function rerunProblems(record: CalculationRecord, input: ResolvedInput): VerifyProblem[] {
  return [...rerun(record, input)].map(({ memberId, address, reason }): VerifyProblem => {
    const member = record.members.find((m) => m.id === memberId);
    const line = member && placedLines(member).find((p) => p.address === address)?.line;
    return {
      member: member ? named(member) : null,
      address,
      kind: line?.kind ?? 'record',
      by: 'rerun',
      reason,
    };
  });
}
