import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres';
import type pg from 'pg';

/** A Drizzle handle, on the pool or inside a transaction. */
export type Db = NodePgDatabase;

/** Everything that commits or rolls back together, over one connection. */
export interface Transaction {
  readonly db: Db;
}

/** Runs `work` in one transaction: what it throws rolls everything back. */
export async function transaction<T>(
  pool: pg.Pool,
  work: (tx: Transaction) => Promise<T>,
): Promise<T> {
  const client = await pool.connect();
  let broken: Error | undefined;
  // A connection that is lost says so by an event as well, which unheard would end the process.
  const lost = (error: Error) => {
    broken = error;
  };
  client.on('error', lost);
  try {
    await client.query('begin');
    const result = await work({ db: drizzle(client) });
    await client.query('commit');
    return result;
  } catch (error) {
    await client.query('rollback').catch((failure: Error) => {
      broken = failure;
    });
    throw error;
  } finally {
    client.off('error', lost);
    client.release(broken);
  }
}
