import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { type Api, startApi } from './support/start-api.ts';

let api: Api;
beforeAll(async () => {
  api = await startApi();
});
afterAll(() => api.stop());

const run = promisify(execFile);
const firmCreate = (...args: string[]) =>
  run(process.execPath, ['--import', 'tsx', 'server/cli/firm-create.ts', ...args], {
    env: { ...process.env, DATABASE_URL: api.deps.env.databaseUrl, HOST: '', PORT: '' },
  });

it('makes a firm whose administrator sets a password by the printed link', async () => {
  const { stdout } = await firmCreate('Bracken Engineers', 'Head@Bracken.example');
  const link = /^http:\/\/127\.0\.0\.1:4310\/welcome\/(\S{43})$/m.exec(stdout);
  const params = { token: link?.[1] ?? '' };
  const client = api.client();
  expect((await client.call('showWelcome', { params })).body).toMatchObject({
    ...{ firm: 'Bracken Engineers', email: 'head@bracken.example' },
  });
  const accepted = await client.call('acceptWelcome', {
    ...{ params, body: { password: 'set by the one-time link' } },
  });
  expect(accepted.body.user.firm).toMatchObject({
    ...{ name: 'Bracken Engineers', role: 'administrator' },
  });
  const opened = await client.call('createProject', {
    body: { number: '1', title: 'First', client: '', place: '' },
  });
  expect(opened.status).toBe(200);
});

it('refuses an address that is taken, and what is no address', async () => {
  await firmCreate('Alder', 'one@alder.example');
  await expect(firmCreate('Alder again', 'one@alder.example')).rejects.toMatchObject({
    ...{ code: 1, stderr: 'one@alder.example has an account already.\n' },
  });
  await expect(firmCreate('Alder', 'nobody')).rejects.toMatchObject({ code: 2 });
  await expect(firmCreate('Alder')).rejects.toMatchObject({ code: 2 });
  const { rows } = await api.deps.pool.query("select name from firms where name like 'Alder%'");
  expect(rows).toEqual([{ name: 'Alder' }]);
});
