import type { ErrorRequestHandler } from 'express';
import type { Logger } from 'pino';
import { AppError, problemDetailsOf } from './app-error.ts';

/** What Express and its body parser throw, as an error of ours. */
function known(error: unknown): AppError | null {
  if (error instanceof AppError) return error;
  const { type, status } = (error ?? {}) as { type?: unknown; status?: unknown };
  if (type === 'entity.too.large') return new AppError('too-large');
  if (type === 'entity.parse.failed') {
    return new AppError('invalid-request', { detail: 'The body is not JSON.' });
  }
  const unsupported = ['charset.unsupported', 'encoding.unsupported'];
  if (unsupported.includes(String(type))) return new AppError('wrong-media-type');
  if (error instanceof URIError) return new AppError('not-found');
  if (typeof status === 'number' && status >= 400 && status < 500) {
    return new AppError('invalid-request', { detail: 'The body cannot be read.' });
  }
  return null;
}

const isAbort = (thrown: unknown) => thrown instanceof DOMException && thrown.name === 'AbortError';

/** Answers every error as problem details; what we do not know is logged and told as a failure. */
export function handleErrors(log: Logger): ErrorRequestHandler {
  return (thrown: unknown, _req, res, next) => {
    const error = known(thrown) ?? new AppError('failed');
    // Whoever asked has gone, and nobody waits for an answer.
    if (res.closed && isAbort(thrown)) return;
    if (error.code === 'failed') log.error({ err: thrown, route: res.locals.route }, 'failed');
    if (res.headersSent) return next(thrown);
    const body = problemDetailsOf(error);
    if (body.retryAfter !== undefined) res.set('Retry-After', String(body.retryAfter));
    res.status(body.status).type('application/problem+json').send(JSON.stringify(body));
  };
}
