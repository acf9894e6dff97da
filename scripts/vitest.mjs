import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { installed } from './clone.mjs';
import { run } from './run.mjs';
import { countTests } from './test-count.mjs';

function readReport(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return undefined;
  }
}

/** Runs the tests, all or those whose path holds one of the filters; counts what passed. */
export async function runVitest(filters, environment) {
  const folder = mkdtempSync(join(tmpdir(), 'stanchion-report-'));
  const file = join(folder, 'report.json');
  // The application's own settings are none of the tests' business.
  const { DATABASE_URL, DATABASE_OWNER_URL, HOST, PORT, SESSION_SECRET, ...rest } = process.env;
  const env = { ...rest, ...environment, NODE_ENV: 'test', STANCHION_DATA: join(folder, 'data') };
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${file}`];
  const { code } = await run(installed('vitest'), ['run', ...reporters, ...filters], { env });
  const count = countTests(readReport(file), code);
  rmSync(folder, { recursive: true, force: true });
  return count;
}
