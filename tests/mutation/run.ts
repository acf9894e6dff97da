import { type ChildProcess, fork } from 'node:child_process';
import { writeFileSync } from 'node:fs';
import { availableParallelism } from 'node:os';
import { parseArgs } from 'node:util';
import { printResult, type Result } from './print-result.ts';
import type { Mutant } from './switchboard.ts';
import type { Outcome } from './worker.ts';

/*
 * npm run mutate -- [WORD] [--workers N] [--tests PATTERN] [--out FILE]: changes the books one step at a
 * time and runs the tests that compare with publications and with working by hand. README.md beside
 * this file says what is changed and how.
 */
const {
  values: { workers, tests: testWord = '', out },
  positionals: [word = ''],
} = parseArgs({
  allowPositionals: true,
  options: { workers: { type: 'string' }, tests: { type: 'string' }, out: { type: 'string' } },
});

interface Ready {
  readonly mutants: readonly Mutant[];
  readonly failing: readonly string[];
  readonly tests: number;
}

/** A run that takes longer has no end: the mutant counts as found. */
const LONGEST_MS = 300_000;

const results = new Map<string, Result>();
let waiting: Mutant[] | null = null;
let ready: Ready | null = null;

/** Runs mutants in a process of its own until none waits; again in another where one has no end. */
function work(): Promise<void> {
  return new Promise((resolve, reject) => {
    const child = fork(new URL('./worker.ts', import.meta.url), [testWord]);
    let current: Mutant | null = null;
    let timer: NodeJS.Timeout | undefined;
    const next = () => {
      clearTimeout(timer);
      current = waiting?.shift() ?? null;
      if (!current) return end(child, resolve);
      child.send(current.id);
      timer = setTimeout(() => {
        if (current) results.set(current.id, { ...current, killer: 'has no end', seen: 1 });
        current = null;
        child.removeAllListeners('exit');
        child.once('exit', () => work().then(resolve, reject));
        child.kill('SIGKILL');
      }, LONGEST_MS);
    };
    child.on('message', (message: Ready | Outcome) => {
      if ('mutants' in message) begin(message);
      else if (current) results.set(current.id, { ...current, ...message });
      if (results.size > 0 && results.size % 100 === 0)
        process.stderr.write(`${results.size} mutants run\n`);
      next();
    });
    child.on('exit', () => reject(new Error(`the process ended at ${current?.id ?? 'its start'}`)));
  });
}

function end(child: ChildProcess, resolve: () => void): void {
  child.removeAllListeners('exit');
  child.once('exit', () => resolve());
  child.kill();
}

function begin(message: Ready): void {
  ready ??= message;
  waiting ??= message.mutants.filter(({ id }) => id.includes(word));
}

const processes = Math.max(1, Number(workers ?? availableParallelism()));
await Promise.all(Array.from({ length: processes }, work));
if (!ready) throw new Error('no process began');
const all = [...results.values()];
if (out) writeFileSync(out, `${JSON.stringify(all, null, 1)}\n`);
printResult(all, ready);
