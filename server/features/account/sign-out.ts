import { accountScope } from '#server/audit/scope-of.ts';
import { writeAudit } from '#server/audit/write-audit.ts';
import { transaction } from '#server/db/transaction.ts';
import type { Handler } from '#server/http/handler.ts';
import type { account } from '#shared/contracts/account.ts';
import { sessionStateOf } from './session-state.ts';

export const signOut: Handler<typeof account.signOut> = async (context) => {
  const { deps, auth, req, viewer } = context;
  await auth.end(req);
  await transaction(deps.pool, (tx) =>
    writeAudit(tx, accountScope(deps, viewer), { action: 'account.signed-out' }),
  );
  return sessionStateOf(context);
};
