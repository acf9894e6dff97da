import { test, vi } from 'vitest';
import type { Line } from '#shared/calc/line.ts';
import { firstMember, linesOf, recordOf } from '../reference/run-input.ts';
import { members } from './arbitraries.ts';
import { assertProperty, type Fault } from './assert-property.ts';
import { exactly } from './exact-text.ts';
import { inputOf, type Member } from './member.ts';

vi.mock('#shared/calc/closure.ts', () => import('./no-digits.ts'));

/*
 * Each line is compared with its own size, sums that nearly cancel too: the expressions are written
 * so that they do not, and both texts of a quantity are cut to the same 15 digits where it is read.
 */
const CLOSE = 1e-12;

/** What a line says besides numbers. */
const words = (line: Line): string => {
  switch (line.kind) {
    case 'choice':
      return line.outcome;
    case 'governing':
      return line.governs;
    case 'check':
      return line.verdict;
    case 'notice':
      return line.code;
    default:
      return line.kind;
  }
};

const number = (line: Line): number | null =>
  'value' in line
    ? line.value
    : line.kind === 'check'
      ? line.ratio
      : line.kind === 'comparison'
        ? line.difference
        : null;

/** Lines that differ by more than a share of their value between both sets of units. */
function faults(member: Member, close = CLOSE): readonly Fault[] {
  const us = inputOf(member, 'us', exactly('us'));
  const si = inputOf(member, 'si', exactly('si'));
  const [a, b] = [us, si].map((input) => linesOf(firstMember(recordOf(input))));
  if (!a || !b) throw new Error('two runs');
  const input = { us, si };
  const fault = (text: string): Fault => ({ text, input });
  if ([...a.keys()].join() !== [...b.keys()].join()) return [fault('other lines')];
  return [...a].flatMap(([address, line]) => {
    const other = b.get(address) as Line;
    if (words(line) !== words(other)) return [fault(`${address}: ${words(line)}, ${words(other)}`)];
    const [x, y] = [number(line), number(other)];
    if (x === null || y === null) return [];
    // A comparison is a quotient less 1.
    const scale = line.kind === 'comparison' ? 1 : Math.max(Math.abs(x), Math.abs(y));
    return Math.abs(x - y) <= close * scale
      ? []
      : [fault(`${address}: ${x} in us units, ${y} in si units`)];
  });
}

/** The same with numbers that no unit writes in few digits. */
const uneven = <T>(value: T): T => {
  if (typeof value === 'number') return (value * (1 + 1e-3 / 3)) as T;
  if (Array.isArray(value)) return value.map(uneven) as T;
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(Object.entries(value).map(([name, part]) => [name, uneven(part)])) as T;
};

test('a member typed in kip, ft and in and in kN, m and mm gives the same lines', {
  timeout: 600_000,
}, () => {
  assertProperty(members(), { seed: 31, runs: 150 }, (member) => faults(uneven(member)));
});

test('quantities of six digits are the same numbers, whatever their unit', () => {
  assertProperty(members(), { seed: 32, runs: 40 }, (member) => faults(member, 0));
});
