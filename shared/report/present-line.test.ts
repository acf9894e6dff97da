import katex from 'katex';
import { describe, expect, it } from 'vitest';
import { placedLines } from '../calc/address.ts';
import { closeLines } from '../calc/closure.ts';
import { defineFormula } from '../calc/formula.ts';
import type { Line, LineKind } from '../calc/line.ts';
import type { GivenValue } from '../calc/quantity.ts';
import type { MemberRecord } from '../calc/record.ts';
import { createRecorder } from '../calc/recorder.ts';
import { UNIT_SETS } from '../units/unit-set.ts';
import { presentLine } from './present-line.ts';
import { createPresenter } from './presenter.ts';
import { symbolTex } from './sheet-books.ts';
import type { LineBlock } from './tree.ts';

const KIP = 4448.2216152605;
const typed = (value: number, text: string): GivenValue => ({
  value,
  text,
  source: { kind: 'drawing', number: 'S-201', revision: 'C', detail: 'grid 4/B' },
  confirmed: false,
});
const book = 'aisc360-22';
const clause = (name: string, equation: string | null = null) => ({ book, clause: name, equation });

const formulas = {
  slenderness: defineFormula(book, {
    id: 'E2-Lc/r',
    clause: 'E2',
    title: 'Slenderness',
    symbol: 'slenderness',
    dimension: 'none',
    expression: 'Lc/r',
    operands: { Lc: 'length', r: 'length' },
  }),
  twice: defineFormula(book, {
    id: 'twice',
    clause: 'App. 8.1.2',
    equation: 'A-8-3',
    title: 'Amplified moment',
    symbol: 'Mr',
    dimension: 'moment',
    expression: 'B1*Mnt',
    operands: { B1: 'none', Mnt: 'moment' },
    prints: 'display',
  }),
  share: defineFormula(book, {
    id: 'share',
    clause: 'H1.1',
    title: 'Use of the axial strength',
    symbol: 'PrPc',
    dimension: 'none',
    expression: 'Pr/Pc',
    operands: { Pr: 'force', Pc: 'force' },
    prints: 'display',
    ratio: true,
  }),
  less: defineFormula(book, {
    id: 'less',
    clause: 'App. 8.1.2',
    title: 'Factor',
    symbol: 'Cm',
    dimension: 'none',
    expression: '0.6-M1M2',
    operands: { M1M2: 'none' },
  }),
  cube: defineFormula(book, {
    id: 'cube',
    clause: 'E4',
    title: 'A root',
    symbol: 'c',
    dimension: 'none',
    expression: 'c^3-B1',
    operands: { c: 'none', B1: 'none' },
  }),
};

/** A member with one line of each kind, some of them in a combination. */
function sample(): MemberRecord {
  const m = createRecorder('');
  m.section('E', 'Compression', clause('E2'));
  const L = m.given('given/Lcx', 'Lcx', 'length', typed(6705.6, '22 ft'), {
    title: 'Buckling length',
  });
  m.statement('given/ends', 'held', { kind: 'assumption', basis: 'detail 5' }, true, {
    title: 'Ends',
  });
  const rx = m.lookup(
    'shape/rx',
    'rx',
    'length',
    {
      value: 5.34 * 25.4,
      published: '5.34 in',
      table: 'Shapes',
      row: 'W12X79',
      column: 'rx',
      tableSource: 'AISC',
    },
    { title: 'Radius of gyration' },
  );
  const s = m.formula(formulas.slenderness, 'E2/x', { Lc: L, r: rx }, { symbol: 'slendernessx' });
  m.choice(
    'E2/branch',
    [
      { left: s, relation: '>', right: 200, outcome: 'the member is very slender' },
      { left: s, relation: '<=', right: 100, outcome: 'the member is stocky' },
    ],
    'the member is slender',
    { title: 'How slender', clause: clause('E2'), because: 'It is only a sample.' },
  );
  const ratio = m.given('given/ratio', 'M1M2', 'none', typed(-0.5, '-0.5'), { title: 'Ratio' });
  m.formula(formulas.less, 'App8/Cm', { M1M2: ratio });
  m.choice(
    'App8/branch',
    [
      { left: s, relation: '<=', right: 20, outcome: 'never' },
      { left: ratio, relation: '>=', right: 0, outcome: 'never' },
      { left: ratio, relation: '<', right: -0.5, outcome: 'never' },
    ],
    'nothing of the kind',
    { title: 'All fail' },
  );
  const c = createRecorder(':');
  const Pr = c.given('given/P', 'Pr', 'force', typed(310 * KIP, '310 kip'), {
    title: 'Axial force',
  });
  const Pc = c.given('given/Pc', 'Pc', 'force', typed(600 * KIP, '600 kip'), { title: 'Strength' });
  const M = c.given('given/M', 'Mnt', 'moment', typed(-118 * KIP * 304.8, '-118 kip ft'), {
    title: 'Moment',
  });
  const B1 = c.given('given/B1', 'B1', 'none', typed(1.25, '1.25'), { title: 'Multiplier' });
  const Mr = c.formula(formulas.twice, 'App8/Mr', { B1, Mnt: M });
  const share = c.formula(formulas.share, 'H1/PrPc', { Pr, Pc });
  const least = c.governing('E1/least', 'min', [Pc, Pr], { title: 'Least', symbol: 'Pn' });
  c.check('H1/axial', Pr, Pc, { title: 'Compression alone', clause: clause('E1') });
  c.check('H1/check', share, 1, { title: 'Interaction', clause: clause('H1.1', 'H1-1a') });
  c.check('H1/over', Pc, Pr, { title: 'Over' });
  c.comparison('compare', Mr, M, 'The moment used, {used}, is {difference} the other, {other}.', {
    title: 'Beside',
  });
  c.root(formulas.cube, 'root', { symbol: 'c', dimension: 'none', bracket: [0, 2] }, { B1 });
  c.notice('out', 'outside scope', 'tension', 'Tension is not covered.', {
    title: 'Tension',
    clause: clause('D2'),
  });
  expect(least.value).toBe(Pr.value);
  const placed = placedLines({
    lines: [...m.lines],
    combinations: [{ id: 'c1', name: '1.2D + 1.6L', lines: [...c.lines], summary: SUMMARY }],
  });
  const closed = closeLines(placed, UNIT_SETS.us);
  return {
    id: 'm1',
    mark: 'C-07',
    section: 'W12X79',
    material: 'A992',
    lines: closed.slice(0, m.lines.length),
    combinations: [
      { id: 'c1', name: '1.2D + 1.6L', lines: closed.slice(m.lines.length), summary: SUMMARY },
    ],
    completeness: [],
    summary: SUMMARY,
    unconfirmed: 5,
  };
}

const SUMMARY = { verdict: 'OK' as const, ratio: 0.5, ratioText: '0.500', governing: null };

const member = sample();
const presenter = createPresenter(member, 12, 'us', (id, name) => symbolTex(id ?? book, name));
const present = (address: string): LineBlock => {
  const placed = presenter.placed.find((p) => p.address === address);
  if (!placed) throw new Error(`no ${address}`);
  const block = presentLine(presenter, placed);
  if (block.kind !== 'line') throw new Error(`${address} is a ${block.kind}`);
  return block;
};
const words = (block: LineBlock): string => block.sentence.map((i) => i.text).join('');

describe('a line as a block', () => {
  it('exists for every kind of line', () => {
    const kinds = new Set(presenter.placed.map((p) => p.line.kind));
    const all = {
      given: 0,
      statement: 0,
      lookup: 0,
      formula: 0,
      choice: 0,
      governing: 0,
      check: 0,
      comparison: 0,
      root: 0,
      notice: 0,
      section: 0,
    } satisfies Record<LineKind, 0>;
    expect([...kinds].sort()).toEqual(Object.keys(all).sort());
    for (const placed of presenter.placed) {
      const block = presentLine(presenter, placed);
      expect(block.address).toBe(placed.address);
      if (block.kind === 'line') expect(block.text.length).toBeGreaterThan(3);
    }
  });

  it('numbers all lines but sections in reading order', () => {
    expect(presenter.placed.map((p) => presenter.number(p.address)).filter(Boolean)).toEqual(
      Array.from({ length: presenter.placed.length - 1 }, (_, i) => `12.${i + 1}`),
    );
  });

  it('prints symbols, substitution and result of a formula, each operand led to its line', () => {
    const block = present('E2/x');
    expect(block.working).toEqual([
      '\\frac{{\\htmlData{ref=given/Lcx}{L_{cx}}}}{{\\htmlData{ref=shape/rx}{r_x}}}',
      '=\\frac{{\\htmlData{ref=given/Lcx}{264}}}{{\\htmlData{ref=shape/rx}{5.34}}}',
    ]);
    // 264/5.34 = 49.438… by hand.
    expect(block.text).toBe('Lcx/rx = 264/5.34 = 49.44');
    expect(block.result).toEqual({ value: '49.44', unit: '' });
  });

  it('prints both units of a moment and brackets a negative factor', () => {
    const block = present('c1:App8/Mr');
    // 1.25 × (−118) = −147.5 kip ft; × 12 = −1770 kip in.
    expect(block.text).toBe('Mr = B1 · Mnt = 1.25 · (−118) = −147.5 kip ft');
    expect(block.working[2]).toContain('({\\htmlData{ref=c1:given/M}{-118}})');
    expect(block.reference).toEqual({ clause: 'App. 8.1.2', equation: 'A-8-3' });
  });

  it('prints a given value as typed, with its working unit, source and state', () => {
    const block = present('given/Lcx');
    expect(block.result).toEqual({ value: '22', unit: 'ft' });
    expect(block.also).toEqual({ value: '264', unit: 'in' });
    expect(block.given).toEqual({
      letter: 'D',
      source: 'drawing S-201 revision C, grid 4/B',
      confirmed: false,
    });
  });

  it('says a choice as a sentence with the numbers that decided', () => {
    expect(words(present('E2/branch'))).toBe(
      'The member is stocky, because Lcx/rx = 49.44 does not exceed 200 and Lcx/rx = 49.44 does not exceed 100. It is only a sample.',
    );
  });

  it('says of conditions that fail how the sides really stand', () => {
    expect(words(present('App8/branch'))).toBe(
      'Nothing of the kind, because Lcx/rx = 49.44 exceeds 20, M1/M2 = −0.5 is less than 0 and M1/M2 = −0.5 equals −0.5.',
    );
  });

  it('brackets a negative value after a sign', () => {
    const block = present('App8/Cm');
    expect(block.working[2]).toBe('={0.6}-({\\htmlData{ref=given/ratio}{-0.5}})');
    expect(block.text).toBe('Cm = 0.6 − (M1/M2) = 0.6 − (−0.5) = 1.100');
  });

  it('says what governs, against what', () => {
    const block = present('c1:E1/least');
    expect(words(block)).toBe('Governs: axial force with Pr = 310 kip, smaller than Pc = 600 kip.');
    expect(block.text).toContain('min(600, 310)');
  });

  it('prints checks with the relation that is true', () => {
    const [ok, ratio, over] = ['c1:H1/axial', 'c1:H1/check', 'c1:H1/over'].map(present);
    // 310/600 = 0.5167, 600/310 = 1.9355 by hand.
    expect(ok?.text).toBe('Pr/Pc = 310/600 = 0.517 ≤ 1, OK');
    expect(ok?.verdict).toBe('OK');
    expect(ratio?.text).toBe('Pr/Pc = 0.517 ≤ 1, OK');
    expect(over?.text).toBe('Pc/Pr = 600/310 = 1.935 > 1, NOT OK');
    expect(over?.verdict).toBe('NOT OK');
  });

  it('puts the values and the difference of a comparison into its words', () => {
    expect(words(present('c1:compare'))).toBe(
      'The moment used, −147.5 kip ft, is 25.0 % above the other, −118 kip ft.',
    );
  });

  it('prints a root with its equation and no plausible number for what is out of scope', () => {
    // Cube root of 1.25 is 1.0772.
    expect(present('c1:root').result).toEqual({ value: '1.077', unit: '' });
    const notice = present('c1:out');
    expect(notice).toMatchObject({ tone: 'outside scope', verdict: 'NOT CHECKED', result: null });
  });

  it('is TeX that KaTeX sets', () => {
    for (const placed of presenter.placed) {
      const block = presentLine(presenter, placed);
      if (block.kind !== 'line') continue;
      for (const chunk of block.working)
        katex.renderToString(chunk, { throwOnError: true, strict: false, trust: true });
    }
  });

  it('throws on a reference that leads nowhere', () => {
    const lost = { ...(member.lines.find((l) => l.key === 'E2/x') as Line), key: 'lost' } as Line;
    const broken = { ...member, lines: [lost] };
    const other = createPresenter(broken, 1, 'us', (id, name) => symbolTex(id ?? book, name));
    expect(() => other.placed.map((p) => presentLine(other, p))).toThrow('refers to');
  });
});
