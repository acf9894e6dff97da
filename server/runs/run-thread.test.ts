import { afterEach, expect, it } from 'vitest';
import { hallBasis, hallMembers } from '#server/demo/hall-columns.ts';
import { RunThread } from './run-thread-client.ts';
import { summariseMember } from './summarise-member.ts';
import type { Tasks } from './tasks.ts';

const thread = new RunThread();
afterEach(() => thread.close());

const members = hallMembers.map((draft, index) => ({ id: `m${index + 1}`, draft }));
const given = { basis: hallBasis, members };

it('makes in the other thread what is made in this one', async () => {
  const here = members.map((member) => summariseMember(hallBasis, member));
  expect(await thread.make('summaries', given)).toEqual(here);
});

it('answers each order with its own result', async () => {
  const orders = members.map((member) =>
    thread.make('summaries', { basis: hallBasis, members: [member] }),
  );
  const verdicts = (await Promise.all(orders)).map(([summary]) => summary?.verdict);
  const together = (await thread.make('summaries', given)).map(({ verdict }) => verdict);
  expect(verdicts).toEqual(together);
});

it('rejects with what the making threw, and goes on', async () => {
  const broken = { basis: hallBasis, members: null } as unknown as Tasks['record']['given'];
  await expect(thread.make('record', broken)).rejects.toThrow(TypeError);
  expect(await thread.make('summaries', given)).toHaveLength(members.length);
});

it('fails what waits when the thread ends, and starts another with the next order', async () => {
  const waiting = thread.make('summaries', given);
  const failure = expect(waiting).rejects.toThrow('the computing thread has ended');
  await thread.close();
  await failure;
  expect(await thread.make('summaries', given)).toHaveLength(members.length);
});
