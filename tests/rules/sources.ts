import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { Source } from './read-imports.ts';

const top = fileURLToPath(new URL('../..', import.meta.url));

/** Every TypeScript file below some top folders of the repository. */
export function readSources(folders: readonly string[]): Source[] {
  return folders
    .flatMap((folder) =>
      readdirSync(join(top, folder), { recursive: true, encoding: 'utf8' }).map(
        (path) => `${folder}/${path}`,
      ),
    )
    .filter((path) => /\.tsx?$/.test(path))
    .sort()
    .map((path) => ({ path, text: readFileSync(join(top, path), 'utf8') }));
}
