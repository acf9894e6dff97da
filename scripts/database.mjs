import { createHash } from 'node:crypto';
import { join } from 'node:path';
import { cloneFolder, dataFolder } from './clone.mjs';
import { startCluster } from './cluster.mjs';
import { isRoot } from './debian.mjs';
import { asWebRole, ensureDatabase, ensureWebRole } from './roles.mjs';
import { keptSecret } from './secret.mjs';

const name = 'stanchion';

// As root the cluster's account couldn't enter a clone below a closed home folder.
function clusterHome() {
  if (!isRoot()) return dataFolder;
  const clone = createHash('sha256').update(cloneFolder).digest('hex').slice(0, 12);
  return join('/var/lib', `stanchion-${clone}`);
}

/**
 * The application's database: the one that DATABASE_URL names, else one in a cluster of our own.
 * `env` holds DATABASE_URL (the web process) and DATABASE_OWNER_URL (migrations).
 */
export async function openDatabase() {
  const { DATABASE_URL: given, DATABASE_OWNER_URL: givenOwner = given } = process.env;
  if (given) {
    const env = { DATABASE_URL: given, DATABASE_OWNER_URL: givenOwner };
    return { env, own: false, stop: async () => {} };
  }
  const home = clusterHome();
  const cluster = await startCluster(home);
  try {
    const password = keptSecret(join(home, 'web-password'));
    await ensureWebRole(cluster, password);
    await ensureDatabase(cluster, name);
    const ownerUrl = cluster.url(name);
    const env = { DATABASE_URL: asWebRole(ownerUrl, password), DATABASE_OWNER_URL: ownerUrl };
    return { env, own: true, stop: cluster.stop };
  } catch (error) {
    await cluster.stop();
    throw error;
  }
}
