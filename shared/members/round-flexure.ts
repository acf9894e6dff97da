import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { roundFlexureClass } from '../standards/aisc360-22/b4-flexure.ts';
import { roundStrengths, roundWithinScope } from '../standards/aisc360-22/f8.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type { RoundSection, SteelQuantities } from './section-quantities.ts';

/** F8 about one axis: yielding, and local buckling of a wall that is not compact; null outside scope. */
export function roundFlexure(
  r: Recorder,
  axis: 'x' | 'y',
  { E, Fy }: SteelQuantities,
  s: RoundSection,
): { readonly Mp: Quantity; readonly LB: Quantity | null } | null {
  const [S, Z] = axis === 'x' ? [s.Sx, s.Zx] : [s.Sy, s.Zy];
  const q = { axis, E, Fy, S, Z, lambda: s.lambdad };
  const name = axis === 'x' ? 'Major' : 'Minor';
  r.section(
    `B4/${axis}`,
    `Width-to-thickness ratio, ${name.toLowerCase()}-axis flexure`,
    clause('B4.1'),
  );
  const wall = roundFlexureClass(r, axis, { E, Fy }, s.lambdad);
  r.section(`F8/${axis}`, `${name}-axis flexural strength`, clause('F8'));
  return roundWithinScope(r, q) ? roundStrengths(r, q, wall) : null;
}
