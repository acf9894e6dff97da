import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { grants } from '#server/db/schema/grants.ts';
import { memberDraft } from './support/drafts.ts';
import { grant } from './support/people.ts';
import { makeWorld, type World } from './support/world.ts';

let world: World;
beforeAll(async () => {
  world = await makeWorld();
});
afterAll(() => world.api.stop());

type Listed = { id: string }[];
const ids = (rows: Listed) => rows.map(({ id }) => id);

it('lists on the desk what grants give and nothing else', async () => {
  const desk = async (name: keyof World['of']) =>
    (await world.of[name].client.call('showDesk')).body as Record<string, Listed>;
  const { projectId, calculationId, siblingId } = world;
  for (const name of ['engineer', 'reviewer', 'issuer', 'reader'] as const) {
    const { projects = [], calculations = [] } = await desk(name);
    expect(ids(projects)).toEqual([projectId]);
    expect(ids(calculations)).toEqual([calculationId, siblingId]);
  }
  for (const name of ['guestEngineer', 'guestReader'] as const) {
    const { projects = [], calculations = [] } = await desk(name);
    expect(projects).toEqual([]);
    expect(ids(calculations)).toEqual([calculationId]);
  }
  for (const name of ['administrator', 'stranger', 'otherFirm'] as const) {
    expect(await desk(name)).toMatchObject({ projects: [], calculations: [], waiting: [] });
  }
});

it('shows what waits to engineers only', async () => {
  const { calculationId, of } = world;
  const draft = { ...memberDraft, mark: 'C-99', length: { text: '', confirmed: false } };
  await of.engineer.client.call('createMember', { params: { calculationId }, body: { draft } });
  const waiting = async (name: keyof World['of']) =>
    (await of[name].client.call('showDesk')).body.waiting;
  expect(await waiting('engineer')).toEqual([
    {
      ...{ reason: 'invalid', count: 1, ratioText: null },
      calculation: { id: calculationId, number: 'CAL-1', title: 'Columns' },
      member: { id: expect.any(String), mark: 'C-99', section: 'W12X79' },
    },
  ]);
  expect(await waiting('reviewer')).toEqual([]);
  expect(await waiting('guestReader')).toEqual([]);
});

it('answers the same for what is not there and what may not be seen', async () => {
  const { client } = world.of.otherFirm;
  const hidden = await client.call('showProject', { params: { projectId: world.projectId } });
  const absent = await client.call('showProject', { params: { projectId: randomUUID() } });
  expect(hidden.status).toBe(404);
  expect(hidden.body).toEqual(absent.body);
});

it('keeps a member and a drawing inside their own calculation and project', async () => {
  const { client } = world.of.engineer;
  const { calculationId, siblingId, projectId } = world;
  const member = await client.call('createMember', {
    ...{ params: { calculationId }, body: { draft: { ...memberDraft, mark: 'C-50' } } },
  });
  const elsewhere = { calculationId: siblingId, memberId: member.body.id };
  expect((await client.call('showMember', { params: elsewhere })).status).toBe(404);
  const body = { version: 1, draft: { ...memberDraft, mark: 'moved' } };
  expect((await client.call('updateMember', { params: elsewhere, body })).status).toBe(404);
  expect((await client.call('deleteMember', { params: elsewhere })).status).toBe(404);
  const drawing = await client.call('createDrawing', {
    params: { projectId },
    body: { number: 'S-9', title: '', revision: 'A', status: 'preliminary' },
  });
  const other = await client.call('createProject', {
    body: { number: 'P2', title: 'Other', client: '', place: '' },
  });
  const away = { projectId: other.body.id, drawingId: drawing.body.id };
  expect((await client.call('deleteDrawing', { params: away })).status).toBe(404);
});

it('puts a grant on one calculation in place of the one on its project', async () => {
  const { api, of, projectId, calculationId, siblingId } = world;
  await grant(api, of.stranger.id, { projectId }, ['engineer']);
  await grant(api, of.stranger.id, { projectId, calculationId }, ['reviewer']);
  const { client } = of.stranger;
  const draft = { ...memberDraft, mark: 'C-77' };
  const add = (id: string) =>
    client.call('createMember', { params: { calculationId: id }, body: { draft } });
  expect((await add(calculationId)).status).toBe(403);
  expect((await add(siblingId)).status).toBe(200);
  const shown = await client.call('showCalculation', { params: { calculationId } });
  expect(shown.body).toMatchObject({ roles: ['reviewer'], can: { edit: false } });
});

it('refuses in the database what no grant may hold', async () => {
  const { api, of, projectId, calculationId } = world;
  const { userId, other } = { userId: of.otherFirm.id, other: randomUUID() };
  const give = (roles: string[], where = {}) =>
    api.deps.db
      .insert(grants)
      // Roles that the types refuse.
      .values({ id: randomUUID(), userId, projectId, roles: roles as 'reader'[], ...where });
  const violated = (constraint: string) => ({ cause: { constraint } });
  await expect(give(['engineer', 'reviewer'])).rejects.toMatchObject(
    violated('grants_independent'),
  );
  await expect(give([])).rejects.toMatchObject(violated('grants_roles'));
  await expect(give(['owner'])).rejects.toMatchObject(violated('grants_roles'));
  await expect(give(['reader'], { projectId: other })).rejects.toMatchObject({
    cause: { code: '23503' },
  });
  const { body } = await of.engineer.client.call('createProject', {
    body: { number: 'P3', title: 'Third', client: '', place: '' },
  });
  // A calculation of another project than the grant's.
  const crossed = { projectId: body.id, calculationId };
  await expect(give(['reader'], crossed)).rejects.toMatchObject({ cause: { code: '23503' } });
});
