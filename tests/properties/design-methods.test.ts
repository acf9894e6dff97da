import { describe, expect, test, vi } from 'vitest';
import { members } from './arbitraries.ts';
import { assertProperty, type Fault } from './assert-property.ts';
import { plainKey } from './crossings.ts';
import type { Member } from './member.ts';
import { checksOf, linesOfKind, type Run, run } from './results.ts';
import { scaled } from './turn-member.ts';

vi.mock('#shared/calc/closure.ts', () => import('./no-digits.ts'));

/*
 * ASD under 1/1.6 of the forces is LRFD under the forces: second-order effects are those at 1.6 times
 * the ASD loads (C2.1(d)), nominal strengths do not depend on the method, and the available ones
 * stand to each other as φ to 1/Ω.
 */
const LEVEL = 1.6;
/** φΩ by what is available: E1 and F1 0.90·1.67, G2.1(a) 1.00·1.50, D2 0.90·1.67 and 0.75·2.00. */
const FACTORS: Readonly<Record<string, readonly number[]>> = {
  'H1/axial': [0.9 * 1.67, 0.75 * 2],
  ...{ 'H1/x': [0.9 * 1.67], 'H1/y': [0.9 * 1.67], 'G/y/check': [0.9 * 1.67] },
  'G/x/check': [0.9 * 1.67, 1 * 1.5],
};
const CLOSE = 1e-11;
const close = (a: number, b: number) =>
  Math.abs(a - b) <= CLOSE * Math.max(Math.abs(a), Math.abs(b));

const pair = (m: Member): readonly [Run, Run] => {
  const lrfd = { ...m, design: 'LRFD' as const };
  return [run(lrfd), run({ ...scaled(lrfd, 1 / LEVEL), design: 'ASD' as const })];
};

let compared = 0;

function faults(m: Member): readonly Fault[] {
  const [lrfd, asd] = pair(m);
  const input = { lrfd: lrfd.input, asd: asd.input };
  const fault = (text: string): Fault => ({ text, input });
  // An available strength between both methods' factors decides for another branch of H1.
  const other = new Map(checksOf(asd).map((check) => [check.key, check]));
  const checks = checksOf(lrfd).flatMap((a): readonly Fault[] => {
    const b = other.get(a.key);
    if (!b) return [fault(`${a.key} is not in ASD`)];
    const factors = FACTORS[plainKey(a.key)];
    if (!factors) return [];
    compared += 1;
    return [
      ...(close(a.demand, b.demand * LEVEL) ? [] : [fault(`${a.key}: ${a.demand}, ${b.demand}`)]),
      ...(factors.some((factor) => close(a.capacity, b.capacity * factor))
        ? []
        : [fault(`${a.key}: available ${a.capacity}, ${b.capacity}`)]),
    ];
  });
  const nominal = linesOfKind(lrfd, 'formula')
    .concat()
    .flatMap(({ address, line }) => {
      if (!/\/([PMV]n|taub|B1|Cm|Cb|Fn|Fe|Ae|Lp|Lr)$/.test(address)) return [];
      const b = asd.lines.get(address);
      const same = b?.kind === 'formula' && close(line.value, b.value);
      return same
        ? []
        : [fault(`${address}: ${line.value}, ${b && 'value' in b ? b.value : 'none'}`)];
    });
  return [...checks, ...nominal];
}

describe('ASD under 1/1.6 of the forces', () => {
  const drawn = members().map((m) => ({ ...m, provisions: [] }));
  test('is LRFD but for φ and Ω', { timeout: 600_000 }, () => {
    assertProperty(drawn, { seed: 61, runs: 200 }, faults);
    expect(compared).toBeGreaterThan(400);
  });
});
