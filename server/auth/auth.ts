import { eq } from 'drizzle-orm';
import type { Request, RequestHandler, Response } from 'express';
import { Passport } from 'passport';
import { Strategy } from 'passport-local';
import { users } from '#server/db/schema/people.ts';
import { isDemoAccount } from '#server/demo/demo-accounts.ts';
import type { Deps } from '#server/deps.ts';
import { isPassword } from './password.ts';
import { sessions, wholeTime } from './session.ts';
import { loadViewer, type Viewer } from './viewer.ts';

declare global {
  namespace Express {
    interface User extends Viewer {}
  }
}

interface Credentials {
  readonly email: string;
  readonly password: string;
}

export interface Auth {
  /** In order: session, then the signed-in person as `req.user`. */
  readonly middleware: readonly RequestHandler[];
  /** The person whose e-mail and password these are, or null. */
  checkPassword(credentials: Credentials, req: Request, res: Response): Promise<Viewer | null>;
  /** Signs in under a new session id. */
  begin(req: Request, viewer: Viewer): Promise<void>;
  /** Signs out and forgets the session. */
  end(req: Request): Promise<void>;
}

export function makeAuth(deps: Deps): Auth {
  const passport = new Passport();
  passport.use(
    new Strategy({ usernameField: 'email' }, (email, password, done) => {
      verifyPassword(deps, email, password).then(
        (viewer) => done(null, viewer ?? false),
        (error: unknown) => done(error),
      );
    }),
  );
  passport.serializeUser<string>((user, done) => done(null, user.userId));
  passport.deserializeUser<string>((userId, done) => {
    admit(deps, userId).then(
      (viewer) => done(null, viewer ?? false),
      (error: unknown) => done(error),
    );
  });
  return {
    middleware: [sessions(deps), endOldSession(deps), passport.initialize(), passport.session()],
    checkPassword: (credentials, req, res) =>
      new Promise((resolve, reject) => {
        const answer = (error: unknown, viewer: Viewer | false) =>
          error ? reject(error) : resolve(viewer || null);
        // In the request itself the strategy looks for what the body leaves empty in the address.
        const asked = { body: { value: credentials }, query: { value: {} } };
        passport.authenticate('local', answer)(Object.create(req, asked), res, reject);
      }),
    begin: async (req, viewer) => {
      await settled((done) => req.logIn(viewer, done));
      req.session.signedInAt = deps.now().getTime();
    },
    end: async (req) => {
      await settled((done) => req.logout(done));
      await settled((done) => req.session.destroy(done));
    },
  };
}

/** A session ends some days after its sign-in, used or not. */
function endOldSession(deps: Deps): RequestHandler {
  return (req, _res, next) => {
    const { signedInAt } = req.session;
    if (signedInAt === undefined || deps.now().getTime() - signedInAt < wholeTime) return next();
    req.session.regenerate(next);
  };
}

async function verifyPassword(deps: Deps, email: string, password: string) {
  const [user] = await deps.db
    .select({ id: users.id, passwordHash: users.passwordHash })
    .from(users)
    .where(eq(users.email, email.trim().toLowerCase()));
  const right = await isPassword(user?.passwordHash ?? null, password);
  return user && right ? admit(deps, user.id) : null;
}

/** The person, or null; the demo's people, whose password is known to all, in demo mode only. */
async function admit(deps: Deps, userId: string): Promise<Viewer | null> {
  const viewer = await loadViewer(deps.db, userId);
  return viewer && (deps.demo || !isDemoAccount(viewer.email)) ? viewer : null;
}

const settled = (call: (done: (error?: unknown) => void) => void) =>
  new Promise<void>((resolve, reject) => {
    call((error) => (error ? reject(error) : resolve()));
  });
