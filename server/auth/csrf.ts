import { createHmac, randomBytes, timingSafeEqual } from 'node:crypto';
import type { CookieOptions, Request, RequestHandler, Response } from 'express';
import type { Env } from '#server/env.ts';
import { AppError } from '#server/http/app-error.ts';
import { csrfHeader } from '#shared/contracts/account.ts';

const visitorCookie = 'stanchion.visitor';
const visitorPattern = /(?:^|;\s*)stanchion\.visitor=([A-Za-z0-9_-]{43})(?:;|$)/;

const visitorOf = (req: Request) => visitorPattern.exec(req.headers.cookie ?? '')?.[1] ?? null;

/** Cookies are for this site, out of scripts' reach, and need TLS except on this machine. */
export const cookieOptions = (env: Env, req: Request): CookieOptions => ({
  httpOnly: true,
  sameSite: 'lax',
  secure: !env.loopback || req.secure,
  path: '/',
});

const tokenOf = (env: Env, of: string) =>
  createHmac('sha256', env.sessionSecret).update(`csrf ${of}`).digest('base64url');

/** What the token is bound to: the session once signed in, before that a random cookie. */
function bearerOf(req: Request): string | null {
  if (req.user) return `session ${req.sessionID}`;
  const visitor = visitorOf(req);
  return visitor && `visitor ${visitor}`;
}

/** The token for this browser; gives a visitor the cookie that it is bound to. */
export function csrfTokenFor(env: Env, req: Request, res: Response): string {
  const bearer = bearerOf(req);
  if (bearer) return tokenOf(env, bearer);
  const visitor = randomBytes(32).toString('base64url');
  res.cookie(visitorCookie, visitor, cookieOptions(env, req));
  return tokenOf(env, `visitor ${visitor}`);
}

/** Throws unless the request carries the token of its session or visitor. */
export function requireCsrfToken(env: Env, req: Request): void {
  const bearer = bearerOf(req);
  const given = Buffer.from(req.get(csrfHeader) ?? '');
  const expected = Buffer.from(bearer ? tokenOf(env, bearer) : '');
  const same = given.length === expected.length && timingSafeEqual(given, expected);
  if (!bearer || !same) throw new AppError('wrong-token');
}

export const changes = (req: Request) => !['GET', 'HEAD', 'OPTIONS'].includes(req.method);

/** Refuses a change that another site asked for, or that hides where it comes from. */
export const requireSameOrigin =
  (env: Env): RequestHandler =>
  (req, _res, next) => {
    if (!changes(req)) return next();
    const own = env.publicOrigin ?? `${req.protocol}://${req.host}`;
    if (req.get('origin') !== own) throw new AppError('wrong-origin');
    next();
  };
