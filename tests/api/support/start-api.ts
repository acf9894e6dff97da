import { createServer, type Server } from 'node:http';
import { createApp } from '#server/app.ts';
import { type Deps, type DepsOptions, makeDeps } from '#server/deps.ts';
import type { Env } from '#server/env.ts';
import { cloneDatabase } from '#tests/support/database.ts';
import { type ApiClient, apiClient } from './api-client.ts';

export interface Api {
  readonly deps: Deps;
  readonly server: Server;
  readonly ownerUrl: string;
  client(): ApiClient;
  stop(): Promise<void>;
}

interface Options extends DepsOptions {
  readonly env?: Partial<Env>;
  readonly clientFolder?: string;
}

/** The API on a database of its own and a free port of this machine. */
export async function startApi({ env, clientFolder, ...options }: Options = {}): Promise<Api> {
  const database = await cloneDatabase();
  const deps = makeDeps(
    {
      ...{ host: '127.0.0.1', port: 0, production: false, loopback: true, logLevel: 'silent' },
      ...{ databaseUrl: database.webUrl, ownerUrl: database.ownerUrl },
      ...{ sessionSecret: 'only for tests, only for tests, only for tests' },
      ...{ publicOrigin: null, trustedProxies: 'loopback' },
      ...env,
    },
    options,
  );
  const server = createServer(createApp(deps, clientFolder));
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  return {
    ...{ deps, server, ownerUrl: database.ownerUrl },
    client: () => apiClient(server),
    stop: async () => {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
      await deps.close();
      await database.drop();
    },
  };
}
