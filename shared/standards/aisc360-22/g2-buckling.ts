import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { g2Formulas } from './g2.ts';
import { clause, formula } from './writer.ts';

// Cv2 of G2.2, which G4 and G6 use too.
export const g2BucklingFormulas = {
  elasticLimit: formula({
    id: 'G2-1.37',
    clause: 'G2.2',
    title: 'Slenderness from which shear buckling is elastic',
    symbol: 'lambdav2',
    dimension: 'none',
    expression: '1.37*sqrt(kv*E/Fy)',
    operands: { kv: 'none', E: 'stress', Fy: 'stress' },
  }),
  stocky: formula({
    id: 'G2-9',
    clause: 'G2.2',
    equation: 'G2-9',
    title: 'Shear buckling coefficient',
    symbol: 'Cv2',
    dimension: 'none',
    expression: '1',
    operands: {},
    validity: 'where h/tw ≤ 1.10√(kv E/Fy)',
  }),
  inelastic: formula({
    id: 'G2-10',
    clause: 'G2.2',
    equation: 'G2-10',
    title: 'Shear buckling coefficient, inelastic buckling',
    symbol: 'Cv2',
    dimension: 'none',
    expression: '1.10*sqrt(kv*E/Fy)/lambda',
    operands: { kv: 'none', E: 'stress', Fy: 'stress', lambda: 'none' },
    validity: 'where 1.10√(kv E/Fy) < h/tw ≤ 1.37√(kv E/Fy)',
  }),
  elastic: formula({
    id: 'G2-11',
    clause: 'G2.2',
    equation: 'G2-11',
    title: 'Shear buckling coefficient, elastic buckling',
    symbol: 'Cv2',
    dimension: 'none',
    expression: '1.51*kv*E/(lambda^2*Fy)',
    operands: { kv: 'none', E: 'stress', lambda: 'none', Fy: 'stress' },
    validity: 'where h/tw > 1.37√(kv E/Fy)',
  }),
};

/** G2-9, G2-10 or G2-11, decided on the slenderness against 1.10 and 1.37 times √(kv E/Fy). */
export function plateCoefficient(
  r: Recorder,
  at: string,
  steel: { readonly E: Quantity; readonly Fy: Quantity },
  kv: Quantity,
  lambda: Quantity,
): Quantity {
  const { E, Fy } = steel;
  const yieldLimit = r.formula(g2Formulas.yieldLimit, `${at}/limit`, { kv, E, Fy });
  const elasticLimit = r.formula(g2BucklingFormulas.elasticLimit, `${at}/elastic`, { kv, E, Fy });
  const taken = r.choice(
    `${at}/branch`,
    [
      {
        left: lambda,
        relation: '<=',
        right: yieldLimit,
        outcome: 'the plate yields: G2-9 applies',
      },
      {
        left: lambda,
        relation: '<=',
        right: elasticLimit,
        outcome: 'the plate buckles inelastically: G2-10 applies',
      },
    ],
    'the plate buckles elastically: G2-11 applies',
    { title: 'Yielding or buckling in shear', clause: clause('G2.2') },
  );
  if (taken === 0) return r.formula(g2BucklingFormulas.stocky, `${at}/Cv2`, {});
  return taken === 1
    ? r.formula(g2BucklingFormulas.inelastic, `${at}/Cv2`, { kv, E, Fy, lambda })
    : r.formula(g2BucklingFormulas.elastic, `${at}/Cv2`, { kv, E, Fy, lambda });
}
