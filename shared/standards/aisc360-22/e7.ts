import type { Formula } from '../../calc/formula.ts';
import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { DimensionName } from '../../units/dimension.ts';
import { type ElementCase, effectiveWidthConstants } from './e7-constants.ts';
import { clause, formula } from './writer.ts';

// E7.1 members with slender elements, except round HSS: effective widths and effective area.
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

const TERMS = {
  web: { text: '(h-he)*tw', operands: ['h', 'he', 'tw'] },
  flange: { text: '(b-be)*tf', operands: ['b', 'be', 'tf'] },
  second: { text: '(b2-be2)*tf2', operands: ['b2', 'be2', 'tf2'] },
} as const;
type Term = keyof typeof TERMS;
type Count = 1 | 2 | 4;

/** Ae = Ag − Σ(b − be)t over the elements that are partly effective, each with its number. */
const area = (id: string, title: string, terms: Partial<Record<Term, Count>>): Formula => {
  const parts = (Object.entries(terms) as [Term, Count][]).map(([term, n]) => ({
    ...TERMS[term],
    factor: n === 1 ? '' : `${n}*`,
  }));
  const operands: Record<string, DimensionName> = { Ag: 'area' };
  for (const name of parts.flatMap((p) => p.operands)) operands[name] = 'length';
  return formula({
    id: `E7-Ae-${id}`,
    clause: 'E7',
    title: `Effective area, slender ${title}`,
    symbol: 'Ae',
    dimension: 'area',
    expression: `Ag${parts.map((p) => `-${p.factor}${p.text}`).join('')}`,
    operands,
  });
};

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
  wallWidth: formula({
    id: 'B4.1-wall',
    clause: 'B4.1',
    title: 'Flat width of the wall',
    symbol: 'b',
    dimension: 'length',
    expression: 'lambda*t',
    operands: { lambda: 'none', t: 'length' },
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
  areaWeb: area('web', 'web', { web: 1 }),
  areaFlange: area('flange', 'flanges', { flange: 4 }),
  areaBoth: area('both', 'web and flanges', { web: 1, flange: 4 }),
  areaTwoFlanges: area('two-flanges', 'flanges', { flange: 2 }),
  areaWebTwoFlanges: area('web-two-flanges', 'web and flanges', { web: 1, flange: 2 }),
  areaTwoWebs: area('two-webs', 'webs', { web: 2 }),
  areaFourWalls: area('four-walls', 'webs and flanges', { web: 2, flange: 2 }),
  areaUnequalFlanges: area('unequal-flanges', 'flanges', { flange: 2, second: 2 }),
  areaWebUnequalFlanges: area('web-unequal-flanges', 'web and flanges', {
    web: 1,
    flange: 2,
    second: 2,
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

/** Area formulas by the numbers of webs, flanges and second flanges that are partly effective. */
const AREAS: Readonly<Record<string, Formula>> = {
  '1 0 0': e7Formulas.areaWeb,
  '0 4 0': e7Formulas.areaFlange,
  '1 4 0': e7Formulas.areaBoth,
  '0 2 0': e7Formulas.areaTwoFlanges,
  '1 2 0': e7Formulas.areaWebTwoFlanges,
  '2 0 0': e7Formulas.areaTwoWebs,
  '2 2 0': e7Formulas.areaFourWalls,
  '0 2 2': e7Formulas.areaUnequalFlanges,
  '1 2 2': e7Formulas.areaWebUnequalFlanges,
};

/** One kind of element of a section under uniform compression. */
export interface CompressedElement {
  /** Part of its keys: `web`, `flange`, `top-flange`. */
  readonly name: string;
  /** In sentences: `top flange`. */
  readonly words: string;
  /** All of them: `flanges`. */
  readonly plural: string;
  /** A width h from flange to flange, or a width b. */
  readonly role: 'web' | 'flange';
  /** How many the section has; an I-shape has four half flanges. */
  readonly count: Count;
  readonly constants: ElementCase;
  readonly lambda: Quantity;
  readonly lambdar: Quantity;
  readonly slender: boolean;
  readonly t: Quantity;
  /** Full width; its line, where it has one, is written when it is asked for. */
  readonly width: () => Quantity;
  /** Symbol of the effective width where be or he is not enough. */
  readonly effective?: string;
}

/** A slender element with its constants, full width and local buckling stress. */
export interface SlenderElement extends CompressedElement {
  readonly c1: Quantity;
  readonly full: Quantity;
  readonly Fel: Quantity;
}

/** E7.1, E7-5: what does not depend on Fn, once per member, of the elements that are slender. */
export const slenderElements = (
  r: Recorder,
  Fy: Quantity,
  elements: readonly CompressedElement[],
): readonly SlenderElement[] =>
  elements
    .filter((e) => e.slender)
    .map((e) => {
      const { c1, c2 } = effectiveWidthConstants(r, e.name, e.constants);
      const full = e.width();
      const { lambda, lambdar } = e;
      const Fel = r.formula(e7Formulas.localStress, `E7/${e.name}/Fel`, {
        c2,
        lambdar,
        lambda,
        Fy,
      });
      return { ...e, c1, full, Fel };
    });

/** E7-2 or E7-3 of one element at the stress Fn; null where it is fully effective. */
function effectiveWidth(
  r: Recorder,
  key: string,
  Fy: Quantity,
  e: SlenderElement,
  Fn: Quantity,
): Quantity | null {
  const { lambda, lambdar, words, c1, full, Fel } = e;
  const limit = r.formula(e7Formulas.limit, `${key}/limit`, { lambdar, Fy, Fn });
  const taken = r.choice(
    `${key}/effective`,
    [{ left: lambda, relation: '<=', right: limit, outcome: `the ${words} is fully effective` }],
    `the ${words} is partly effective`,
    { title: `Effective width of the ${words}`, clause: clause('E7.1', 'E7-2') },
  );
  if (taken === 0) return null;
  const web = e.role === 'web';
  const trial = r.formula(
    web ? e7Formulas.webWidth : e7Formulas.flangeEffective,
    `${key}/be`,
    { [web ? 'h' : 'b']: full, c1, Fel, Fn },
    {
      title: `Effective ${words === 'web' ? 'depth' : 'width'} of the ${words}`,
      ...(e.effective && { symbol: e.effective }),
    },
  );
  return r.governing(`${key}/width`, 'min', [trial, full], {
    title: `Effective width of the ${words}, not more than the full one`,
    symbol: trial.symbol,
    clause: clause('E7.1', 'E7-3'),
  });
}

/**
 * Effective area at the stress Fn (E7.1), `key` naming the use: `E7` for the strength, `C2` for
 * the cross-section strength at Fn = Fy. Ag itself where every element is fully effective.
 */
export function effectiveArea(
  r: Recorder,
  key: string,
  Fy: Quantity,
  Ag: Quantity,
  elements: readonly SlenderElement[],
  Fn: Quantity,
  symbol = 'Ae',
): Quantity {
  const partly = elements.flatMap((e) => {
    const effective = effectiveWidth(r, `${key}/${e.name}`, Fy, e, Fn);
    return effective ? [{ e, effective }] : [];
  });
  if (partly.length === 0) return Ag;
  const web = partly.find(({ e }) => e.role === 'web');
  const [flange, second] = partly.filter(({ e }) => e.role === 'flange');
  const counts = [web, flange, second].map((p) => p?.e.count ?? 0).join(' ');
  const of = AREAS[counts];
  if (!of) throw new Error(`no area formula for ${counts}`);
  return r.formula(
    of,
    `${key}/Ae`,
    {
      Ag,
      ...(web && { h: web.e.full, he: web.effective, tw: web.e.t }),
      ...(flange && { b: flange.e.full, be: flange.effective, tf: flange.e.t }),
      ...(second && { b2: second.e.full, be2: second.effective, tf2: second.e.t }),
    },
    { title: `Effective area, slender ${partly.map(({ e }) => e.plural).join(' and ')}`, symbol },
  );
}
