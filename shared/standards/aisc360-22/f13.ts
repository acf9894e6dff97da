import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// F13.2 proportion limits of I-shapes. Webs are taken as unstiffened: no stiffeners are given.
export const f13Formulas = {
  IycIy: formula({
    id: 'F13-IycIy',
    clause: 'F13.2',
    title: 'Share of the compression flange in the second moment of area',
    symbol: 'IycIy',
    dimension: 'none',
    expression: 'Iyc/Iy',
    operands: { Iyc: 'inertia', Iy: 'inertia' },
  }),
  slenderest: formula({
    id: 'F13-4',
    clause: 'F13.2',
    equation: 'F13-4',
    title: 'Most slender web, a/h above 1.5',
    symbol: 'lambdamost',
    dimension: 'none',
    expression: '0.40*E/Fy',
    operands: { E: 'stress', Fy: 'stress' },
    validity: 'where a/h > 1.5',
  }),
  webRatio: formula({
    id: 'F13-AwAfc',
    clause: 'F13.2',
    title: 'Area of the web over the area of the compression flange',
    symbol: 'AwAfc',
    dimension: 'none',
    expression: 'h*tw/(bfc*tfc)',
    operands: { h: 'length', tw: 'length', bfc: 'length', tfc: 'length' },
  }),
};

/** F13-2 for a singly symmetric I-shape; null after an outside-scope notice. Answers Iyc/Iy. */
export function flangeShare(
  r: Recorder,
  q: { readonly Iyc: Quantity; readonly Iy: Quantity },
): Quantity | null {
  const ratio = r.formula(f13Formulas.IycIy, 'F13/IycIy', { Iyc: q.Iyc, Iy: q.Iy });
  const beyond = r.choice(
    'F13/flanges',
    [
      { left: ratio, relation: '<', right: 0.1, outcome: 'the compression flange is too small' },
      { left: ratio, relation: '>', right: 0.9, outcome: 'the compression flange is too large' },
    ],
    'the flanges are within the limits',
    { title: 'Proportion of the flanges', clause: clause('F13.2', 'F13-2') },
  );
  if (beyond < 0) return ratio;
  outside(
    r,
    'flange-proportion',
    'Iyc/Iy is not between 0.1 and 0.9: Chapter F does not cover such a shape. Flexure is not checked.',
  );
  return null;
}

export interface SlenderWeb {
  readonly E: Quantity;
  readonly Fy: Quantity;
  /** h/tw. */
  readonly lambdaw: Quantity;
  /** F4-12, which F5-6 limits to 10. */
  readonly aw: Quantity;
  readonly h: Quantity;
  readonly tw: Quantity;
  readonly bfc: Quantity;
  readonly tfc: Quantity;
}

/**
 * Limits of an unstiffened slender web: F13-4 (a/h above 1.5), h/tw at most 260, web area at most
 * ten compression flange areas, aw at most 10 (F5-6). False after an outside-scope notice.
 */
export function slenderWebWithin(r: Recorder, q: SlenderWeb): boolean {
  const { E, Fy, lambdaw, aw, h, tw, bfc, tfc } = q;
  const limit = r.formula(f13Formulas.slenderest, 'F13/lambdamost', { E, Fy });
  const ratio = r.formula(f13Formulas.webRatio, 'F13/AwAfc', { h, tw, bfc, tfc });
  const beyond = r.choice(
    'F13/web',
    [
      { left: lambdaw, relation: '>', right: limit, outcome: 'the web is too slender: F13-4' },
      { left: lambdaw, relation: '>', right: 260, outcome: 'the web is too slender' },
      { left: ratio, relation: '>', right: 10, outcome: 'the web is too large for the flange' },
      { left: aw, relation: '>', right: 10, outcome: 'the web is too large for the flange: F5-6' },
    ],
    'the web is within the limits',
    { title: 'Proportion of an unstiffened slender web', clause: clause('F13.2') },
  );
  if (beyond < 0) return true;
  outside(
    r,
    'web-proportion',
    'The slender web is beyond the limits of F13.2 for a web without stiffeners, or of F5-6. Flexure is not checked.',
  );
  return false;
}

const outside = (r: Recorder, code: string, text: string): void =>
  r.notice('F13/outside', 'outside scope', code, text, {
    title: 'Proportions outside the scope of Chapter F',
    clause: clause('F13.2'),
  });
