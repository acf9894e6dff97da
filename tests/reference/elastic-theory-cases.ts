import { readFileSync } from 'node:fs';
import { expect } from 'vitest';

/** One case of `tests/reference/elastic-theory`. */
export interface Reference {
  readonly id: string;
  readonly inputs: Readonly<Record<string, unknown>>;
  readonly expected: Readonly<Record<string, number | string>>;
}

export const casesIn = (name: string): readonly Reference[] =>
  (
    JSON.parse(readFileSync(new URL(`./elastic-theory/${name}.json`, import.meta.url), 'utf8')) as {
      cases: Reference[];
    }
  ).cases;

export const number = (value: unknown): number => {
  if (typeof value !== 'number') throw new Error(`${value} is not a number`);
  return value;
};

/** Agreement to 1e-9, relative; `scale` where the reference is zero. */
export function near(value: number, reference: unknown, what: string, scale = 1): void {
  const wanted = number(reference);
  const size = wanted === 0 ? scale : Math.abs(wanted);
  expect(Math.abs(value - wanted) / size, `${what}: ${value}, reference ${wanted}`).toBeLessThan(
    1e-9,
  );
}
