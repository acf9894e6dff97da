import { parseArgs } from 'node:util';
import { NotAPdf } from '#server/verify/pages/read-pdf.ts';
import { verifyPdf } from '#server/verify/verify-pdf.ts';
import { NotARecord } from '#server/verify/verify-record.ts';
import { printVerification } from './print-verification.ts';
import { readBytes } from './read-file.ts';
import { runCommand } from './run-command.ts';
import { UsageError } from './usage-error.ts';

const HELP = `npm run --silent verify -- FILE.pdf

Reproduces a calculation from the record its PDF carries: hashes, each line by a second
evaluator, choices, checks and verdicts, look-ups against the shipped tables, the run
again from the input, and the numbers visible on the pages. Heads of sections are not
counted as lines: they hold nothing to reproduce.

  FILE.pdf   the file; - reads standard input (200 MB at most)
  --help     prints this

Exit code 0: all lines are reproduced. Exit code 1: something is not, and is named.
Exit code 2: the file is no PDF, or carries no record.
`;

const MOST = 200 * 1024 * 1024;

await runCommand(async () => {
  const { values, positionals } = parseArgs({
    allowPositionals: true,
    options: { help: { type: 'boolean', short: 'h' } },
  });
  const [path] = positionals;
  if (values.help) {
    process.stdout.write(HELP);
    return 0;
  }
  if (path === undefined || positionals.length > 1)
    throw new UsageError(`one PDF file is needed\n\n${HELP}`);
  try {
    const verification = await verifyPdf(await readBytes(path, MOST));
    process.stdout.write(printVerification(verification));
    return verification.problems.length === 0 ? 0 : 1;
  } catch (error) {
    if (error instanceof NotAPdf) throw new UsageError(`${path}: is not a PDF: ${error.message}`);
    if (error instanceof NotARecord)
      throw new UsageError(`${path}: carries no record: ${error.message}`);
    if (error instanceof UsageError) throw new UsageError(`${path}: ${error.message}`);
    throw error;
  }
});
