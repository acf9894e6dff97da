import { createServer } from 'node:http';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { createApp } from '#server/app.ts';
import { seedDemo } from '#server/demo/seed-demo.ts';
import { makeDeps } from '#server/deps.ts';
import { apiClient } from './support/api-client.ts';
import { type Api, startApi } from './support/start-api.ts';

let api: Api;
beforeAll(async () => {
  api = await startApi({ demo: true });
  // Two processes may start at once.
  await Promise.all([seedDemo(api.deps), seedDemo(api.deps)]);
  await seedDemo(api.deps);
});
afterAll(() => api.stop());

it('shows four accounts, one per role, whose password is right', async () => {
  const { demo } = (await api.client().call('showSession')).body;
  const roles = demo.accounts.map(({ role }: { role: string }) => role);
  expect(roles).toEqual(['engineer', 'reviewer', 'issuer', 'reader']);
  for (const { email, role } of demo.accounts) {
    const client = api.client();
    expect((await client.signIn(email, demo.password)).status).toBe(200);
    const { calculations } = (await client.call('showDesk')).body;
    expect(calculations.map((row: { roles: string[] }) => row.roles)).toEqual([[role], [role]]);
  }
});

it('holds the scenario once, with every verdict and some inputs not confirmed', async () => {
  const client = api.client();
  const { demo } = (await client.call('showSession')).body;
  await client.signIn(demo.accounts[0].email, demo.password);
  const { projects, calculations } = (await client.call('showDesk')).body;
  expect(projects.map(({ title }: { title: string }) => title)).toEqual(['Tern Quay Ferry Hall']);
  const found: { verdict: string; unconfirmed: number; problems: unknown[] }[] = [];
  for (const { id, number } of calculations) {
    const params = { calculationId: id };
    const shown = (await client.call('showCalculation', { params })).body;
    expect(shown.problems, number).toEqual([]);
    found.push(...shown.memberRows.map(({ summary }: { summary: (typeof found)[0] }) => summary));
  }
  const verdicts = new Set(found.map(({ verdict }) => verdict));
  expect([...verdicts].sort()).toEqual(['FAILED', 'NOT CHECKED', 'NOT OK', 'OK']);
  expect(found.flatMap(({ problems }) => problems)).toEqual([]);
  expect(new Set(found.map(({ unconfirmed }) => unconfirmed > 0))).toEqual(new Set([true, false]));
  const bases = calculations.map(({ design, units }: Record<string, string>) => [design, units]);
  expect(bases).toEqual([
    ['LRFD', 'us'],
    ['ASD', 'si'],
  ]);
});

it('admits none of the demo accounts outside demo mode, signed in before or not', async () => {
  const deps = makeDeps(api.deps.env);
  const server = createServer(createApp(deps));
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { demo } = (await api.client().call('showSession')).body;
  const [{ email }] = demo.accounts;
  const before = api.client();
  const signedIn = await before.signIn(email, demo.password);
  expect(signedIn.status).toBe(200);
  const cookies = [signedIn.headers['set-cookie']].flat().map((cookie) => cookie?.split(';')[0]);
  const headers = { Cookie: cookies.join('; ') };
  expect((await before.call('showDesk', { headers })).status).toBe(200);
  expect((await apiClient(server).call('showDesk', { headers })).status).toBe(401);
  expect((await apiClient(server).signIn(email, demo.password)).status).toBe(401);
  server.closeAllConnections();
  server.close();
  await deps.close();
});

it('has no accounts to show outside demo mode', async () => {
  const other = await startApi();
  expect((await other.client().call('showSession')).body.demo).toBeNull();
  const { rows } = await other.deps.pool.query('select count(*)::int from users');
  expect(rows).toEqual([{ count: 0 }]);
  await other.stop();
});
