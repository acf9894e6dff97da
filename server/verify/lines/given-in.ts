import type { GivenValue } from '#shared/calc/quantity.ts';
import type { ResolvedMember } from '#shared/members/resolved.ts';

const LENGTHS = ['Lcx', 'Lcy', 'Lcz', 'Lb'] as const;

/** The value that a member's input has for the line of that key; null where it gives none. */
export function givenIn(
  member: ResolvedMember,
  combination: string | null,
  key: string,
): GivenValue | null {
  if (combination !== null) {
    const found = member.combinations.find((c) => c.id === combination);
    if (!found) return null;
    const moment = /^given\/M([xy])(A|B|Max)$/.exec(key);
    if (!moment) return key === 'given/P' ? found.P : null;
    const plane = found.moments[moment[1] as 'x' | 'y'];
    return plane[moment[2] === 'Max' ? 'max' : (moment[2] as 'A' | 'B')];
  }
  if (key === 'steel/Fy') return member.steel.kind === 'own' ? member.steel.Fy : null;
  if (key === 'given/L') return member.length;
  if (key === 'given/Cb') return member.Cb === 'auto' ? null : member.Cb;
  const length = LENGTHS.find((name) => key === `given/${name}`);
  return length ? member[length] : null;
}
