import { eq } from 'drizzle-orm';
import { accountScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { networkOf } from '#server/auth/network-of.ts';
import { hashPassword } from '#server/auth/password.ts';
import { loadViewer } from '#server/auth/viewer.ts';
import { users } from '#server/db/schema/people.ts';
import { transaction } from '#server/db/transaction.ts';
import { notFound } from '#server/http/app-error.ts';
import type { Handler } from '#server/http/handler.ts';
import type { account } from '#shared/contracts/account.ts';
import { endSessionsOf } from './end-sessions.ts';
import { sessionStateOf } from './session-state.ts';
import { findWelcome, useWelcomeToken } from './welcome-token.ts';

/** Sets the first password by the one-time link, which is used up, and signs in. */
export const acceptWelcome: Handler<typeof account.acceptWelcome> = async (context) => {
  const { deps, auth, req, params, body } = context;
  await deps.limits.spend('welcome', networkOf(req.ip));
  if (!(await findWelcome(deps.db, params.token, deps.now()))) throw notFound();
  const passwordHash = await hashPassword(body.password);
  const viewer = await transaction(deps.pool, async (tx) => {
    const userId = await useWelcomeToken(tx, params.token, deps.now());
    const person = userId && (await loadViewer(tx.db, userId));
    if (!person) throw notFound();
    await tx.db.update(users).set({ passwordHash }).where(eq(users.id, person.userId));
    await endSessionsOf(tx, person.userId);
    await writeAudit(tx, accountScope(deps, person), { action: 'account.welcomed' });
    return person;
  });
  await auth.begin(req, viewer);
  return sessionStateOf(context);
};
