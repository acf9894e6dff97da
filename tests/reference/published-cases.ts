import { readFileSync } from 'node:fs';
import { PUBLISHED_CASES, type PublishedCase } from '#shared/published-cases/published-cases.ts';

export { publishedInput } from '#shared/published-cases/published-cases.ts';

const folder = new URL('./aisc360-22/', import.meta.url);

/** Data of one file of published values that only the tests read. */
export const readPublished = (file: string): unknown =>
  JSON.parse(readFileSync(new URL(file, folder), 'utf8'));

/** Published examples of whole members by their ids. */
export const publishedCases = (): readonly { file: string; data: PublishedCase }[] =>
  PUBLISHED_CASES.map((data) => ({ file: data.id, data }));
