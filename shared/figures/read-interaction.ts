import type { CombinationRecord, MemberRecord } from '../calc/record.ts';
import type { InteractionPoint } from './drawing.ts';

/** Keys of the checks of H1.1: each strength by itself. */
const AXIAL = 'H1/axial';
const MOMENTS = ['H1/x', 'H1/y'];

/** One point per combination that has a ratio. */
export const readInteraction = (member: MemberRecord): InteractionPoint[] =>
  member.combinations.flatMap((combination): InteractionPoint[] => {
    const { ratio, ratioText } = combination.summary;
    if (ratio === null || ratioText === null) return [];
    return [
      {
        combination: combination.name,
        axial: checkRatio(combination, AXIAL),
        moment: MOMENTS.reduce((sum, key) => sum + checkRatio(combination, key), 0),
        ratio,
        ratioText,
      },
    ];
  });

const checkRatio = (combination: CombinationRecord, key: string): number => {
  const line = combination.lines.find((l) => l.key === key);
  return line?.kind === 'check' ? line.ratio : 0;
};
