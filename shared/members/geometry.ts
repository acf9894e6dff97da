import type { ResolvedMember, ResolvedRestraint } from './resolved.ts';

/** A place that ends a bay or a segment: an end of the member or one of its restraints. */
export type Place = 'A' | 'B' | ResolvedRestraint;

/** A stretch between two places. */
export interface Stretch {
  readonly from: Place;
  readonly to: Place;
}

const LATERAL = ['top', 'bottom', 'centre'] as const;

export const holdsLaterally = (r: ResolvedRestraint): boolean =>
  LATERAL.some((h) => r.holds.has(h));

/** Twist is held by itself, or by both flanges. */
export const holdsTwist = (r: ResolvedRestraint): boolean =>
  r.holds.has('twist') || (r.holds.has('top') && r.holds.has('bottom'));

/**
 * The one flange at which lateral restraints without twist hold the member, off its shear centre;
 * null where there is none such, `both` where some hold the one flange and some the other.
 */
export function offsetFlange(member: ResolvedMember): 'top' | 'bottom' | 'both' | null {
  const flanges = new Set(
    (member.restraints ?? [])
      .filter((r) => holdsLaterally(r) && !holdsTwist(r) && !r.holds.has('centre'))
      .map((r) => (r.holds.has('top') ? ('top' as const) : ('bottom' as const))),
  );
  const [first, second] = flanges;
  return second ? 'both' : (first ?? null);
}

/** Whether a restraint ends a buckling length about an axis, or in torsion (z). */
export const holds = (r: ResolvedRestraint, about: 'x' | 'y' | 'z'): boolean =>
  about === 'x' ? r.holds.has('in-plane') : about === 'y' ? holdsLaterally(r) : holdsTwist(r);

/** The stretches between the ends and those restraints that end them, in order from A. */
export function stretches(
  member: ResolvedMember,
  ends: (r: ResolvedRestraint) => boolean,
): readonly Stretch[] {
  const between = (member.restraints ?? []).filter(ends);
  const places: readonly Place[] = ['A', ...between, 'B'];
  return places.slice(1).map((to, i) => ({ from: places[i] as Place, to }));
}

/** Distance from end A in mm. */
export const distance = (place: Place, member: ResolvedMember): number =>
  place === 'A' ? 0 : place === 'B' ? member.length.value : place.at.value;

export const placeName = (place: Place): string => (typeof place === 'string' ? place : place.id);
