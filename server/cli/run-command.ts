import { UsageError } from './usage-error.ts';

/** Wrong use and wrong input end with this. */
const WRONG_INPUT = 2;

/** Runs a command; wrong input prints its reasons to stderr and nothing to stdout. */
export async function runCommand(command: () => Promise<number>): Promise<void> {
  // Whoever reads may have seen enough (`| head`).
  process.stdout.on('error', (error: NodeJS.ErrnoException) => {
    if (error.code !== 'EPIPE') throw error;
  });
  try {
    process.exitCode = await command();
  } catch (error) {
    if (!(error instanceof UsageError) && !isArgumentError(error)) throw error;
    console.error((error as Error).message);
    process.exitCode = WRONG_INPUT;
  }
}

/** Unknown options, as node:util parseArgs reports them. */
const isArgumentError = (error: unknown): boolean =>
  error instanceof Error &&
  'code' in error &&
  typeof error.code === 'string' &&
  error.code.startsWith('ERR_PARSE_ARGS');
