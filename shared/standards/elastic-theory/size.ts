import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { endMomentFormulas } from './end-moments.ts';
import { clause, formula } from './writer.ts';

export const sizeFormulas = {
  shear: formula({
    id: 'shear-size',
    clause: '0',
    title: 'Size of the shear',
    symbol: 'Vabs',
    dimension: 'force',
    expression: 'abs(V)',
    operands: { V: 'force' },
    prints: 'display',
  }),
};

/**
 * The algebraically largest and least of signed candidates, and the larger of the two sizes, under
 * `${letter}high`, `${letter}low` and `${letter}max`.
 */
export function largestSize(
  r: Recorder,
  at: string,
  candidates: readonly Quantity[],
  named: {
    readonly word: 'moment' | 'shear';
    readonly letter: 'M' | 'V';
    readonly symbols: { readonly highest: string; readonly lowest: string; readonly size: string };
  },
): { highest: Quantity; lowest: Quantity; size: Quantity } {
  const { word, letter, symbols } = named;
  const extreme = (key: string, sense: 'max' | 'min', symbol: string, title: string) =>
    r.governing(`${at}/${letter}${key}`, sense, candidates, {
      title,
      symbol,
      clause: clause('2.1'),
    });
  const highest = extreme('high', 'max', symbols.highest, `Largest ${word}, with its sign`);
  const lowest = extreme('low', 'min', symbols.lowest, `Least ${word}, with its sign`);
  const sizeOf = (key: string, q: Quantity, title: string) =>
    letter === 'M'
      ? r.formula(
          endMomentFormulas.size,
          `${at}/M${key}/size`,
          { M: q },
          { title, symbol: `absM${key}` },
        )
      : r.formula(
          sizeFormulas.shear,
          `${at}/V${key}/size`,
          { V: q },
          { title, symbol: `absV${key}` },
        );
  const size = r.governing(
    `${at}/${letter}max`,
    'max',
    [
      sizeOf('high', highest, `Size of the largest ${word}`),
      sizeOf('low', lowest, `Size of the least ${word}`),
    ],
    { title: `Largest ${word} as a size`, symbol: symbols.size, clause: clause('2.1') },
  );
  return { highest, lowest, size };
}
