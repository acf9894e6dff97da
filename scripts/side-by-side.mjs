import { spawn } from 'node:child_process';
import { cloneFolder } from './clone.mjs';
import { wasInterrupted } from './run.mjs';

const patience = 10_000;

/** Starts a long-running process out of the terminal's reach: only we send it signals. */
function launch({ command, args, env }) {
  const stdio = ['ignore', 'inherit', 'inherit'];
  const child = spawn(command, args, { cwd: cloneFolder, env, stdio, detached: true });
  const ended = new Promise((resolve) => {
    child.once('error', () => resolve(127));
    child.once('exit', (code) => resolve(code ?? 1));
  });
  return { child, ended };
}

/**
 * Runs processes until a signal comes or one of them ends; then ends them all.
 * Gives the exit code: 0 after a signal, else that of the process that ended first.
 */
export async function runSideBySide(commands) {
  if (wasInterrupted()) return 0;
  const processes = commands.map(launch);
  const signalled = new Promise((resolve) => {
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => resolve(0));
  });
  const code = await Promise.race([signalled, ...processes.map(({ ended }) => ended)]);
  for (const { child } of processes) child.kill('SIGTERM');
  const timer = setTimeout(() => {
    for (const { child } of processes) child.kill('SIGKILL');
  }, patience);
  await Promise.all(processes.map(({ ended }) => ended));
  clearTimeout(timer);
  return code;
}
