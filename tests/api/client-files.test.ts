import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { request } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { originOf } from './support/api-client.ts';
import { type Api, startApi } from './support/start-api.ts';

const folder = mkdtempSync(join(tmpdir(), 'stanchion-client-'));
let api: Api;
beforeAll(async () => {
  // A clone may lie in a hidden folder.
  const client = join(folder, '.hidden', 'client');
  mkdirSync(join(client, 'assets'), { recursive: true });
  writeFileSync(join(client, 'index.html'), '<title>the page</title>');
  writeFileSync(join(client, 'assets', 'main-1a2b.js'), 'run()');
  for (const outside of [folder, join(folder, '.hidden')]) {
    writeFileSync(join(outside, 'secret.txt'), 'not for the web');
  }
  writeFileSync(join(client, '.hidden'), 'not for the web');
  api = await startApi({ clientFolder: client });
});
afterAll(async () => {
  await api.stop();
  rmSync(folder, { recursive: true });
});

const get = (path: string) => api.client().agent.get(path);

/** The path as it is written, which other clients would clean up. */
const getRaw = (path: string) =>
  new Promise<string>((resolve, reject) => {
    const asked = request(originOf(api.server), { path }, (answer) => {
      answer.setEncoding('utf8');
      let body = '';
      answer.on('data', (part: string) => {
        body += part;
      });
      answer.on('end', () => resolve(body));
    });
    asked.on('error', reject).end();
  });

it.each(['/', '/desk', '/calculations/1/members/2?line=c1:H1/ratio'])(
  'serves the page at %s',
  async (path) => {
    const { status, text, headers } = await get(path);
    expect(status).toBe(200);
    expect(text).toBe('<title>the page</title>');
    expect(headers['cache-control']).toBe('no-cache');
    expect(headers['content-security-policy']).toContain("script-src 'self'");
  },
);

it('serves files that never change for a year, and no page in place of an absent one', async () => {
  const file = await get('/assets/main-1a2b.js');
  expect(file.headers['cache-control']).toBe('public, max-age=31536000, immutable');
  expect((await get('/assets/main-9999.js')).status).toBe(404);
});

it('does not serve the page below /api', async () => {
  const { status, headers } = await get('/api/desk/nothing');
  expect(status).toBe(404);
  expect(headers['content-type']).toContain('application/problem+json');
});

it('answers what is no page as a problem', async () => {
  const { status, headers } = await api.client().agent.post('/desk');
  expect(status).toBe(404);
  expect(headers['content-type']).toContain('application/problem+json');
});

it.each([
  '/../secret.txt',
  '/..%2fsecret.txt',
  '/assets/../../secret.txt',
  '/assets/..%2f..%2fsecret.txt',
  '/%2e%2e/secret.txt',
  '/..\\secret.txt',
  '/.hidden',
])('keeps to its folder: %s', async (path) => {
  expect(await getRaw(path)).not.toContain('not for the web');
});
