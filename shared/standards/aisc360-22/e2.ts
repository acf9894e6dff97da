import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { formula } from './writer.ts';

// E2: lengths between points that are held. Lc = K L with K = 1 in braced members (C3, App. 7.2).
const stretch = (id: string, expression: string, operands: Record<string, 'length'>) =>
  formula({
    id,
    clause: 'E2',
    title: 'Distance between points that are held',
    symbol: 'Lbay',
    dimension: 'length',
    expression,
    operands,
  });

export const e2Formulas = {
  fromA: stretch('E2-from-A', 'zb', { zb: 'length' }),
  between: stretch('E2-between', 'zb-za', { zb: 'length', za: 'length' }),
  toB: stretch('E2-to-B', 'L-za', { L: 'length', za: 'length' }),
  offset: formula({
    id: 'E4-offset',
    clause: 'E4',
    title: 'Distance of the restrained flange from the shear centre',
    symbol: 'yoff',
    dimension: 'length',
    expression: 'd/2',
    operands: { d: 'length' },
  }),
};

/** Length of the stretch between two places; `null` is the end A as start, the end B as finish. */
export function stretchLength(
  r: Recorder,
  key: string,
  L: Quantity,
  za: Quantity | null,
  zb: Quantity | null,
  named: { title?: string; symbol?: string } = {},
): Quantity {
  if (za && zb) return r.formula(e2Formulas.between, key, { zb, za }, named);
  if (za) return r.formula(e2Formulas.toB, key, { L, za }, named);
  if (zb) return r.formula(e2Formulas.fromA, key, { zb }, named);
  return L;
}

// Places along the member, for bays, segments and loads that are cut by them.
export const placeFormulas = {
  local: formula({
    id: 'E2-place',
    clause: 'E2',
    title: 'Place measured from the start of the bay',
    symbol: 'zlocal',
    dimension: 'length',
    expression: 'z-za',
    operands: { z: 'length', za: 'length' },
  }),
  quarterA: formula({
    id: 'F1-place-A',
    clause: 'F1',
    title: 'Place of the first quarter point',
    symbol: 'z',
    dimension: 'length',
    expression: 'za+Lb/4',
    operands: { za: 'length', Lb: 'length' },
  }),
  quarterB: formula({
    id: 'F1-place-B',
    clause: 'F1',
    title: 'Place of the middle',
    symbol: 'z',
    dimension: 'length',
    expression: 'za+Lb/2',
    operands: { za: 'length', Lb: 'length' },
  }),
  quarterC: formula({
    id: 'F1-place-C',
    clause: 'F1',
    title: 'Place of the third quarter point',
    symbol: 'z',
    dimension: 'length',
    expression: 'za+3*Lb/4',
    operands: { za: 'length', Lb: 'length' },
  }),
  middle: formula({
    id: 'E2-middle',
    clause: 'E2',
    title: 'Middle of the bay',
    symbol: 'zlocal',
    dimension: 'length',
    expression: 'L1/2',
    operands: { L1: 'length' },
  }),
  intensity: formula({
    id: 'E2-intensity',
    clause: 'E2',
    title: 'Load where the bay cuts it',
    symbol: 'wcut',
    dimension: 'lineLoad',
    expression: 'wa+(wb-wa)*(z-za)/(zb-za)',
    operands: {
      wa: 'lineLoad',
      wb: 'lineLoad',
      z: 'length',
      za: 'length',
      zb: 'length',
    },
  }),
};
