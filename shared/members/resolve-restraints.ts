import type { GivenValue } from '../calc/quantity.ts';
import { type ReadQuantity, TYPED } from './given-values.ts';
import type { MemberInput } from './input.ts';
import type { ResolvedRestraint } from './resolved.ts';

/** Positions that agree to this share of the member's length are one place. */
const SAME_PLACE = 1e-9;

/** Whether two distances from end A are the same place of a member of that length (mm). */
export const samePlace = (a: number, b: number, length: number): boolean =>
  Math.abs(a - b) <= SAME_PLACE * length;

/** Restraints stand at least this share of the length apart: nothing is built closer. */
const CLOSEST = 1e-4;

/** Restraints in the order of their places; null where the member gives none at all. */
export function resolveRestraints(
  m: MemberInput,
  length: GivenValue,
  problem: (path: string, message: string) => void,
  quantity: ReadQuantity,
): readonly ResolvedRestraint[] | null {
  if (m.restraints === undefined) return null;
  const closest = CLOSEST * length.value;
  const read = m.restraints.flatMap((given, i) => {
    const at = quantity(`restraints[${i}].at`, given.at, 'length');
    if (!at) return [];
    if (!(at.value > closest) || at.value > length.value - closest) {
      problem(
        `restraints[${i}].at`,
        `is ${at.text} from end A; it must lie between the ends, which are held`,
      );
      return [];
    }
    return [
      {
        index: i,
        at,
        holds: new Set(given.holds),
        source: given.source ?? TYPED,
        confirmed: given.confirmed ?? false,
      },
    ];
  });
  read.sort((a, b) => a.at.value - b.at.value);
  return read.map(({ index, ...restraint }, i) => {
    const before = read[i - 1];
    if (before && restraint.at.value - before.at.value < closest)
      problem(
        `restraints[${index}].at`,
        `is ${restraint.at.text}, where another restraint stands: say all that is held there in one`,
      );
    return { id: `r${i + 1}`, ...restraint };
  });
}
