import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// B4.1, Table B4.1a: width-to-thickness limits of rolled I-shapes.
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
