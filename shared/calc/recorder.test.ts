import { describe, expect, it } from 'vitest';
import type { DimensionName } from '../units/dimension.ts';
import { defineFormula } from './formula.ts';
import { lineSchema } from './line.ts';
import type { Quantity } from './quantity.ts';
import { createRecorder, NotComputable } from './recorder.ts';

const typed = { kind: 'typed' } as const;
const given = (
  r: ReturnType<typeof createRecorder>,
  key: string,
  value: number,
  dimension: DimensionName = 'none',
): Quantity =>
  r.given(
    key,
    key,
    dimension,
    { value, text: String(value), source: typed, confirmed: false },
    { title: key },
  );
const area = defineFormula('b', {
  id: 'Pn',
  clause: 'E3',
  equation: 'E3-1',
  title: 'Strength',
  symbol: 'Pn',
  dimension: 'force',
  expression: 'Fn*Ag',
  operands: { Fn: 'stress', Ag: 'area' },
});
const quotient = defineFormula('b', {
  id: 'q',
  clause: 'A',
  title: 'Quotient',
  symbol: 'q',
  dimension: 'none',
  expression: 'a/b',
  operands: { a: 'none', b: 'none' },
});

describe('a formula line', () => {
  it('carries value, operands and where they come from', () => {
    const r = createRecorder(':');
    const Fn = given(r, 'Fn', 40, 'stress');
    const Ag = given(r, 'Ag', 10, 'area');
    const Pn = r.formula(area, 'E3/Pn', { Fn, Ag });
    expect(Pn).toEqual({ ref: ':E3/Pn', symbol: 'Pn', value: 400, dimension: 'force' });
    expect(r.lines.at(-1)).toMatchObject({
      kind: 'formula',
      key: 'E3/Pn',
      clause: { book: 'b', clause: 'E3', equation: 'E3-1' },
      formula: 'b/Pn',
      expression: 'Fn*Ag',
      operands: { Fn: { ref: ':Fn', symbol: 'Fn' }, Ag: { ref: ':Ag', symbol: 'Ag' } },
    });
    for (const line of r.lines) expect(lineSchema.safeParse(line).success).toBe(true);
  });
  it('refuses an operand of another dimension, or none', () => {
    const r = createRecorder('');
    const Fn = given(r, 'Fn', 40, 'stress');
    expect(() => r.formula(area, 'E3/Pn', { Fn, Ag: Fn })).toThrow(/Ag is stress, not area/);
    expect(() => r.formula(area, 'E3/Pn', { Fn })).toThrow(/Ag is undefined, not area/);
  });
  it('ends the run with a failed notice where there is no finite value', () => {
    const r = createRecorder('');
    const [a, zero] = [given(r, 'a', 1), given(r, 'b', 0)];
    expect(() => r.formula(quotient, 'q', { a, b: zero })).toThrow(NotComputable);
    expect(r.lines.at(-1)).toMatchObject({
      kind: 'notice',
      severity: 'failed',
      key: 'q/failed',
      code: 'not-a-number',
    });
  });
  it('has no minus zero', () => {
    const r = createRecorder('');
    const q = r.formula(quotient, 'q', { a: given(r, 'a', 0), b: given(r, 'b', -2) });
    expect(Object.is(r.lines.at(-1) && q.value, -0)).toBe(false);
  });
  it('settles noise of the last bits in plain numbers, and nothing larger', () => {
    const r = createRecorder('');
    // 0.1 + 0.2 is 0.30000000000000004 in binary.
    expect(
      r.formula(quotient, 'q1', { a: given(r, 'a', 0.1 + 0.2), b: given(r, 'b', 1) }).value,
    ).toBe(0.3);
    // Equal values have the ratio 1.
    for (const [i, ratio] of [1 + 1e-13, -1 + 1e-13].entries())
      expect(
        r.formula(quotient, `e${i}`, { a: given(r, `n${i}`, ratio), b: given(r, `m${i}`, 1) })
          .value,
      ).toBe(Math.sign(ratio));
    const near = 0.3 * (1 + 1e-13);
    expect(r.formula(quotient, 'q2', { a: given(r, 'c', near), b: given(r, 'd', 1) }).value).toBe(
      near,
    );
  });
});

describe('keys and lines', () => {
  it('a key twice is a mistake', () => {
    const r = createRecorder('');
    given(r, 'a', 1);
    expect(() => given(r, 'a', 2)).toThrow(/two lines with the key a/);
  });
  it('are frozen', () => {
    const r = createRecorder('');
    given(r, 'a', 1);
    expect(Object.isFrozen(r.lines[0])).toBe(true);
  });
});

describe('a choice', () => {
  const decide = (value: number) => {
    const r = createRecorder('');
    const taken = r.choice(
      'branch',
      [
        { left: given(r, 'a', value), relation: '<=', right: 0.5, outcome: 'low' },
        { left: given(r, 'b', value), relation: '<', right: 2, outcome: 'middle' },
      ],
      'high',
      { title: 'Branch' },
    );
    const line = r.lines.at(-1);
    return { taken, line: line?.kind === 'choice' ? line : null };
  };
  it('takes the first that holds, and tells only what it read', () => {
    expect(decide(0.5)).toMatchObject({
      taken: 0,
      line: { outcome: 'low', tried: [{ holds: true }] },
    });
    expect(decide(0.5).line?.tried).toHaveLength(1);
    expect(decide(1)).toMatchObject({
      taken: 1,
      line: { outcome: 'middle', tried: [{ holds: false }, { holds: true }] },
    });
    expect(decide(2)).toMatchObject({ taken: -1, line: { outcome: 'high' } });
  });
  it('takes what differs by rounding only as equal, and nothing else', () => {
    expect(decide(0.5 + Number.EPSILON).taken).toBe(0);
    expect(decide(0.5 + 1e-13).taken).toBe(0);
    expect(decide(0.500000000001).taken).toBe(1);
    expect(decide(2 - Number.EPSILON).taken).toBe(-1);
    expect(decide(1.99999999999).taken).toBe(1);
  });
  it('has every relation of equals and of others', () => {
    const holds = (left: number, relation: '<' | '<=' | '>' | '>=' | '=', right: number) =>
      createRecorder('').choice(
        'c',
        [{ left: given(createRecorder(''), 'l', left), relation, right, outcome: 'so' }],
        'not so',
        { title: 'C' },
      ) === 0;
    const relations = ['<', '<=', '>', '>=', '='] as const;
    const third = 1 / 3;
    for (const near of [third, third * (1 + 1e-15), third * (1 - 1e-15)])
      expect(relations.map((relation) => holds(near, relation, third))).toEqual([
        ...[false, true, false, true, true],
      ]);
    expect(relations.map((relation) => holds(0.3, relation, third))).toEqual([
      ...[true, true, false, false, false],
    ]);
    expect(relations.map((relation) => holds(0.4, relation, third))).toEqual([
      ...[false, false, true, true, false],
    ]);
    // Nothing but zero is equal to it.
    expect(relations.map((relation) => holds(1e-300, relation, 0))).toEqual([
      ...[false, false, true, true, false],
    ]);
  });
});

describe('what governs', () => {
  const governing = (sense: 'min' | 'max', values: number[]) => {
    const r = createRecorder('');
    return r.governing(
      'best',
      sense,
      values.map((v, i) => given(r, `v${i}`, v)),
      {
        title: 'Best',
        symbol: 'v',
      },
    );
  };
  it('is the least, or the greatest', () => {
    expect(governing('min', [3, 1, 2]).value).toBe(1);
    expect(governing('max', [3, 1, 2]).value).toBe(3);
  });
  it('is the first of equals', () => {
    const r = createRecorder('');
    r.governing('best', 'min', [given(r, 'a', 1), given(r, 'b', 1)], {
      title: 'Best',
      symbol: 'v',
    });
    expect(r.lines.at(-1)).toMatchObject({ governs: 'a', candidates: ['a', 'b'] });
  });
});

describe('a check', () => {
  const check = (demand: number, capacity: number | null) => {
    const r = createRecorder('');
    return r.check(
      'check',
      given(r, 'd', demand),
      capacity === null ? 1 : given(r, 'c', capacity),
      { title: 'Check' },
    );
  };
  it('is OK up to the unrounded 1', () => {
    expect(check(1, 2)).toMatchObject({ ratio: 0.5, verdict: 'OK' });
    expect(check(2, 2)).toMatchObject({ ratio: 1, verdict: 'OK' });
    expect(check(1.0000001, null)).toMatchObject({ ratio: 1.0000001, verdict: 'NOT OK' });
  });
  it('against no capacity is a failed notice', () => {
    expect(() => check(1, 0)).toThrow(NotComputable);
  });
});

describe('a comparison', () => {
  it('is used over other, less one', () => {
    const r = createRecorder('');
    expect(
      r.comparison('c', given(r, 'a', 95), given(r, 'b', 100), '{difference}', { title: 'C' }),
    ).toBeCloseTo(-0.05, 14);
  });
  it('with nothing has no share, and no line', () => {
    const r = createRecorder('');
    const [used, nothing] = [given(r, 'a', 95), given(r, 'b', 0)];
    expect(r.comparison('c', used, nothing, '{difference}', { title: 'C' })).toBe(null);
    expect(r.lines.map(({ kind }) => kind)).toEqual(['given', 'given']);
  });
});

/*
 * Alignment chart, sway, GA = 10, GB = 1: [GA GB (π/K)² − 36]/[6(GA + GB)] − (π/K)/tan(π/K) = 0
 * (Commentary to ANSI/AISC 360-22, C-A-7-2, from memory); K = 1.9029690405129926, computed for this
 * project as the first root of a 40-digit power-series determinant, without that equation.
 */
describe('a root', () => {
  const sway = defineFormula('b', {
    id: 'C-A-7-2',
    clause: 'App. 7',
    title: 'Effective length factor, sway',
    symbol: 'K',
    dimension: 'none',
    expression: '(GA*GB*(pi/K)^2-36)/(6*(GA+GB))-(pi/K)/tan(pi/K)',
    operands: { GA: 'none', GB: 'none', K: 'none' },
  });
  const solve = (bracket: readonly [number, number], GA = 10, GB = 1) => {
    const r = createRecorder('');
    const K = r.root(
      sway,
      'K',
      { symbol: 'K', dimension: 'none', bracket },
      { GA: given(r, 'GA', GA), GB: given(r, 'GB', GB) },
    );
    return { r, K };
  };
  it('is found to the last digits, with its bracket and residual', () => {
    const { r, K } = solve([1.01, 20]);
    expect(K.value).toBeCloseTo(1.9029690405129926, 12);
    const line = r.lines.at(-1);
    expect(line).toMatchObject({ kind: 'root', unknown: 'K', bracket: [1.01, 20] });
    expect(line?.kind === 'root' && Math.abs(line.residual)).toBeLessThan(1e-12);
    expect(lineSchema.safeParse(line).success).toBe(true);
  });
  it('does not care which end is which', () =>
    expect(solve([1.01, 20], 1, 10).K.value).toBeCloseTo(1.9029690405129926, 12));
  it('outside its bounds is a failed notice', () => {
    const r = createRecorder('');
    expect(() =>
      r.root(
        sway,
        'K',
        { symbol: 'K', dimension: 'none', bracket: [3, 20] },
        { GA: given(r, 'GA', 10), GB: given(r, 'GB', 1) },
      ),
    ).toThrow(NotComputable);
    expect(r.lines.at(-1)).toMatchObject({ kind: 'notice', severity: 'failed', code: 'no-root' });
  });
});
