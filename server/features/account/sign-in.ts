import { eq } from 'drizzle-orm';
import { accountScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { networkOf } from '#server/auth/network-of.ts';
import { memberships, users } from '#server/db/schema/people.ts';
import { transaction } from '#server/db/transaction.ts';
import type { Deps } from '#server/deps.ts';
import { AppError } from '#server/http/app-error.ts';
import type { Handler } from '#server/http/handler.ts';
import type { account } from '#shared/contracts/account.ts';
import { sessionStateOf } from './session-state.ts';

/** Signs in with e-mail and password, under limits per address and per account. */
export const signIn: Handler<typeof account.signIn> = async (context) => {
  const { deps, auth, req, res, body } = context;
  const email = body.email.trim().toLowerCase();
  const address = networkOf(req.ip);
  await deps.limits.spend('signInOfAddress', address);
  await deps.limits.spend('signInOfAccount', `${email} ${address}`);
  await deps.limits.spend('signInOfAccountAnywhere', email);
  const viewer = await auth.checkPassword({ email, password: body.password }, req, res);
  if (!viewer) {
    // Not awaited: the answer takes as long where there is no such account.
    noteRefusal(deps, email).catch((err) => deps.log.error({ err }, 'refusal not noted'));
    throw new AppError('wrong-credentials');
  }
  await deps.limits.reset('signInOfAccount', `${email} ${address}`);
  await deps.limits.reset('signInOfAccountAnywhere', email);
  // First the entry: no session without one.
  await transaction(deps.pool, (tx) =>
    writeAudit(tx, accountScope(deps, viewer), { action: 'account.signed-in' }),
  );
  await auth.begin(req, viewer);
  return sessionStateOf(context);
};

/** A refused attempt on an account that exists belongs into its firm's audit log. */
async function noteRefusal(deps: Deps, email: string) {
  const [user] = await deps.db
    .select({ id: users.id, firmId: memberships.firmId })
    .from(users)
    .leftJoin(memberships, eq(memberships.userId, users.id))
    .where(eq(users.email, email));
  if (!user) return;
  const scope = { at: deps.now(), actorId: null, firmId: user.firmId, subjectId: user.id };
  await transaction(deps.pool, (tx) =>
    writeAudit(tx, scope, { action: 'account.sign-in-refused' }),
  );
}
