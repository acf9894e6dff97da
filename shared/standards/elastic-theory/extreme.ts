import { byOrder, type Order } from './transfer.ts';
import { formula } from './writer.ts';

/*
 * The extreme moment of a stretch without load or with a uniform one, between whose ends the shear
 * changes sign. M′² + k²M² + 2wM is the same all along the stretch, so the moment there is
 * Mi + Vi²/h, h = g ± √(g² + k²Vi²), g = w + k²Mi, with + for a crest (Vi > 0) and − for a trough,
 * and tan(kξ/2) = kVi/h. Where g and the root have opposite signs, h is written k²Vi²/(±√… − g), which
 * doesn't cancel. In tension k² is negative, and g has the sign of the root. By hand.
 */
const SQUARE = { compression: '(kL/L1)^2', tension: '-(kL/L1)^2' } as const;
const ROOT = 'sqrt(gi^2+(kL*Vi/L1)^2)';
type Axial = Exclude<Order, 'first'>;

const g = (order: Axial, loaded: boolean) =>
  formula({
    id: `g-${order}${loaded ? '-uniform' : ''}`,
    clause: '2.1',
    title: loaded
      ? 'Load with that of the axial force on the bent axis, at the start of the stretch'
      : 'Load of the axial force on the bent axis, at the start of the stretch',
    symbol: 'gi',
    dimension: 'lineLoad',
    expression: loaded ? `wi${order === 'tension' ? '-' : '+'}(kL/L1)^2*Mi` : `${SQUARE[order]}*Mi`,
    operands: {
      ...(loaded ? ({ wi: 'lineLoad' } as const) : {}),
      kL: 'angle',
      L1: 'length',
      Mi: 'moment',
    },
    prints: 'display',
  });

export const startLoad = {
  compression: { none: g('compression', false), uniform: g('compression', true) },
  tension: { none: g('tension', false), uniform: g('tension', true) },
};

const h = (id: string, title: string, expression: string) =>
  formula({
    id: `h-${id}`,
    clause: '2.1',
    title,
    symbol: 'hi',
    dimension: 'lineLoad',
    expression,
    operands: { gi: 'lineLoad', kL: 'angle', Vi: 'force', L1: 'length' },
    prints: 'display',
  });

/** Compression; `against`: g has the other sign than the root. */
export const auxiliaryLoad = {
  compression: {
    crest: h('crest', 'Auxiliary load of the crest', `gi+${ROOT}`),
    crestAgainst: h('crest-against', 'Auxiliary load of the crest', `(kL*Vi/L1)^2/(${ROOT}-gi)`),
    trough: h('trough', 'Auxiliary load of the trough', `gi-${ROOT}`),
    troughAgainst: h(
      'trough-against',
      'Auxiliary load of the trough',
      `-(kL*Vi/L1)^2/(${ROOT}+gi)`,
    ),
  },
  tension: {
    crest: h(
      'crest-tension',
      'Auxiliary load of the crest',
      'gi+sqrt((gi-kL*Vi/L1)*(gi+kL*Vi/L1))',
    ),
    trough: h(
      'trough-tension',
      'Auxiliary load of the trough',
      'gi-sqrt((gi-kL*Vi/L1)*(gi+kL*Vi/L1))',
    ),
  },
};

const distance = (order: Order) =>
  formula({
    id: `extreme-xi-${order}`,
    clause: '2.1',
    title: 'Its distance from the start of the stretch',
    symbol: 'xi',
    dimension: 'length',
    expression: {
      first: 'Vi/wi',
      compression: '2*L1*atan(kL*Vi/(L1*hi))/kL',
      tension: '2*L1*atanh(kL*Vi/(L1*hi))/kL',
    }[order],
    operands:
      order === 'first'
        ? { Vi: 'force', wi: 'lineLoad' }
        : { L1: 'length', kL: 'angle', Vi: 'force', hi: 'lineLoad' },
    prints: 'display',
  });
export const extremeDistance = byOrder(distance);

/** Auxiliary load is 2w in first order. */
export const extremeMoment = {
  first: formula({
    id: 'extreme-M-first',
    clause: '2.1',
    title: 'Extreme moment in the stretch',
    symbol: 'Mz',
    dimension: 'moment',
    expression: 'Mi+Vi^2/(2*wi)',
    operands: { Mi: 'moment', Vi: 'force', wi: 'lineLoad' },
    prints: 'display',
  }),
  second: formula({
    id: 'extreme-M',
    clause: '2.1',
    title: 'Extreme moment in the stretch',
    symbol: 'Mz',
    dimension: 'moment',
    expression: 'Mi+Vi^2/hi',
    operands: { Mi: 'moment', Vi: 'force', hi: 'lineLoad' },
    prints: 'display',
  }),
};

export const placeFromStart = formula({
  id: 'place',
  clause: '2.1',
  title: 'Its distance from end A',
  symbol: 'zi',
  dimension: 'length',
  expression: 'zi+xi',
  operands: { zi: 'length', xi: 'length' },
  prints: 'display',
});

export const extremeFormulas = [
  ...Object.values(startLoad).flatMap((o) => Object.values(o)),
  ...Object.values(auxiliaryLoad.compression),
  ...Object.values(auxiliaryLoad.tension),
  ...Object.values(extremeDistance),
  ...Object.values(extremeMoment),
  placeFromStart,
];
