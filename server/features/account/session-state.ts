import type { Request, Response } from 'express';
import { csrfTokenFor } from '#server/auth/csrf.ts';
import type { Viewer } from '#server/auth/viewer.ts';
import { demoAccounts, demoPassword } from '#server/demo/demo-accounts.ts';
import type { Deps } from '#server/deps.ts';
import type { Person, SessionState } from '#shared/contracts/account.ts';

/** What the browser has to know: who is signed in, and the token for its changes. */
export function sessionStateOf(context: {
  readonly deps: Deps;
  readonly req: Request;
  readonly res: Response;
}): SessionState {
  const { deps, req, res } = context;
  return {
    user: req.user ? personOf(req.user) : null,
    csrfToken: csrfTokenFor(deps.env, req, res),
    demo: deps.demo ? { password: demoPassword, accounts: [...demoAccounts] } : null,
  };
}

function personOf({ userId, name, email, firm, firmName }: Viewer): Person {
  return {
    id: userId,
    name,
    email,
    firm: firm && { id: firm.firmId, name: firmName ?? '', role: firm.role },
  };
}
