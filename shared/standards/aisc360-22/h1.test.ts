import { describe, expect, it } from 'vitest';
import type { Quantity } from '../../calc/quantity.ts';
import { createRecorder, type Recorder } from '../../calc/recorder.ts';
import { interactionChecks } from './h1.ts';

const given = (
  r: Recorder,
  symbol: string,
  dimension: 'force' | 'moment',
  value: number,
): Quantity =>
  r.given(
    symbol,
    symbol,
    dimension,
    { value, text: String(value), source: { kind: 'typed' }, confirmed: false },
    { title: symbol },
  );

const pair = (r: Recorder, name: 'P' | 'Mx', share: number) => {
  const dimension = name === 'P' ? 'force' : 'moment';
  const [required, available] = name === 'P' ? ['Pr', 'Pc'] : ['Mrx', 'Mcx'];
  return {
    r: given(r, required as string, dimension, 1000 * share),
    c: given(r, available as string, dimension, 1000),
  };
};

describe('the interaction of a part of the member', () => {
  // By hand: 0.4 + 8/9·0.3 = 0.6667 by H1-1a; 0.1/2 + 0.3 = 0.35 by H1-1b.
  for (const [share, equation, ratio] of [
    [0.4, 'H1-1a', 0.4 + (8 / 9) * 0.3],
    [0.1, 'H1-1b', 0.35],
  ] as const)
    it(`names ${equation} on its check`, () => {
      const r = createRecorder(':').within('s2');
      const P = pair(r, 'P', share);
      const M = pair(r, 'Mx', 0.3);
      const [check] = interactionChecks(r, { Pr: P.r, Pc: P.c }, { Mr: M.r, Mc: M.c }, null);
      expect(check?.key).toBe('s2/H1/check');
      expect(check?.clause).toEqual({ book: 'aisc360-22', clause: 'H1.1', equation });
      expect(check?.ratio).toBeCloseTo(ratio, 12);
    });
});
