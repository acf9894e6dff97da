import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { mustRun, say } from './run.mjs';

const waiting = ['-o', 'DPkg::Lock::Timeout=300'];
const keepingConfiguration = ['confold', 'confdef'].flatMap((way) => [
  '-o',
  `Dpkg::Options::=--force-${way}`,
]);

export const isRoot = () => process.getuid?.() === 0;

/** The place of a program on the search path, if it is there. */
export function findProgram(name) {
  const folders = [...(process.env.PATH ?? '').split(':'), '/usr/sbin', '/sbin'];
  return folders
    .filter(Boolean)
    .map((folder) => join(folder, name))
    .find((path) => existsSync(path));
}

/** Installs Debian packages; who isn't root is told what to install. */
export async function installDebian(names) {
  if (names.length === 0) return;
  if (!isRoot() || !findProgram('apt-get')) {
    throw new Error(`Please install first: ${names.join(', ')}. (As root on Debian this is done.)`);
  }
  say(`Installing Debian's ${names.join(', ')} …`);
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive', UCF_FORCE_CONFFOLD: '1' };
  const apt = (args) => mustRun('apt-get', ['-q', ...waiting, ...args], { env, quiet: true });
  await apt(['update']);
  await apt(['install', '-y', '--no-install-recommends', ...keepingConfiguration, ...names]);
}
