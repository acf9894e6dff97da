import type { Request, Response, Router } from 'express';
import { z } from 'zod';
import type { Auth } from '#server/auth/auth.ts';
import { changes, requireCsrfToken } from '#server/auth/csrf.ts';
import type { Deps } from '#server/deps.ts';
import type { Contract } from '#shared/contracts/contract.ts';
import { AppError, notFound } from './app-error.ts';
import type { Context, FileContent, Handler } from './handler.ts';
import { resolveScope } from './resolve-scope.ts';
import { sendFile } from './send-file.ts';

/**
 * Binds a contract to its handler. In order: who is it, does the request come from our page, may
 * they do this here, is the body well-formed, do it, is the answer what the contract says.
 */
export function serve(
  router: Router,
  deps: Deps,
  auth: Auth,
  contract: Contract,
  handler: Handler<Contract>,
): void {
  const method = contract.method.toLowerCase() as 'get' | 'post' | 'put' | 'delete';
  router[method](contract.path, async (req, res) => {
    res.locals.route = `${contract.method} ${contract.path}`;
    const context = await contextOf(deps, auth, contract, req, res);
    const work = async (): Promise<unknown> => handler(context);
    const permitted = contract.access.who === 'permitted' ? req.user : null;
    const answer =
      permitted && changes(req) ? await deps.takeTurn(permitted.userId, work) : await work();
    if ('file' in contract.answer) sendFile(res, contract.answer, answer as FileContent);
    else res.json(contract.answer.parse(answer));
  });
}

async function contextOf(
  deps: Deps,
  auth: Auth,
  contract: Contract,
  req: Request,
  res: Response,
): Promise<Context> {
  const { access } = contract;
  const viewer = req.user ?? null;
  if (access.who !== 'anyone' && !viewer) throw new AppError('signed-out');
  if (changes(req)) requireCsrfToken(deps.env, req);
  const params = contract.params.safeParse(req.params);
  if (!params.success) throw notFound();
  const scope =
    access.who === 'permitted' && viewer
      ? await resolveScope(deps.db, viewer, access.permission, req.params as Record<string, string>)
      : null;
  const body = contract.body && parseBody(contract.body, req);
  // The types of a contract's context follow from the contract; here it is any of them.
  return { deps, auth, req, res, viewer, scope, body, params: params.data } as Context;
}

function parseBody(schema: z.ZodType, req: Request): unknown {
  if (!req.is('application/json')) throw new AppError('wrong-media-type');
  const parsed = schema.safeParse(req.body);
  if (parsed.success) return parsed.data;
  const problems = parsed.error.issues.map(({ path, message }) => ({
    path: z.core.toDotPath(path),
    message,
  }));
  throw new AppError('invalid-request', { problems });
}
