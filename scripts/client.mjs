import { installed } from './clone.mjs';
import { fingerprint, isStamped, putStamp } from './fingerprint.mjs';
import { run, say } from './run.mjs';

// Every build empties the folder first: only a whole one carries the stamp.
const stamp = 'dist/client/.fingerprint';
const sources = [
  ...['src', 'shared', 'templates', 'fonts', 'public'],
  ...['index.html', 'vite.config.ts', 'tsconfig.json', 'package.json', 'package-lock.json'],
];

/** Builds the client; gives the exit code. */
export async function buildClient() {
  const print = fingerprint(sources);
  const { code } = await run(installed('vite'), ['build', '--logLevel', 'warn']);
  if (code === 0) putStamp(stamp, print);
  return code;
}

/** Builds the client unless the built one is of these sources. */
export async function ensureClient() {
  if (isStamped(stamp, fingerprint(sources))) return;
  say('Building the client …');
  if ((await buildClient()) !== 0) throw new Error("The client couldn't be built.");
}
