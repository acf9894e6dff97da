import { createHash } from 'node:crypto';
import type pg from 'pg';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { AppError } from '#server/http/app-error.ts';

/** Attempts allowed within a number of seconds. */
interface Allowance {
  readonly points: number;
  readonly duration: number;
}

const quarter = 15 * 60;

export const rateLimitSettings = {
  signInOfAddress: { points: 300, duration: quarter },
  /** Both of one account; forgotten when the right password comes. */
  signInOfAccount: { points: 8, duration: quarter },
  signInOfAccountAnywhere: { points: 60, duration: quarter },
  passwordChange: { points: 8, duration: quarter },
  welcome: { points: 30, duration: quarter },
  record: { points: 60, duration: 60 },
  report: { points: 20, duration: 60 },
} as const satisfies Record<string, Allowance>;

export type LimitName = keyof typeof rateLimitSettings;
export type RateLimitSettings = Record<LimitName, Allowance>;

export interface Limits {
  /** Counts one attempt; throws `too-many` where none is left. */
  spend(limit: LimitName, of: string): Promise<void>;
  /** Forgets the attempts. */
  reset(limit: LimitName, of: string): Promise<void>;
}

// Keys are hashed: the table holds neither e-mail nor network addresses.
const keyOf = (of: string) => createHash('sha256').update(of).digest('base64url');

const tooMany = (milliseconds: number) => {
  const retryAfter = Math.max(1, Math.ceil(milliseconds / 1000));
  const minutes = Math.ceil(retryAfter / 60);
  const wait = minutes === 1 ? 'one minute' : `${minutes} minutes`;
  return new AppError('too-many', { retryAfter, detail: `Try again in ${wait}.` });
};

/** Rate limits kept in PostgreSQL, so that every web process counts together. */
export function makeLimits(pool: pg.Pool, changed: Partial<RateLimitSettings> = {}): Limits {
  const settings: RateLimitSettings = { ...rateLimitSettings, ...changed };
  // One of them sweeps the table for all.
  const limiters = new Map(
    Object.entries(settings).map(([name, { points, duration }]) => [
      name,
      new RateLimiterPostgres({
        ...{ storeClient: pool, storeType: 'pool', tableName: 'rate_limits', tableCreated: true },
        ...{ keyPrefix: name, points, duration, clearExpiredByTimeout: name === 'report' },
      }),
    ]),
  );
  const limiter = (name: LimitName) => {
    const found = limiters.get(name);
    if (!found) throw new Error(`no rate limit is named ${name}`);
    return found;
  };
  return {
    async spend(name, of) {
      try {
        await limiter(name).consume(keyOf(of));
      } catch (refused) {
        if (refused instanceof RateLimiterRes) throw tooMany(refused.msBeforeNext);
        throw refused;
      }
    },
    async reset(name, of) {
      await limiter(name).delete(keyOf(of));
    },
  };
}
