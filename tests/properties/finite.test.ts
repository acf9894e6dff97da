import fc from 'fast-check';
import { expect, test } from 'vitest';
import { parseInput } from '#shared/members/parse-input.ts';
import { runCalculation } from '#shared/members/run.ts';
import { members } from './arbitraries.ts';
import { assertProperty, type Fault } from './assert-property.ts';
import { inputOf, type Member } from './member.ts';

/** Every number in a value that is none, with its path. */
function unreal(value: unknown, path: string): readonly string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [`${path} is ${value}`];
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([name, part]) => unreal(part, `${path}/${name}`));
}

/** Runs an input with the printed digits fixed too; what is refused is no fault. */
function outcome(member: Member): 'refused' | readonly Fault[] {
  const input = inputOf(member);
  const parsed = parseInput(input);
  if (!parsed.ok) return 'refused';
  try {
    return unreal(runCalculation(parsed.input), '').map((text) => ({ text, input }));
  } catch (error) {
    return [{ text: String(error instanceof Error ? error.stack : error), input }];
  }
}

type Path = readonly string[];

/** Paths of the numbers of a member that are not zero. */
const numbers = (value: unknown, path: Path = []): readonly Path[] =>
  typeof value === 'number'
    ? value === 0
      ? []
      : [path]
    : typeof value === 'object' && value !== null
      ? Object.entries(value).flatMap(([name, part]) => numbers(part, [...path, name]))
      : [];

/** The same with the number at a path multiplied. */
function multiplied(value: unknown, [name, ...rest]: Path, by: number): unknown {
  if (name === undefined) return (value as number) * by;
  const part = multiplied(Reflect.get(value as object, name), rest, by);
  if (Array.isArray(value)) return value.map((one, i) => (String(i) === name ? part : one));
  return { ...(value as object), [name]: part };
}

/** Members of which one to four numbers are a thousand to 10¹⁵ times too large or too small. */
const wild = members().chain((member) =>
  fc
    .array(
      fc.record({
        path: fc.constantFrom(...numbers(member)),
        power: fc.constantFrom(3, -3, 6, -6, 9, -9, 15, -15),
      }),
      { minLength: 1, maxLength: 4 },
    )
    .map((changes) =>
      changes.reduce((m, { path, power }) => multiplied(m, path, 10 ** power) as Member, member),
    ),
);

test('of ordinary members', { timeout: 600_000 }, () => {
  assertProperty(members(), { seed: 221, runs: 120 }, (member) => {
    const found = outcome(member);
    return found === 'refused' ? [{ text: 'refused', input: inputOf(member) }] : found;
  });
});

test('of members with numbers far beyond any building', { timeout: 600_000 }, () => {
  let ran = 0;
  assertProperty(wild, { seed: 222, runs: 500 }, (member) => {
    const found = outcome(member);
    if (found === 'refused') return [];
    ran += 1;
    return found;
  });
  expect(ran).toBeGreaterThan(200);
});
