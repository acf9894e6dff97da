import type { ServerResponse } from 'node:http';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';

/**
 * One line per request of the API: method and route as the contract writes it, status, time. No
 * addresses, headers, bodies, names or tokens.
 */
export function logRequests(log: Logger) {
  return pinoHttp({
    logger: log,
    autoLogging: { ignore: (req) => !req.url?.startsWith('/api/') },
    serializers: { req: () => undefined, res: () => undefined, err: () => undefined },
    quietReqLogger: true,
    customSuccessObject: (_req, res, logged) => ({ ...logged, ...told(res) }),
    customErrorObject: (_req, res, _error, logged) => ({ ...logged, ...told(res) }),
    customLogLevel: (_req, res) => (res.statusCode >= 500 ? 'error' : 'info'),
  });
}

const told = (res: ServerResponse & { locals?: { route?: string } }) => ({
  route: res.locals?.route ?? 'unknown',
  status: res.statusCode,
});
