import type { Problem } from './resolved.ts';

/** Adds a problem for each name that stands a second time. */
export function repeated(
  names: readonly string[],
  path: (i: number) => string,
  what: string,
  problems: Problem[],
): void {
  names.forEach((name, i) => {
    if (names.indexOf(name) !== i)
      problems.push({ path: path(i), message: `the ${what} "${name}" is used twice` });
  });
}
