import {
  type ConflictDetail,
  type ProblemCode,
  type ProblemDetails,
  type ProblemPlace,
  problemKinds,
} from '#shared/contracts/problems.ts';

interface ErrorDetail {
  readonly detail?: string;
  readonly problems?: ProblemPlace[];
  readonly conflict?: ConflictDetail;
  readonly retryAfter?: number;
}

/** A request that is wrong, by its code; anything else that is thrown is a fault of ours. */
export class AppError extends Error {
  readonly code: ProblemCode;
  readonly more: ErrorDetail;

  constructor(code: ProblemCode, more: ErrorDetail = {}) {
    super(more.detail ?? problemKinds[code].title);
    this.name = 'AppError';
    this.code = code;
    this.more = more;
  }
}

export const notFound = () => new AppError('not-found');

/** The answer's body for an error (RFC 9457). */
export function problemDetailsOf(error: AppError): ProblemDetails {
  const { status, title } = problemKinds[error.code];
  return {
    type: `/problems/${error.code}`,
    title,
    status,
    code: error.code,
    ...error.more,
  };
}
