import { placeFormulas } from '../standards/aisc360-22/e2.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { type BayMoments, WORD } from './bay-moments.ts';
import type { PlaneMoments } from './plane-moments.ts';

/**
 * For information: the second-order deflection in the middle of each bay with load between its ends,
 * under the loads of this combination and with the stiffness of its moments. No limit is set.
 */
export function deflectionLines(plane: PlaneMoments): void {
  for (const bay of plane.bays) inTheMiddle(plane, bay);
}

function inTheMiddle({ axis }: PlaneMoments, { r, bay, loads, exact }: BayMoments): void {
  if (!exact?.deflection || loads.length === 0) return;
  r.section(
    `L/${axis}`,
    `Deflection in the middle, ${WORD[axis]} axis, for information`,
    clause('L'),
  );
  exact.deflection(
    r,
    `L/${axis}/y`,
    r.formula(placeFormulas.middle, `L/${axis}/z`, { L1: bay.L1 }),
  );
}
