import type { LineOf, ValuedLine } from '#shared/calc/line.ts';
import { type LineContext, missing } from './line-context.ts';

/** A governing line: the least or greatest of its candidates, the first of equals. */
export function* checkGoverning(
  line: LineOf<'governing'>,
  { valued }: LineContext,
): Iterable<string> {
  const found: { ref: string; candidate: ValuedLine }[] = [];
  for (const ref of line.candidates) {
    const candidate = valued(ref);
    if (candidate) found.push({ ref, candidate });
    else yield missing(ref);
  }
  if (found.length < line.candidates.length) return;
  const odd = found.find(({ candidate }) => candidate.dimension !== line.dimension);
  if (odd) yield `compares ${line.dimension} with ${odd.ref}, which is ${odd.candidate.dimension}`;
  const values = found.map(({ candidate }) => candidate.value);
  const extreme = line.sense === 'min' ? Math.min(...values) : Math.max(...values);
  const governs = found.find(({ candidate }) => candidate.value === extreme);
  if (governs?.ref !== line.governs)
    yield `says that ${line.governs} governs, but ${governs?.ref} is the ${line.sense === 'min' ? 'least' : 'greatest'}`;
  if (line.value !== extreme) yield `is ${line.value}, its candidates give ${extreme}`;
}
