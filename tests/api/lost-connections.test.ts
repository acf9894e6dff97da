import { afterAll, beforeAll, expect, it } from 'vitest';
import { transaction } from '#server/db/transaction.ts';
import { runSql } from '#tests/support/database-server.ts';
import { type Api, startApi } from './support/start-api.ts';

let api: Api;
beforeAll(async () => {
  api = await startApi();
});
afterAll(() => api.stop());

const endConnections = () =>
  runSql(
    api.ownerUrl,
    `select pg_terminate_backend(pid) from pg_stat_activity
     where datname = current_database() and pid <> pg_backend_pid()`,
  );

it('survives a connection that is lost between two queries of a change', async () => {
  const change = transaction(api.deps.pool, async () => {
    await endConnections();
    await new Promise((resolve) => setTimeout(resolve, 200));
  });
  await expect(change).rejects.toThrow();
  expect((await api.client().call('showHealth')).status).toBe(200);
});

it('survives one that is lost during a query of a change', async () => {
  const change = transaction(api.deps.pool, ({ db }) => db.execute('select pg_sleep(5)'));
  const failure = expect(change).rejects.toThrow();
  await new Promise((resolve) => setTimeout(resolve, 200));
  await endConnections();
  await failure;
  expect((await api.client().call('showHealth')).status).toBe(200);
});
