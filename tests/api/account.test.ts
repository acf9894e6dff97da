import { afterAll, beforeAll, expect, it } from 'vitest';
import { transaction } from '#server/db/transaction.ts';
import { makeWelcomeToken } from '#server/features/account/welcome-token.ts';
import { addFirm, addPerson, password } from './support/people.ts';
import { type Api, startApi } from './support/start-api.ts';

let api: Api;
let firmId: string;
let clock = new Date('2025-05-14T09:00:00Z');

beforeAll(async () => {
  api = await startApi({ now: () => clock });
  firmId = await addFirm(api, 'Firm');
});
afterAll(() => api.stop());

const person = (name: string) => addPerson(api, name, { firmId, role: 'member' });
const cookieOf = (response: { headers: Record<string, unknown> }) =>
  ([response.headers['set-cookie']].flat() as string[]).find((cookie) =>
    cookie?.startsWith('stanchion.session='),
  );

it('signs in, says who it is, and signs out', async () => {
  const { client, email } = await person('one');
  const signedIn = await client.call('showSession');
  expect(signedIn.body.user).toMatchObject({ name: 'one', email, firm: { name: 'Firm' } });
  const signedOut = await client.call('signOut');
  expect(signedOut.body.user).toBeNull();
  expect((await client.call('showDesk')).status).toBe(401);
});

it('says the same for a wrong password and for an address that nobody has', async () => {
  const { email } = await person('two');
  const wrong = await api.client().signIn(email, 'not the password');
  const unknown = await api.client().signIn('nobody@people.example', 'not the password');
  expect(wrong.status).toBe(401);
  expect(wrong.body).toEqual(unknown.body);
});

it('keeps the password as argon2id only', async () => {
  const { id } = await person('three');
  const { rows } = await api.deps.pool.query('select * from users where id = $1', [id]);
  expect(rows[0].password_hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  expect(JSON.stringify(rows[0])).not.toContain(password);
});

it('gives a new session at sign-in, whatever the browser brought', async () => {
  const { email } = await person('four');
  const client = api.client();
  const brought = 'stanchion.session=s%3Abrought-along.AAAA';
  await client.call('showSession', { headers: { Cookie: brought } });
  const first = cookieOf(await client.signIn(email, password));
  const again = cookieOf(await client.signIn(email, password));
  expect(first).toMatch(/HttpOnly; SameSite=Lax$/);
  expect(first).not.toContain('brought-along');
  expect(again?.split(';')[0]).not.toBe(first?.split(';')[0]);
  const { rows } = await api.deps.pool.query(
    "select 1 from sessions where sess -> 'passport' ->> 'user' = (select id::text from users where email = $1)",
    [email],
  );
  // The session of `person` and the last one: the one in between is gone.
  expect(rows).toHaveLength(2);
});

it('makes no session for a visitor', async () => {
  const before = await api.deps.pool.query('select count(*) from sessions');
  const visit = await api.client().call('showSession');
  const after = await api.deps.pool.query('select count(*) from sessions');
  expect(visit.body).toMatchObject({ user: null, demo: null });
  expect(after.rows).toEqual(before.rows);
});

it('ends a session seven days after its sign-in, used or not', async () => {
  const { client } = await person('five');
  const start = clock;
  clock = new Date(start.getTime() + 7 * 24 * 3_600_000 - 1000);
  expect((await client.call('showDesk')).status).toBe(200);
  clock = new Date(start.getTime() + 7 * 24 * 3_600_000);
  expect((await client.call('showDesk')).status).toBe(401);
  clock = start;
});

it('changes the password and ends every other session', async () => {
  const { client, email } = await person('six');
  const elsewhere = api.client();
  await elsewhere.signIn(email, password);
  const next = 'another long password';
  const wrong = await client.call('changePassword', { body: { current: 'guess', next } });
  expect(wrong.body.problems).toEqual([
    { path: 'current', message: 'is not your present password' },
  ]);
  const short = await client.call('changePassword', { body: { current: password, next: 'short' } });
  expect(short.body.problems).toEqual([{ path: 'next', message: 'at least 12 characters' }]);
  const changed = await client.call('changePassword', { body: { current: password, next } });
  expect(changed.status).toBe(200);
  expect((await client.call('showDesk')).status).toBe(200);
  expect((await elsewhere.call('showDesk')).status).toBe(401);
  expect((await api.client().signIn(email, password)).status).toBe(401);
  expect((await api.client().signIn(email, next)).status).toBe(200);
});

it('refuses more attempts on an account, the right password included', async () => {
  const { email } = await person('seven');
  const client = api.client();
  for (let attempt = 0; attempt < 8; attempt += 1) {
    expect((await client.signIn(email, 'wrong')).status).toBe(401);
  }
  const refused = await client.signIn(email, password);
  expect(refused.status).toBe(429);
  expect(refused.body).toMatchObject({ code: 'too-many', detail: 'Try again in 15 minutes.' });
  expect(Number(refused.headers['retry-after'])).toBeGreaterThan(800);
  const { rows } = await api.deps.pool.query('select key from rate_limits');
  expect(JSON.stringify(rows)).not.toContain(email);
});

it('forgets failed attempts when the right password comes', async () => {
  const { email } = await person('eight');
  const client = api.client();
  for (let round = 0; round < 2; round += 1) {
    for (let attempt = 0; attempt < 7; attempt += 1) await client.signIn(email, 'wrong');
    expect((await client.signIn(email, password)).status).toBe(200);
  }
});

it('lets a one-time link set the password once, within 72 hours', async () => {
  const { id, email } = await person('nine');
  const link = () => transaction(api.deps.pool, (tx) => makeWelcomeToken(tx, id, api.deps.now()));
  const start = clock;
  const late = await link();
  const token = await link();
  const params = { token };
  const shown = await api.client().call('showWelcome', { params });
  expect(shown.body).toEqual({ name: 'nine', email, firm: 'Firm' });
  const body = { password: 'set by the one-time link' };
  const client = api.client();
  const accepted = await client.call('acceptWelcome', { params, body });
  expect(accepted.body.user.email).toBe(email);
  expect((await client.call('showDesk')).status).toBe(200);
  expect((await api.client().call('acceptWelcome', { params, body })).status).toBe(404);
  expect((await api.client().signIn(email, body.password)).status).toBe(200);
  clock = new Date(start.getTime() + 72 * 3_600_000);
  const expired = { params: { token: late }, body };
  expect((await api.client().call('showWelcome', expired)).status).toBe(404);
  expect((await api.client().call('acceptWelcome', expired)).status).toBe(404);
  clock = start;
  const { rows } = await api.deps.pool.query('select * from welcomes');
  expect(JSON.stringify(rows)).not.toContain(token);
});

it('ends every other link of a person with the first that is used', async () => {
  const { id } = await person('eleven');
  const link = () => transaction(api.deps.pool, (tx) => makeWelcomeToken(tx, id, api.deps.now()));
  const [first, second] = [await link(), await link()];
  const body = { password: 'set by the one-time link' };
  const accept = (token: string) => api.client().call('acceptWelcome', { params: { token }, body });
  expect((await accept(second)).status).toBe(200);
  expect((await accept(first)).status).toBe(404);
});

it('uses a one-time link once even when it is opened twice at the same moment', async () => {
  const { id } = await person('ten');
  const token = await transaction(api.deps.pool, (tx) => makeWelcomeToken(tx, id, api.deps.now()));
  const call = { params: { token }, body: { password: 'set by the one-time link' } };
  const answers = await Promise.all(
    [api.client(), api.client()].map((client) => client.call('acceptWelcome', call)),
  );
  expect(answers.map(({ status }) => status).sort()).toEqual([200, 404]);
});
