import { isValued } from '../calc/line.ts';
import type { CombinationRecord, MemberRecord } from '../calc/record.ts';
import type { InteractionPoint } from './drawing.ts';
import { governingSegment } from './governing-segment.ts';

/** Keys of the checks of H1.1: each strength by itself. */
const AXIAL = 'H1/axial';
const MOMENTS = ['H1/x', 'H1/y'];

/** One point per combination that has a ratio, of the segment that governs there. */
export const readInteraction = (member: MemberRecord): InteractionPoint[] =>
  member.combinations.flatMap((combination): InteractionPoint[] => {
    const { ratio, ratioText } = combination.summary;
    if (ratio === null || ratioText === null) return [];
    const segment = governingSegment(combination);
    const at = segment === null ? '' : `${segment}/`;
    const pull = combination.lines.find(({ key }) => key === 'given/P');
    const sign = pull && isValued(pull) && pull.value < 0 ? -1 : 1;
    return [
      {
        combination: combination.name,
        segment: segment?.slice(1) ?? null,
        axial: sign * checkRatio(combination, `${at}${AXIAL}`),
        moment: MOMENTS.reduce((sum, key) => sum + checkRatio(combination, `${at}${key}`), 0),
        ratio,
        ratioText,
      },
    ];
  });

const checkRatio = (combination: CombinationRecord, key: string): number => {
  const line = combination.lines.find((l) => l.key === key);
  return line?.kind === 'check' ? line.ratio : 0;
};
