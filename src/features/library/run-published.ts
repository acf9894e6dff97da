import type { ClauseFacts } from '#shared/library/clause-facts.ts';
import { PUBLISHED_RUNS, type PublishedValue } from '#shared/library/published-values.ts';

export interface Published {
  readonly values: readonly PublishedValue[];
  /** What the clauses gave and decided on the way, each once. */
  readonly facts: readonly ClauseFacts[];
}

/** Runs every published case, with a breath between two so that the page goes on answering. */
export async function runPublished(): Promise<Published> {
  const values: PublishedValue[] = [];
  const facts = new Map<string, ClauseFacts>();
  for (const run of PUBLISHED_RUNS) {
    const made = run();
    values.push(...made.values);
    for (const fact of made.facts) facts.set(JSON.stringify(fact), fact);
    await new Promise((resolve) => setTimeout(resolve));
  }
  return { values, facts: [...facts.values()] };
}
