import { type LoadText, textsOfLoad } from '#shared/contracts/draft-input-parts.ts';
import {
  type DraftLoad,
  type DraftNetSection,
  type DraftRestraint,
  type DraftSprings,
  type DraftSupport,
  type DraftSway,
  springNames,
  swayNames,
} from '#shared/contracts/draft-parts.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';
import { holdText, loadKindWords, springWords, swayWords } from './part-words.ts';

/* Parts of a member in one line, for the choice between two versions of it. */

const listed = (texts: readonly (string | false)[]): string => texts.filter(Boolean).join(', ');

export const restraintText = ({ at, holds }: DraftRestraint): string =>
  `${at || 'no distance'}: ${holds.map(holdText).join(', ') || 'holds nothing'}`;

export function loadText(load: DraftLoad): string {
  const texts = textsOfLoad(load.kind)
    .filter((name) => load[name] !== '')
    .map((name) => `${shortNames[name]} ${load[name]}`);
  return listed([
    loadKindWords[load.kind],
    ...texts,
    `about ${load.bends}`,
    load.height !== '' && `at the ${load.height}`,
  ]);
}

const shortNames: Readonly<Record<LoadText, string>> = {
  ...{ w: 'w', wFrom: 'w', wTo: 'to w', W: 'W', at: 'at', from: 'from', to: 'to' },
};

export const supportText = ({ Mx, My }: DraftSupport): string =>
  listed([Mx.text !== '' && `major ${Mx.text}`, My.text !== '' && `minor ${My.text}`]);

export const swayText = (sway: DraftSway): string =>
  listed([
    sway.P.text !== '' && `axial ${sway.P.text}`,
    ...(['x', 'y'] as const).flatMap((axis) => {
      const direction = sway[axis];
      return direction
        ? swayNames.map(
            (name) =>
              direction[name].text !== '' &&
              `${swayWords[name].label} about ${axis} ${direction[name].text}`,
          )
        : [];
    }),
  ]);

export const springsText = (springs: DraftSprings | undefined): string =>
  springs
    ? listed(
        springNames.map(
          (name) => springs[name].text !== '' && `${springWords[name].label} ${springs[name].text}`,
        ),
      )
    : '';

export const chartsText = (charts: MemberDraft['charts']): string =>
  listed(
    (['x', 'y'] as const).map((axis) => {
      const chart = charts?.[axis];
      return chart !== undefined && `about ${axis} ${chart.GA.text}, ${chart.GB.text}`;
    }),
  );

export const netSectionText = (net: DraftNetSection | undefined): string => {
  if (!net) return '';
  return net.by === 'Ae' ? net.Ae.text : listed([net.An.text, net.U.text]);
};
