import { parseArgs } from 'node:util';
import { inputJsonSchema } from '#shared/members/input.ts';
import { makeRecord } from './make-record.ts';
import { runCommand } from './run-command.ts';
import { UsageError } from './usage-error.ts';

const HELP = `npm run --silent calc -- INPUT.json

Prints the record of a calculation as JSON: for each member its lines, for each
combination its lines, verdicts with what governs, engine version and hashes.

  INPUT.json   the input file; - reads standard input (10 MB at most)
  --schema     prints the JSON Schema of INPUT.json
  --help       prints this

Exit code 0: a record was made, whatever its verdicts.
Exit code 2: the input is wrong; stderr lists each place and reason.
`;

await runCommand(async () => {
  const { values, positionals } = parseArgs({
    allowPositionals: true,
    options: { schema: { type: 'boolean' }, help: { type: 'boolean', short: 'h' } },
  });
  const [path] = positionals;
  if (values.help) process.stdout.write(HELP);
  else if (values.schema) process.stdout.write(`${JSON.stringify(inputJsonSchema(), null, 2)}\n`);
  else if (path === undefined || positionals.length > 1)
    throw new UsageError(`one input file is needed\n\n${HELP}`);
  else process.stdout.write(`${JSON.stringify(await makeRecord(path), null, 2)}\n`);
  return 0;
});
