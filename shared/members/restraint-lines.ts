import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { stretchLength } from '../standards/aisc360-22/e2.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import { holds, type Place, type Stretch, stretches } from './geometry.ts';
import type { ResolvedMember, ResolvedRestraint } from './resolved.ts';
import type { Hold } from './restraint-input.ts';

const WORDS: Readonly<Record<Hold, string>> = {
  'in-plane': 'in the plane of major-axis bending',
  top: 'laterally at the top flange',
  bottom: 'laterally at the bottom flange',
  centre: 'laterally at the shear centre',
  twist: 'against twist',
};

/** Distances of restraints from end A, by their ids. */
export type Places = ReadonlyMap<string, Quantity>;

export const placeQuantity = (places: Places, place: Place): Quantity | null =>
  typeof place === 'string' ? null : (places.get(place.id) ?? null);

/** Where the member is held between its ends, and how. */
export function restraintLines(r: Recorder, member: ResolvedMember): Places {
  const { restraints } = member;
  if (!restraints || restraints.length === 0) return new Map();
  r.section('restraints', 'Held between the ends', clause('E2'));
  return new Map(
    restraints.map((restraint) => {
      const { id, at, source, confirmed } = restraint;
      const order = Object.keys(WORDS) as Hold[];
      r.statement(
        `given/${id}/holds`,
        `${order
          .filter((h) => restraint.holds.has(h))
          .map((h) => WORDS[h])
          .join(', ')}`,
        source,
        confirmed,
        { title: `Restraint ${id} holds` },
      );
      return [
        id,
        r.given(`given/${id}/z`, 'z', 'length', at, {
          title: `Restraint ${id}, distance from end A`,
        }),
      ] as const;
    }),
  );
}

/** A stretch between neighbouring points held in one plane. */
export interface Bay extends Stretch {
  /** `1`, `2`, … from end A. */
  readonly id: string;
  readonly L1: Quantity;
}

const TITLES = {
  x: 'held in the plane of major-axis bending',
  y: 'held laterally',
  z: 'held against twist',
} as const;

/** The bays of a plane (x, y) or between points held against twist (z), with their lengths. */
export function bayLines(
  r: Recorder,
  member: ResolvedMember,
  about: 'x' | 'y' | 'z',
  L: Quantity,
  places: Places,
  key = `E2/${about}`,
  ends: (restraint: ResolvedRestraint) => boolean = (restraint) => holds(restraint, about),
): readonly Bay[] {
  const all = stretches(member, ends);
  return all.map((stretch, i) => ({
    ...stretch,
    id: String(i + 1),
    L1:
      all.length === 1
        ? L
        : stretchLength(
            r,
            `${key}/bay${i + 1}`,
            L,
            placeQuantity(places, stretch.from),
            placeQuantity(places, stretch.to),
            { title: `Bay ${i + 1} between points ${TITLES[about]}` },
          ),
  }));
}
