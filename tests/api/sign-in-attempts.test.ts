import { afterAll, beforeAll, expect, it } from 'vitest';
import { csrfHeader } from '#shared/contracts/account.ts';
import { originOf } from './support/api-client.ts';
import { addAccount, password } from './support/people.ts';
import { type Api, startApi } from './support/start-api.ts';

let api: Api;
beforeAll(async () => {
  api = await startApi();
});
afterAll(() => api.stop());

it('takes e-mail and password from the body only', async () => {
  const { email } = await addAccount(api, 'one', null);
  const { agent, call } = api.client();
  const { csrfToken } = (await call('showSession')).body;
  const answer = await agent
    .post('/api/session')
    .query({ email, password })
    .set({ Origin: originOf(api.server), [csrfHeader]: csrfToken })
    .send({ email: '', password: '' });
  expect(answer.status).toBe(401);
});

it('counts the addresses of one IPv6 network together', async () => {
  const { email } = await addAccount(api, 'two', null);
  const attempt = (address: string) =>
    api.client().call('signIn', {
      headers: { 'X-Forwarded-For': address },
      body: { email, password: 'wrong' },
    });
  for (const last of [1, 2, 3, 4, 5, 6, 7, 8]) {
    expect((await attempt(`2001:db8:1:2::${last}`)).status).toBe(401);
  }
  expect((await attempt('2001:db8:1:2:ffff:1:2:3')).status).toBe(429);
  expect((await attempt('2001:db8:1:3::1')).status).toBe(401);
  expect((await attempt('203.0.113.7')).status).toBe(401);
});
