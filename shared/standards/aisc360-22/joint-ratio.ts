import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { formula } from './writer.ts';

// Commentary to Appendix 7.2: stiffness ratio of columns to girders at a joint.
const COMMENTARY = 'Commentary App. 7.2';
const STIFFNESS = { clause: COMMENTARY, symbol: 'EIL', dimension: 'rotationalStiffness' } as const;
const MEMBER = { E: 'stress', I: 'inertia', L: 'length' } as const;
const SUM = { EILa: 'rotationalStiffness', EILb: 'rotationalStiffness' } as const;
const G = { clause: COMMENTARY, symbol: 'Gjoint', dimension: 'none' } as const;

const girder = (id: string, far: string, expression: string) =>
  formula({
    ...{ ...STIFFNESS, id, title: `Stiffness of a girder, ${far}`, expression },
    operands: MEMBER,
  });

export const jointRatioFormulas = {
  stiffness: formula({
    ...{ ...STIFFNESS, id: 'C-A-7-bar', title: 'Stiffness over length', expression: 'E*I/L' },
    operands: MEMBER,
  }),
  // A far end that isn't rigidly joined to a column changes the girder's stiffness at the near end
  // from 2EI/L (inhibited) or 6EI/L (uninhibited) to 4EI/L (fixed) or 3EI/L (pinned).
  inhibitedFixed: girder(
    'C-A-7-girder-inhibited-fixed',
    'sidesway inhibited, far end fixed',
    '2*E*I/L',
  ),
  inhibitedPinned: girder(
    'C-A-7-girder-inhibited-pinned',
    'sidesway inhibited, far end pinned',
    '1.5*E*I/L',
  ),
  uninhibitedFixed: girder(
    'C-A-7-girder-uninhibited-fixed',
    'sidesway uninhibited, far end fixed',
    '2*E*I/(3*L)',
  ),
  uninhibitedPinned: girder(
    'C-A-7-girder-uninhibited-pinned',
    'sidesway uninhibited, far end pinned',
    '0.5*E*I/L',
  ),
  columns: formula({
    ...{ id: 'C-A-7-columns', clause: COMMENTARY, title: 'Columns at the joint' },
    ...{ symbol: 'sumEILc', dimension: 'rotationalStiffness' },
    ...{ expression: 'EILa+EILb', operands: SUM, prints: 'display' },
  }),
  girders: formula({
    ...{ id: 'C-A-7-girders', clause: COMMENTARY, title: 'Girders at the joint' },
    ...{ symbol: 'sumEILg', dimension: 'rotationalStiffness' },
    ...{ expression: 'EILa+EILb', operands: SUM, prints: 'display' },
  }),
  G: formula({
    ...{ ...G, id: 'C-A-7-3', equation: 'C-A-7-3', title: 'Stiffness ratio at the joint' },
    expression: 'sumEILc/sumEILg',
    operands: { sumEILc: 'rotationalStiffness', sumEILg: 'rotationalStiffness' },
    prints: 'display',
  }),
  Greduced: formula({
    ...{ ...G, id: 'C-A-7-3-taub', equation: 'C-A-7-3' },
    title: 'Stiffness ratio at the joint, columns with reduced stiffness',
    expression: 'taub*(sumEILc/sumEILg)',
    operands: { taub: 'none', sumEILc: 'rotationalStiffness', sumEILg: 'rotationalStiffness' },
    prints: 'display',
  }),
  Gpinned: formula({
    ...{ ...G, id: 'C-A-7-G-pinned', title: 'Practical stiffness ratio of a pinned base' },
    ...{ expression: '10', operands: {} },
  }),
  Gfixed: formula({
    ...{ ...G, id: 'C-A-7-G-fixed', title: 'Practical stiffness ratio of a fixed base' },
    ...{ expression: '1', operands: {} },
  }),
};

export type Sidesway = 'inhibited' | 'uninhibited';

interface Bar {
  readonly E: Quantity;
  readonly I: Quantity;
  readonly L: Quantity;
}

/** EI/L of a column, or of a girder whose far end is rigidly joined to a column like this one. */
export const barStiffness = (r: Recorder, key: string, { E, I, L }: Bar): Quantity =>
  r.formula(jointRatioFormulas.stiffness, key, { E, I, L });

/** EI/L of a girder with its far end fixed or pinned, brought to the model of the charts. */
export function girderStiffness(
  r: Recorder,
  key: string,
  { E, I, L }: Bar,
  kind: Sidesway,
  farEnd: 'fixed' | 'pinned',
): Quantity {
  const { inhibitedFixed, inhibitedPinned, uninhibitedFixed, uninhibitedPinned } =
    jointRatioFormulas;
  const used = {
    inhibited: { fixed: inhibitedFixed, pinned: inhibitedPinned },
    uninhibited: { fixed: uninhibitedFixed, pinned: uninhibitedPinned },
  }[kind][farEnd];
  return r.formula(used, key, { E, I, L });
}

/**
 * C-A-7-3: G at an end of a column under `at` (`K/x`), from EI/L of the columns above and below and
 * of the girders rigidly joined to them; each list has at least one. `taub` reduces the columns
 * where they buckle inelastically, null leaves them elastic.
 */
export function jointRatio(
  r: Recorder,
  at: string,
  end: 'A' | 'B',
  taub: Quantity | null,
  columns: readonly Quantity[],
  girders: readonly Quantity[],
): Quantity {
  const total = (name: 'columns' | 'girders', all: readonly Quantity[]): Quantity =>
    all.reduce((EILa, EILb, i) =>
      r.formula(jointRatioFormulas[name], `${at}/G${end}/${name}/${i + 1}`, { EILa, EILb }),
    );
  const sums = { sumEILc: total('columns', columns), sumEILg: total('girders', girders) };
  return taub
    ? r.formula(jointRatioFormulas.Greduced, `${at}/G${end}`, { taub, ...sums }, named(end))
    : r.formula(jointRatioFormulas.G, `${at}/G${end}`, sums, named(end));
}

const named = (end: 'A' | 'B') => ({ symbol: `G${end}` });

/** Commentary to App. 7.2: G = 10 for a base built as a pin, 1 for one built as fixed. */
export const practicalRatio = (
  r: Recorder,
  at: string,
  end: 'A' | 'B',
  base: 'pinned' | 'fixed',
): Quantity =>
  r.formula(
    base === 'pinned' ? jointRatioFormulas.Gpinned : jointRatioFormulas.Gfixed,
    `${at}/G${end}`,
    {},
    named(end),
  );
