import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { cloneDatabase, cloneOf, keepForClones, type TestDatabase } from './database.ts';

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

/**
 * The built application with its demo, served by a process of its own on a free port and a fresh
 * database: a clone of one that the first call of a run lets the application fill.
 */
export async function serveApplication(): Promise<Application> {
  let database = await cloneOf('demo');
  if (!database) {
    const filled = await cloneDatabase();
    await (await serve(filled)).end();
    await keepForClones(filled, 'demo');
    database = (await cloneOf('demo'))!;
  }
  const { ownerUrl, drop } = database;
  const { origin, end } = await serve(database);
  const stop = async () => {
    await end();
    await drop();
  };
  return { origin, ownerUrl, stop };
}

/** The web process on a database; `end` leaves the database. */
async function serve(database: TestDatabase): Promise<{ origin: string; end(): Promise<void> }> {
  const folder = await mkdtemp(join(tmpdir(), 'stanchion-application-'));
  const env = {
    ...process.env,
    ...{ NODE_ENV: 'production', HOST: '127.0.0.1', PORT: '0', LOG_LEVEL: 'warn' },
    ...{ DATABASE_URL: database.webUrl, DATABASE_OWNER_URL: database.ownerUrl },
    ...{ SESSION_SECRET: 'only for tests, only for tests, only for tests', STANCHION_DATA: folder },
  };
  const args = ['--import', 'tsx', 'server/index.ts', '--demo'];
  const web = spawn(process.execPath, args, { env, stdio: ['ignore', 'pipe', 'pipe'] });
  const ended = new Promise((resolve) => web.once('close', resolve));
  const killWeb = () => web.kill('SIGKILL');
  process.once('exit', killWeb);
  const end = async () => {
    web.kill('SIGTERM');
    await ended;
    process.removeListener('exit', killWeb);
    await rm(folder, { recursive: true, force: true });
  };
  try {
    return { origin: await servedOrigin(web), end };
  } catch (error) {
    await end();
    throw error;
  }
}
