import pg from 'pg';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { memberDraft } from './support/drafts.ts';
import { makeWorld, type World } from './support/world.ts';

let world: World;
beforeAll(async () => {
  world = await makeWorld();
});
afterAll(() => world.api.stop());

it('answers others while changes of one person wait', async () => {
  const { api, of, calculationId } = world;
  const owner = new pg.Client({ connectionString: api.ownerUrl });
  await owner.connect();
  await owner.query('begin');
  await owner.query('select 1 from calculations where id = $1 for update', [calculationId]);
  const call = { params: { calculationId }, body: { draft: memberDraft } };
  const changes = Array.from({ length: 30 }, () => of.engineer.client.call('createMember', call));
  // supertest sends a request when it is waited for.
  const answers = Promise.all(changes);
  await new Promise((resolve) => setTimeout(resolve, 1500));
  const start = performance.now();
  expect((await of.reader.client.call('showDesk')).status).toBe(200);
  expect(performance.now() - start).toBeLessThan(5000);
  await owner.query('rollback');
  await owner.end();
  const statuses = (await answers).map(({ status }) => status);
  expect(statuses.filter((status) => status === 200)).toHaveLength(20);
  expect(statuses.filter((status) => status === 429)).toHaveLength(10);
});
