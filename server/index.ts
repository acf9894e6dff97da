import { createServer } from 'node:http';
import { fileURLToPath } from 'node:url';
import { createApp } from './app.ts';
import { migrate } from './db/migrate.ts';
import { seedDemo } from './demo/seed-demo.ts';
import { makeDeps } from './deps.ts';
import { parseEnv } from './env.ts';
import { refreshSummaries } from './features/members/refresh-summaries.ts';

const clientFolder = fileURLToPath(new URL('../dist/client', import.meta.url));

const env = parseEnv(process.env);
const demo = process.argv.includes('--demo');
await migrate(env.ownerUrl, new URL(env.databaseUrl).username);
const deps = makeDeps(env, { demo });
if (demo) await seedDemo(deps);
await refreshSummaries(deps);

const server = createServer(createApp(deps, clientFolder));
server.on('error', (error: NodeJS.ErrnoException) => {
  const words: Record<string, string> = {
    EADDRINUSE: 'is in use; set PORT to another one',
    EACCES: 'may not be used by this user; set PORT to one above 1023',
    EADDRNOTAVAIL: `is not an address of this machine: HOST is ${env.host}`,
  };
  const known = words[error.code ?? ''];
  if (!known) throw error;
  process.stderr.write(`Port ${env.port} ${known}.\n`);
  void deps.close().then(() => process.exit(1));
});
server.listen(env.port, env.host, () => {
  const address = server.address();
  const port = typeof address === 'object' && address ? address.port : env.port;
  const host = env.host.includes(':') ? `[${env.host}]` : env.host;
  process.stdout.write(`Stanchion serves on http://${host}:${port}\n`);
});

let stopping = false;
function stop() {
  if (stopping) return;
  stopping = true;
  server.close(() => {
    deps.close().then(() => process.exit(0));
  });
  server.closeIdleConnections();
  // Whoever still waits for an answer gets a few seconds.
  setTimeout(() => server.closeAllConnections(), 5_000).unref();
}
process.on('SIGINT', stop);
process.on('SIGTERM', stop);
