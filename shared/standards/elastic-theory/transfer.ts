import type { Formula } from '../../calc/formula.ts';
import type { DimensionName } from '../../units/dimension.ts';
import { formula } from './writer.ts';

/*
 * Moment and shear along a stretch whose load is constant or varies in a straight line, from those at
 * its start: the solution of M″ + k²M = −w by initial values, k² = αP/EI* (compression), its limit
 * k = 0 (first order) and its continuation to tension. Shear is V = M′, normal to the bent axis.
 * S. P. Timoshenko, J. M. Gere, Theory of Elastic Stability, 2nd ed., McGraw-Hill 1961, chapter 1;
 * from memory. Terms are written so that none cancels for small k: 1 − cos x is 2 sin²(x/2), and the
 * varying part of the load takes Φ₃(x) = 1/6 − x/120 + x²/5040 − …
 */
export type Order = 'first' | 'compression' | 'tension';
export type LoadShape = 'none' | 'uniform' | 'linear';

const ORDERS: readonly Order[] = ['first', 'compression', 'tension'];
const SHAPES: readonly LoadShape[] = ['none', 'uniform', 'linear'];

/** One of something per order. */
export const byOrder = <T>(make: (order: Order) => T): Readonly<Record<Order, T>> => ({
  first: make('first'),
  compression: make('compression'),
  tension: make('tension'),
});
export const byShape = <T>(make: (shape: LoadShape) => T): Readonly<Record<LoadShape, T>> => ({
  none: make('none'),
  uniform: make('uniform'),
  linear: make('linear'),
});

/** What each part of the state at the start, and of the load, adds at the distance ξ. */
const MOMENT: Readonly<Record<Order, { state: string; uniform: string; varying: string }>> = {
  first: {
    state: 'Mi+Vi*xi',
    uniform: '-wi*xi^2/2',
    varying: '-(wj-wi)*xi^3/(6*li)',
  },
  compression: {
    state: 'Mi*cos(kxi)+Vi*xi*sin(kxi)/kxi',
    uniform: '-2*wi*(xi*sin(kxi/2)/kxi)^2',
    varying: '-(wj-wi)*xi^3*Phi3(kxi^2)/li',
  },
  tension: {
    state: 'Mi*cosh(kxi)+Vi*xi*sinh(kxi)/kxi',
    uniform: '-2*wi*(xi*sinh(kxi/2)/kxi)^2',
    varying: '-(wj-wi)*xi^3*Phi3(-kxi^2)/li',
  },
};
const SHEAR: typeof MOMENT = {
  first: { state: 'Vi', uniform: '-wi*xi', varying: '-(wj-wi)*xi^2/(2*li)' },
  compression: {
    state: 'Vi*cos(kxi)-Mi*kxi*sin(kxi)/xi',
    uniform: '-wi*xi*sin(kxi)/kxi',
    varying: '-2*(wj-wi)*(xi*sin(kxi/2)/kxi)^2/li',
  },
  tension: {
    state: 'Vi*cosh(kxi)+Mi*kxi*sinh(kxi)/xi',
    uniform: '-wi*xi*sinh(kxi)/kxi',
    varying: '-2*(wj-wi)*(xi*sinh(kxi/2)/kxi)^2/li',
  },
};
/** The shear once more, with the angles written out: its root is the distance ξ of a zero. */
const ZERO: typeof MOMENT = {
  first: SHEAR.first,
  compression: {
    state: 'Vi*cos(kL*xi/L1)-Mi*kL*sin(kL*xi/L1)/L1',
    uniform: '-wi*L1*sin(kL*xi/L1)/kL',
    varying: '-2*(wj-wi)*(L1*sin(kL*xi/(2*L1))/kL)^2/li',
  },
  tension: {
    state: 'Vi*cosh(kL*xi/L1)+Mi*kL*sinh(kL*xi/L1)/L1',
    uniform: '-wi*L1*sinh(kL*xi/L1)/kL',
    varying: '-2*(wj-wi)*(L1*sinh(kL*xi/(2*L1))/kL)^2/li',
  },
};
/** Change of the shear along the stretch, times −1; zero where the shear turns. */
const TURN: typeof MOMENT = {
  first: { state: '', uniform: 'wi', varying: '+(wj-wi)*xi/li' },
  compression: {
    state: '(kL/L1)^2*(Mi*cos(kL*xi/L1)+Vi*L1*sin(kL*xi/L1)/kL)',
    uniform: '+wi*cos(kL*xi/L1)',
    varying: '+(wj-wi)*L1*sin(kL*xi/L1)/(kL*li)',
  },
  tension: {
    state: '-(kL/L1)^2*(Mi*cosh(kL*xi/L1)+Vi*L1*sinh(kL*xi/L1)/kL)',
    uniform: '+wi*cosh(kL*xi/L1)',
    varying: '+(wj-wi)*L1*sinh(kL*xi/L1)/(kL*li)',
  },
};

const DIMENSIONS: Readonly<Record<string, DimensionName>> = {
  Mi: 'moment',
  Vi: 'force',
  wi: 'lineLoad',
  wj: 'lineLoad',
  xi: 'length',
  li: 'length',
  kxi: 'angle',
  kL: 'angle',
  L1: 'length',
};

/** The operands that a text names. */
const operandsOf = (text: string): Record<string, DimensionName> =>
  Object.fromEntries(
    Object.entries(DIMENSIONS).filter(([name]) => new RegExp(`\\b${name}\\b`).test(text)),
  );

const textOf = (terms: (typeof MOMENT)[Order], shape: LoadShape): string =>
  terms.state + (shape === 'none' ? '' : terms.uniform) + (shape === 'linear' ? terms.varying : '');

/** Moment at the distance ξ from the start of a stretch, by order and shape of the load. */
export const momentAt = byOrder((order) =>
  byShape((shape) => {
    const expression = textOf(MOMENT[order], shape);
    return formula({
      id: `M-${order}-${shape}`,
      clause: '2',
      title: 'Moment',
      symbol: 'Mz',
      dimension: 'moment',
      expression,
      operands: operandsOf(expression),
      prints: 'display',
    });
  }),
);

/** Shear at the distance ξ; null where it doesn't change: first order, no load. */
export const shearAt = byOrder((order) =>
  byShape((shape) => {
    if (order === 'first' && shape === 'none') return null;
    const expression = textOf(SHEAR[order], shape);
    return formula({
      id: `V-${order}-${shape}`,
      clause: '2',
      title: 'Shear',
      symbol: 'Vz',
      dimension: 'force',
      expression,
      operands: operandsOf(expression),
      prints: 'display',
    });
  }),
);

const zero = (order: Order, shape: LoadShape): Formula => {
  const expression = textOf(ZERO[order], shape);
  return formula({
    id: `zero-shear-${order}-${shape}`,
    clause: '2.1',
    title: 'Distance of zero shear from the start of the stretch',
    symbol: 'Vz',
    dimension: 'force',
    expression,
    operands: operandsOf(expression),
  });
};

/** Zero shear where no closed form stands: under a varying load, and in tension. */
export const zeroShear = {
  first: { linear: zero('first', 'linear') },
  compression: { linear: zero('compression', 'linear') },
  tension: byShape((shape) => zero('tension', shape)),
};

/** Extreme shear under a varying load: its root is ξ. */
export const turningShear = byOrder((order) => {
  const expression = textOf(TURN[order], 'linear');
  return formula({
    id: `turning-shear-${order}`,
    clause: '2.1',
    title: 'Distance of the extreme shear from the start of the stretch',
    symbol: 'wz',
    dimension: 'lineLoad',
    expression,
    operands: operandsOf(expression),
  });
});

export const transferFormulas: readonly Formula[] = ORDERS.flatMap((order) => [
  ...SHAPES.map((shape) => momentAt[order][shape]),
  ...SHAPES.flatMap((shape) => shearAt[order][shape] ?? []),
  ...Object.values<Formula>(zeroShear[order]),
  turningShear[order],
]);
