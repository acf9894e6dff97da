import { isBuiltin } from 'node:module';
import { posix } from 'node:path';

/** A file of the repository, a part of Node.js, or a package by its name. */
export type Target =
  | { readonly kind: 'file'; readonly path: string }
  | { readonly kind: 'node' | 'package'; readonly name: string };

const aliases: Readonly<Record<string, string>> = {
  '#shared/': 'shared/',
  '#server/': 'server/',
  '#client/': 'src/',
  '#tests/': 'tests/',
};

/** What an import in the file at `from` means; bundler suffixes such as `?raw` fall away. */
export function resolveImport(from: string, written: string): Target {
  const name = written.replace(/\?.*$/, '');
  for (const [alias, folder] of Object.entries(aliases)) {
    if (name.startsWith(alias)) return { kind: 'file', path: folder + name.slice(alias.length) };
  }
  if (name.startsWith('.')) return { kind: 'file', path: posix.join(posix.dirname(from), name) };
  if (isBuiltin(name)) return { kind: 'node', name };
  const [first = '', second = ''] = name.split('/');
  return { kind: 'package', name: first.startsWith('@') ? `${first}/${second}` : first };
}
