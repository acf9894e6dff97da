import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { plateCoefficient } from './g2-buckling.ts';
import { formula } from './writer.ts';

// G4 rectangular HSS and box sections: two walls resist the shear force.
export const g4Formulas = {
  wallWidth: formula({
    id: 'G4-h',
    clause: 'G4',
    title: 'Flat width of a wall that resists the shear force',
    symbol: 'hw',
    dimension: 'length',
    expression: 'lambda*t',
    operands: { lambda: 'none', t: 'length' },
  }),
  area: formula({
    id: 'G4-Aw',
    clause: 'G4',
    title: 'Area of both walls that resist the shear force',
    symbol: 'Aw',
    dimension: 'area',
    expression: '2*hw*t',
    operands: { hw: 'length', t: 'length' },
  }),
  kv: formula({
    id: 'G4-kv',
    clause: 'G4',
    title: 'Plate buckling coefficient of a wall',
    symbol: 'kv',
    dimension: 'none',
    expression: '5',
    operands: {},
  }),
  strength: formula({
    id: 'G4-1',
    clause: 'G4',
    equation: 'G4-1',
    title: 'Nominal shear strength',
    symbol: 'Vn',
    dimension: 'force',
    expression: '0.6*Fy*Aw*Cv2',
    operands: { Fy: 'stress', Aw: 'area', Cv2: 'none' },
  }),
};

/** The two walls along the shear force: thickness, width-to-thickness ratio, clear or flat width. */
export interface Walls {
  readonly t: Quantity;
  readonly lambda: Quantity;
  /** null: the ratio times the thickness, which is the width that the ratio was made with. */
  readonly h: Quantity | null;
}

/** G4-1 with kv = 5. */
export function closedShearStrength(
  r: Recorder,
  at: string,
  steel: { readonly E: Quantity; readonly Fy: Quantity },
  { t, lambda, h }: Walls,
): Quantity {
  const hw = h ?? r.formula(g4Formulas.wallWidth, `${at}/h`, { lambda, t });
  const Aw = r.formula(g4Formulas.area, `${at}/Aw`, { hw, t });
  const kv = r.formula(g4Formulas.kv, `${at}/kv`, {});
  const Cv2 = plateCoefficient(r, at, steel, kv, lambda);
  return r.formula(g4Formulas.strength, `${at}/Vn`, { Fy: steel.Fy, Aw, Cv2 });
}
