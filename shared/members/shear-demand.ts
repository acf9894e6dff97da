import type { LineOf } from '../calc/line.ts';
import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { g1Formulas } from '../standards/aisc360-22/g1.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { AXES, type Axis, WORD } from './bay-moments.ts';
import type { MemberStrengths } from './member-strengths.ts';
import type { PlaneMoments } from './plane-moments.ts';
import type { ResolvedCombination } from './resolved.ts';
import { shearCheck } from './shear.ts';

/**
 * Whether the shear of a plane can be told: given, or from loads and moments whose diagram is known.
 * Equilibrium decides it, so it is that of first order.
 */
export const shearKnown = (c: ResolvedCombination, axis: Axis): boolean =>
  c.shears[axis] !== null ||
  (!c.sway?.[axis] && (c.moments[axis].max === null || c.loads.some((l) => l.axis === axis)));

/** Required against available shear strength, per plane that has shear. */
export function checkShear(
  r: Recorder,
  m: MemberStrengths,
  c: ResolvedCombination,
  planes: Readonly<Record<Axis, PlaneMoments>>,
): LineOf<'check'>[] {
  return AXES.flatMap((axis) => {
    const Vc = m.shear[axis];
    const plane = planes[axis];
    if (!Vc || !shearKnown(c, axis) || (plane.state !== 'done' && !c.shears[axis])) return [];
    r.section(`G/${axis}`, `Shear, flexure about the ${WORD[axis]} axis`, clause('G1'));
    const Vr = required(r, c, axis, plane);
    return Vr && Vr.value > 0 ? [shearCheck(r, axis, Vr, Vc)] : [];
  });
}

function required(
  r: Recorder,
  c: ResolvedCombination,
  axis: Axis,
  plane: PlaneMoments,
): Quantity | null {
  const given = c.shears[axis];
  const diagram = plane.state === 'done' && !c.sway?.[axis];
  const known = diagram && (!plane.givenMax || c.loads.some((l) => l.axis === axis));
  const candidates = [
    ...(given
      ? [
          r.formula(g1Formulas.size, `G/${axis}/given`, {
            V: r.given(`given/V${axis}`, 'V', 'force', given, {
              title: `Largest shear force from the analysis, bending about the ${WORD[axis]} axis`,
            }),
          }),
        ]
      : []),
    ...(known
      ? plane.bays.flatMap((bay) =>
          bay.state === 'done' ? (bay.first().largestShear?.(bay.r, `G/${axis}`) ?? []) : [],
        )
      : []),
  ];
  const [only] = candidates;
  if (candidates.length <= 1) return only ?? null;
  return r.governing(`G/${axis}/Vr`, 'max', candidates, {
    title: `Required shear strength, flexure about the ${WORD[axis]} axis`,
    symbol: 'Vr',
    clause: clause('G1'),
  });
}
