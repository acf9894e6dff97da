import type {
  DraftChart,
  DraftLoad,
  DraftNetSection,
  DraftRestraint,
  DraftSizes,
  DraftSprings,
  DraftSupport,
  DraftSway,
  DraftSwayDirection,
} from './draft-parts.ts';
import { springNames } from './draft-parts.ts';
import type { DraftQuantity, DraftSource } from './draft-quantity.ts';
import { hasWall, mayBeEmpty, sizesOf } from './draft-section.ts';

/** What says where a text is from. */
interface Stated {
  readonly source?: DraftSource | undefined;
  readonly confirmed: boolean;
}

/** A quantity as INPUT.json writes it, left out where it is empty. */
export const given = (name: string, quantity: DraftQuantity) =>
  quantity.text.trim() === '' ? {} : asked(name, quantity);

/** The same, kept where it is empty: it is needed, and its absence is a problem of its own place. */
export const asked = (name: string, { text, ...stated }: DraftQuantity) => ({
  [name]: { value: text.trim(), ...statedInputOf(stated) },
});

export const statedInputOf = ({ source, confirmed }: Stated) => ({
  source: sourceInputOf(source ?? { kind: 'typed' }),
  confirmed,
});

export function sourceInputOf(source: DraftSource) {
  if (source.kind !== 'file') return source;
  const { row, ...file } = source;
  return /^\d+$/.test(row ?? '') ? { ...file, row: Number(row) } : file;
}

/** Their source and state stand beside the sizes, which hold for all of them. */
export const sizesInputOf = (sizes: DraftSizes) => ({
  shape: sizes.shape,
  ...(hasWall(sizes) && sizes.wall !== '' ? { wall: sizes.wall } : {}),
  ...Object.fromEntries(
    sizesOf(sizes)
      .filter((name) => !mayBeEmpty(name) || sizes[name].trim() !== '')
      .map((name) => [name, sizes[name].trim()]),
  ),
  ...statedInputOf(sizes),
});

export const restraintInputOf = ({ at, holds, source, confirmed }: DraftRestraint) => ({
  ...asked('at', { text: at, source, confirmed }),
  holds,
  ...statedInputOf({ source, confirmed }),
});

/** Texts that every load of the kind has, and those that it may have. */
const textsOf = {
  whole: { kind: 'uniform', needs: ['w'], may: [] },
  part: { kind: 'uniform', needs: ['w', 'from', 'to'], may: [] },
  varying: { kind: 'linear', needs: ['wFrom', 'wTo'], may: ['from', 'to'] },
  point: { kind: 'point', needs: ['W', 'at'], may: [] },
} as const;

export type LoadText = (typeof loadTexts)[number];
export const loadTexts = ['w', 'wFrom', 'wTo', 'W', 'at', 'from', 'to'] as const;

/** The texts that a load of this kind has, in the order of its fields. */
export const textsOfLoad = (kind: DraftLoad['kind']): readonly LoadText[] => [
  ...textsOf[kind].needs,
  ...textsOf[kind].may,
];

export function loadInputOf(load: DraftLoad) {
  const { source, confirmed, height } = load;
  const { kind, needs, may } = textsOf[load.kind];
  const quantity = (name: LoadText) => ({ text: load[name], source, confirmed });
  return {
    kind,
    bends: load.bends,
    ...(height === '' ? {} : { height }),
    ...Object.assign(
      {},
      ...needs.map((name) => asked(name, quantity(name))),
      ...may.map((name) => given(name, quantity(name))),
    ),
  };
}

/** The moments over a restraint, at the place that it has. */
export const supportInputOf =
  (restraints: readonly DraftRestraint[]) =>
  ({ restraint, Mx, My }: DraftSupport) => {
    const held = restraints.find(({ id }) => id === restraint);
    const place = {
      text: held?.at ?? '',
      source: held?.source,
      confirmed: held?.confirmed ?? false,
    };
    return { ...asked('at', place), ...given('Mx', Mx), ...given('My', My) };
  };

export const swayInputOf = ({ P, x, y }: DraftSway) => ({
  ...given('P', P),
  ...(x ? { x: directionInputOf(x) } : {}),
  ...(y ? { y: directionInputOf(y) } : {}),
});

const directionInputOf = (sway: DraftSwayDirection) => ({
  ...given('MA', sway.MA),
  ...given('MB', sway.MB),
  ...asked('Pstory', sway.Pstory),
  ...(sway.by === 'critical'
    ? asked('PeStory', sway.PeStory)
    : {
        ...given('H', sway.H),
        ...given('height', sway.height),
        ...given('drift', sway.drift),
        ...(sway.frames === 'share' ? asked('Pmf', sway.Pmf) : {}),
        ...(sway.frames === 'braced' || sway.frames === 'lower bound' ? { RM: sway.frames } : {}),
      }),
});

export const springsInputOf = (springs: DraftSprings) =>
  Object.assign({}, ...springNames.map((name) => given(name, springs[name])));

export const chartInputOf = ({ sidesway, GA, GB }: DraftChart) => ({
  ...(sidesway === '' ? {} : { sidesway }),
  ...asked('GA', GA),
  ...asked('GB', GB),
});

export const netSectionInputOf = ({ by, Ae, An, U }: DraftNetSection) =>
  by === 'Ae' ? asked('Ae', Ae) : { ...asked('An', An), ...asked('U', U) };
