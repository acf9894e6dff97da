import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { type Design, methodConstant } from './parameters.ts';
import { clause, formula } from './writer.ts';

// G1 available shear strength; G2.1 webs of I-shapes and channels without tension field action.
const STEEL = { E: 'stress', Fy: 'stress' } as const;
const PLATE = { kv: 'none', ...STEEL } as const;

export const g2Formulas = {
  availableLrfd: formula({
    id: 'G1-LRFD',
    clause: 'G1',
    title: 'Design shear strength',
    symbol: 'Vc',
    dimension: 'force',
    expression: 'phiv*Vn',
    operands: { phiv: 'none', Vn: 'force' },
  }),
  availableAsd: formula({
    id: 'G1-ASD',
    clause: 'G1',
    title: 'Allowable shear strength',
    symbol: 'Vc',
    dimension: 'force',
    expression: 'Vn/Omegav',
    operands: { Omegav: 'none', Vn: 'force' },
  }),
  webArea: formula({
    id: 'G2-Aw',
    clause: 'G2.1',
    title: 'Area of the web, over the whole depth',
    symbol: 'Aw',
    dimension: 'area',
    expression: 'd*tw',
    operands: { d: 'length', tw: 'length' },
  }),
  stockyLimit: formula({
    id: 'G2-stocky',
    clause: 'G2.1',
    title: 'Slenderness up to which a rolled web is stocky',
    symbol: 'lambdastocky',
    dimension: 'none',
    expression: '2.24*sqrt(E/Fy)',
    operands: STEEL,
  }),
  CvRolled: formula({
    id: 'G2-2',
    clause: 'G2.1',
    equation: 'G2-2',
    title: 'Web shear strength coefficient',
    symbol: 'Cv1',
    dimension: 'none',
    expression: '1',
    operands: {},
    validity: 'for webs of rolled I-shapes where h/tw ≤ 2.24√(E/Fy)',
  }),
  kvUnstiffened: formula({
    id: 'G2-kv',
    clause: 'G2.1',
    title: 'Plate buckling coefficient without stiffeners',
    symbol: 'kv',
    dimension: 'none',
    expression: '5.34',
    operands: {},
  }),
  clearDepth: formula({
    id: 'G2-h',
    clause: 'G2.1',
    title: 'Clear depth of the web',
    symbol: 'h',
    dimension: 'length',
    expression: 'lambdaw*tw',
    operands: { lambdaw: 'none', tw: 'length' },
  }),
  panelRatio: formula({
    id: 'G2-a/h',
    clause: 'G2.1',
    title: 'Length of the web panel over its depth',
    symbol: 'ah',
    dimension: 'none',
    expression: 'a/h',
    operands: { a: 'length', h: 'length' },
  }),
  kvStiffened: formula({
    id: 'G2-5',
    clause: 'G2.1',
    equation: 'G2-5',
    title: 'Plate buckling coefficient between stiffeners',
    symbol: 'kv',
    dimension: 'none',
    expression: '5+5/ah^2',
    operands: { ah: 'none' },
    validity: 'where a/h ≤ 3',
  }),
  yieldLimit: formula({
    id: 'G2-1.10',
    clause: 'G2.1',
    title: 'Slenderness up to which shear yields the plate',
    symbol: 'lambdav1',
    dimension: 'none',
    expression: '1.10*sqrt(kv*E/Fy)',
    operands: PLATE,
  }),
  CvStocky: formula({
    id: 'G2-3',
    clause: 'G2.1',
    equation: 'G2-3',
    title: 'Web shear strength coefficient',
    symbol: 'Cv1',
    dimension: 'none',
    expression: '1',
    operands: {},
    validity: 'where h/tw ≤ 1.10√(kv E/Fy)',
  }),
  CvSlender: formula({
    id: 'G2-4',
    clause: 'G2.1',
    equation: 'G2-4',
    title: 'Web shear strength coefficient, slender web',
    symbol: 'Cv1',
    dimension: 'none',
    expression: '1.10*sqrt(kv*E/Fy)/lambdaw',
    operands: { ...PLATE, lambdaw: 'none' },
    validity: 'where h/tw > 1.10√(kv E/Fy)',
  }),
  strength: formula({
    id: 'G2-1',
    clause: 'G2.1',
    equation: 'G2-1',
    title: 'Nominal shear strength of the web',
    symbol: 'Vn',
    dimension: 'force',
    expression: '0.6*Fy*Aw*Cv1',
    operands: { Fy: 'stress', Aw: 'area', Cv1: 'none' },
  }),
};

/** φv Vn or Vn/Ωv of G1, with the factor of G2.1(a) for a rolled I-shape with a stocky web. */
export function availableShear(
  r: Recorder,
  at: string,
  design: Design,
  Vn: Quantity,
  axis: 'x' | 'y',
  rolledStocky = false,
): Quantity {
  const constant = methodConstant(r, rolledStocky ? 'shearStockyWeb' : 'shear', design, at);
  const symbol = { symbol: `Vc${axis}` };
  return design === 'LRFD'
    ? r.formula(g2Formulas.availableLrfd, `${at}/Vc`, { phiv: constant, Vn }, symbol)
    : r.formula(g2Formulas.availableAsd, `${at}/Vc`, { Omegav: constant, Vn }, symbol);
}

export interface Web {
  readonly E: Quantity;
  readonly Fy: Quantity;
  readonly d: Quantity;
  readonly tw: Quantity;
  readonly lambdaw: Quantity;
  /** null: h is h/tw times tw. */
  readonly h: Quantity | null;
  /** Clear distance between transverse stiffeners; null without them. */
  readonly a: Quantity | null;
  readonly shape: 'a rolled I-shape' | 'a built-up I-shape' | 'a channel';
}

/** G2.1: nominal strength in the plane of the web, and whether the factors of G2.1(a) apply. */
export function webShearStrength(
  r: Recorder,
  at: string,
  q: Web,
): { readonly Vn: Quantity; readonly rolledStocky: boolean } {
  const { E, Fy, d, tw, lambdaw } = q;
  const Aw = r.formula(g2Formulas.webArea, `${at}/Aw`, { d, tw });
  const rolledStocky = isRolledStocky(r, at, q);
  const Cv1 = rolledStocky
    ? r.formula(g2Formulas.CvRolled, `${at}/Cv1`, {})
    : buckledCoefficient(r, at, { E, Fy, lambdaw }, bucklingCoefficient(r, at, q));
  return { Vn: r.formula(g2Formulas.strength, `${at}/Vn`, { Fy, Aw, Cv1 }), rolledStocky };
}

/** G2.1(a) or (b), decided on h/tw ≤ 2.24√(E/Fy) for rolled I-shapes alone. */
function isRolledStocky(r: Recorder, at: string, q: Web): boolean {
  const { E, Fy, lambdaw, shape } = q;
  const outcome = 'G2.1(a) applies';
  const tried =
    shape === 'a rolled I-shape'
      ? {
          left: lambdaw,
          relation: '<=' as const,
          right: r.formula(g2Formulas.stockyLimit, `${at}/stocky`, { E, Fy }),
          outcome,
        }
      : { left: shape, relation: 'is' as const, right: 'a rolled I-shape', outcome };
  return (
    r.choice(`${at}/case`, [tried], 'G2.1(b) applies', {
      title: 'Which case of G2.1',
      clause: clause('G2.1'),
    }) === 0
  );
}

/** kv of G2.1(b): 5.34 without stiffeners and for a/h > 3, else G2-5. */
function bucklingCoefficient(r: Recorder, at: string, q: Web): Quantity {
  const { a, tw, lambdaw } = q;
  if (!a) return r.formula(g2Formulas.kvUnstiffened, `${at}/kv`, {});
  const h = q.h ?? r.formula(g2Formulas.clearDepth, `${at}/h`, { lambdaw, tw });
  const ah = r.formula(g2Formulas.panelRatio, `${at}/ah`, { a, h });
  const wide = r.choice(
    `${at}/panel`,
    [{ left: ah, relation: '>', right: 3, outcome: 'the web counts as unstiffened' }],
    'the stiffeners raise the buckling coefficient: G2-5 applies',
    { title: 'Distance between the stiffeners', clause: clause('G2.1') },
  );
  if (wide === 0) return r.formula(g2Formulas.kvUnstiffened, `${at}/kv`, {});
  r.notice(
    `${at}/stiffeners`,
    'note',
    'stiffeners-not-checked',
    'The transverse stiffeners raise the shear strength; their own stiffness and width (G2.4) are not checked here.',
    { title: 'Transverse stiffeners', clause: clause('G2.4') },
  );
  return r.formula(g2Formulas.kvStiffened, `${at}/kv`, { ah });
}

/** G2-3 or G2-4, decided on h/tw ≤ 1.10√(kv E/Fy). */
function buckledCoefficient(
  r: Recorder,
  at: string,
  q: { E: Quantity; Fy: Quantity; lambdaw: Quantity },
  kv: Quantity,
): Quantity {
  const { E, Fy, lambdaw } = q;
  const limit = r.formula(g2Formulas.yieldLimit, `${at}/limit`, { kv, E, Fy });
  const taken = r.choice(
    `${at}/branch`,
    [{ left: lambdaw, relation: '<=', right: limit, outcome: 'the web yields: G2-3 applies' }],
    'the web buckles in shear: G2-4 applies',
    { title: 'Yielding or buckling in shear', clause: clause('G2.1') },
  );
  if (taken === 0) return r.formula(g2Formulas.CvStocky, `${at}/Cv1`, {});
  r.notice(
    `${at}/tension-field`,
    'note',
    'no-tension-field',
    'Tension field action (G2.2, G2.3) could give more; it is not used.',
    { title: 'Tension field action', clause: clause('G2.2') },
  );
  return r.formula(g2Formulas.CvSlender, `${at}/Cv1`, { kv, E, Fy, lambdaw });
}
