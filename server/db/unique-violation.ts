/** The name of the unique index or constraint that an error says is violated, or null. */
export function uniqueViolation(error: unknown): string | null {
  const cause = error instanceof Error && error.cause ? error.cause : error;
  if (typeof cause !== 'object' || cause === null) return null;
  const { code, constraint } = cause as { code?: unknown; constraint?: unknown };
  return code === '23505' && typeof constraint === 'string' ? constraint : null;
}
