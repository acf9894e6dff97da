import { execFile } from 'node:child_process';

export interface Ran {
  readonly code: number;
  readonly stdout: string;
  readonly stderr: string;
}

const root = new URL('../../', import.meta.url);

function run(file: string, args: readonly string[], input: string): Promise<Ran> {
  return new Promise((resolve) => {
    const child = execFile(
      file,
      args,
      { cwd: root, maxBuffer: 64 * 1024 * 1024 },
      (error, stdout, stderr) => {
        const code = typeof error?.code === 'number' ? error.code : error ? 1 : 0;
        resolve({ code, stdout, stderr });
      },
    );
    // A command that refuses its input may be gone before it is written.
    child.stdin?.on('error', () => undefined);
    child.stdin?.end(input);
  });
}

/** Runs a command of `server/cli` as its npm script does. */
export const runCommand = (name: string, args: readonly string[], input = ''): Promise<Ran> =>
  run('node', ['--import', 'tsx', `server/cli/${name}.ts`, ...args], input);

/** Runs an npm script as a person does. */
export const runScript = (name: string, args: readonly string[]): Promise<Ran> =>
  run('npm', ['run', '--silent', name, '--', ...args], '');
