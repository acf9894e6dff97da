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
export const cloneDatabase = (): Promise<TestDatabase> => clone(templateName());

/** The same of a database that was kept under a name; null where none was in this run. */
export async function cloneOf(kept: string): Promise<TestDatabase | null> {
  const name = keptName(kept);
  const found = await runSql(serverUrl(), `SELECT FROM pg_database WHERE datname = '${name}'`);
  return found.length > 0 ? clone(name) : null;
}

/**
 * Keeps a database, to which nobody may be connected any more, for `cloneOf` to the run's end. Where
 * another file kept one under the name meanwhile, that one stays and this one is removed.
 */
export async function keepForClones({ ownerUrl, drop }: TestDatabase, kept: string): Promise<void> {
  const own = new URL(ownerUrl).pathname.slice(1);
  try {
    await runSql(serverUrl(), `ALTER DATABASE ${own} RENAME TO ${keptName(kept)}`);
  } catch (error) {
    if ((error as { code?: string }).code !== DUPLICATE_DATABASE) throw error;
    await drop();
  }
}

/** SQLSTATE of a database name that is taken (PostgreSQL, appendix A). */
const DUPLICATE_DATABASE = '42P04';

const serverUrl = (): string => process.env.TEST_DATABASE_URL!;

function templateName(): string {
  const template = inject('template');
  if ('reason' in template) throw new Error(template.reason);
  return template.name;
}

const keptName = (kept: string): string => `${templateName()}_${kept}`;

async function clone(source: string): Promise<TestDatabase> {
  const name = `${templateName()}_${randomBytes(4).toString('hex')}`;
  await runSql(serverUrl(), `CREATE DATABASE ${name} TEMPLATE ${source}`);
  return {
    ownerUrl: databaseUrl(serverUrl(), name),
    webUrl: databaseUrl(process.env.TEST_WEB_DATABASE_URL ?? serverUrl(), name),
    drop: async () => {
      await runSql(serverUrl(), `DROP DATABASE IF EXISTS ${name} WITH (FORCE)`);
    },
  };
}
