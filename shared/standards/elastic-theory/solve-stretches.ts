import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { Bay } from './bay.ts';
import { endsShear, linearShear, pointShear, uniformShear, wholeShear } from './end-shear.ts';
import { numbered, type Stretch, stretchesOf } from './stretches.ts';
import { momentAt, type Order, shearAt } from './transfer.ts';
import { formula } from './writer.ts';

export const walkFormulas = {
  angle: formula({
    id: 'angle',
    clause: '2',
    title: 'Axial parameter up to a place of the stretch',
    symbol: 'kxi',
    dimension: 'angle',
    expression: 'kL*xi/L1',
    operands: { kL: 'angle', xi: 'length', L1: 'length' },
    prints: 'display',
  }),
  afterForce: formula({
    id: 'after-force',
    clause: '2',
    title: 'Shear behind a force',
    symbol: 'Vi',
    dimension: 'force',
    expression: 'Vi-W',
    operands: { Vi: 'force', W: 'force' },
    prints: 'display',
  }),
  distance: formula({
    id: 'distance-in-stretch',
    clause: '2',
    title: 'Distance from the start of the stretch',
    symbol: 'xi',
    dimension: 'length',
    expression: 'zj-zi',
    operands: { zj: 'length', zi: 'length' },
    prints: 'display',
  }),
};

/** Order of the solution, and kL where there is an axial force. */
export type AxialOrder = { readonly order: Exclude<Order, 'first'>; readonly kL: Quantity };
export type OrderOf = { readonly order: 'first'; readonly kL: null } | AxialOrder;

/** A stretch with the moment and the shear at its two ends. */
export interface SolvedStretch {
  readonly stretch: Stretch;
  readonly Mi: Quantity;
  readonly Vi: Quantity;
  readonly Mj: Quantity;
  /** Before a force at the end of the stretch. */
  readonly Vj: Quantity;
  /** What the transfer formulas take at its end. */
  readonly atEnd: Record<string, Quantity>;
}

/** Shear at the start: end moments, then load by load. */
export function startShear(r: Recorder, at: string, bay: Bay, { order, kL }: OrderOf): Quantity {
  const { L1, loads, ends } = bay;
  const key = (n: number) => (n === loads.length ? `${at}/VA` : `${at}/VA/${n}`);
  const symbol = (n: number) => ({
    symbol: n === loads.length ? 'VA' : numbered('VA', n),
  });
  const first = r.formula(
    endsShear[order],
    key(0),
    { MA: ends.MA, MB: ends.MB, L1, ...(kL ? { kL } : {}) },
    symbol(0),
  );
  return loads.reduce((Vp, load, i) => {
    const known = { Vp, L1, ...(kL ? { kL } : {}) };
    const to = key(i + 1);
    const named = symbol(i + 1);
    if (load.kind === 'point')
      return r.formula(pointShear[order], to, { ...known, W: load.W, a: load.at }, named);
    if (load.kind === 'linear') {
      const { wa, wb, from: a, to: b } = load;
      return r.formula(linearShear[order], to, { ...known, wa, wb, a, b }, named);
    }
    const { w, from: a, to: b } = load;
    return a.value === 0 && b.value === L1.value
      ? r.formula(wholeShear[order], to, { ...known, w }, named)
      : r.formula(uniformShear[order], to, { ...known, w, a, b }, named);
  }, first);
}

/** What the transfer formulas take at the distance ξ from the start of a stretch. */
export function operandsAt(
  r: Recorder,
  key: string,
  L1: Quantity,
  { kL }: OrderOf,
  state: Pick<SolvedStretch, 'stretch' | 'Mi' | 'Vi'>,
  xi: Quantity,
  named: { readonly title: string; readonly symbol: string },
): Record<string, Quantity> {
  const { stretch, Mi, Vi } = state;
  const { load, length: li } = stretch;
  const loads =
    load.shape === 'none'
      ? {}
      : load.shape === 'uniform'
        ? { wi: load.wi }
        : { wi: load.wi, wj: load.wj, li };
  if (!kL) return { Mi, Vi, xi, ...loads };
  const kxi = xi === L1 ? kL : r.formula(walkFormulas.angle, key, { kL, xi, L1 }, named);
  return { Mi, Vi, xi, kxi, ...loads };
}

/** Said where a formula calls Φ₃. */
const SERIES = '; Φ₃(x) = 1/6 − x/120 + x²/5040 − …';
export const withSeries = (order: Order, { load }: Stretch): string =>
  order !== 'first' && load.shape === 'linear' ? SERIES : '';

/** The lines from end A to end B: shear and moment at every end of a stretch. */
export function solveStretches(
  r: Recorder,
  at: string,
  bay: Bay,
  solution: OrderOf,
  given: { readonly VA: Quantity; readonly middle: boolean },
): SolvedStretch[] {
  const { order } = solution;
  const stretches = stretchesOf(r, at, bay, given.middle);
  const solved: SolvedStretch[] = [];
  let [M, V] = [bay.ends.MA, given.VA];
  for (const stretch of stretches) {
    const { index, length, load } = stretch;
    const last = index === stretches.length;
    stretch.forces.forEach((W, n) => {
      V = r.formula(
        walkFormulas.afterForce,
        `${at}/V${index - 1}/behind${n === 0 ? '' : n + 1}`,
        { Vi: V, W },
        {
          title: `Shear at the start of stretch ${index}, behind the force`,
          symbol: numbered('Vb', index - 1),
        },
      );
    });
    const state = { stretch, Mi: M, Vi: V };
    const shear = shearAt[order][load.shape];
    const atEnd = operandsAt(r, `${at}/kl${index}`, bay.L1, solution, state, length, {
      title: `Axial parameter of stretch ${index}`,
      symbol: numbered('kl', index),
    });
    const Vj = shear
      ? r.formula(shear, last ? `${at}/VB` : `${at}/V${index}`, atEnd, {
          title: last ? 'Shear at end B' : `Shear at the end of stretch ${index}`,
          symbol: last ? 'VB' : numbered('V', index),
        })
      : V;
    const Mj = last
      ? bay.ends.MB
      : r.formula(momentAt[order][load.shape], `${at}/M${index}`, atEnd, {
          title: `Moment at the end of stretch ${index}${withSeries(order, stretch)}`,
          symbol: numbered('M', index, 'z'),
        });
    solved.push({ ...state, Mj, Vj, atEnd });
    [M, V] = [Mj, Vj];
  }
  return solved;
}
