import { afterAll, beforeAll, expect, it } from 'vitest';
import { users } from '#server/db/schema/people.ts';
import { loggedError } from '#server/http/logged-error.ts';
import { addAccount } from './support/people.ts';
import { type Api, startApi } from './support/start-api.ts';

let api: Api;
beforeAll(async () => {
  api = await startApi();
});
afterAll(() => api.stop());

it('logs which query failed and why, without the values in it', async () => {
  const { id, email } = await addAccount(api, 'somebody', null);
  const again = { id, email, name: 'Some Body', passwordHash: 'a-hash', createdAt: new Date() };
  const error = await api.deps.db
    .insert(users)
    .values(again)
    .catch((thrown: unknown) => thrown);
  expect(String(error)).toContain(email);
  const logged = loggedError(error);
  expect(logged.query).toContain('insert into "users"');
  expect(logged.cause).toMatchObject({ code: '23505' });
  expect(logged.at?.join()).toContain('logged-errors.test.ts');
  for (const value of [id, email, 'Some Body', 'a-hash']) {
    expect(JSON.stringify(logged)).not.toContain(value);
  }
});
