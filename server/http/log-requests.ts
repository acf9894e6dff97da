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
    customProps: (_req, res) => ({
      route: (res as { locals?: { route?: string } }).locals?.route ?? 'unknown',
      status: res.statusCode,
    }),
    customLogLevel: (_req, res) => (res.statusCode >= 500 ? 'error' : 'info'),
  });
}
