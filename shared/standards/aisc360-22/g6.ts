import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { plateCoefficient } from './g2-buckling.ts';
import { formula } from './writer.ts';

// G6 I-shapes and channels bent about the minor axis: the flanges resist the shear force.
export const g6Formulas = {
  kv: formula({
    id: 'G6-kv',
    clause: 'G6',
    title: 'Plate buckling coefficient of a flange',
    symbol: 'kv',
    dimension: 'none',
    expression: '1.2',
    operands: {},
  }),
  flange: formula({
    id: 'G6-1',
    clause: 'G6',
    equation: 'G6-1',
    title: 'Nominal shear strength of one flange',
    symbol: 'Vnf',
    dimension: 'force',
    expression: '0.6*Fy*bf*tf*Cv2',
    operands: { Fy: 'stress', bf: 'length', tf: 'length', Cv2: 'none' },
  }),
  twoEqual: formula({
    id: 'G6-equal',
    clause: 'G6',
    title: 'Nominal shear strength of two equal flanges',
    symbol: 'Vn',
    dimension: 'force',
    expression: '2*Vnf',
    operands: { Vnf: 'force' },
  }),
  twoUnequal: formula({
    id: 'G6-unequal',
    clause: 'G6',
    title: 'Nominal shear strength of both flanges',
    symbol: 'Vn',
    dimension: 'force',
    expression: 'Vnt+Vnb',
    operands: { Vnt: 'force', Vnb: 'force' },
  }),
};

export interface Flange {
  readonly bf: Quantity;
  readonly tf: Quantity;
  /** bf/2tf of an I-shape, bf/tf of a channel. */
  readonly lambda: Quantity;
}

interface Steel {
  readonly E: Quantity;
  readonly Fy: Quantity;
}

/** G6-1 for a section with two equal flanges. */
export function equalFlangesShear(r: Recorder, at: string, steel: Steel, flange: Flange): Quantity {
  const kv = r.formula(g6Formulas.kv, `${at}/kv`, {});
  const Vnf = flangeShear(r, at, steel, kv, flange);
  return r.formula(g6Formulas.twoEqual, `${at}/Vn`, { Vnf });
}

/** G6-1 for each flange of a section with two different ones, summed. */
export function unequalFlangesShear(
  r: Recorder,
  at: string,
  steel: Steel,
  top: Flange,
  bottom: Flange,
): Quantity {
  const kv = r.formula(g6Formulas.kv, `${at}/kv`, {});
  const Vnt = flangeShear(r, `${at}/top`, steel, kv, top, 'Vnt');
  const Vnb = flangeShear(r, `${at}/bottom`, steel, kv, bottom, 'Vnb');
  return r.formula(g6Formulas.twoUnequal, `${at}/Vn`, { Vnt, Vnb });
}

function flangeShear(
  r: Recorder,
  at: string,
  steel: Steel,
  kv: Quantity,
  { bf, tf, lambda }: Flange,
  symbol: 'Vnf' | 'Vnt' | 'Vnb' = 'Vnf',
): Quantity {
  const Cv2 = plateCoefficient(r, at, steel, kv, lambda);
  const title = { Vnf: 'one flange', Vnt: 'the top flange', Vnb: 'the bottom flange' }[symbol];
  return r.formula(
    g6Formulas.flange,
    `${at}/Vnf`,
    { Fy: steel.Fy, bf, tf, Cv2 },
    { symbol, title: `Nominal shear strength of ${title}` },
  );
}
