import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startCluster } from './cluster.mjs';
import { isRoot } from './debian.mjs';
import { asWebRole, ensureWebRole } from './roles.mjs';
import { keptSecret } from './secret.mjs';

/**
 * A PostgreSQL server for tests: the one that DATABASE_URL names (its role needs CREATEDB),
 * else one of a throw-away cluster. `env` holds TEST_DATABASE_URL (an owner that may create
 * databases) and, in our own cluster, TEST_WEB_DATABASE_URL (the web process's role).
 */
export async function openTestCluster() {
  const given = process.env.DATABASE_URL;
  if (given) return { env: { TEST_DATABASE_URL: given }, close: async () => {} };
  // The cluster's account must be able to enter the folder, which root's TMPDIR may forbid.
  const home = mkdtempSync(join(isRoot() ? '/tmp' : tmpdir(), 'stanchion-test-'));
  const remove = () => rmSync(home, { recursive: true, force: true });
  try {
    const cluster = await startCluster(home, { temporary: true });
    const password = keptSecret(join(home, 'web-password'));
    await ensureWebRole(cluster, password);
    const url = cluster.url('postgres');
    const env = { TEST_DATABASE_URL: url, TEST_WEB_DATABASE_URL: asWebRole(url, password) };
    const close = async () => {
      await cluster.stop();
      remove();
    };
    return { env, close };
  } catch (error) {
    remove();
    throw error;
  }
}
