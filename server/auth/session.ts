import connectPgSimple from 'connect-pg-simple';
import session from 'express-session';
import type { Deps } from '#server/deps.ts';

declare module 'express-session' {
  interface SessionData {
    /** When the password was given, in milliseconds; a session ends for good some time after. */
    signedInAt?: number;
  }
}

const hour = 3_600_000;
export const idleTime = 12 * hour;
export const wholeTime = 7 * 24 * hour;

const Store = connectPgSimple(session);

/** Sessions in PostgreSQL. Visitors have none: one is made at sign-in. */
export function sessions(deps: Deps) {
  return session({
    name: 'stanchion.session',
    secret: deps.env.sessionSecret,
    store: new Store({
      pool: deps.pool,
      tableName: 'sessions',
      pruneSessionInterval: 15 * 60,
      errorLog: (error: unknown) => deps.log.error({ err: error }, 'session store'),
    }),
    resave: false,
    saveUninitialized: false,
    rolling: true,
    cookie: {
      httpOnly: true,
      sameSite: 'lax',
      secure: deps.env.loopback ? 'auto' : true,
      path: '/',
      maxAge: idleTime,
    },
  });
}
