import { textsOfLoad } from './draft-input-parts.ts';
import {
  type DraftSizes,
  type DraftSwayDirection,
  type SwayName,
  springNames,
} from './draft-parts.ts';
import type { DraftQuantity, DraftSource } from './draft-quantity.ts';
import { sizesOf } from './draft-section.ts';
import { actionNames, actionOf, inSprings, lengthNames, type MemberDraft } from './members.ts';

/** A text of a member's form that carries a source, by the path of its problems. */
export interface DraftValue {
  readonly path: string;
  readonly text: string;
  readonly source?: DraftSource | undefined;
  readonly confirmed: boolean;
}

/** Every text of a member's form that its input would hold, empty ones too. */
export function valuesOf(draft: MemberDraft): DraftValue[] {
  const { springs, charts, netSection, stiffeners } = draft;
  return [
    ...(draft.sizes ? sizeValues(draft.sizes) : [at('section', draft.section)]),
    ...(['ends', 'Cb', ...lengthNames] as const).map((name) => at(name, draft[name])),
    ...(draft.restraints ?? []).map(({ at: text, source, confirmed }, i) => ({
      ...{ path: `restraints[${i}].at`, text, source, confirmed },
    })),
    ...(springs && inSprings(draft)
      ? springNames.map((name) => at(`springs.${name}`, springs[name]))
      : []),
    ...(['x', 'y'] as const).flatMap((axis) => {
      const chart = charts?.[axis];
      return chart ? [at(`charts.${axis}.GA`, chart.GA), at(`charts.${axis}.GB`, chart.GB)] : [];
    }),
    ...(netSection
      ? (netSection.by === 'Ae' ? (['Ae'] as const) : (['An', 'U'] as const)).map((name) =>
          at(`netSection.${name}`, netSection[name]),
        )
      : []),
    ...(stiffeners ? [at('stiffeners', stiffeners)] : []),
    ...draft.combinations.flatMap((row, index) => {
      const here = `combinations[${index}]`;
      return [
        ...actionNames.map((action) => at(`${here}.${action}`, actionOf(row, action))),
        ...(row.loads ?? []).flatMap((load, i) =>
          textsOfLoad(load.kind).map((name) => ({
            ...{ path: `${here}.loads[${i}].${name}`, text: load[name] },
            ...{ source: load.source, confirmed: load.confirmed },
          })),
        ),
        ...(row.supports ?? []).flatMap(({ Mx, My }, i) => [
          at(`${here}.supports[${i}].Mx`, Mx),
          at(`${here}.supports[${i}].My`, My),
        ]),
        ...swayValues(`${here}.sway`, row.sway),
      ];
    }),
  ];
}

const at = (path: string, quantity: DraftQuantity): DraftValue => ({ path, ...quantity });

const sizeValues = (sizes: DraftSizes): DraftValue[] =>
  sizesOf(sizes).map((name) => ({
    ...{ path: `section.${name}`, text: sizes[name] },
    ...{ source: sizes.source, confirmed: sizes.confirmed },
  }));

/** Those of the story's stiffness that are not chosen are kept in the form and not sent. */
function swayValues(path: string, sway: MemberDraft['combinations'][number]['sway']): DraftValue[] {
  if (!sway) return [];
  return [
    at(`${path}.P`, sway.P),
    ...(['x', 'y'] as const).flatMap((axis) => {
      const direction = sway[axis];
      if (!direction) return [];
      return usesOf(direction).map((name) => at(`${path}.${axis}.${name}`, direction[name]));
    }),
  ];
}

const usesOf = ({ by, frames }: DraftSwayDirection): readonly SwayName[] => [
  ...(['MA', 'MB', 'Pstory'] as const),
  ...(by === 'critical' ? (['PeStory'] as const) : (['H', 'height', 'drift'] as const)),
  ...(by === 'drift' && frames === 'share' ? (['Pmf'] as const) : []),
];
