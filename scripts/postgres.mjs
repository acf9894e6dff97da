import { existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { findProgram, installDebian, isRoot } from './debian.mjs';

const debianFolder = '/usr/lib/postgresql';
const clusterDefaults = '/etc/postgresql-common/createcluster.conf';

function newestDebianBin() {
  if (!existsSync(debianFolder)) return undefined;
  return readdirSync(debianFolder)
    .sort((a, b) => Number(b) - Number(a))
    .map((version) => join(debianFolder, version, 'bin'))
    .find((folder) => existsSync(join(folder, 'initdb')));
}

function findBin() {
  const program = findProgram('initdb');
  return newestDebianBin() ?? (program && dirname(program));
}

/** Keeps Debian's package from making and starting a cluster of its own. */
function declineMainCluster() {
  const before = existsSync(clusterDefaults) ? readFileSync(clusterDefaults, 'utf8') : '';
  const others = before.split('\n').filter((line) => !/^\s*create_main_cluster\b/.test(line));
  mkdirSync(dirname(clusterDefaults), { recursive: true });
  writeFileSync(clusterDefaults, `${others.join('\n').trimEnd()}\ncreate_main_cluster = false\n`);
}

/**
 * The folder of PostgreSQL's programs, installed when absent.
 * A cluster of an earlier major version is served by that version.
 */
export async function ensurePostgres(clusterFolder) {
  if (!findBin()) {
    if (isRoot()) declineMainCluster();
    await installDebian(['postgresql']);
  }
  const versionFile = join(clusterFolder, 'PG_VERSION');
  const bin = findBin();
  if (!bin) throw new Error("PostgreSQL is installed, but its initdb can't be found.");
  if (!existsSync(versionFile)) return bin;
  const ownVersion = join(debianFolder, readFileSync(versionFile, 'utf8').trim(), 'bin');
  return existsSync(join(ownVersion, 'postgres')) ? ownVersion : bin;
}
