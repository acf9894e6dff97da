import { join } from 'node:path';
import { dataFolder } from './clone.mjs';
import { firstFreePort } from './free-port.mjs';
import { keptSecret } from './secret.mjs';

const isLoopback = (host) => /^(localhost|127(\.\d+){3}|::1)$/.test(host);

/** Environment and arguments of the web process: what is given, the rest as README says. */
export async function webSettings(database, nodeEnv) {
  const host = process.env.HOST || '127.0.0.1';
  const port = process.env.PORT || String(await firstFreePort(4310, host));
  const demo = process.argv.includes('--demo') || (database.own && isLoopback(host));
  const env = {
    ...process.env,
    ...database.env,
    ...{ NODE_ENV: nodeEnv, HOST: host, PORT: port, STANCHION_DATA: dataFolder },
    SESSION_SECRET: process.env.SESSION_SECRET || keptSecret(join(dataFolder, 'session-secret')),
  };
  return { env, args: demo ? ['--demo'] : [] };
}
