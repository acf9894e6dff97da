import type {
  DraftChart,
  DraftNetSection,
  DraftSizes,
  DraftSprings,
} from '#shared/contracts/draft-parts.ts';
import { notGiven } from '#shared/contracts/draft-quantity.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';

/** Takes a part of the member away as a whole. */
export function withoutPart(
  draft: MemberDraft,
  part: 'sizes' | 'charts' | 'netSection' | 'stiffeners',
): MemberDraft {
  const { [part]: _, ...rest } = draft;
  return rest;
}

export function withChart(
  draft: MemberDraft,
  axis: 'x' | 'y',
  chart: DraftChart | undefined,
): MemberDraft {
  const { [axis]: _, ...rest } = draft.charts ?? {};
  return { ...draft, charts: chart ? { ...rest, [axis]: chart } : rest };
}

/** Sizes of which only the shape is said. */
export const noSizes: DraftSizes = {
  ...{ shape: 'i', wall: '', confirmed: false },
  ...{ d: '', bf: '', tf: '', tw: '', bfTop: '', tfTop: '', bfBottom: '', tfBottom: '' },
  ...{ B: '', Ht: '', t: '', Ro: '', D: '' },
};

export const noSprings: DraftSprings = { xA: notGiven, xB: notGiven, yA: notGiven, yB: notGiven };

export const noJoints: DraftChart = { sidesway: '', GA: notGiven, GB: notGiven };

export const noNetSection: DraftNetSection = {
  ...{ by: 'An', Ae: notGiven, An: notGiven, U: notGiven },
};
