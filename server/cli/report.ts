import { rename, rm, writeFile } from 'node:fs/promises';
import { basename } from 'node:path';
import { parseArgs } from 'node:util';
import { renderPdf } from '#server/pdf/render-pdf.ts';
import { fullTemplate } from '#server/runs/full-template.ts';
import { canonicalText } from '#shared/calc/hashes.ts';
import type { CalculationRecord } from '#shared/calc/record.ts';
import { assembleReport } from '#shared/report/assemble.ts';
import { type DocumentData, unsignedDocument } from '#shared/report/document-data.ts';
import { makeRecord } from './make-record.ts';
import { runCommand } from './run-command.ts';
import { UsageError } from './usage-error.ts';

const HELP = `npm run --silent report -- INPUT.json --out FILE.pdf

Writes the calculation as a PDF that is marked preliminary and carries its record.

  INPUT.json         the input file; - reads standard input (10 MB at most)
  --out FILE.pdf     where the PDF goes; a file there is replaced
  --project TITLE    title of the project
  --client NAME      for whom
  --number NUMBER    number of the calculation
  --title TITLE      its title; by default the name of the input file
  --revision TEXT    its revision
  --by NAME          who made it
  --paper letter|a4  by default letter for US units, a4 for SI
  --help             prints this

Exit code 0: the file is written. Exit code 2: the input is wrong; nothing is written.
`;

const text = { type: 'string' } as const;
const flag = { type: 'boolean', short: 'h' } as const;
const options = {
  ...{ out: text, project: text, client: text, number: text, title: text, revision: text },
  ...{ by: text, paper: text, help: flag },
} as const;
type Values = ReturnType<typeof parseArgs<{ options: typeof options }>>['values'];

const PAPERS: Readonly<Record<string, DocumentData['paper']>> = { letter: 'Letter', a4: 'A4' };

await runCommand(async () => {
  const { values, positionals } = parseArgs({ allowPositionals: true, options });
  const [path] = positionals;
  if (values.help) {
    process.stdout.write(HELP);
    return 0;
  }
  if (path === undefined || positionals.length > 1 || values.out === undefined)
    throw new UsageError(`one input file and --out are needed\n\n${HELP}`);
  if (values.paper !== undefined && !Object.hasOwn(PAPERS, values.paper.toLowerCase()))
    throw new UsageError(`--paper ${values.paper}: is neither letter nor a4`);
  const record = await makeRecord(path);
  const date = new Date();
  const document = documentOf(record, path, values, date);
  const tree = assembleReport({ template: fullTemplate(), record, document });
  await write(values.out, await renderPdf(tree, { date, record: canonicalText(record) }));
  return 0;
});

/** What the cover says: what the options give, and the day. */
function documentOf(
  record: CalculationRecord,
  path: string,
  values: Values,
  date: Date,
): DocumentData {
  const { project = '', client = '', number = '', revision = '', by = '', paper = '' } = values;
  const usual = record.units === 'us' ? 'Letter' : 'A4';
  const title = values.title ?? (path === '-' ? 'Calculation' : basename(path, '.json'));
  const words = date.toLocaleDateString('en-GB', {
    ...{ day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' },
  });
  const plain = unsignedDocument(title, words, PAPERS[paper.toLowerCase()] ?? usual);
  return {
    ...plain,
    project: { ...plain.project, title: project, client },
    calculation: { ...plain.calculation, number, revision },
    people: { ...plain.people, originator: by },
  };
}

/** A file is whole or not there: it is written beside its place and moved into it. */
async function write(path: string, bytes: Buffer): Promise<void> {
  const beside = `${path}.${process.pid}.part`;
  try {
    await writeFile(beside, bytes);
    await rename(beside, path);
  } catch (error) {
    await rm(beside, { force: true });
    throw new UsageError(`${path}: cannot be written (${(error as NodeJS.ErrnoException).code})`);
  }
}
