import type { LineOf } from '#shared/calc/line.ts';
import { type LineContext, missing } from './line-context.ts';

/** Of 1, which is what cancels in a difference of nearly equal values. */
const TOLERANCE = 1e-12;

/** A comparison: what is used over the other route, less one. */
export function* checkComparison(
  line: LineOf<'comparison'>,
  { valued }: LineContext,
): Iterable<string> {
  const [used, other] = [valued(line.used), valued(line.other)];
  if (!used) yield missing(line.used);
  if (!other) yield missing(line.other);
  if (!used || !other) return;
  if (used.dimension !== other.dimension)
    yield `compares ${used.dimension} with ${other.dimension}`;
  const difference = used.value / other.value - 1;
  if (!(Math.abs(difference - line.difference) <= TOLERANCE * Math.max(1, Math.abs(difference))))
    yield `has the difference ${line.difference}, its lines give ${difference}`;
}
