import {
  type ProblemCode,
  type ProblemDetails,
  problemDetails,
} from '#shared/contracts/problems.ts';

/** A request that was answered with a problem, or, `unreachable`, not answered at all. */
export class Problem extends Error {
  readonly code: ProblemCode | 'unreachable';
  readonly details: ProblemDetails | null;

  constructor(code: ProblemCode | 'unreachable', message: string, details: ProblemDetails | null) {
    super(message);
    this.name = 'Problem';
    this.code = code;
    this.details = details;
  }
}

export const isProblem = (error: unknown, code?: Problem['code']): error is Problem =>
  error instanceof Problem && (code === undefined || error.code === code);

export const unreachable = () =>
  new Problem(
    'unreachable',
    'The server cannot be reached. Check the connection and try again.',
    null,
  );

/** Reads an answer that is not a 2xx. */
export async function problemOf(response: Response): Promise<Problem> {
  const body: unknown = await response.json().catch(() => null);
  const read = problemDetails.safeParse(body);
  if (!read.success) {
    return new Problem('failed', `The server answered ${response.status}. Try again.`, null);
  }
  const { code, title, detail } = read.data;
  return new Problem(code, detail ?? title, read.data);
}

/** What a person can read of any error. */
export function reasonOf(error: unknown): string {
  if (!(error instanceof Problem)) return 'Something in this page failed. Load it again.';
  const places = error.code === 'invalid-request' ? (error.details?.problems ?? []) : [];
  if (places.length > 0) return places.map(({ message }) => asSentence(message)).join(' ');
  const wait = error.details?.retryAfter;
  if (wait === undefined) return sentence(error.message);
  return `${sentence(error.message)} Try again in ${waitingTime(wait)}.`;
}

/** Why one field of a request is refused, where the answer names it. */
export const refusalOf = (error: unknown, path: string): string | undefined => {
  const found = isProblem(error) && error.details?.problems?.find((place) => place.path === path);
  return found ? asSentence(found.message) : undefined;
};

const asSentence = (text: string) => sentence(text.charAt(0).toUpperCase() + text.slice(1));

const sentence = (text: string) => (/[.!?]$/.test(text) ? text : `${text}.`);

const waitingTime = (seconds: number) =>
  seconds < 90 ? `${Math.ceil(seconds)} s` : `${Math.ceil(seconds / 60)} minutes`;
