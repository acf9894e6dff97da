import { spawn } from 'node:child_process';
import { cloneFolder } from './clone.mjs';

const active = new Set();
let passing = false;
let interrupted = false;

/** One line for the person at the terminal. */
export const say = (text) => process.stdout.write(`${text}\n`);

export const wasInterrupted = () => interrupted;

// The command and all that it started.
function endGroup({ pid }) {
  try {
    process.kill(-pid, 'SIGTERM');
  } catch {
    // It has ended by itself.
  }
}

/** From now on a signal ends the running command, not this process, so that it can tidy up. */
export function passSignalsOn() {
  passing = true;
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, () => {
      interrupted = true;
      active.forEach(endGroup);
    });
  }
}

/**
 * Runs a command to its end and gives its exit code; 127 when it can't be started.
 * Its output is shown, or with `quiet` kept and given back.
 */
export function run(command, args, { cwd = cloneFolder, env = process.env, input, quiet } = {}) {
  const output = quiet ? 'pipe' : 'inherit';
  const stdin = input === undefined ? 'ignore' : 'pipe';
  return new Promise((resolve) => {
    const stdio = [stdin, output, output];
    const child = spawn(command, args, { cwd, env, stdio, detached: passing });
    let text = '';
    active.add(child);
    const end = (code) => {
      active.delete(child);
      resolve({ code, output: text });
    };
    child.on('error', (error) => {
      text += error.message;
      end(127);
    });
    child.on('close', (code) => end(code ?? 1));
    child.stdout?.setEncoding('utf8').on('data', (chunk) => {
      text += chunk;
    });
    child.stderr?.setEncoding('utf8').on('data', (chunk) => {
      text += chunk;
    });
    child.stdin?.on('error', () => {});
    child.stdin?.end(input);
  });
}

/** Runs a command that has to succeed; gives what it printed when `quiet`. */
export async function mustRun(command, args, options) {
  const { code, output } = await run(command, args, options);
  if (code === 0) return output;
  const reason = output.trim();
  throw new Error(`${command} ${args.join(' ')} ended with ${code}${reason && `:\n${reason}`}`);
}

/** Runs a script's main part; an error ends it with its message and exit code 1. */
export async function main(work) {
  try {
    process.exitCode = (await work()) ?? 0;
  } catch (error) {
    process.stderr.write(`${error.message}\n`);
    process.exitCode = 1;
  }
}
