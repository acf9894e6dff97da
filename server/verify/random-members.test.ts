import { expect, it } from 'vitest';
import { sealRecord } from '#shared/calc/hashes.ts';
import { parseInput } from '#shared/members/parse-input.ts';
import { runCalculation } from '#shared/members/run.ts';
import { seededRandom } from '#tests/rules/random.ts';
import { randomInput } from '#tests/rules/random-members.ts';
import { verifyRecord } from './verify-record.ts';

it('reproduces every line of 60 random members', { timeout: 120_000 }, () => {
  const random = seededRandom(19471112);
  for (let count = 0; count < 60; count += 1) {
    const input = randomInput(random);
    const parsed = parseInput(input);
    if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
    const record = JSON.parse(JSON.stringify(sealRecord(runCalculation(parsed.input))));
    const { problems, lines, reproduced } = verifyRecord(record);
    expect({ input, problems }).toEqual({ input, problems: [] });
    expect(reproduced).toBe(lines);
  }
});
