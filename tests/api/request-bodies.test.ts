import { afterAll, beforeAll, expect, it } from 'vitest';
import { csrfHeader } from '#shared/contracts/account.ts';
import { originOf } from './support/api-client.ts';
import { memberDraft } from './support/drafts.ts';
import { makeWorld, type World } from './support/world.ts';

let world: World;
beforeAll(async () => {
  world = await makeWorld();
});
afterAll(() => world.api.stop());

const save = (draft: object) =>
  world.of.engineer.client.call('createMember', {
    ...{ params: { calculationId: world.calculationId }, body: { draft } },
  });

const path = () => `/api/calculations/${world.calculationId}/members`;

async function post(type: string, text: string) {
  const { client } = world.of.engineer;
  const { body } = await client.call('showSession');
  return client.agent
    .post(path())
    .set({ Origin: originOf(world.api.server), [csrfHeader]: body.csrfToken })
    .type(type)
    .send(text);
}

it('refuses a body of more than 2 MB', async () => {
  const answer = await post('application/json', `{"draft":"${'x'.repeat(2 * 1024 * 1024)}"}`);
  expect(answer.status).toBe(413);
  expect(answer.body.code).toBe('too-large');
});

it('refuses what is not JSON', async () => {
  expect((await post('application/json', '{"draft":')).body).toMatchObject({
    ...{ status: 400, detail: 'The body is not JSON.' },
  });
  expect((await post('text/plain', '{}')).body.code).toBe('wrong-media-type');
  expect((await post('application/x-www-form-urlencoded', 'draft=1')).status).toBe(415);
});

it('refuses what is not packed as it says', async () => {
  const { client } = world.of.engineer;
  const { body } = await client.call('showSession');
  const answer = await client.agent
    .post(path())
    .set({ Origin: originOf(world.api.server), [csrfHeader]: body.csrfToken })
    .set({ 'Content-Encoding': 'gzip', 'Content-Type': 'application/json' })
    .send('{}');
  expect(answer.body).toMatchObject({ status: 400, detail: 'The body cannot be read.' });
});

it('names every place that is wrong', async () => {
  const answer = await save({
    ...memberDraft,
    ...{ mark: 'x'.repeat(41), endMomentSign: 'left', length: { text: 22, confirmed: true } },
  });
  expect(answer.status).toBe(400);
  expect(answer.body.problems.map(({ path: at }: { path: string }) => at)).toEqual([
    'draft.mark',
    'draft.length.text',
    'draft.endMomentSign',
  ]);
});

it('stores a script in a mark as the text that it is', async () => {
  const mark = '<script>alert(1)</script>&"\'';
  const { status, body, headers } = await save({ ...memberDraft, mark });
  expect(status).toBe(200);
  expect(headers['content-type']).toBe('application/json; charset=utf-8');
  expect(body.draft.mark).toBe(mark);
  const { rows } = await world.api.deps.pool.query('select draft from members where id = $1', [
    body.id,
  ]);
  expect(JSON.parse(rows[0].draft).mark).toBe(mark);
  // It is no valid input all the same: a mark holds letters, digits and the signs of drawings.
  expect(body.summary.verdict).toBe('NOT CHECKED');
  expect(body.summary.problems[0]).toMatchObject({ path: 'mark' });
});

it.each([
  ['a zero byte', 'C\u0000'],
  ['an escape character', 'C\u001b[31m'],
  ['half a surrogate pair', 'C\ud800'],
  ['a line break', 'C\n1'],
])('refuses %s in a mark', async (_, mark) => {
  const answer = await save({ ...memberDraft, mark });
  expect(answer.status).toBe(400);
  expect(answer.body.problems[0].path).toBe('draft.mark');
});

it('keeps what is typed, valid or not', async () => {
  const length = { text: '-22 stone', confirmed: false };
  const { status, body } = await save({ ...memberDraft, length });
  expect(status).toBe(200);
  const shown = await world.of.engineer.client.call('showMember', {
    ...{ params: { calculationId: world.calculationId, memberId: body.id } },
  });
  expect(shown.body.draft.length).toEqual(length);
  expect(shown.body.summary).toMatchObject({ verdict: 'NOT CHECKED', ratio: null });
  expect(shown.body.summary.problems.map(({ path: at }: { path: string }) => at)).toEqual([
    'length',
  ]);
});

it('finds nothing under an id that is none', async () => {
  const { client } = world.of.engineer;
  for (const calculationId of ["' or 1=1 --", 'ffffffff-ffff-4fff-8fff-ffffffffffff', '../desk']) {
    const answer = await client.call('showCalculation', { params: { calculationId } });
    expect(answer.status).toBe(404);
  }
});
