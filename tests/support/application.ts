import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { cloneDatabase } from './database.ts';

export interface Application {
  /** Such as http://127.0.0.1:40123. */
  readonly origin: string;
  readonly ownerUrl: string;
  stop(): Promise<void>;
}

const patience = 60_000;

/** The address that the web process prints when it serves. Rejects with its output otherwise. */
function servedOrigin(web: ChildProcess): Promise<string> {
  return new Promise((resolve, reject) => {
    let output = '';
    const fail = (why: string) => reject(new Error(`The web process ${why}.\n${output}`));
    const timer = setTimeout(() => fail('does not serve'), patience);
    const read = (chunk: Buffer) => {
      output += chunk.toString();
      const origin = /^Stanchion serves on (\S+)/m.exec(output)?.[1];
      if (!origin) return;
      clearTimeout(timer);
      resolve(origin);
    };
    web.stdout?.on('data', read);
    web.stderr?.on('data', read);
    web.once('exit', (code) => {
      clearTimeout(timer);
      fail(`ended with ${code}`);
    });
  });
}

/** The built application, served by a process of its own on a free port and a fresh database. */
export async function serveApplication({ demo = true } = {}): Promise<Application> {
  const database = await cloneDatabase();
  const folder = await mkdtemp(join(tmpdir(), 'stanchion-application-'));
  const env = {
    ...process.env,
    ...{ NODE_ENV: 'production', HOST: '127.0.0.1', PORT: '0', LOG_LEVEL: 'warn' },
    ...{ DATABASE_URL: database.webUrl, DATABASE_OWNER_URL: database.ownerUrl },
    ...{ SESSION_SECRET: 'only for tests, only for tests, only for tests', STANCHION_DATA: folder },
  };
  const args = ['--import', 'tsx', 'server/index.ts', ...(demo ? ['--demo'] : [])];
  const web = spawn(process.execPath, args, { env, stdio: ['ignore', 'pipe', 'pipe'] });
  const ended = new Promise((resolve) => web.once('close', resolve));
  const killWeb = () => web.kill('SIGKILL');
  process.once('exit', killWeb);
  const stop = async () => {
    web.kill('SIGTERM');
    await ended;
    process.removeListener('exit', killWeb);
    await database.drop();
    await rm(folder, { recursive: true, force: true });
  };
  try {
    return { origin: await servedOrigin(web), ownerUrl: database.ownerUrl, stop };
  } catch (error) {
    await stop();
    throw error;
  }
}
