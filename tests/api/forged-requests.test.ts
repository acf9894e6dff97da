import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { csrfHeader } from '#shared/contracts/account.ts';
import { routeTable } from '#shared/contracts/route-table.ts';
import { originOf } from './support/api-client.ts';
import { password } from './support/people.ts';
import { validCalls } from './support/valid-calls.ts';
import { makeWorld, type World } from './support/world.ts';

let world: World;
beforeAll(async () => {
  world = await makeWorld();
});
afterAll(() => world.api.stop());

const changing = (Object.keys(routeTable) as (keyof typeof routeTable)[]).filter(
  (route) => routeTable[route].method !== 'GET',
);

describe.each(changing)('%s', (route) => {
  const attempt = async (headers: Record<string, string>) => {
    const caller = world.of.engineer;
    const target = { world, calculationId: world.calculationId, caller };
    return caller.client.call(route, { ...(await validCalls[route](target)), headers });
  };

  it.each([
    ['another site', 'https://elsewhere.example'],
    ['a site whose name begins with ours', 'http://127.0.0.1.elsewhere.example'],
    ['an opaque origin', 'null'],
    ['no origin', ''],
  ])('is refused from %s', async (_, origin) => {
    const answer = await attempt({ Origin: origin });
    expect(answer.status).toBe(403);
    expect(answer.body.code).toBe('wrong-origin');
  });

  it('is refused without the token', async () => {
    const answer = await attempt({ [csrfHeader]: '' });
    expect(answer.status).toBe(403);
    expect(answer.body.code).toBe('wrong-token');
  });

  it("is refused with another session's token", async () => {
    const { body } = await world.of.reviewer.client.call('showSession');
    const answer = await attempt({ [csrfHeader]: body.csrfToken });
    expect(answer.body.code).toBe('wrong-token');
  });
});

it("refuses a sign-in with another visitor's token", async () => {
  const { body } = await world.api.client().call('showSession');
  const answer = await world.api
    .client()
    .agent.post('/api/session')
    .set({ Origin: originOf(world.api.server), [csrfHeader]: body.csrfToken })
    .send({ email: world.of.reader.email, password });
  expect(answer.body.code).toBe('wrong-token');
});
