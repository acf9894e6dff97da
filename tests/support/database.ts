import { randomBytes } from 'node:crypto';
import { inject } from 'vitest';
import { databaseUrl, runSql } from './database-server.ts';

export interface TestDatabase {
  /** The role that owns the tables and may do everything. */
  readonly ownerUrl: string;
  /** The web process's role; the owner where the server has no such role. */
  readonly webUrl: string;
  /** Ends every connection and removes the database. */
  drop(): Promise<void>;
}

/** A migrated, empty database for one test file. Throws when the run has no database server. */
export async function cloneDatabase(): Promise<TestDatabase> {
  const template = inject('template');
  if ('reason' in template) throw new Error(template.reason);
  const serverUrl = process.env.TEST_DATABASE_URL!;
  const name = `${template.name}_${randomBytes(4).toString('hex')}`;
  await runSql(serverUrl, `CREATE DATABASE ${name} TEMPLATE ${template.name}`);
  return {
    ownerUrl: databaseUrl(serverUrl, name),
    webUrl: databaseUrl(process.env.TEST_WEB_DATABASE_URL ?? serverUrl, name),
    drop: async () => {
      await runSql(serverUrl, `DROP DATABASE IF EXISTS ${name} WITH (FORCE)`);
    },
  };
}
