import type { Unit } from 'mathjs';
import { canonicalText } from '#shared/calc/hashes.ts';
import { runMember } from '#shared/members/run.ts';
import { secondsEach } from './measure.ts';
import { type BenchMember, plainMember, restrainedMember } from './members.ts';
import { type Forces, OF_SECTION, plainRatios } from './plain-check.ts';
import { printTable } from './print-table.ts';
import { type Run, replayByBooks, replayPlainly, replayWithUnits, stepsOf } from './replay.ts';

/*
 * Speed of the engine, as ratios beside the same formulas in the same run. A check is one member
 * under one combination, with everything the book asks. Nothing here is asserted but agreement: a
 * comparison of two different computations would say nothing.
 */
const COMBINATIONS = 100;
const LARGE = [1, 10, 100, 1000];

const record = ({ input, member }: BenchMember) => runMember(input, member);
const whole = (value: number): string => Math.round(value).toLocaleString('en-US');

/** N and mm from SI's base, kg, m and s. */
const inBase = (unit: Unit): number => {
  const { value, dimensions } = unit.toSI() as unknown as { value: number; dimensions: number[] };
  const [mass = 0, length = 0] = dimensions;
  return value * 1000 ** (length - mass);
};

/** The replay, or throws where its values are not those of the record. */
function proven(name: string, run: Run, values: readonly number[]): Run {
  run().forEach((v, i) => {
    const expected = values[i] as number;
    const got = typeof v === 'number' ? v : inBase(v);
    if (!(Math.abs(got - expected) <= 1e-9 * Math.max(1, Math.abs(expected))))
      throw new Error(`${name}: value ${i} is ${got}, in the record ${expected}`);
  });
  return run;
}

/** The hand-written check of the W14×99, or throws where its ratios are not those of the record. */
function provenByHand(bench: BenchMember): () => number[] {
  const made = record(bench);
  const valueAt = (lines: readonly object[], key: string): number => {
    const line = lines.find((l) => (l as { key: string }).key === key);
    return (line as { value: number }).value;
  };
  const properties = {
    ...(Object.fromEntries(
      OF_SECTION.map((name) => [name, valueAt(made.lines, `section/${name}`)]),
    ) as Record<(typeof OF_SECTION)[number], number>),
    E: valueAt(made.lines, 'steel/E'),
    Fy: valueAt(made.lines, 'steel/Fy'),
    L: valueAt(made.lines, 'given/L'),
  };
  const forces = made.combinations.map(({ lines }): Forces => {
    const at = (name: string) => valueAt(lines, `given/${name}`);
    return { P: at('P'), MxA: at('MxA'), MxB: at('MxB'), MyA: at('MyA'), MyB: at('MyB') };
  });
  const run = () => plainRatios(properties, forces);
  run().forEach((ratio, i) => {
    const expected = valueAt(made.combinations[i]?.lines ?? [], 'H1/ratio');
    if (!(Math.abs(ratio / expected - 1) < 1e-9))
      throw new Error(`by hand ${ratio}, in the record ${expected}`);
  });
  return run;
}

function compare(bench: BenchMember, byHand: Record<string, () => unknown>): void {
  const steps = stepsOf(record(bench));
  const prove = (name: string, run: Run) => proven(name, run, steps.values);
  const plain = 'its formulas as plain functions';
  const seconds = secondsEach(
    {
      'record: every line, closed': () => record(bench),
      "its formulas by the books' evaluator": prove('books', replayByBooks(steps)),
      'its formulas in mathjs with units': prove('units', replayWithUnits(steps)),
      [plain]: prove('plain', replayPlainly(steps)),
      ...byHand,
    },
    4,
  );
  const rows = Object.entries(seconds).map(([name, s]) => [
    name,
    whole(COMBINATIONS / s),
    ((1e6 * s) / COMBINATIONS).toFixed(1),
    (s / (seconds[plain] as number)).toPrecision(3),
  ]);
  const count = (steps.formulas.length / COMBINATIONS).toFixed(0);
  printTable(
    `${bench.name}: ${COMBINATIONS} combinations, ${count} formulas each`,
    ['', 'checks/s', 'µs/check', 'times plain'],
    rows,
  );
}

function growth(name: string, make: (count: number) => BenchMember): void {
  const benches = LARGE.map((count) => ({ count, bench: make(count) }));
  const seconds = secondsEach(
    Object.fromEntries(benches.map(({ count, bench }) => [String(count), () => record(bench)])),
    1,
  );
  const least = (seconds['1000'] as number) / 1000;
  printTable(
    `${name}: growth with the number of combinations`,
    ['combinations', 'ms', 'ms/combination', 'of 1,000’s', 'record bytes', 'bytes/combination'],
    benches.map(({ count, bench }) => {
      const s = seconds[String(count)] as number;
      const bytes = Buffer.byteLength(canonicalText(record(bench)));
      return [
        whole(count),
        (1000 * s).toFixed(2),
        ((1000 * s) / count).toFixed(3),
        (s / count / least).toFixed(2),
        whole(bytes),
        whole(bytes / count),
      ];
    }),
  );
}

const plain = plainMember(COMBINATIONS);
compare(plain, { 'by hand: the ratio alone, no lines': provenByHand(plain) });
compare(restrainedMember(COMBINATIONS), {});
growth('W14×99, both axes', plainMember);
growth('W18×50, restraints and loads', restrainedMember);
