import { uniqueViolation } from '#server/db/unique-violation.ts';
import { AppError } from './app-error.ts';

/** Runs a change; a number that something else already has becomes a problem of that field. */
export async function refuseTakenNumber<T>(
  index: string,
  message: string,
  change: Promise<T>,
): Promise<T> {
  try {
    return await change;
  } catch (error) {
    if (uniqueViolation(error) !== index) throw error;
    throw new AppError('invalid-request', { problems: [{ path: 'number', message }] });
  }
}
