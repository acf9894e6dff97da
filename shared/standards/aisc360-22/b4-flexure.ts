import type { Formula } from '../../calc/formula.ts';
import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// B4.1, Table B4.1b: width-to-thickness limits of compression elements in flexure.
const TITLES = { p: 'Compact limit', r: 'Noncompact limit' } as const;

/** One limit of a row, `factor` times √(E/Fy). */
const limit = (row: number, which: 'p' | 'r', symbol: string, element: string, factor: string) =>
  formula({
    id: `B4.1b-${row}${which}`,
    clause: 'B4.1',
    equation: `Table B4.1b, ${row}`,
    title: `${TITLES[which]} of the ${element}`,
    symbol,
    dimension: 'none',
    expression: `${factor}*sqrt(E/Fy)`,
    operands: { E: 'stress', Fy: 'stress' },
  });

const roundLimit = (which: 'p' | 'r', symbol: string, factor: string) =>
  formula({
    id: `B4.1b-20${which}`,
    clause: 'B4.1',
    equation: 'Table B4.1b, 20',
    title: `${TITLES[which]} of the wall in flexure`,
    symbol,
    dimension: 'none',
    expression: `${factor}*E/Fy`,
    operands: { E: 'stress', Fy: 'stress' },
  });

export const b4FlexureFormulas = {
  flangeCompact: limit(10, 'p', 'lambdapf', 'flange in flexure', '0.38'),
  flangeNoncompact: limit(10, 'r', 'lambdarf', 'flange in flexure', '1.0'),
  builtUpCompact: limit(11, 'p', 'lambdapf', 'flange in flexure', '0.38'),
  builtUpNoncompact: formula({
    id: 'B4.1b-11r',
    clause: 'B4.1',
    equation: 'Table B4.1b, 11',
    title: 'Noncompact limit of the flange in flexure',
    symbol: 'lambdarf',
    dimension: 'none',
    expression: '0.95*sqrt(kc*E/FL)',
    operands: { kc: 'none', E: 'stress', FL: 'stress' },
  }),
  minorCompact: limit(13, 'p', 'lambdapf', 'flange, minor-axis flexure', '0.38'),
  minorNoncompact: limit(13, 'r', 'lambdarf', 'flange, minor-axis flexure', '1.0'),
  webCompact: limit(15, 'p', 'lambdapw', 'web in flexure', '3.76'),
  webNoncompact: limit(15, 'r', 'lambdarw', 'web in flexure', '5.70'),
  hc: formula({
    id: 'B4.1-hc',
    clause: 'B4.1',
    title: 'Clear depth of the web',
    symbol: 'hc',
    dimension: 'length',
    expression: 'lambdaw*tw',
    operands: { lambdaw: 'none', tw: 'length' },
  }),
  lambdahc: formula({
    id: 'B4.1-lambdahc',
    clause: 'B4.1',
    title: 'Width-to-thickness ratio of the web by its compressed part',
    symbol: 'lambdahc',
    dimension: 'none',
    expression: 'hc/tw',
    operands: { hc: 'length', tw: 'length' },
  }),
  plasticMoment: formula({
    id: 'B4.1b-16-Mp',
    clause: 'B4.1',
    equation: 'Table B4.1b, 16',
    title: 'Plastic moment of the section',
    symbol: 'FyZx',
    dimension: 'moment',
    expression: 'Fy*Zx',
    operands: { Fy: 'stress', Zx: 'modulus' },
  }),
  yieldMoment: formula({
    id: 'B4.1b-16-My',
    clause: 'B4.1',
    equation: 'Table B4.1b, 16',
    title: 'Moment at which the first face yields',
    symbol: 'My',
    dimension: 'moment',
    expression: 'Fy*Sx',
    operands: { Fy: 'stress', Sx: 'modulus' },
  }),
  monoWebTrial: formula({
    id: 'B4.1b-16p',
    clause: 'B4.1',
    equation: 'Table B4.1b, 16',
    title: 'Compact limit of the web in flexure before its bound',
    symbol: 'lambdapwtrial',
    dimension: 'none',
    expression: 'hc*sqrt(E/Fy)/(hp*(0.54*Mp/My-0.09)^2)',
    operands: {
      hc: 'length',
      hp: 'length',
      E: 'stress',
      Fy: 'stress',
      Mp: 'moment',
      My: 'moment',
    },
  }),
  monoWebNoncompact: limit(16, 'r', 'lambdarw', 'web in flexure', '5.70'),
  hssFlangeCompact: limit(17, 'p', 'lambdapf', 'flange in flexure', '1.12'),
  hssFlangeNoncompact: limit(17, 'r', 'lambdarf', 'flange in flexure', '1.40'),
  boxWebCompact: limit(19, 'p', 'lambdapw', 'webs in flexure', '2.42'),
  boxWebNoncompact: limit(19, 'r', 'lambdarw', 'webs in flexure', '5.70'),
  roundCompact: roundLimit('p', 'lambdap', '0.07'),
  roundNoncompact: roundLimit('r', 'lambdar', '0.31'),
  boxFlangeCompact: limit(21, 'p', 'lambdapf', 'flange in flexure', '1.12'),
  boxFlangeNoncompact: limit(21, 'r', 'lambdarf', 'flange in flexure', '1.49'),
};

export interface Steel {
  readonly E: Quantity;
  readonly Fy: Quantity;
}

export type FlexureClass = 'compact' | 'noncompact' | 'slender';

export interface ClassWithLimits {
  readonly class: FlexureClass;
  readonly lambdap: Quantity;
  readonly lambdar: Quantity;
}

const CLASSES: readonly FlexureClass[] = ['compact', 'noncompact'];

/** The class by limits whose lines are written already; `key` gets the choice `class`. */
export function classBy(
  r: Recorder,
  key: string,
  element: string,
  row: string,
  lambda: Quantity,
  limits: { readonly lambdap: Quantity; readonly lambdar: Quantity },
): ClassWithLimits {
  const { lambdap, lambdar } = limits;
  const taken = r.choice(
    `${key}/class`,
    [
      { left: lambda, relation: '<=', right: lambdap, outcome: `the ${element} is compact` },
      { left: lambda, relation: '<=', right: lambdar, outcome: `the ${element} is noncompact` },
    ],
    `the ${element} is slender`,
    {
      title: `${element[0]?.toUpperCase()}${element.slice(1)} in flexure`,
      clause: clause('B4.1', row),
    },
  );
  return { class: CLASSES[taken] ?? 'slender', lambdap, lambdar };
}

/** The class by a row whose two limits follow from E and Fy. */
function classOfRow(
  r: Recorder,
  key: string,
  element: string,
  steel: Steel,
  lambda: Quantity,
  row: { readonly p: Formula; readonly r: Formula },
): ClassWithLimits {
  const { E, Fy } = steel;
  const lambdap = r.formula(row.p, `${key}/lambdap`, { E, Fy });
  const lambdar = r.formula(row.r, `${key}/lambdar`, { E, Fy });
  return classBy(r, key, element, row.p.equation ?? '', lambda, { lambdap, lambdar });
}

const f = b4FlexureFormulas;

export interface MonoWeb {
  readonly Zx: Quantity;
  /** The smaller of both faces. */
  readonly Sx: Quantity;
  readonly hc: Quantity;
  /** Zero or less where the plastic neutral axis lies in the compression flange. */
  readonly hp: Quantity;
  /** hc/tw. */
  readonly lambdahc: Quantity;
}

/**
 * Table B4.1b row 16: web of a singly symmetric I-shape. λp is at most λr; it is λr too where the
 * plastic neutral axis lies in the compression flange, so that the plastic stresses don't compress
 * the web (row 16 grows beyond all bounds as hp goes to zero).
 */
export function monoWebClass(r: Recorder, steel: Steel, q: MonoWeb): ClassWithLimits {
  const { E, Fy } = steel;
  const { Zx, Sx, hc, hp, lambdahc } = q;
  const key = 'B4/x/web';
  const row = 'Table B4.1b, 16';
  const lambdar = r.formula(f.monoWebNoncompact, `${key}/lambdar`, { E, Fy });
  const stretched = r.choice(
    `${key}/plastic`,
    [
      {
        left: hp,
        relation: '<=',
        right: 0,
        outcome:
          'the plastic stresses do not compress the web: its compact limit is the noncompact one',
      },
    ],
    'the plastic stresses compress a part of the web',
    { title: 'Place of the plastic neutral axis', clause: clause('B4.1', row) },
  );
  if (stretched === 0) return classBy(r, key, 'web', row, lambdahc, { lambdap: lambdar, lambdar });
  const Mp = r.formula(f.plasticMoment, `${key}/Mp`, { Fy, Zx });
  const My = r.formula(f.yieldMoment, `${key}/My`, { Fy, Sx });
  const trial = r.formula(f.monoWebTrial, `${key}/lambdap/trial`, { hc, hp, E, Fy, Mp, My });
  const lambdap = r.governing(`${key}/lambdap`, 'min', [trial, lambdar], {
    title: 'Compact limit of the web in flexure, not more than the noncompact limit',
    symbol: 'lambdapw',
    clause: clause('B4.1', row),
  });
  return classBy(r, key, 'web', row, lambdahc, { lambdap, lambdar });
}

/** Twice the compressed depth of a doubly symmetric web: its clear depth. Key `${at}/hc`. */
export const clearDepth = (
  r: Recorder,
  at: string,
  q: { readonly lambdaw: Quantity; readonly tw: Quantity },
): Quantity => r.formula(f.hc, `${at}/hc`, { lambdaw: q.lambdaw, tw: q.tw });

/** hc/tw of a singly symmetric I-shape. */
export const compressedWebRatio = (
  r: Recorder,
  q: { readonly hc: Quantity; readonly tw: Quantity },
): Quantity => r.formula(f.lambdahc, 'B4/x/web/lambdahc', { hc: q.hc, tw: q.tw });

/** Table B4.1b row 10: flange of a rolled I-shape or a channel, major-axis flexure. */
export const rolledFlangeClass = (r: Recorder, steel: Steel, lambdaf: Quantity): ClassWithLimits =>
  classOfRow(r, 'B4/x/flange', 'flange', steel, lambdaf, {
    p: f.flangeCompact,
    r: f.flangeNoncompact,
  });

/** Table B4.1b row 11: compression flange of a built-up I-shape, with kc and FL of that row. */
export function builtUpFlangeClass(
  r: Recorder,
  steel: Steel,
  lambdaf: Quantity,
  kc: Quantity,
  FL: Quantity,
): ClassWithLimits {
  const { E, Fy } = steel;
  const lambdap = r.formula(f.builtUpCompact, 'B4/x/flange/lambdap', { E, Fy });
  const lambdar = r.formula(f.builtUpNoncompact, 'B4/x/flange/lambdar', { kc, E, FL });
  return classBy(r, 'B4/x/flange', 'flange', 'Table B4.1b, 11', lambdaf, { lambdap, lambdar });
}

/** Table B4.1b row 15: web of a doubly symmetric I-shape or a channel. */
export const webClass = (r: Recorder, steel: Steel, lambdaw: Quantity): ClassWithLimits =>
  classOfRow(r, 'B4/x/web', 'web', steel, lambdaw, { p: f.webCompact, r: f.webNoncompact });

/** Table B4.1b rows 10 and 15: rolled I-shapes and channels, major-axis flexure. */
export const majorFlexureClass = (
  r: Recorder,
  steel: Steel,
  lambdaf: Quantity,
  lambdaw: Quantity,
) => ({
  flange: rolledFlangeClass(r, steel, lambdaf),
  web: webClass(r, steel, lambdaw),
});

/** Table B4.1b row 13: flange of an I-shape or a channel, minor-axis flexure. */
export const minorFlexureClass = (r: Recorder, steel: Steel, lambdaf: Quantity): ClassWithLimits =>
  classOfRow(r, 'B4/y/flange', 'flange', steel, lambdaf, {
    p: f.minorCompact,
    r: f.minorNoncompact,
  });

/** Table B4.1b rows 17 or 21 and 19: a rectangular HSS or a box bent about one axis. */
export const closedFlexureClass = (
  r: Recorder,
  axis: 'x' | 'y',
  kind: 'rect-hss' | 'box',
  steel: Steel,
  lambdaf: Quantity,
  lambdaw: Quantity,
) => ({
  flange: classOfRow(r, `B4/${axis}/flange`, 'flange', steel, lambdaf, {
    p: kind === 'box' ? f.boxFlangeCompact : f.hssFlangeCompact,
    r: kind === 'box' ? f.boxFlangeNoncompact : f.hssFlangeNoncompact,
  }),
  web: classOfRow(r, `B4/${axis}/web`, 'web', steel, lambdaw, {
    p: f.boxWebCompact,
    r: f.boxWebNoncompact,
  }),
});

/** Table B4.1b row 20: wall of a round HSS or pipe. */
export const roundFlexureClass = (
  r: Recorder,
  axis: 'x' | 'y',
  steel: Steel,
  lambdad: Quantity,
): ClassWithLimits =>
  classOfRow(r, `B4/${axis}/wall`, 'wall', steel, lambdad, {
    p: f.roundCompact,
    r: f.roundNoncompact,
  });
