import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { Bay, BayLoad } from './bay.ts';
import { formula } from './writer.ts';

/* The bay in stretches, from load end to load end, so that the load of each is one straight line. */
export const stretchFormulas = {
  length: formula({
    id: 'stretch-length',
    clause: '2',
    title: 'Length of the stretch',
    symbol: 'li',
    dimension: 'length',
    expression: 'zj-zi',
    operands: { zj: 'length', zi: 'length' },
    prints: 'display',
  }),
  half: formula({
    id: 'half-length',
    clause: '2',
    title: 'The middle',
    symbol: 'zi',
    dimension: 'length',
    expression: 'L1/2',
    operands: { L1: 'length' },
    prints: 'display',
  }),
  intensity: formula({
    id: 'intensity',
    clause: '2',
    title: 'Varying load at a place',
    symbol: 'wi',
    dimension: 'lineLoad',
    expression: 'wa+(wb-wa)*(zi-a)/(b-a)',
    operands: { wa: 'lineLoad', wb: 'lineLoad', zi: 'length', a: 'length', b: 'length' },
    prints: 'display',
  }),
  together: formula({
    id: 'loads-together',
    clause: '2',
    title: 'Loads together',
    symbol: 'wi',
    dimension: 'lineLoad',
    expression: 'wi+wj',
    operands: { wi: 'lineLoad', wj: 'lineLoad' },
    prints: 'display',
  }),
};

type LineLoad = Exclude<BayLoad, { kind: 'point' }>;

/** Load of a stretch: at its start and at its end. */
export type StretchLoad =
  | { readonly shape: 'none' }
  | { readonly shape: 'uniform'; readonly wi: Quantity }
  | { readonly shape: 'linear'; readonly wi: Quantity; readonly wj: Quantity };

export interface Stretch {
  /** Number of the stretch, from 1; its end is the node of that number. */
  readonly index: number;
  /** From end A; null at end A itself. */
  readonly from: Quantity | null;
  readonly to: Quantity;
  readonly length: Quantity;
  readonly load: StretchLoad;
  /** Forces at the stretch's start. */
  readonly forces: readonly Quantity[];
}

/** Symbols of the book are numbered up to this; a bay with more stretches repeats the last one. */
export const MOST_NUMBERED = 40;
/** `M` at node 3 is `M3z`: the name of its symbol in the book. */
export const numbered = (name: string, index: number, after = ''): string =>
  `${name}${Math.min(index, MOST_NUMBERED)}${after}`;

/** Places nearer to each other than this share of the bay are one. */
const SAME = 1e-9;

/** Lengths and loads of the stretches, between the ends of loads and, if asked, at the middle. */
export function stretchesOf(r: Recorder, at: string, bay: Bay, middle: boolean): Stretch[] {
  const { L1, loads } = bay;
  const same = (a: number, b: number) => Math.abs(a - b) <= SAME * L1.value;
  for (const load of loads) assertInside(load, L1);
  const places = [
    ...loads.flatMap((l) => (l.kind === 'point' ? [l.at] : [l.from, l.to])),
    ...(middle
      ? [r.formula(stretchFormulas.half, `${at}/middle`, { L1 }, { symbol: numbered('z', 0) })]
      : []),
  ]
    .filter((p) => !same(p.value, 0) && !same(p.value, L1.value))
    .sort((a, b) => a.value - b.value)
    .filter((p, i, all) => i === 0 || !same(p.value, (all[i - 1] as Quantity).value));
  const lineLoads = loads.filter((l) => l.kind !== 'point');
  return [...places, L1].map((to, i) => {
    const from = i === 0 ? null : (places[i - 1] as Quantity);
    const start = from?.value ?? 0;
    const index = i + 1;
    return {
      index,
      from,
      to,
      length: from
        ? r.formula(
            stretchFormulas.length,
            `${at}/l${index}`,
            { zj: to, zi: from },
            { title: `Length of stretch ${index}`, symbol: numbered('l', index) },
          )
        : to,
      load: loadOf(
        r,
        at,
        index,
        lineLoads.filter(
          (l) =>
            (l.from.value < start || same(l.from.value, start)) &&
            (l.to.value > to.value || same(l.to.value, to.value)),
        ),
        { from, to, same },
      ),
      forces: loads.flatMap((l) => (l.kind === 'point' && same(l.at.value, start) ? [l.W] : [])),
    };
  });
}

function assertInside(load: BayLoad, L1: Quantity): void {
  const inside =
    load.kind === 'point'
      ? load.at.value > 0 && load.at.value < L1.value
      : load.from.value >= 0 &&
        load.from.value < load.to.value &&
        load.to.value <= L1.value * (1 + SAME);
  if (!inside) throw new Error(`a load lies outside its bay of ${L1.value}`);
}

function loadOf(
  r: Recorder,
  at: string,
  index: number,
  loads: readonly LineLoad[],
  place: {
    readonly from: Quantity | null;
    readonly to: Quantity;
    readonly same: (a: number, b: number) => boolean;
  },
): StretchLoad {
  if (loads.length === 0) return { shape: 'none' };
  const sum = (key: string, name: string, terms: readonly Quantity[]): Quantity =>
    terms.reduce((wi, wj, n) =>
      r.formula(
        stretchFormulas.together,
        `${at}/${key}${index}${n === terms.length - 1 ? '' : `/${n}`}`,
        { wi, wj },
        {
          title: `Load ${key === 'w' ? 'of' : 'at the end of'} stretch ${index}`,
          symbol: numbered(name, index),
        },
      ),
    );
  const intensity = (end: 'from' | 'to', key: string, name: string): Quantity[] =>
    loads.map((l, n) => {
      if (l.kind === 'uniform') return l.w;
      const z = place[end];
      if (place.same(z?.value ?? 0, l.from.value)) return l.wa;
      if (place.same(z?.value ?? 0, l.to.value)) return l.wb;
      return r.formula(
        stretchFormulas.intensity,
        `${at}/${key}${index}/load${n + 1}`,
        { wa: l.wa, wb: l.wb, zi: z as Quantity, a: l.from, b: l.to },
        {
          title: `Varying load at the ${end === 'from' ? 'start' : 'end'} of stretch ${index}`,
          symbol: numbered(name, index),
        },
      );
    });
  const wi = sum('w', 'w', intensity('from', 'w', 'w'));
  if (loads.every((l) => l.kind === 'uniform')) return { shape: 'uniform', wi };
  return { shape: 'linear', wi, wj: sum('we', 'we', intensity('to', 'we', 'we')) };
}
