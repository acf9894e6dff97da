import { randomBytes } from 'node:crypto';
import { afterAll, expect, it } from 'vitest';
import { migrate } from '#server/db/migrate.ts';
import { cloneDatabase } from '#tests/support/database.ts';
import { databaseUrl, runSql } from '#tests/support/database-server.ts';

const made: string[] = [];
const serverUrl = () => process.env.TEST_DATABASE_URL ?? '';
afterAll(async () => {
  for (const name of made) await runSql(serverUrl(), `drop database ${name} with (force)`);
});

async function emptyDatabase() {
  const name = `stanchion_empty_${randomBytes(4).toString('hex')}`;
  await runSql(serverUrl(), `create database ${name}`);
  made.push(name);
  return databaseUrl(serverUrl(), name);
}

it('brings an empty database to the present schema from several processes at once', async () => {
  const url = await emptyDatabase();
  await Promise.all([migrate(url), migrate(url), migrate(url)]);
  await migrate(url);
  const tables = await runSql<{ tablename: string }>(
    url,
    "select tablename from pg_tables where schemaname = 'public' order by 1",
  );
  expect(tables.map(({ tablename }) => tablename)).toEqual([
    ...['audit', 'calculations', 'drawings', 'firms', 'grants'],
    ...['member_formula_uses', 'members', 'memberships'],
    ...['projects', 'rate_limits', 'sessions', 'users', 'welcomes'],
  ]);
});

it.skipIf(!process.env.TEST_WEB_DATABASE_URL)(
  'gives the web role no more than it needs',
  async () => {
    const database = await cloneDatabase();
    const web = (sql: string) => runSql(database.webUrl, sql);
    await expect(web('create table mine (id int)')).rejects.toMatchObject({ code: '42501' });
    await expect(web('alter table users add column x int')).rejects.toMatchObject({
      code: '42501',
    });
    await expect(web('truncate users')).rejects.toMatchObject({ code: '42501' });
    await expect(web('select * from drizzle.__drizzle_migrations')).rejects.toMatchObject({
      code: '42501',
    });
    await database.drop();
  },
);
