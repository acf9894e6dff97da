import type { z } from 'zod';

/** What stands in for a field that is not given yet, so that the rest can be read. */
const STAND_INS: Readonly<Record<string, (index: number) => string>> = {
  mark: (index) => `member ${index + 1}`,
  name: (index) => `combination ${index + 1}`,
  section: () => 'W12X79',
  material: () => 'A992',
  length: () => '1 m',
  ends: () => 'held',
  P: () => '0 N',
};

interface Completed {
  readonly json: unknown;
  /** Paths that were filled in: what is found of them says nothing. */
  readonly paths: readonly (readonly PropertyKey[])[];
}

/**
 * The input with its missing fields filled in, where missing fields are all that its shape lacks;
 * null where something else is wrong with it.
 */
export function withStandIns(json: unknown, issues: readonly z.core.$ZodIssue[]): Completed | null {
  const copy: unknown = structuredClone(json);
  for (const { path } of issues) {
    const field = path.at(-1);
    const parent = path.slice(0, -1).reduce<unknown>((at, key) => Object(at)[key], copy);
    const standIn = typeof field === 'string' ? STAND_INS[field] : undefined;
    if (!standIn || typeof field !== 'string' || typeof parent !== 'object' || parent === null)
      return null;
    const holder = parent as Record<string, unknown>;
    if (holder[field] !== undefined) return null;
    const index = path.findLast((key): key is number => typeof key === 'number') ?? 0;
    holder[field] = standIn(index);
  }
  return { json: copy, paths: issues.map(({ path }) => path) };
}
