import { drizzle } from 'drizzle-orm/node-postgres';
import pg from 'pg';
import { type Logger, pino } from 'pino';
import { type Limits, makeLimits, type RateLimitSettings } from './auth/limits.ts';
import type { Db } from './db/transaction.ts';
import type { Env } from './env.ts';
import { loggedError } from './http/logged-error.ts';
import { makeTurns, type TakeTurn } from './http/turns.ts';
import { makeRuns, type Runs } from './runs/runs.ts';

/** Everything a handler may use of the outside world, made once at start. */
export interface Deps {
  readonly env: Env;
  readonly pool: pg.Pool;
  readonly db: Db;
  readonly log: Logger;
  readonly limits: Limits;
  readonly runs: Runs;
  readonly takeTurn: TakeTurn;
  readonly now: () => Date;
  /** The demo's accounts are shown on the sign-in page. */
  readonly demo: boolean;
  /** Ends what was opened. */
  close(): Promise<void>;
}

export interface DepsOptions {
  readonly demo?: boolean;
  readonly now?: () => Date;
  readonly rateLimits?: Partial<RateLimitSettings>;
}

/** Opens the pool and makes the rest; `close` when done. */
export function makeDeps(env: Env, options: DepsOptions = {}): Deps {
  // Standard output is for the one line that says where it serves.
  const log = pino({ level: env.logLevel, serializers: { err: loggedError } }, pino.destination(2));
  const pool = new pg.Pool({
    connectionString: env.databaseUrl,
    max: 20,
    connectionTimeoutMillis: 10_000,
    statement_timeout: 30_000,
  });
  pool.on('error', (error) => log.error({ err: error }, 'idle database connection lost'));
  const runs = makeRuns();
  return {
    env,
    pool,
    db: drizzle(pool),
    log,
    limits: makeLimits(pool, options.rateLimits),
    now: options.now ?? (() => new Date()),
    runs,
    takeTurn: makeTurns(),
    demo: options.demo ?? false,
    close: async () => {
      await runs.close();
      await pool.end();
    },
  };
}
