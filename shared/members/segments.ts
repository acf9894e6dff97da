import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { placeFormulas, stretchLength } from '../standards/aisc360-22/e2.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type { BayResult } from '../standards/elastic-theory/bay.ts';
import { type BayMoments, WORD } from './bay-moments.ts';
import {
  distance,
  holdsTwist,
  type Place,
  placeName,
  type Stretch,
  stretches,
} from './geometry.ts';
import type { Side } from './major-strengths.ts';
import type { MemberQuantities } from './member-quantities.ts';
import type { PlaneMoments } from './plane-moments.ts';
import { samePlace } from './resolve-restraints.ts';
import type { ResolvedMember, ResolvedRestraint } from './resolved.ts';
import { placeQuantity } from './restraint-lines.ts';

/** A stretch between points that end lateral-torsional buckling; the whole member has no id. */
export interface Segment extends Stretch {
  readonly id: string | null;
  readonly r: Recorder;
}

export interface SegmentContext {
  readonly member: ResolvedMember;
  readonly q: MemberQuantities;
  readonly start: () => Quantity;
}

/**
 * The segments of one combination. A restraint ends a segment where it holds twist, or the flange
 * that is in compression there; a point of inflection ends none.
 */
export function segmentsOf(r: Recorder, m: SegmentContext, x: PlaneMoments): readonly Segment[] {
  const { member } = m;
  if (!member.restraints || x.state !== 'done') return [{ from: 'A', to: 'B', id: null, r }];
  const flanged = member.restraints.some((one) => !holdsTwist(one) && holdsAFlange(one));
  if (flanged)
    r.section('F1/restraints', 'Which restraints hold the compressed flange', clause('F1'));
  const ending = new Set(member.restraints.filter((one) => endsSegment(r, m, x, one)));
  const parts = stretches(member, (one) => ending.has(one));
  return parts.map((part, i) => {
    const id = parts.length === 1 ? null : `s${i + 1}`;
    return { ...part, id, r: id ? r.within(id) : r };
  });
}

/** Begins the lines of a segment; its unbraced length, null where the major axis is not bent. */
export function unbracedLength(
  { id, r, from, to }: Segment,
  { member, q }: SegmentContext,
  x: PlaneMoments,
): Quantity | null {
  if (id !== null)
    r.section(
      'segment',
      `Segment ${id.replace('s', '')}, ${placeName(from)} to ${placeName(to)}`,
      clause('F1'),
    );
  if (q.Lb || !member.restraints || x.state !== 'done') return q.Lb;
  const [za, zb] = [placeQuantity(q.places, from), placeQuantity(q.places, to)];
  return stretchLength(r, 'F2/Lb', q.L, za, zb, {
    title: 'Laterally unbraced length of the segment',
    symbol: 'Lb',
  });
}

const holdsAFlange = (restraint: ResolvedRestraint): boolean =>
  restraint.holds.has('top') || restraint.holds.has('bottom');

/** Whether a restraint ends a segment under this combination, as a line where a flange decides. */
function endsSegment(
  r: Recorder,
  m: SegmentContext,
  x: PlaneMoments,
  restraint: ResolvedRestraint,
): boolean {
  if (holdsTwist(restraint)) return true;
  if (!holdsAFlange(restraint)) return false;
  const top = restraint.holds.has('top');
  const flange = top ? 'top' : 'bottom';
  const M = momentAt(r, m, x, restraint, `F1/${restraint.id}`);
  return (
    r.choice(
      `F1/${restraint.id}/holds`,
      [
        {
          left: M,
          relation: top ? '>' : '<',
          right: 0,
          outcome: `the ${flange} flange is in compression there, and it is held: a segment ends`,
        },
      ],
      `the ${flange} flange, which it holds, is not in compression there: no segment ends`,
      { title: `Restraint ${restraint.id} and the compressed flange`, clause: clause('F1') },
    ) === 0
  );
}

/** The bay that holds a place, and the place measured from its start. */
function within(
  m: SegmentContext,
  x: PlaneMoments,
  place: Exclude<Place, 'A' | 'B'> | { readonly z: Quantity },
): { readonly bay: BayMoments; readonly z: number } {
  const z = 'z' in place ? place.z.value : place.at.value;
  const found = x.bays.find(({ bay }) => z <= distance(bay.to, m.member));
  const bay = found ?? (x.bays.at(-1) as BayMoments);
  return { bay, z };
}

/** The diagram whose largest value enters the required moment. */
export const diagramOf = (bay: BayMoments): BayResult =>
  bay.alongExact && bay.exact ? bay.exact : bay.first();

/** A distance from end A as one from the start of the bay. */
function localPlace(
  r: Recorder,
  m: SegmentContext,
  key: string,
  bay: BayMoments,
  z: Quantity,
): Quantity {
  const za = placeQuantity(m.q.places, bay.bay.from);
  return za ? r.formula(placeFormulas.local, key, { z, za }) : z;
}

/** Signed moment at a restraint. */
function momentAt(
  r: Recorder,
  m: SegmentContext,
  x: PlaneMoments,
  restraint: ResolvedRestraint,
  at: string,
): Quantity {
  const { bay } = within(m, x, restraint);
  const same = (place: Place) =>
    samePlace(distance(place, m.member), restraint.at.value, m.q.L.value);
  if (same(bay.bay.to)) return bay.ends.MB;
  const z = m.q.places.get(restraint.id) as Quantity;
  return diagramOf(bay).moment(r, `${at}/M`, localPlace(r, m, `${at}/z`, bay, z));
}

/** Signed moment at a distance from end A, along the diagram that `of` takes of its bay. */
export function momentAlong(
  r: Recorder,
  m: SegmentContext,
  x: PlaneMoments,
  key: string,
  z: Quantity,
  of: (bay: BayMoments) => BayResult,
): Quantity {
  const { bay } = within(m, x, { z });
  return of(bay).moment(r, key, localPlace(r, m, `${key}/z`, bay, z));
}

/**
 * The largest moment of a plane within a segment, as a size. Exact moments: the largest of the
 * curve within the segment. Else the required moment of every bay that the segment touches, for a
 * multiplier belongs to the whole bay. null where the plane has none.
 */
export function largestIn(
  segment: Segment,
  m: SegmentContext,
  plane: PlaneMoments,
  exactMoments: boolean,
): Quantity | null {
  const pieces = plane.bays
    .filter((bay) => bay.state === 'done' && overlaps(segment, bay, m))
    .map((bay) =>
      exactMoments && bay.alongExact && bay.exact
        ? largestAlong(segment, m, bay, bay.exact, `H1/M${plane.axis}/${bay.bay.id}`)
        : (bay.Mr as Quantity),
    );
  return largestOf(segment.r, `H1/M${plane.axis}`, pieces, {
    title: `Required moment within the segment, ${WORD[plane.axis]} axis`,
    symbol: `Mr${plane.axis}`,
  });
}

/**
 * The flanges that the moments of a segment compress, asked of every bay that it touches; one name
 * stands for both where the section has no sides.
 */
export function sidesIn(
  segment: Segment,
  m: SegmentContext,
  x: PlaneMoments,
  sided: boolean,
): readonly Side[] {
  if (!sided) return ['top'];
  if (x.givenMax) return ['top', 'bottom'];
  const sides = x.bays
    .filter((bay) => bay.state === 'done' && overlaps(segment, bay, m))
    .flatMap((bay): readonly Side[] => {
      const { highest, lowest } = diagramOf(bay).largest;
      const taken = segment.r.choice(
        `F4/side/${bay.bay.id}`,
        [
          {
            left: lowest.M,
            relation: '>=',
            right: 0,
            outcome: 'moments compress the top flange only',
          },
          {
            left: highest.M,
            relation: '<=',
            right: 0,
            outcome: 'moments compress the bottom flange only',
          },
        ],
        'moments compress the one flange and the other: both are checked',
        { title: 'Flange in compression', clause: clause('F4') },
      );
      return taken === 0 ? ['top'] : taken === 1 ? ['bottom'] : ['top', 'bottom'];
    });
  return [...new Set(sides)];
}

/** The largest of a diagram within a segment, over all bays it touches, as a size. */
export function largestOn(
  segment: Segment,
  m: SegmentContext,
  plane: PlaneMoments,
  of: (bay: BayMoments) => BayResult,
  key: string,
): Quantity | null {
  const pieces = plane.bays
    .filter((bay) => bay.state === 'done' && overlaps(segment, bay, m))
    .map((bay) => largestAlong(segment, m, bay, of(bay), `${key}/${bay.bay.id}`));
  return largestOf(segment.r, key, pieces, {
    title: 'Largest moment within the segment',
    symbol: 'Mmax',
  });
}

function largestOf(
  r: Recorder,
  key: string,
  pieces: readonly Quantity[],
  named: { readonly title: string; readonly symbol: string },
): Quantity | null {
  const [only] = pieces;
  if (pieces.length <= 1) return only ?? null;
  return r.governing(key, 'max', pieces, { ...named, clause: clause('H1.1') });
}

const overlaps = (
  segment: Segment,
  { bay }: BayMoments,
  { member, q }: SegmentContext,
): boolean => {
  const from = Math.max(distance(segment.from, member), distance(bay.from, member));
  const to = Math.min(distance(segment.to, member), distance(bay.to, member));
  return to > from && !samePlace(from, to, q.L.value);
};

function largestAlong(
  segment: Segment,
  m: SegmentContext,
  bay: BayMoments,
  diagram: BayResult,
  key: string,
): Quantity {
  const { member, q } = m;
  const [from, to] = [distance(segment.from, member), distance(segment.to, member)];
  const [z0, z1] = [distance(bay.bay.from, member), distance(bay.bay.to, member)];
  const wholeFrom = from <= z0 || samePlace(from, z0, q.L.value);
  const wholeTo = to >= z1 || samePlace(to, z1, q.L.value);
  if (wholeFrom && wholeTo) return diagram.largest.size.M;
  const local = (place: Place, name: string): Quantity =>
    localPlace(segment.r, m, `${key}/${name}/z`, bay, placeQuantity(q.places, place) as Quantity);
  return diagram.largestWithin(
    segment.r,
    key,
    wholeFrom ? m.start() : local(segment.from, 'from'),
    wholeTo ? bay.bay.L1 : local(segment.to, 'to'),
  );
}
