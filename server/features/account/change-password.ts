import { eq } from 'drizzle-orm';
import { accountScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { hashPassword, isPassword } from '#server/auth/password.ts';
import { users } from '#server/db/schema/people.ts';
import { transaction } from '#server/db/transaction.ts';
import { AppError } from '#server/http/app-error.ts';
import type { Handler } from '#server/http/handler.ts';
import type { account } from '#shared/contracts/account.ts';
import { endSessionsOf } from './end-sessions.ts';
import { sessionStateOf } from './session-state.ts';

/** Changes the own password; every session ends and this browser gets a new one. */
export const changePassword: Handler<typeof account.changePassword> = async (context) => {
  const { deps, auth, req, viewer, body } = context;
  await deps.limits.spend('passwordChange', viewer.userId);
  const [user] = await deps.db.select().from(users).where(eq(users.id, viewer.userId));
  if (!(await isPassword(user?.passwordHash ?? null, body.current))) {
    throw new AppError('invalid-request', {
      problems: [{ path: 'current', message: 'is not your present password' }],
    });
  }
  const passwordHash = await hashPassword(body.next);
  await transaction(deps.pool, async (tx) => {
    await tx.db.update(users).set({ passwordHash }).where(eq(users.id, viewer.userId));
    await endSessionsOf(tx, viewer.userId);
    await writeAudit(tx, accountScope(deps, viewer), { action: 'account.password-changed' });
  });
  await deps.limits.reset('passwordChange', viewer.userId);
  await auth.begin(req, viewer);
  return sessionStateOf(context);
};
