import { DrizzleQueryError } from 'drizzle-orm/errors';

interface LoggedError {
  readonly type: string;
  readonly message?: string;
  readonly code?: unknown;
  readonly query?: string;
  /** Where it was thrown. */
  readonly at?: readonly string[];
  readonly cause?: LoggedError;
}

/**
 * What the log keeps of an error. The values of a query are people's data and secrets: neither they
 * nor PostgreSQL's detail, which repeats them, are kept; the database's message names no values.
 */
export function loggedError(error: unknown): LoggedError {
  if (!(error instanceof Error)) return { type: typeof error };
  const ofQuery = error instanceof DrizzleQueryError;
  const { code } = error as { code?: unknown };
  const frames = error.stack?.split('\n').filter((line) => line.startsWith('    at ')) ?? [];
  return {
    type: error.constructor.name,
    ...(ofQuery ? { query: error.query } : { message: error.message }),
    ...(code === undefined ? {} : { code }),
    at: frames.map((line) => line.trim()),
    ...(error.cause ? { cause: loggedError(error.cause) } : {}),
  };
}
