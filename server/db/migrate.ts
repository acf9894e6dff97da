import { fileURLToPath } from 'node:url';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate as applyMigrations } from 'drizzle-orm/node-postgres/migrator';
import pg from 'pg';
import { grantWebRights } from './grant-web-rights.ts';

const migrationsFolder = fileURLToPath(new URL('../../drizzle', import.meta.url));
/** Any fixed number: the lock that lets one process migrate at a time. */
const lock = 4_310_001;

/**
 * Brings the database to the present schema and gives the web role its rights. Safe to run from
 * several processes at once and on a database that is up to date.
 */
export async function migrate(ownerUrl: string, webRole = 'stanchion_web'): Promise<void> {
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    await client.query('select pg_advisory_lock($1)', [lock]);
    await client.query("set client_min_messages = 'warning'");
    await applyMigrations(drizzle(client), { migrationsFolder });
    await grantWebRights(client, webRole);
  } finally {
    // The lock goes with the connection.
    await client.end();
  }
}
