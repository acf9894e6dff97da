import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { alignmentK, bucklingLength } from '../standards/aisc360-22/alignment-chart.ts';
import { e2Formulas } from '../standards/aisc360-22/e2.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { holds, holdsLaterally, holdsTwist, offsetFlange } from './geometry.ts';
import type { GivenLengths } from './member-lines.ts';
import type { ResolvedMember, ResolvedRestraint } from './resolved.ts';
import { type Bay, bayLines, type Places } from './restraint-lines.ts';
import type { SectionQuantities } from './section-quantities.ts';

/** Lengths of the member with its bays and places. */
export interface MemberQuantities {
  readonly L: Quantity;
  readonly Lcx: Quantity | null;
  readonly Lcy: Quantity | null;
  readonly Lcz: Quantity | null;
  /** Given for every segment; null: it follows from the restraints. */
  readonly Lb: Quantity | null;
  readonly bays: Readonly<Record<'x' | 'y', readonly Bay[]>>;
  readonly places: Places;
  /** Lateral restraint at one flange without twist (E4(d)): its distance from the shear centre. */
  readonly offset: Quantity | null;
}

const WORDS = { x: 'about the major axis', y: 'about the minor axis', z: 'in torsion' } as const;
const SYMBOLS = { x: 'Lcx', y: 'Lcy', z: 'Lcz' } as const;

/** Buckling lengths as given, or from bays between restraints and from alignment charts (K L). */
export function memberQuantities(
  r: Recorder,
  member: ResolvedMember,
  given: GivenLengths,
  places: Places,
  section: SectionQuantities | null,
  compressed: boolean,
): MemberQuantities {
  const { L } = given;
  if (member.restraints?.length || member.charts.x || member.charts.y)
    r.section('E2', 'Lengths between points that are held', clause('E2'));
  const bays = {
    x: bayLines(r, member, 'x', L, places),
    y: bayLines(r, member, 'y', L, places),
  };
  const offset = compressed ? offsetRestraint(r, member, section) : null;
  /** Bays that buckle: a restraint off the shear centre counts where the clauses know it. */
  const bucklingBays = (about: 'x' | 'y' | 'z'): readonly Bay[] => {
    if (about === 'x') return bays.x;
    if (about === 'z') return bayLines(r, member, 'z', L, places);
    const counts = (one: ResolvedRestraint) =>
      holdsLaterally(one) && (offset !== null || one.holds.has('centre') || holdsTwist(one));
    const all = member.restraints ?? [];
    if (all.every((one) => counts(one) === holds(one, 'y'))) return bays.y;
    r.notice(
      'E2/y/left-out',
      'note',
      'offset-restraints-left-out',
      'Restraints at one flange that leave the member free to twist are left out of its buckling lengths, on the safe side.',
      { title: 'Restraints at one flange', clause: clause('E4') },
    );
    return bayLines(r, member, 'y', L, places, 'E2/Lcy', counts);
  };
  const length = (about: 'x' | 'y' | 'z'): Quantity | null => {
    const symbol = SYMBOLS[about];
    const stated = given[symbol];
    const chart = about === 'z' ? null : member.charts[about];
    if (stated || !compressed) return stated;
    if (!member.restraints && !chart) return null;
    const longest = longestBay(r, about, bucklingBays(about), chart ? 'Lbay' : symbol);
    if (!chart || about === 'z') return longest;
    const stiffness = (end: 'GA' | 'GB') =>
      r.given(`given/${about}/${end}`, end, 'none', chart[end], {
        title: `Stiffness ratio of the joint at end ${end[1]}, bending ${WORDS[about]}`,
      });
    const K = alignmentK(r, `App7/${about}`, chart.sidesway, stiffness('GA'), stiffness('GB'));
    return K && bucklingLength(r, `App7/${about}`, K, longest);
  };
  return {
    ...{ L, Lb: given.Lb, bays, places, offset },
    ...{ Lcx: length('x'), Lcy: length('y'), Lcz: length('z') },
  };
}

const longestBay = (
  r: Recorder,
  about: 'x' | 'y' | 'z',
  bays: readonly Bay[],
  symbol: string,
): Quantity =>
  r.governing(
    `E2/${SYMBOLS[about]}`,
    'max',
    bays.map((bay) => bay.L1),
    { title: `Buckling length ${WORDS[about]}: the longest bay`, symbol, clause: clause('E2') },
  );

/**
 * The distance of lateral restraints at one flange from the shear centre, where they leave the
 * member free to twist: E4(d) for doubly symmetric I-shapes, E4(f) for closed ones. null for shapes
 * whose twist about a restraint the book does not have, and where both flanges are held in turn.
 */
function offsetRestraint(
  r: Recorder,
  member: ResolvedMember,
  section: SectionQuantities | null,
): Quantity | null {
  const flange = offsetFlange(member);
  if (!flange || flange === 'both' || !section) return null;
  const d = depthOf(section);
  return d && r.formula(e2Formulas.offset, 'E4/ya', { d });
}

function depthOf(section: SectionQuantities): Quantity | null {
  switch (section.kind) {
    case 'i':
    case 'box':
      return section.d;
    case 'rect-hss':
      return section.Ht;
    case 'round':
      return section.D;
    default:
      return null;
  }
}
