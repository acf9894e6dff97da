import { readdirSync, readFileSync } from 'node:fs';

export interface Expected {
  readonly what: string;
  readonly method: 'LRFD' | 'ASD' | 'nominal';
  /** Address of the engine's line. */
  readonly line: string;
  /** The published quantity from the line's value x in `lineUnit`. */
  readonly derive?: string;
  readonly lineUnit?: string;
  readonly unit: string;
  /** As the source prints it. */
  readonly printed: string;
  /** The example's chain from its inputs, nothing rounded on the way. */
  readonly fromInputs: number;
  readonly working: string;
  /** Printed intermediates that lead to what is printed. */
  readonly explained?: { readonly by: string; readonly expression: string };
}

export interface PublishedCase {
  readonly id: string;
  readonly source: {
    readonly title: string;
    readonly edition: string;
    readonly example: string;
    readonly page: string;
  };
  readonly analysis: unknown;
  readonly member: Record<string, unknown>;
  readonly combinations: Record<'LRFD' | 'ASD', readonly unknown[]>;
  readonly expected: readonly Expected[];
}

const folder = new URL('./aisc360-22/', import.meta.url);

/** Data of one file of the folder of published values. */
export const readPublished = (file: string): unknown =>
  JSON.parse(readFileSync(new URL(file, folder), 'utf8'));

const isCase = (data: unknown): data is PublishedCase =>
  typeof data === 'object' && data !== null && 'combinations' in data;

/** Published examples of whole members, each from its own file. */
export const publishedCases = (): readonly { file: string; data: PublishedCase }[] =>
  readdirSync(folder).flatMap((file) => {
    const data = readPublished(file);
    return isCase(data) ? [{ file, data }] : [];
  });

/** INPUT.json of a published example by one design method; null where the source has none. */
export const publishedInput = (data: PublishedCase, design: 'LRFD' | 'ASD'): unknown =>
  data.combinations[design].length === 0
    ? null
    : {
        format: 1,
        standard: 'aisc360-22',
        design,
        units: 'us',
        analysis: data.analysis,
        members: [{ ...data.member, combinations: data.combinations[design] }],
      };
