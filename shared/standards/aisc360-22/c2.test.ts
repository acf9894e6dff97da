import { describe, expect, it } from 'vitest';
import type { Quantity } from '../../calc/quantity.ts';
import { createRecorder, type Recorder } from '../../calc/recorder.ts';
import { notionalLoad, secondOrderRatio, stiffnessByNotionalLoad } from './c2.ts';

const given = (r: Recorder, symbol: string, dimension: 'force' | 'none', value: number): Quantity =>
  r.given(
    `given/${symbol}`,
    symbol,
    dimension,
    { value, text: String(value), source: { kind: 'typed' }, confirmed: false },
    { title: symbol },
  );
const notices = (r: Recorder) => r.lines.filter((l) => l.kind === 'notice');

describe('the notional load', () => {
  it('is 0.002·1.6·500 = 1.6 in ASD', () => {
    const r = createRecorder('');
    const N = notionalLoad(r, given(r, 'alpha', 'none', 1.6), given(r, 'Yi', 'force', 500));
    expect(N.value).toBeCloseTo(1.6, 14);
  });
});

describe('τb = 1 by a further notional load', () => {
  const solve = (Pr: number, Yi: number | null) => {
    const r = createRecorder('');
    const q = {
      alpha: given(r, 'alpha', 'none', 1.6),
      Pr: given(r, 'Pr', 'force', Pr),
      Pns: given(r, 'Pns', 'force', 1000),
    };
    const taub = stiffnessByNotionalLoad(r, q, Yi === null ? null : given(r, 'Yi', 'force', Yi));
    return { r, taub };
  };
  // 1.6·312.5 = 500 is half of 1000; C2-2b would give 4·0.64·0.36 = 0.9216 at 400.
  it('needs nothing up to half the cross-section strength', () => {
    const { r, taub } = solve(312.5, 500);
    expect(taub).toMatchObject({ ref: 'C2/taub', value: 1 });
    expect(notices(r)).toEqual([]);
  });
  it('says what the analysis has to hold above: 0.001·1.6·500 = 0.8', () => {
    const { r, taub } = solve(400, 500);
    expect(taub.value).toBe(1);
    expect(r.lines.at(-1)?.clause).toMatchObject({ clause: 'C2.3', equation: null });
    expect(notices(r)).toMatchObject([{ severity: 'note', code: 'further-notional-load' }]);
    const load = r.lines.find((l) => l.key === 'C2/further/Ni');
    expect(load && 'value' in load && load.value).toBeCloseTo(0.8, 14);
  });
  it('says so without the gravity load of a level', () => {
    const { r } = solve(400, null);
    expect(notices(r)).toHaveLength(1);
    expect(r.lines.map((l) => l.key)).not.toContain('C2/further/Ni');
  });
});

describe('second-order over first-order drift', () => {
  for (const [method, ratio, allowed, severity] of [
    ['direct', 1.7, true, null],
    ['direct', 1.7001, true, 'caution'],
    ['effective-length', 1.5, true, null],
    ['effective-length', 1.5001, false, 'outside scope'],
    ['first-order', 1.5, true, null],
    ['first-order', 1.5001, false, 'outside scope'],
  ] as const)
    it(`${method}, ${ratio}: ${allowed}, ${severity}`, () => {
      const r = createRecorder('');
      expect(secondOrderRatio(r, method, given(r, 'ratio', 'none', ratio))).toBe(allowed);
      expect(notices(r)).toMatchObject(severity ? [{ severity }] : []);
    });
});
