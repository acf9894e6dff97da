import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type RouteName, routeTable } from '#shared/contracts/route-table.ts';
import { validCalls } from './support/valid-calls.ts';
import { makeWorld, type World } from './support/world.ts';

let world: World;
beforeAll(async () => {
  world = await makeWorld();
});
afterAll(() => world.api.stop());

const since = async (id: number) => {
  const { rows } = await world.api.deps.pool.query(
    'select *, id::int as row from audit where id > $1 order by audit.id',
    [id],
  );
  return rows;
};
const lastId = async () => (await since(0)).at(-1)?.row ?? 0;

/** What each change writes, by hand. Changes of the account are below. */
const written: Partial<Record<RouteName, [action: string, snapshots: string]>> = {
  updateProject: ['project.updated', 'before after'],
  createDrawing: ['drawing.created', 'after'],
  updateDrawing: ['drawing.updated', 'before after'],
  deleteDrawing: ['drawing.deleted', 'before'],
  restoreDrawing: ['drawing.restored', 'after'],
  createCalculation: ['calculation.created', 'after'],
  updateCalculation: ['calculation.updated', 'before after'],
  createMember: ['member.created', 'after'],
  updateMember: ['member.updated', 'before after'],
  changeMembers: ['member.updated', 'before after'],
  duplicateMember: ['member.duplicated', 'after'],
  deleteMember: ['member.deleted', 'before'],
  restoreMember: ['member.restored', 'after'],
  reorderMembers: ['members.reordered', 'before after'],
};
const ofAccount: RouteName[] = ['signIn', 'signOut', 'changePassword', 'acceptWelcome'];

it('covers every change', () => {
  const changing = (Object.keys(routeTable) as RouteName[]).filter(
    (route) => routeTable[route].method !== 'GET',
  );
  const covered = [...Object.keys(written), ...ofAccount, 'createProject'];
  expect(covered.sort()).toEqual(changing.sort());
});

describe.each(Object.entries(written))('%s', (route, [action, snapshots]) => {
  it(`writes ${action} once, with who and where`, async () => {
    const caller = world.of.engineer;
    const target = { world, calculationId: world.calculationId, caller };
    const call = await validCalls[route as RouteName](target);
    const before = await lastId();
    expect((await caller.client.call(route as RouteName, call)).status).toBe(200);
    const rows = await since(before);
    expect(rows).toHaveLength(1);
    expect(rows[0]).toMatchObject({ action, actor_id: caller.id, project_id: world.projectId });
    const present = ['before', 'after'].filter((side) => rows[0][side] !== null);
    expect(present.join(' ')).toBe(snapshots);
  });
});

it('writes the project and the grant of whoever opens it', async () => {
  const before = await lastId();
  const body = { number: 'P7', title: 'New', client: '', place: '' };
  const made = await world.of.engineer.client.call('createProject', { body });
  const rows = await since(before);
  expect(rows.map(({ action }) => action)).toEqual(['project.created', 'grant.given']);
  expect(rows.map(({ project_id }) => project_id)).toEqual([made.body.id, made.body.id]);
});

it('writes sign-in, refusal, change of password, sign-out and welcome', async () => {
  const before = await lastId();
  const caller = world.of.reader;
  const target = { world, calculationId: world.calculationId, caller };
  const client = world.api.client();
  await client.signIn(caller.email, 'wrong');
  await expect.poll(async () => (await since(before)).length).toBe(1);
  for (const route of ofAccount.filter((name) => name !== 'acceptWelcome')) {
    if (route === 'signOut') continue;
    expect((await client.call(route, await validCalls[route](target))).status).toBe(200);
  }
  expect((await client.call('signOut')).status).toBe(200);
  const rows = await since(before);
  expect(rows.map(({ action }) => action)).toEqual([
    'account.sign-in-refused',
    'account.signed-in',
    'account.password-changed',
    'account.signed-out',
  ]);
  expect(new Set(rows.map(({ subject_id }) => subject_id))).toEqual(new Set([caller.id]));
  const invited = await validCalls.acceptWelcome(target);
  const then = await lastId();
  await world.api.client().call('acceptWelcome', invited);
  expect((await since(then)).map(({ action }) => action)).toEqual(['account.welcomed']);
});

it('writes nothing when the change is refused or changes nothing', async () => {
  const { client } = world.of.engineer;
  const target = { world, calculationId: world.calculationId, caller: world.of.engineer };
  const call = await validCalls.updateMember(target);
  await client.call('updateMember', call);
  const before = await lastId();
  await client.call('updateMember', call);
  const stale = { ...call, body: { ...call.body, version: 1, draft: { nothing: 'right' } } };
  expect((await client.call('updateMember', stale)).status).toBe(400);
  expect(await since(before)).toEqual([]);
});

it.each(['updateProject', 'updateDrawing'] as const)(
  'writes %s once when it is sent twice',
  async (route) => {
    const caller = world.of.engineer;
    const call = await validCalls[route]({ world, calculationId: world.calculationId, caller });
    const renamed = { ...call, body: { ...call.body, title: `once ${route}` } };
    const before = await lastId();
    const first = await caller.client.call(route, renamed);
    const second = await caller.client.call(route, renamed);
    expect(second.status).toBe(200);
    expect(second.body).toEqual(first.body);
    expect(await since(before)).toHaveLength(1);
  },
);

describe.each(['owner', 'web'] as const)('the %s role', (role) => {
  it.each([
    'update audit set actor_id = null',
    'delete from audit',
    'delete from audit where id = (select max(id) from audit)',
    'truncate audit',
    'truncate audit cascade',
  ])('cannot %s', async (statement) => {
    const { ownerUrl, deps } = world.api;
    const connectionString = role === 'owner' ? ownerUrl : deps.env.databaseUrl;
    const client = new pg.Client({ connectionString });
    await client.connect();
    const before = await client.query('select count(*) from audit');
    // 42501, insufficient_privilege: from the trigger for the owner, from the grants for the web.
    await expect(client.query(statement)).rejects.toMatchObject({ code: '42501' });
    expect((await client.query('select count(*) from audit')).rows).toEqual(before.rows);
    await client.end();
  });
});

it.skipIf(!process.env.TEST_WEB_DATABASE_URL)(
  'lets the web role neither own nor disarm it',
  async () => {
    const { pool } = world.api.deps;
    await expect(pool.query('alter table audit disable trigger all')).rejects.toMatchObject({
      code: '42501',
    });
    await expect(pool.query('drop trigger audit_append_only on audit')).rejects.toMatchObject({
      code: '42501',
    });
    await expect(pool.query('drop table audit')).rejects.toMatchObject({ code: '42501' });
  },
);
