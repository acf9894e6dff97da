import { networkOf } from '#server/auth/network-of.ts';
import { notFound } from '#server/http/app-error.ts';
import type { Handler } from '#server/http/handler.ts';
import type { account } from '#shared/contracts/account.ts';
import { findWelcome } from './welcome-token.ts';

export const showWelcome: Handler<typeof account.showWelcome> = async ({ deps, req, params }) => {
  await deps.limits.spend('welcome', networkOf(req.ip));
  const welcome = await findWelcome(deps.db, params.token, deps.now());
  if (!welcome) throw notFound();
  return welcome;
};
