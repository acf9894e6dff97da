import { afterAll, beforeAll, expect, it } from 'vitest';
import { runSql } from '#tests/support/database-server.ts';
import { originOf } from './support/api-client.ts';
import { addAccount, password } from './support/people.ts';
import { type Api, startApi } from './support/start-api.ts';

let api: Api;
beforeAll(async () => {
  api = await startApi();
});
afterAll(() => api.stop());

it('sends the content policy and the other headers with every answer', async () => {
  const { headers } = await api.client().agent.get('/api/health');
  expect(headers['content-security-policy']?.split(';')).toEqual([
    "default-src 'self'",
    "script-src 'self'",
    "style-src 'self'",
    "style-src-attr 'unsafe-inline'",
    "img-src 'self' data:",
    "font-src 'self'",
    "object-src 'none'",
    "frame-ancestors 'none'",
    "base-uri 'none'",
    "form-action 'self'",
  ]);
  expect(headers).toMatchObject({
    'x-content-type-options': 'nosniff',
    'x-frame-options': 'DENY',
    'referrer-policy': 'same-origin',
    'cache-control': 'no-store',
  });
  expect(headers).not.toHaveProperty('x-powered-by');
});

it('answers an unknown path of the API as a problem', async () => {
  const answer = await api.client().agent.get('/api/nothing/here');
  expect(answer.status).toBe(404);
  expect(answer.headers['content-type']).toContain('application/problem+json');
  expect(answer.body).toEqual({
    ...{ type: '/problems/not-found', title: 'Not found', status: 404, code: 'not-found' },
  });
});

it('sends cookies over TLS only, once served beyond this machine', async () => {
  const beyond = await startApi({ env: { loopback: false } });
  const client = beyond.client();
  const overTls = {
    'X-Forwarded-Proto': 'https',
    Origin: originOf(beyond.server).replace('http:', 'https:'),
  };
  const { email } = await addAccount(beyond, 'somebody', null);
  const visit = await client.call('showSession', { headers: overTls });
  // supertest keeps no Secure cookie over plain HTTP: it is sent by hand.
  const [cookie = ''] = visit.headers['set-cookie'] ?? [];
  const headers = { ...overTls, Cookie: cookie.split(';')[0] ?? '' };
  const body = { email, password };
  const signedIn = await client.call('signIn', { headers, body });
  const cookies = [cookie, ...([signedIn.headers['set-cookie']].flat() as string[])];
  expect(cookies).toHaveLength(2);
  for (const sent of cookies) expect(sent).toMatch(/; HttpOnly; Secure; SameSite=Lax$/);
  await beyond.stop();
});

it('tells nothing of a failure of the server', async () => {
  const broken = await startApi();
  await runSql(broken.ownerUrl, 'drop table users cascade');
  const answer = await broken.client().signIn('somebody@people.example', password);
  expect(answer.status).toBe(500);
  expect(answer.body).toEqual({
    ...{ type: '/problems/failed', title: 'The server failed', status: 500, code: 'failed' },
  });
  await broken.stop();
});
