import type { LineOf } from '#shared/calc/line.ts';
import { type LineContext, missing } from './line-context.ts';
import { sameNumber } from './same-number.ts';

/** A few bits: a ratio that is a plain number but for them is taken as that number. */
const TOLERANCE = 1e-14;

/** A check: demand over capacity, and the verdict that the unrounded ratio gives. */
export function* checkCheck(line: LineOf<'check'>, { valued }: LineContext): Iterable<string> {
  const demand = valued(line.demand);
  const capacity = line.capacity === 1 ? null : valued(line.capacity);
  if (!demand) yield missing(line.demand);
  if (line.capacity !== 1 && !capacity) yield missing(line.capacity);
  if (!demand || (line.capacity !== 1 && !capacity)) return;
  if (demand.dimension !== (capacity?.dimension ?? 'none'))
    yield `puts ${demand.dimension} against ${capacity?.dimension ?? 'a plain limit'}`;
  const limit = capacity?.value ?? 1;
  const ratio = sameNumber(demand.value, limit) ? 1 : demand.value / limit;
  if (!(Math.abs(ratio - line.ratio) <= TOLERANCE * Math.abs(ratio)))
    yield `has the ratio ${line.ratio}, its lines give ${ratio}`;
  const verdict = line.ratio <= 1 ? 'OK' : 'NOT OK';
  if (verdict !== line.verdict) yield `says ${line.verdict} at the ratio ${line.ratio}`;
}
