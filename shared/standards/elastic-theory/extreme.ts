import { formula } from './writer.ts';

/*
 * The extreme moment of a stretch between whose ends the shear changes sign: without load or with a
 * uniform one, in first order and in compression. M′² + k²M² + 2wM is the same all along the stretch,
 * so the moment there is Mi + Vi²/h, h = g ± √(g² + k²Vi²), g = w + k²Mi, with + for a crest (Vi > 0)
 * and − for a trough, and tan(kξ/2) = kVi/h. Where g and the root have opposite signs, h is written
 * k²Vi²/(±√… − g), which doesn't cancel. First order: h = 2w. By hand.
 */
const ROOT = 'sqrt(gi^2+(kL*Vi/L1)^2)';

/** k² Mi, and the load. */
export const startLoad = {
  none: formula({
    id: 'g',
    clause: '2.1',
    title: 'Load of the axial force on the bent axis, at the start of the stretch',
    symbol: 'gi',
    dimension: 'lineLoad',
    expression: '(kL/L1)^2*Mi',
    operands: { kL: 'angle', L1: 'length', Mi: 'moment' },
    prints: 'display',
  }),
  uniform: formula({
    id: 'g-uniform',
    clause: '2.1',
    title: 'Load with that of the axial force on the bent axis, at the start of the stretch',
    symbol: 'gi',
    dimension: 'lineLoad',
    expression: 'wi+(kL/L1)^2*Mi',
    operands: { wi: 'lineLoad', kL: 'angle', L1: 'length', Mi: 'moment' },
    prints: 'display',
  }),
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

/** `Against`: g has the other sign than the root. */
export const auxiliaryLoad = {
  crest: h('crest', 'Auxiliary load of the crest', `gi+${ROOT}`),
  crestAgainst: h('crest-against', 'Auxiliary load of the crest', `(kL*Vi/L1)^2/(${ROOT}-gi)`),
  trough: h('trough', 'Auxiliary load of the trough', `gi-${ROOT}`),
  troughAgainst: h('trough-against', 'Auxiliary load of the trough', `-(kL*Vi/L1)^2/(${ROOT}+gi)`),
};

export const extremeDistance = {
  first: formula({
    id: 'extreme-xi-first',
    clause: '2.1',
    title: 'Distance of the extreme from the start of the stretch',
    symbol: 'xi',
    dimension: 'length',
    expression: 'Vi/wi',
    operands: { Vi: 'force', wi: 'lineLoad' },
    prints: 'display',
  }),
  compression: formula({
    id: 'extreme-xi',
    clause: '2.1',
    title: 'Distance of the extreme from the start of the stretch',
    symbol: 'xi',
    dimension: 'length',
    expression: '2*L1*atan(kL*Vi/(L1*hi))/kL',
    operands: { L1: 'length', kL: 'angle', Vi: 'force', hi: 'lineLoad' },
    prints: 'display',
  }),
};

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
  compression: formula({
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
  ...Object.values(startLoad),
  ...Object.values(auxiliaryLoad),
  ...Object.values(extremeDistance),
  ...Object.values(extremeMoment),
  placeFromStart,
];
