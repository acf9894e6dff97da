import { describe, expect, it } from 'vitest';
import { UNIT_SETS } from '../units/unit-set.ts';
import { closeLines, hidesSide } from './closure.ts';
import { closureProblems } from './closure-problems.ts';
import { defineFormula } from './formula.ts';
import type { Line } from './line.ts';
import { printedForms } from './printed.ts';
import { createRecorder } from './recorder.ts';

const set = UNIT_SETS.us;
const place = (lines: readonly Line[]) =>
  lines.map((line) => ({ address: line.key, combination: null, line }));
const given = (r: ReturnType<typeof createRecorder>, key: string, text: string) =>
  r.given(
    key,
    key,
    'none',
    { value: Number(text), text, source: { kind: 'typed' }, confirmed: false },
    { title: key },
  );
const formula = (id: string, expression: string, ...operands: string[]) =>
  defineFormula('b', {
    id,
    clause: 'A',
    title: id,
    symbol: id,
    dimension: 'none',
    expression,
    operands: Object.fromEntries(operands.map((o) => [o, 'none'])),
  });
const printed = (line: Line | undefined): string =>
  line && 'value' in line ? (printedForms(line, set).working?.number.text ?? '') : '';
const digits = (line: Line | undefined): unknown => line && 'print' in line && line.print.working;

/*
 * By hand: a = 1.00004, b = 1. Four figures print a·b as 1.000, and d = (q − 1)·1e5 = 4 can't follow
 * from 1.000; it follows from 1.00004.
 */
describe('digits are added to operands until the line closes', () => {
  const r = createRecorder('');
  const a = given(r, 'a', '1.00004');
  const q = r.formula(formula('q', 'a*b', 'a', 'b'), 'q', { a, b: given(r, 'b', '1') });
  r.formula(formula('d', '(q-1)*100000', 'q'), 'd', { q });
  const closed = closeLines(place(r.lines), set);
  it('the operand prints what the result needs, the result stays at four', () => {
    expect(printed(closed[2])).toBe('1.00004');
    expect(digits(closed[3])).toEqual({ sig: 4 });
    expect(printed(closed[3])).toBe('4.000');
  });
  it('and the proof finds nothing; it does where a digit is taken away', () => {
    expect(closureProblems(place(closed), set)).toEqual([]);
    const short = closed.map((l, i) =>
      i === 2 && 'print' in l ? { ...l, print: { ...l.print, working: { sig: 4 } } } : l,
    ) as Line[];
    expect(closureProblems(place(short), set)).toEqual([
      {
        address: 'd',
        reason: expect.stringContaining('prints 4.000, its printed operands give 0') as string,
      },
    ]);
  });
  it('typed values print as they stand', () => expect(printed(closed[0])).toBe('1.00004'));
});

describe('a given number', () => {
  const forms = (text: string) => {
    const r = createRecorder('');
    given(r, 'a', text);
    const [line] = closeLines(place(r.lines), set);
    if (!line || !('value' in line)) throw new Error(text);
    const { working, typed } = printedForms(line, set);
    return [working?.number.text, typed];
  };
  it('prints as typed with up to 12 digits', () => {
    expect(forms('1.23456789012')).toEqual(['1.23456789012', null]);
    expect(forms('-0.000123456789012')).toEqual(['−0.000123456789012', null]);
  });
  it('was computed if it has more, and prints as other values do, its text beside it', () => {
    expect(forms('1.234567890123')).toEqual(['1.235', '1.234567890123']);
    // 0.1 + 0.2 of a spreadsheet.
    expect(forms('0.30000000000000004')).toEqual(['0.3', '0.30000000000000004']);
  });
});

describe('a comparison prints the truth', () => {
  const compare = (left: number, right: number) => {
    const r = createRecorder('');
    const one = given(r, 'one', '1');
    const value = (key: string, v: number) =>
      r.formula(formula(key, `${v}*one`, 'one'), key, { one });
    r.choice(
      'c',
      [{ left: value('l', left), relation: '<', right: value('r', right), outcome: 'below' }],
      'not below',
      { title: 'C' },
    );
    const closed = closeLines(place(r.lines), set);
    expect(closureProblems(place(closed), set)).toEqual([]);
    return [printed(closed[1]), printed(closed[2])];
  };
  it('with more digits where four would lie', () => {
    // 1.000 and 1.000 would not be one below the other.
    const [l, r] = compare(1.00001, 1.00002);
    expect(Number(l)).toBeLessThan(Number(r));
  });
  it('equal where they differ by rounding only, with the relation that equals have', () => {
    const [l, r] = compare(12.34565, 12.34565 * (1 + 1e-15));
    expect(l).toBe(r);
  });
  it('with no more digits than there are where 12 tell them apart', () => {
    const [l, r] = compare(1.23456789012, 1.23456789013);
    expect(Number(l)).toBeLessThan(Number(r));
    expect(l?.length).toBeLessThanOrEqual(15);
  });
  it('with four where they do', () => expect(compare(1.5, 2)).toEqual(['1.500', '2.000']));
  it('equal values print equal', () => {
    const [l, r] = compare(4 / 3, 4 / 3);
    expect(l).toBe(r);
  });
});

describe('a ratio never hides its side of 1', () => {
  const check = (ratio: number) => {
    const r = createRecorder('');
    r.check('check', given(r, 'd', String(ratio)), 1, { title: 'Check' });
    const closed = closeLines(place(r.lines), set);
    expect(closureProblems(place(closed), set)).toEqual([]);
    return digits(closed[1]);
  };
  it('three decimals, more near 1', () => {
    expect(check(0.9293)).toEqual({ dec: 3 });
    expect(check(1)).toEqual({ dec: 3 });
    expect(check(1.0004)).toEqual({ dec: 4 });
    expect(check(0.99996)).toEqual({ dec: 5 });
    expect(check(1.0000001)).toEqual({ dec: 7 });
  });
  it('is decided on the rounded number', () => {
    expect(hidesSide(1.0004, { dec: 3 })).toBe(true);
    expect(hidesSide(1.0006, { dec: 3 })).toBe(false);
    expect(hidesSide(0.9996, { dec: 3 })).toBe(true);
    expect(hidesSide(1, { dec: 3 })).toBe(false);
  });
});

/*
 * By hand: a = 1/3 and b = 1/3 + 1e-11 at 14 digits are 0.33333333333333 and 0.33333333334333; their
 * difference, 1.000e-11, is known to 1e-14 from these: 0.001 of it, one unit of its fourth digit.
 * With 1.537e-12 between them they are 0.33333333333487 and 0.33333333333333, which give 1.54e-12:
 * three digits are all that they carry. Seven times that is 1.078e-11, not the 1.076e-11 that it is.
 */
describe('a difference prints no more digits than its operands carry', () => {
  const difference = (apart: number) => {
    const r = createRecorder('');
    const one = given(r, 'one', '1');
    const a = r.formula(formula('a', `${1 / 3}*one`, 'one'), 'a', { one });
    const b = r.formula(formula('b', `${1 / 3 + apart}*one`, 'one'), 'b', { one });
    const d = r.formula(formula('d', 'b-a', 'a', 'b'), 'd', { a, b });
    // What uses it has no more either.
    r.formula(formula('m', '7*d', 'd'), 'm', { d });
    r.governing('g', 'max', [d], { title: 'G', symbol: 'd' });
    const closed = closeLines(place(r.lines), set);
    expect(closureProblems(place(closed), set)).toEqual([]);
    return closed;
  };
  const significant = (line: Line | undefined): number =>
    (digits(line) as { sig: number } | null)?.sig ?? 0;
  it('four where they do', () => {
    const closed = difference(3.3e-8);
    expect([3, 4, 5].map((i) => significant(closed[i]))).toEqual([4, 4, 4]);
  });
  it('fewer where terms cancel, and they print all there are', () => {
    const closed = difference(1.537e-12);
    expect([1, 2, 3, 4, 5].map((i) => printed(closed[i]))).toEqual([
      '0.33333333333333',
      '0.33333333333487',
      '1.54×10⁻¹²',
      '1.08×10⁻¹¹',
      '1.54×10⁻¹²',
    ]);
  });
  it('none where it is their rounding', () => {
    expect(printed(difference(1e-14)[3])).toBe('0');
  });
  it('the proof asks that fewer than four are all there are', () => {
    const short = difference(3.3e-8).map((l, i) =>
      i === 3 && 'print' in l ? { ...l, print: { ...l.print, working: { sig: 2 } } } : l,
    ) as Line[];
    expect(closureProblems(place(short), set)).toContainEqual({
      address: 'd',
      reason: expect.stringContaining('carry more digits') as string,
    });
  });
  it('and does not excuse a result that is wrong', () => {
    const wrong = place(difference(1.537e-12)).map((p) =>
      p.address === 'm' && 'value' in p.line
        ? { ...p, line: { ...p.line, value: p.line.value * 1.5 } as Line }
        : p,
    );
    expect(closureProblems(place(closeLines(wrong, set)), set)[0]).toEqual({
      address: 'm',
      reason: expect.stringContaining(
        'prints 1.61×10⁻¹¹, its printed operands give 1.07',
      ) as string,
    });
  });
});

/*
 * A root closes by its residual: the equation changes sign across one step of the last printed digit.
 * x² − a = 0 at a = 2: 1.414 ± 0.001.
 */
describe('a root', () => {
  const square = formula('square', 'x^2-a', 'x', 'a');
  const closed = (() => {
    const r = createRecorder('');
    r.root(
      square,
      'root',
      { symbol: 'x', dimension: 'none', bracket: [0, 2] },
      { a: given(r, 'a', '2') },
    );
    return closeLines(place(r.lines), set);
  })();
  it('prints and closes', () => {
    expect(printed(closed[1])).toBe('1.414');
    expect(closureProblems(place(closed), set)).toEqual([]);
  });
  it('does not close on another number', () => {
    const wrong = closed.map((l) => (l.kind === 'root' ? { ...l, value: 1.42 } : l));
    expect(closureProblems(place(wrong), set)[0]?.reason).toMatch(/no sign change/);
  });
});

/*
 * Two lines share an operand: the one read later closes on the operand's short form, the earlier one
 * then needs a longer form. Both have to close in the end. u = 10 000·v − 9 999·w is touchy in v.
 */
describe('lines that share an operand', () => {
  it('close together', () => {
    for (let n = 0; n < 200; n += 1) {
      const r = createRecorder('');
      const one = given(r, 'one', '1');
      const v = r.formula(formula('v', `${1.2341 + n * 1.7e-5}*one`, 'one'), 'v', { one });
      const w = r.formula(formula('w', `${1.2347 - n * 1.3e-5}*one`, 'one'), 'w', { one });
      r.formula(formula('u', '10000*v-9999*w', 'v', 'w'), 'u', { v, w });
      r.formula(formula('t', 'v*w', 'v', 'w'), 't', { v, w });
      r.formula(formula('s', 'v/w', 'v', 'w'), 's', { v, w });
      expect(closureProblems(place(closeLines(place(r.lines), set)), set)).toEqual([]);
    }
  });
});
