import express, { type Express, Router } from 'express';
import type { Contract } from '#shared/contracts/contract.ts';
import { type RouteName, routeTable } from '#shared/contracts/route-table.ts';
import { makeAuth } from './auth/auth.ts';
import { requireSameOrigin } from './auth/csrf.ts';
import type { Deps } from './deps.ts';
import { accountHandlers } from './features/account/routes.ts';
import { calculationHandlers } from './features/calculations/routes.ts';
import { deskHandlers } from './features/desk/routes.ts';
import { healthHandlers } from './features/health/routes.ts';
import { libraryHandlers } from './features/library/routes.ts';
import { severalMemberHandlers } from './features/members/change-several.ts';
import { memberHandlers } from './features/members/routes.ts';
import { projectHandlers } from './features/projects/routes.ts';
import { reportHandlers } from './features/reports/routes.ts';
import { notFound } from './http/app-error.ts';
import { handleErrors } from './http/handle-errors.ts';
import type { Handler } from './http/handler.ts';
import { logRequests } from './http/log-requests.ts';
import { securityHeaders } from './http/security-headers.ts';
import { serve } from './http/serve.ts';
import { serveClient } from './http/serve-client.ts';

const handlers = {
  ...healthHandlers,
  ...accountHandlers,
  ...deskHandlers,
  ...projectHandlers,
  ...calculationHandlers,
  ...memberHandlers,
  ...severalMemberHandlers,
  ...reportHandlers,
  ...libraryHandlers,
} satisfies { [Name in RouteName]: Handler<(typeof routeTable)[Name]> };

/** The longest body: a member with 500 combinations, every value with its source. */
const bodyLimit = '2mb';

/** The whole application: API, and the built client where `clientFolder` names it. */
export function createApp(deps: Deps, clientFolder?: string): Express {
  const auth = makeAuth(deps);
  const api = Router();
  for (const name of Object.keys(routeTable) as RouteName[]) {
    // Which handler belongs to which contract is proven where `handlers` is declared.
    serve(api, deps, auth, routeTable[name] as Contract, handlers[name] as Handler<Contract>);
  }
  const app = express();
  app.disable('x-powered-by');
  app.disable('etag');
  app.set('trust proxy', deps.env.trustedProxies);
  app.use(logRequests(deps.log));
  app.use(securityHeaders());
  app.use('/api', (_req, res, next) => {
    res.set('Cache-Control', 'no-store');
    next();
  });
  app.use('/api', requireSameOrigin(deps.env));
  app.use('/api', ...auth.middleware);
  app.use('/api', express.json({ limit: bodyLimit }));
  app.use(api);
  app.use('/api', () => {
    throw notFound();
  });
  if (clientFolder) app.use(serveClient(clientFolder));
  app.use(() => {
    throw notFound();
  });
  app.use(handleErrors(deps.log));
  return app;
}
