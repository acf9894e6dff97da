import { createReadStream } from 'node:fs';
import { UsageError } from './usage-error.ts';

/** Largest input read, bytes. */
const MOST = 10 * 1024 * 1024;

/** Reads a file, or standard input for `-`, up to `most` bytes. Throws a UsageError with the reason. */
export async function readBytes(path: string, most: number): Promise<Buffer> {
  const parts: Buffer[] = [];
  let size = 0;
  try {
    for await (const part of path === '-' ? process.stdin : createReadStream(path)) {
      size += (part as Buffer).length;
      if (size > most) throw new UsageError(`is larger than ${most / 1024 / 1024} MB`);
      parts.push(part as Buffer);
    }
  } catch (error) {
    if (error instanceof UsageError) throw error;
    throw new UsageError(`cannot be read (${(error as NodeJS.ErrnoException).code ?? error})`);
  }
  return Buffer.concat(parts);
}

/** Reads JSON from a file or from standard input. Throws a UsageError with the reason. */
export async function readJson(path: string): Promise<unknown> {
  const text = (await readBytes(path, MOST)).toString('utf8').replace(/^\uFEFF/, '');
  try {
    return JSON.parse(text);
  } catch (error) {
    throw new UsageError(`is not JSON: ${(error as Error).message}`);
  }
}
