import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// B4.1, Tables B4.1a and B4.1b: width-to-thickness limits of rolled I-shapes.
const limit = (id: string, row: string, symbol: string, title: string, factor: string) =>
  formula({
    id,
    clause: 'B4.1',
    equation: row,
    title,
    symbol,
    dimension: 'none',
    expression: `${factor}*sqrt(E/Fy)`,
    operands: { E: 'stress', Fy: 'stress' },
  });

export const b4Formulas = {
  flangeCompression: limit(
    'B4.1a-1',
    'Table B4.1a, 1',
    'lambdarfc',
    'Slender limit of the flange in compression',
    '0.56',
  ),
  webCompression: limit(
    'B4.1a-5',
    'Table B4.1a, 5',
    'lambdarwc',
    'Slender limit of the web in compression',
    '1.49',
  ),
  flangeCompact: limit(
    'B4.1b-10p',
    'Table B4.1b, 10',
    'lambdapf',
    'Compact limit of the flange in flexure',
    '0.38',
  ),
  flangeNoncompact: limit(
    'B4.1b-10r',
    'Table B4.1b, 10',
    'lambdarf',
    'Noncompact limit of the flange in flexure',
    '1.0',
  ),
  minorCompact: limit(
    'B4.1b-13p',
    'Table B4.1b, 13',
    'lambdapf',
    'Compact limit of the flange, minor-axis flexure',
    '0.38',
  ),
  minorNoncompact: limit(
    'B4.1b-13r',
    'Table B4.1b, 13',
    'lambdarf',
    'Noncompact limit of the flange, minor-axis flexure',
    '1.0',
  ),
  webCompact: limit(
    'B4.1b-15p',
    'Table B4.1b, 15',
    'lambdapw',
    'Compact limit of the web in flexure',
    '3.76',
  ),
  webNoncompact: limit(
    'B4.1b-15r',
    'Table B4.1b, 15',
    'lambdarw',
    'Noncompact limit of the web in flexure',
    '5.70',
  ),
};

export interface Steel {
  readonly E: Quantity;
  readonly Fy: Quantity;
}

export interface CompressionClass {
  readonly flangeSlender: boolean;
  readonly webSlender: boolean;
  readonly lambdarf: Quantity;
  readonly lambdarw: Quantity;
}

/** B4.1, Table B4.1a: nonslender or slender under uniform compression. */
export function compressionClass(
  r: Recorder,
  steel: Steel,
  lambdaf: Quantity,
  lambdaw: Quantity,
): CompressionClass {
  const lambdarf = r.formula(b4Formulas.flangeCompression, 'B4/flange/lambdar', { ...steel });
  const flange = r.choice(
    'B4/flange/class',
    [{ left: lambdaf, relation: '<=', right: lambdarf, outcome: 'the flange is nonslender' }],
    'the flange is slender',
    { title: 'Flange in compression', clause: clause('B4.1', 'Table B4.1a, 1') },
  );
  const lambdarw = r.formula(b4Formulas.webCompression, 'B4/web/lambdar', { ...steel });
  const web = r.choice(
    'B4/web/class',
    [{ left: lambdaw, relation: '<=', right: lambdarw, outcome: 'the web is nonslender' }],
    'the web is slender',
    { title: 'Web in compression', clause: clause('B4.1', 'Table B4.1a, 5') },
  );
  return { flangeSlender: flange < 0, webSlender: web < 0, lambdarf, lambdarw };
}

export type FlexureClass = 'compact' | 'noncompact' | 'slender';

export interface ClassWithLimits {
  readonly class: FlexureClass;
  readonly lambdap: Quantity;
  readonly lambdar: Quantity;
}

const CLASSES: readonly FlexureClass[] = ['compact', 'noncompact'];

function flexureClass(
  r: Recorder,
  key: string,
  element: string,
  row: string,
  steel: Steel,
  lambda: Quantity,
  limits: {
    readonly p: typeof b4Formulas.flangeCompact;
    readonly r: typeof b4Formulas.flangeCompact;
  },
): ClassWithLimits {
  const lambdap = r.formula(limits.p, `${key}/lambdap`, { ...steel });
  const lambdar = r.formula(limits.r, `${key}/lambdar`, { ...steel });
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

/** B4.1, Table B4.1b rows 10 and 15: major-axis flexure. */
export const majorFlexureClass = (
  r: Recorder,
  steel: Steel,
  lambdaf: Quantity,
  lambdaw: Quantity,
) => ({
  flange: flexureClass(r, 'B4/x/flange', 'flange', 'Table B4.1b, 10', steel, lambdaf, {
    p: b4Formulas.flangeCompact,
    r: b4Formulas.flangeNoncompact,
  }),
  web: flexureClass(r, 'B4/x/web', 'web', 'Table B4.1b, 15', steel, lambdaw, {
    p: b4Formulas.webCompact,
    r: b4Formulas.webNoncompact,
  }),
});

/** B4.1, Table B4.1b row 13: minor-axis flexure. */
export const minorFlexureClass = (r: Recorder, steel: Steel, lambdaf: Quantity): ClassWithLimits =>
  flexureClass(r, 'B4/y/flange', 'flange', 'Table B4.1b, 13', steel, lambdaf, {
    p: b4Formulas.minorCompact,
    r: b4Formulas.minorNoncompact,
  });
