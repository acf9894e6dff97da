import type { Formula } from '../../calc/formula.ts';
import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// B4.1, Table B4.1a: width-to-thickness limits of elements in uniform compression.
const limit = (row: number, symbol: string, element: string, expression: string): Formula =>
  formula({
    id: `B4.1a-${row}`,
    clause: 'B4.1',
    equation: `Table B4.1a, ${row}`,
    title: `Slender limit of the ${element} in compression`,
    symbol,
    dimension: 'none',
    expression,
    operands: expression.includes('kc')
      ? { kc: 'none', E: 'stress', Fy: 'stress' }
      : { E: 'stress', Fy: 'stress' },
  });

export const b4CompressionFormulas = {
  flange: limit(1, 'lambdarfc', 'flange', '0.56*sqrt(E/Fy)'),
  builtUpFlange: limit(2, 'lambdarfc', 'flange', '0.64*sqrt(kc*E/Fy)'),
  web: limit(5, 'lambdarwc', 'web', '1.49*sqrt(E/Fy)'),
  wall: limit(6, 'lambdar', 'wall', '1.40*sqrt(E/Fy)'),
  otherStiffened: limit(8, 'lambdar', 'element', '1.49*sqrt(E/Fy)'),
  roundWall: limit(9, 'lambdar', 'wall', '0.11*E/Fy'),
};

export interface LimitOperands {
  readonly E: Quantity;
  readonly Fy: Quantity;
  /** Row 2 only: flanges of built-up I-shapes. */
  readonly kc?: Quantity;
}

/** λr of a row of Table B4.1a (ANSI/AISC 360-22) as the line `B4/<name>/lambdar`. */
export const slenderLimit = (
  r: Recorder,
  row: keyof typeof b4CompressionFormulas,
  name: string,
  { E, Fy, kc }: LimitOperands,
  more: { title?: string; symbol?: string } = {},
): Quantity =>
  r.formula(b4CompressionFormulas[row], `B4/${name}/lambdar`, { E, Fy, ...(kc && { kc }) }, more);

/** B4.1: whether λ exceeds λr of its row, as the line `B4/<name>/class`; `words` names the element. */
export function isSlender(
  r: Recorder,
  row: keyof typeof b4CompressionFormulas,
  name: string,
  words: string,
  lambda: Quantity,
  lambdar: Quantity,
): boolean {
  const taken = r.choice(
    `B4/${name}/class`,
    [{ left: lambda, relation: '<=', right: lambdar, outcome: `the ${words} is nonslender` }],
    `the ${words} is slender`,
    {
      title: `${words[0]?.toUpperCase()}${words.slice(1)} in compression`,
      clause: clause('B4.1', b4CompressionFormulas[row].equation),
    },
  );
  return taken < 0;
}
