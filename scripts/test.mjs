import { buildClient, ensureClient } from './client.mjs';
import { installed } from './clone.mjs';
import { findProgram, installDebian } from './debian.mjs';
import { ensurePackages } from './packages.mjs';
import { main, passSignalsOn, run, say, wasInterrupted } from './run.mjs';
import { openTestCluster } from './test-cluster.mjs';
import { runVitest } from './vitest.mjs';

// Programs that the tests read their products with, and Debian's packages that bring them.
const programs = { pdftotext: 'poppler-utils', qpdf: 'qpdf' };
if (!process.env.CHROMIUM) programs.chromium = 'chromium';

const steps = [
  ['types', () => run(installed('tsc'), [])],
  ['lint', () => run(installed('biome'), ['ci', '.'])],
  ['build', async () => ({ code: await buildClient() })],
];

async function setUp() {
  await ensurePackages();
  const absent = Object.keys(programs).filter((program) => !findProgram(program));
  await installDebian(absent.map((program) => programs[program]));
}

async function runTests(filters) {
  const cluster = await openTestCluster();
  try {
    const chromium = process.env.CHROMIUM || findProgram('chromium');
    return await runVitest(filters, { ...cluster.env, CHROMIUM: chromium });
  } finally {
    await cluster.close();
  }
}

/** Runs one part; an error in it is one failure with its message. */
async function count(name, work) {
  say(`\n── ${name}`);
  try {
    return { name, ...(await work()) };
  } catch (error) {
    return { name, passed: 0, failed: 1, reasons: [error.message] };
  }
}

async function countCommand([name, work]) {
  return await count(name, async () => {
    const { code } = await work();
    return { passed: Number(code === 0), failed: Number(code !== 0), reasons: [] };
  });
}

function summarise(results) {
  say('');
  for (const { name, passed, failed, reasons } of results) {
    say(`${name}: ${passed} passed, ${failed} failed`);
    for (const reason of reasons) say(`  ${reason}`);
  }
  const total = (key) => results.reduce((sum, result) => sum + result[key], 0);
  say(`${total('passed')} passed, ${total('failed')} failed`);
  return total('failed') === 0 && total('passed') > 0 ? 0 : 1;
}

// Everything always runs, so that one run shows all that is wrong.
// `npm test -- WORD…` runs only the tests whose path holds one of the words.
await main(async () => {
  const filters = process.argv.slice(2);
  const ready = await count('set-up', async () => {
    await setUp();
    if (filters.length > 0) await ensureClient();
    return { passed: 1, failed: 0 };
  });
  if (ready.failed > 0) return summarise([ready]);
  passSignalsOn();
  const results = [];
  for (const step of filters.length > 0 ? [] : steps) {
    if (!wasInterrupted()) results.push(await countCommand(step));
  }
  if (!wasInterrupted()) results.push(await count('tests', () => runTests(filters)));
  const code = summarise(results);
  return wasInterrupted() ? 1 : code;
});
