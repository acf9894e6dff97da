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
  const verdicts = (await Promise.all(orders)).map(([made]) => made?.summary.verdict);
  const together = (await thread.make('summaries', given)).map(({ summary }) => summary.verdict);
  expect(verdicts).toEqual(together);
});

const by = (person: string) => {
  const gone = new AbortController();
  return { gone, person, signal: gone.signal };
};

it('takes three orders of one person at a time, beside those of others', async () => {
  const orders = [1, 2, 3].map(() => thread.make('summaries', given, by('one')));
  await expect(thread.make('summaries', given, by('one'))).rejects.toMatchObject({
    code: 'too-many',
  });
  orders.push(thread.make('summaries', given, by('two')));
  expect(await Promise.all(orders)).toHaveLength(4);
  expect(await thread.make('summaries', given, by('one'))).toHaveLength(members.length);
});

it('gives up what nobody waits for any more, in work or not, and does the rest', async () => {
  const [inWork, waiting] = [by('one'), by('one')];
  const many = { ...given, members: Array.from({ length: 2000 }, () => members).flat() };
  const failures = [
    expect(thread.make('summaries', many, inWork)).rejects.toThrow('aborted'),
    expect(thread.make('summaries', many, waiting)).rejects.toThrow('aborted'),
  ];
  const other = thread.make('summaries', given, by('two'));
  waiting.gone.abort();
  inWork.gone.abort();
  await Promise.all(failures);
  expect(await other).toHaveLength(members.length);
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
