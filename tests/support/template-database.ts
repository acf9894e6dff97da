import { randomBytes } from 'node:crypto';
import pg from 'pg';
import type { TestProject } from 'vitest/node';
import { databaseUrl, runSql } from './database-server.ts';

/** The migrated database that each test file clones, or why there is none. */
export type Template = { name: string } | { reason: string };

declare module 'vitest' {
  interface ProvidedContext {
    template: Template;
  }
}

async function makeTemplate(serverUrl: string, name: string): Promise<Template> {
  try {
    const { migrate } = await import('#server/db/migrate.ts');
    await runSql(serverUrl, `CREATE DATABASE ${name}`);
    await migrate(databaseUrl(serverUrl, name));
    return { name };
  } catch (error) {
    return { reason: `The template database couldn't be made: ${String(error)}` };
  }
}

/** Drops the template and what tests left behind: a clone's name begins with the template's. */
async function dropAll(serverUrl: string, name: string): Promise<void> {
  const found = await runSql<{ datname: string }>(
    serverUrl,
    `SELECT datname FROM pg_database WHERE datname LIKE '${name}%'`,
  );
  for (const { datname } of found) {
    await runSql(serverUrl, `DROP DATABASE IF EXISTS ${pg.escapeIdentifier(datname)} WITH (FORCE)`);
  }
}

/**
 * Once per run: vitest calls it for each of its projects, which all inherit what the root provides.
 * Without a server only the tests that need a database fail.
 */
export default async function setup(project: TestProject): Promise<(() => Promise<void>) | void> {
  if (!project.isRootProject()) return;
  const serverUrl = process.env.TEST_DATABASE_URL;
  if (!serverUrl) {
    const reason = 'This test needs a database: run it with `npm test -- PATH`.';
    project.provide('template', { reason });
    return;
  }
  const name = `stanchion_test_${randomBytes(6).toString('hex')}`;
  project.provide('template', await makeTemplate(serverUrl, name));
  return () => dropAll(serverUrl, name);
}
