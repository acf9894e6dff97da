import { afterAll, beforeAll, expect, it } from 'vitest';
import { memberDraft } from './support/drafts.ts';
import { grant } from './support/people.ts';
import { makeWorld, type World } from './support/world.ts';

/** Two engineers of one calculation. */
let world: World;
beforeAll(async () => {
  world = await makeWorld();
  const { api, of, projectId } = world;
  await grant(api, of.stranger.id, { projectId }, ['engineer']);
});
afterAll(() => world.api.stop());

const renamed = (mark: string) => ({ ...memberDraft, mark });

async function newMember() {
  const params = { calculationId: world.calculationId };
  const { body } = await world.of.engineer.client.call('createMember', {
    ...{ params, body: { draft: memberDraft } },
  });
  return { ...params, memberId: body.id as string };
}

it('refuses a change of an older version and shows the other one', async () => {
  const params = await newMember();
  const first = await world.of.stranger.client.call('updateMember', {
    ...{ params, body: { version: 1, draft: renamed('theirs') } },
  });
  expect(first.body.version).toBe(2);
  const second = await world.of.engineer.client.call('updateMember', {
    ...{ params, body: { version: 1, draft: renamed('mine') } },
  });
  expect(second.status).toBe(409);
  expect(second.body.conflict).toMatchObject({
    theirs: { version: 2, draft: { mark: 'theirs' } },
    changedBy: 'stranger',
    changedAt: first.body.changedAt,
  });
  const third = await world.of.engineer.client.call('updateMember', {
    ...{ params, body: { version: 2, draft: renamed('mine') } },
  });
  expect(third.body).toMatchObject({ version: 3, draft: { mark: 'mine' }, changedBy: 'engineer' });
});

it('takes one of two changes that come at once', async () => {
  const params = await newMember();
  const answers = await Promise.all(
    [world.of.engineer, world.of.stranger].map(({ client }, index) =>
      client.call('updateMember', {
        ...{ params, body: { version: 1, draft: renamed(`at once ${index}`) } },
      }),
    ),
  );
  expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
});

it('takes a change whose answer was lost a second time', async () => {
  const params = await newMember();
  const call = { params, body: { version: 1, draft: renamed('sent twice') } };
  const first = await world.of.engineer.client.call('updateMember', call);
  const second = await world.of.engineer.client.call('updateMember', call);
  expect(second.status).toBe(200);
  expect(second.body).toEqual(first.body);
});

it('holds for the basis, the project and a drawing too', async () => {
  const { client } = world.of.engineer;
  const other = world.of.stranger.client;
  const one = { calculationId: world.calculationId };
  const project = { projectId: world.projectId };

  const { body: calculation } = await client.call('showCalculation', { params: one });
  const { number, basis, version } = calculation;
  const edit = (title: string) => ({ params: one, body: { number, title, basis, version } });
  expect((await other.call('updateCalculation', edit('theirs'))).status).toBe(200);
  const refused = await client.call('updateCalculation', edit('mine'));
  expect(refused.status).toBe(409);
  expect(refused.body.conflict).toMatchObject({
    ...{ theirs: { title: 'theirs', version: version + 1 }, changedBy: 'stranger' },
  });

  const fields = { number: 'P1', client: '', place: '', version: 1 };
  const rename = (title: string) => ({ params: project, body: { ...fields, title } });
  expect((await other.call('updateProject', rename('theirs'))).status).toBe(200);
  const second = await client.call('updateProject', rename('mine'));
  expect(second.body.conflict).toMatchObject({
    ...{ theirs: { title: 'theirs', version: 2 }, changedBy: 'stranger' },
  });

  const drawing = { number: 'S-1', title: '', revision: 'A', status: 'preliminary' };
  const made = await client.call('createDrawing', { params: project, body: drawing });
  const params = { ...project, drawingId: made.body.id };
  const revise = (revision: string) => ({ params, body: { ...drawing, revision, version: 1 } });
  expect((await other.call('updateDrawing', revise('B'))).status).toBe(200);
  const third = await client.call('updateDrawing', revise('C'));
  expect(third.body.conflict).toMatchObject({
    ...{ theirs: { revision: 'B', version: 2 }, changedBy: 'stranger' },
  });
});

it('refuses an order of members that are no longer these', async () => {
  const params = { calculationId: world.siblingId };
  const { client } = world.of.engineer;
  const show = async (): Promise<string[]> => {
    const { body } = await client.call('showCalculation', { params });
    return body.memberRows.map(({ id }: { id: string }) => id);
  };
  await client.call('createMember', { params, body: { draft: memberDraft } });
  const before = await show();
  const added = await world.of.stranger.client.call('createMember', {
    ...{ params, body: { draft: memberDraft } },
  });
  const refused = await client.call('reorderMembers', {
    ...{ params, body: { memberIds: [...before].reverse() } },
  });
  expect(refused.status).toBe(409);
  expect(refused.body.conflict.theirs.memberIds).toEqual([...before, added.body.id]);
  const memberIds = [added.body.id, ...before];
  expect((await client.call('reorderMembers', { params, body: { memberIds } })).status).toBe(200);
  expect(await show()).toEqual(memberIds);
  const twice = { memberIds: [memberIds[0], memberIds[0], memberIds[2]] };
  expect((await client.call('reorderMembers', { params, body: twice })).status).toBe(409);
});

it('refuses a number that is taken, at its field', async () => {
  const { client } = world.of.engineer;
  const params = { projectId: world.projectId };
  const { body } = await client.call('showCalculation', {
    params: { calculationId: world.siblingId },
  });
  const copy = { number: body.number, title: 'Copy', basis: body.basis };
  const refused = await client.call('createCalculation', { params, body: copy });
  expect(refused.status).toBe(400);
  expect(refused.body.problems).toEqual([
    { path: 'number', message: 'is the number of another calculation of the project' },
  ]);
});
