import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { readRecord, verifyRecord } from '#server/verify/verify-record.ts';
import type { Line } from '#shared/calc/line.ts';
import type { CalculationRecord, MemberRecord } from '#shared/calc/record.ts';
import { linesOf, recordOf } from '../reference/run-input.ts';

/*
 * Inputs of format 1 with the results that engine 0.1.0 gave, written by that engine: two published
 * examples, a member with every kind of line and 24 random members. They say that no result moved
 * since; what is right stands in tests/reference.
 */
type Result = number | string;
interface Case {
  readonly name: string;
  readonly input: unknown;
  readonly results: readonly {
    readonly mark: string;
    readonly verdict: string;
    readonly ratio: number | null;
    readonly lines: Readonly<Record<string, Result>>;
  }[];
}

const read = (name: string): string => readFileSync(new URL(name, import.meta.url), 'utf8');
const cases = read('./engine-0.1.0.jsonl')
  .trim()
  .split('\n')
  .map((line) => JSON.parse(line) as Case);

/** What a line says, as the cases hold it. */
function resultOf(line: Line): Result | null {
  switch (line.kind) {
    case 'check':
      return line.ratio;
    case 'comparison':
      return line.difference;
    case 'choice':
      return line.outcome;
    case 'notice':
      return `${line.severity}: ${line.code}`;
    case 'statement':
      return line.statement;
    default:
      return 'value' in line ? line.value : null;
  }
}

/** Shape of moments: no longer computed in a plane that is then outside scope. */
const SHAPE = /^(c\d+:theory\/[xy]\/)(?:MB|absA|absB|larger|psi|curvature)$/;

function differences(member: MemberRecord, then: Readonly<Record<string, Result>>): string[] {
  const now = linesOf(member);
  return Object.entries(then).flatMap(([address, was]) => {
    const line = now.get(address);
    if (!line) {
      const plane = SHAPE.exec(address)?.[1];
      const outside = plane && now.get(`${plane}outside`)?.kind === 'notice';
      return outside ? [] : [`${address} was ${was}, is absent`];
    }
    const is = resultOf(line);
    const same =
      typeof was === 'number' && typeof is === 'number'
        ? Math.abs(is - was) <= 1e-12 * Math.abs(was)
        : is === was;
    return same ? [] : [`${address} was ${was}, is ${is}`];
  });
}

describe('inputs of format 1 give the results of engine 0.1.0', () => {
  it('over every kind of line and verdict', () => {
    const results = cases.flatMap((c) => c.results);
    expect(results.length).toBeGreaterThanOrEqual(27);
    expect(new Set(results.map(({ verdict }) => verdict))).toEqual(
      new Set(['OK', 'NOT OK', 'NOT CHECKED', 'FAILED']),
    );
    expect(results.flatMap(({ lines }) => Object.keys(lines)).length).toBeGreaterThan(4500);
  });

  it.each(cases)('$name', ({ input, results }) => {
    const { members } = recordOf(input);
    expect(members.map(({ mark }) => mark)).toEqual(results.map(({ mark }) => mark));
    members.forEach((member, i) => {
      const then = results[i] as Case['results'][number];
      expect(member.summary.verdict).toBe(then.verdict);
      if (then.ratio === null) expect(member.summary.ratio).toBe(null);
      else expect(Math.abs((member.summary.ratio ?? 0) / then.ratio - 1)).toBeLessThan(1e-12);
      expect(differences(member, then.lines)).toEqual([]);
    });
  });
});

describe('a record of engine 0.1.0', () => {
  const whole = () => JSON.parse(read('./record-0.1.0.json')) as CalculationRecord;

  it('is read and verified line by line, and said not to be run again', () => {
    const record = readRecord(whole());
    expect(record.program.engine).toBe('0.1.0');
    const { problems, lines, reproduced, notes } = verifyRecord(record);
    expect(problems).toEqual([]);
    expect(lines).toBeGreaterThan(90);
    expect(reproduced).toBe(lines);
    expect(notes.join()).toContain('not run again: the record is of engine 0.1.0');
  });

  it('is not whole where one value is another', () => {
    const record = whole();
    const line = record.members[0]?.lines.find(({ key }) => key === 'E3/Fn') as { value: number };
    line.value *= 1.001;
    const { problems } = verifyRecord(readRecord(record));
    expect(problems.map(({ address }) => address)).toContain('E3/Fn');
  });
});
