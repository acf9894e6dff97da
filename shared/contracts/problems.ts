import { z } from 'zod';

/** Every way a request can be wrong, with its HTTP status and title (RFC 9457 problem details). */
export const problemKinds = {
  'invalid-request': { status: 400, title: 'The request is not valid' },
  'wrong-credentials': { status: 401, title: 'The e-mail address or the password is wrong' },
  'signed-out': { status: 401, title: 'You are signed out' },
  'not-permitted': { status: 403, title: 'Your role does not allow this' },
  'wrong-origin': { status: 403, title: 'The request does not come from this site' },
  'wrong-token': { status: 403, title: 'The page is out of date; load it again' },
  'not-found': { status: 404, title: 'Not found' },
  conflict: { status: 409, title: 'Someone else changed this in the meantime' },
  'too-large': { status: 413, title: 'The request is too large' },
  'wrong-media-type': { status: 415, title: 'The request is not JSON' },
  'invalid-input': { status: 422, title: 'The calculation has inputs that are not valid' },
  'too-many': { status: 429, title: 'Too many attempts' },
  failed: { status: 500, title: 'The server failed' },
} as const satisfies Record<string, { status: number; title: string }>;

export type ProblemCode = keyof typeof problemKinds;
const problemCodes = Object.keys(problemKinds) as [ProblemCode, ...ProblemCode[]];

/** One place in the request or the input that is wrong: a dotted path and the reason. */
export const problemPlace = z.object({ path: z.string(), message: z.string() });
export type ProblemPlace = z.infer<typeof problemPlace>;

/** What stands in a conflict: the stored version, who saved it and when. */
export const conflictDetail = z.object({
  theirs: z.unknown(),
  changedBy: z.string(),
  changedAt: z.iso.datetime(),
});
export type ConflictDetail = z.infer<typeof conflictDetail>;

/** The body of every answer that is not a 2xx, sent as application/problem+json. */
export const problemDetails = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  code: z.enum(problemCodes),
  detail: z.string().optional(),
  problems: z.array(problemPlace).optional(),
  conflict: conflictDetail.optional(),
  /** Seconds until the next attempt is worth making. */
  retryAfter: z.number().optional(),
});
export type ProblemDetails = z.infer<typeof problemDetails>;
