import { chownSync } from 'node:fs';
import { isRoot } from './debian.mjs';
import { mustRun, run } from './run.mjs';

// PostgreSQL refuses to run as root: then its own system user runs it.
const account = 'postgres';
const env = { ...process.env, LC_ALL: 'C.UTF-8' };

/** Runs one of PostgreSQL's own programs as the account that owns the cluster. */
export function runAsCluster(command, args) {
  const options = { cwd: '/', env, quiet: true };
  if (!isRoot()) return run(command, args, options);
  return run('runuser', ['-u', account, '--', command, ...args], options);
}

/** Hands files to the account that owns the cluster. */
export async function giveToCluster(...paths) {
  if (!isRoot()) return;
  const id = async (flag) => Number(await mustRun('id', [flag, account], { quiet: true }));
  const [user, group] = [await id('-u'), await id('-g')];
  for (const path of paths) chownSync(path, user, group);
}
