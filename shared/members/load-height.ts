import type { Recorder } from '../calc/recorder.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { distance, type Stretch } from './geometry.ts';
import { samePlace } from './resolve-restraints.ts';
import type { ResolvedCombination, ResolvedLoad, ResolvedMember } from './resolved.ts';

/**
 * A load within an unbraced segment that acts off the shear centre towards the side it pushes from:
 * a downward load on the top flange, an upward one on the bottom flange. It moves with the twist and
 * lowers lateral-torsional buckling below F1, whose loads act at the shear centre. True, with an
 * outside-scope notice, where there is one; a load over an end of the segment is held there.
 */
export function destabilisingLoad(
  r: Recorder,
  member: ResolvedMember,
  c: ResolvedCombination,
  segment: Stretch,
): boolean {
  const [from, to] = [distance(segment.from, member), distance(segment.to, member)];
  const L = member.length.value;
  const inside = (load: ResolvedLoad): boolean => {
    if (load.kind === 'point') {
      const z = load.at.value;
      return z > from && z < to && !samePlace(z, from, L) && !samePlace(z, to, L);
    }
    const [a, b] = load.reach ? [load.reach.from.value, load.reach.to.value] : [0, L];
    return Math.min(b, to) > Math.max(a, from);
  };
  const pushes = (load: ResolvedLoad): readonly number[] =>
    load.kind === 'point'
      ? [load.W.value]
      : load.kind === 'uniform'
        ? [load.w.value]
        : [load.wFrom.value, load.wTo.value];
  const found = c.loads.filter(
    (load) =>
      load.axis === 'x' &&
      inside(load) &&
      ((load.height === 'top' && pushes(load).some((p) => p > 0)) ||
        (load.height === 'bottom' && pushes(load).some((p) => p < 0))),
  );
  if (found.length === 0) return false;
  r.notice(
    'F1/height',
    'outside scope',
    'destabilising-load',
    `A load within the unbraced segment acts at the flange it pushes on (${found.map((l) => l.id.replace('load', 'load ')).join(', ')}) and would move with the section as it twists. F1 takes loads at the shear centre: lateral-torsional buckling of this segment is not checked. Hold the member where the load acts, or show that the load does not move with the flange.`,
    { title: 'Load above the shear centre', clause: clause('F1') },
  );
  return true;
}
