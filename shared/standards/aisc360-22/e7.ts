import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { effectiveWidthConstants } from './parameters.ts';
import { clause, formula } from './writer.ts';

// E7 members with slender elements: effective widths of the web and the flange of a rolled I-shape.
const width = (id: string, title: string, symbol: 'be' | 'he', full: 'b' | 'h') =>
  formula({
    id,
    clause: 'E7.1',
    equation: 'E7-3',
    title,
    symbol,
    dimension: 'length',
    expression: `${full}*(1-c1*sqrt(Fel/Fn))*sqrt(Fel/Fn)`,
    operands: { [full]: 'length', c1: 'none', Fel: 'stress', Fn: 'stress' },
  });

export const e7Formulas = {
  webDepth: formula({
    id: 'B4.1-h',
    clause: 'B4.1',
    title: 'Clear depth of the web, from the table',
    symbol: 'h',
    dimension: 'length',
    expression: 'lambdaw*tw',
    operands: { lambdaw: 'none', tw: 'length' },
  }),
  flangeWidth: formula({
    id: 'B4.1-b',
    clause: 'B4.1',
    title: 'Half of the flange width',
    symbol: 'b',
    dimension: 'length',
    expression: 'bf/2',
    operands: { bf: 'length' },
  }),
  limit: formula({
    id: 'E7-2-limit',
    clause: 'E7.1',
    equation: 'E7-2',
    title: 'Slenderness up to which the element is fully effective',
    symbol: 'lambdalim',
    dimension: 'none',
    expression: 'lambdar*sqrt(Fy/Fn)',
    operands: { lambdar: 'none', Fy: 'stress', Fn: 'stress' },
  }),
  localStress: formula({
    id: 'E7-5',
    clause: 'E7.1',
    equation: 'E7-5',
    title: 'Elastic local buckling stress',
    symbol: 'Fel',
    dimension: 'stress',
    expression: '(c2*lambdar/lambda)^2*Fy',
    operands: { c2: 'none', lambdar: 'none', lambda: 'none', Fy: 'stress' },
  }),
  webWidth: width('E7-3-web', 'Effective depth of the web', 'he', 'h'),
  flangeEffective: width('E7-3-flange', 'Effective width of the flange', 'be', 'b'),
  areaWeb: formula({
    id: 'E7-Ae-web',
    clause: 'E7',
    title: 'Effective area, slender web',
    symbol: 'Ae',
    dimension: 'area',
    expression: 'Ag-(h-he)*tw',
    operands: { Ag: 'area', h: 'length', he: 'length', tw: 'length' },
  }),
  areaFlange: formula({
    id: 'E7-Ae-flange',
    clause: 'E7',
    title: 'Effective area, slender flanges',
    symbol: 'Ae',
    dimension: 'area',
    expression: 'Ag-4*(b-be)*tf',
    operands: { Ag: 'area', b: 'length', be: 'length', tf: 'length' },
  }),
  areaBoth: formula({
    id: 'E7-Ae-both',
    clause: 'E7',
    title: 'Effective area, slender web and flanges',
    symbol: 'Ae',
    dimension: 'area',
    expression: 'Ag-(h-he)*tw-4*(b-be)*tf',
    operands: {
      Ag: 'area',
      h: 'length',
      he: 'length',
      tw: 'length',
      b: 'length',
      be: 'length',
      tf: 'length',
    },
  }),
  strength: formula({
    id: 'E7-1',
    clause: 'E7',
    equation: 'E7-1',
    title: 'Nominal compressive strength, slender elements',
    symbol: 'Pn',
    dimension: 'force',
    expression: 'Fn*Ae',
    operands: { Fn: 'stress', Ae: 'area' },
  }),
};

export interface SlenderElements {
  readonly Fy: Quantity;
  readonly Ag: Quantity;
  readonly web: {
    readonly slender: boolean;
    readonly lambda: Quantity;
    readonly lambdar: Quantity;
    readonly tw: Quantity;
  };
  readonly flange: {
    readonly slender: boolean;
    readonly lambda: Quantity;
    readonly lambdar: Quantity;
    readonly bf: Quantity;
    readonly tf: Quantity;
  };
}

/** Constants and full widths of the slender elements; written once per member. */
export interface SlenderWidths {
  readonly web: {
    readonly c1: Quantity;
    readonly c2: Quantity;
    readonly full: Quantity;
    readonly Fel: Quantity;
  } | null;
  readonly flange: {
    readonly c1: Quantity;
    readonly c2: Quantity;
    readonly full: Quantity;
    readonly Fel: Quantity;
  } | null;
}

export function slenderWidths(r: Recorder, q: SlenderElements): SlenderWidths {
  const element = (name: 'web' | 'flange', full: () => Quantity) => {
    const { slender, lambda, lambdar } = q[name];
    if (!slender) return null;
    const constants = effectiveWidthConstants(r, name);
    const width = full();
    const Fel = r.formula(e7Formulas.localStress, `E7/${name}/Fel`, {
      c2: constants.c2,
      lambdar,
      lambda,
      Fy: q.Fy,
    });
    return { ...constants, full: width, Fel };
  };
  return {
    web: element('web', () =>
      r.formula(e7Formulas.webDepth, 'E7/web/h', { lambdaw: q.web.lambda, tw: q.web.tw }),
    ),
    flange: element('flange', () =>
      r.formula(e7Formulas.flangeWidth, 'E7/flange/b', { bf: q.flange.bf }),
    ),
  };
}

/**
 * Effective area at the stress Fn (E7.1), `key` naming the use: `E7` for the strength, `C2.3` for
 * the cross-section strength at Fn = Fy.
 */
export function effectiveArea(
  r: Recorder,
  key: string,
  q: SlenderElements,
  widths: SlenderWidths,
  Fn: Quantity,
  symbol = 'Ae',
): Quantity {
  const reduced = (name: 'web' | 'flange', full: 'h' | 'b'): Quantity | null => {
    const w = widths[name];
    if (!w) return null;
    const { lambda, lambdar } = q[name];
    const limit = r.formula(e7Formulas.limit, `${key}/${name}/limit`, { lambdar, Fy: q.Fy, Fn });
    const taken = r.choice(
      `${key}/${name}/effective`,
      [{ left: lambda, relation: '<=', right: limit, outcome: `the ${name} is fully effective` }],
      `the ${name} is partly effective`,
      { title: `Effective width of the ${name}`, clause: clause('E7.1', 'E7-2') },
    );
    if (taken === 0) return null;
    const trial = r.formula(
      name === 'web' ? e7Formulas.webWidth : e7Formulas.flangeEffective,
      `${key}/${name}/be`,
      { [full]: w.full, c1: w.c1, Fel: w.Fel, Fn },
    );
    return r.governing(`${key}/${name}/width`, 'min', [trial, w.full], {
      title: `Effective width of the ${name}, not more than the full one`,
      symbol: trial.symbol,
      clause: clause('E7.1', 'E7-3'),
    });
  };
  const he = reduced('web', 'h');
  const be = reduced('flange', 'b');
  const { Ag } = q;
  const web = widths.web && he ? { h: widths.web.full, he, tw: q.web.tw } : null;
  const flange = widths.flange && be ? { b: widths.flange.full, be, tf: q.flange.tf } : null;
  const at = `${key}/Ae`;
  if (web && flange)
    return r.formula(e7Formulas.areaBoth, at, { Ag, ...web, ...flange }, { symbol });
  if (web) return r.formula(e7Formulas.areaWeb, at, { Ag, ...web }, { symbol });
  if (flange) return r.formula(e7Formulas.areaFlange, at, { Ag, ...flange }, { symbol });
  return Ag;
}
