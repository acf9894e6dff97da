import { describe, expect, it } from 'vitest';
import type { Line } from '../calc/line.ts';
import type { CalculationRecord } from '../calc/record.ts';
import { parseInput } from './parse-input.ts';
import { runCalculation } from './run.ts';

/* Limits of methods and clauses of ANSI/AISC 360-22, by hand. */
const HELD = {
  mark: 'C',
  section: 'W12X79',
  material: 'A992',
  length: '14 ft',
  ends: 'held',
  Lcx: '14 ft',
  Lcy: '14 ft',
  Lcz: '14 ft',
  Lb: '14 ft',
  endMomentSign: 'bending',
};

interface Given {
  readonly member?: Record<string, unknown>;
  readonly forces?: Record<string, unknown>;
  readonly analysis?: Record<string, unknown>;
  readonly design?: 'LRFD' | 'ASD';
}

const parse = ({ member, forces, analysis, design = 'LRFD' }: Given) =>
  parseInput({
    format: 1,
    standard: 'aisc360-22',
    design,
    units: 'us',
    analysis: { method: 'direct', secondOrder: 'amplified', sway: 'none', ...analysis },
    members: [{ ...HELD, ...member, combinations: [{ name: 'any', P: '0 kip', ...forces }] }],
  });

function run(given: Given): CalculationRecord {
  const parsed = parse(given);
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  return runCalculation(parsed.input);
}

const linesOf = (record: CalculationRecord): Line[] =>
  record.members.flatMap((m) => [...m.lines, ...m.combinations.flatMap((c) => c.lines)]);
const codes = (record: CalculationRecord) =>
  linesOf(record).flatMap((l) => (l.kind === 'notice' ? [l.code] : []));
const lineAt = (record: CalculationRecord, key: string) =>
  linesOf(record).find((l) => l.key === key);

describe('the first-order analysis method: αPr ≤ 0.5 Pns (App. 7.3)', () => {
  // W12×79: 0.5·Pns = 0.5·50·23.2 = 580 kip; ASD 580/1.6 = 362.5 kip.
  const analysis = { method: 'first-order' };
  for (const [design, within, above] of [
    ['LRFD', '580 kip', '580.1 kip'],
    ['ASD', '362.5 kip', '362.6 kip'],
  ] as const)
    it(`${design}: a caution above ${within}, not at it`, () => {
      const at = (P: string) => codes(run({ design, analysis, forces: { P } }));
      expect(at(within)).not.toContain('first-order-axial-limit');
      expect(at(above)).toContain('first-order-axial-limit');
    });
  it('is not asked in the other methods', () =>
    expect(codes(run({ forces: { P: '700 kip' } }))).not.toContain('first-order-axial-limit'));
});

describe('Cb from the diagram beyond the critical load of pinned ends', () => {
  /*
   * W10×49, 40 ft, ASD, direct: Pe1x = 0.8·π²·29 000·272/480² = 270.3 kip, over α 168.9 kip.
   * Held about the minor axis, its allowable load is 0.877·π²·29 000·14.4·4.35²/480²/1.67 = 177.8 kip.
   */
  const member = {
    section: 'W10X49',
    length: '40 ft',
    Lcx: '40 ft',
    Lcy: '10 ft',
    Lcz: '10 ft',
    Lb: '40 ft',
    Cb: 'auto',
  };
  const at = (P: string) =>
    run({
      design: 'ASD',
      analysis: { secondOrder: 'from-analysis', includesMemberEffect: true },
      member,
      forces: { P, MxA: '1 kip ft', MxB: '-1 kip ft' },
    });
  it('is 1: the diagram between the end moments is not known', () => {
    const record = at('172 kip');
    expect(codes(record)).toContain('beyond-pin-ended-critical-load');
    expect(lineAt(record, 'F1/Cb')).toMatchObject({ value: 1 });
    expect(codes(record)).toContain('diagram-beyond-critical-load');
  });
  it('below it comes from the second-order diagram', () => {
    expect(lineAt(at('100 kip'), 'F1/Cb')).not.toMatchObject({ value: 1 });
    expect(codes(at('100 kip'))).not.toContain('diagram-beyond-critical-load');
  });
});

describe('load between the ends, without P-δ in the analysis', () => {
  const at = (forces: Record<string, unknown>) =>
    codes(
      run({
        analysis: { secondOrder: 'from-analysis', includesMemberEffect: false },
        forces: { P: '300 kip', ...forces },
      }),
    );
  it('is outside scope whether or not end moments are given', () => {
    expect(at({ MxMax: '200 kip ft' })).toContain('transverse-load');
    expect(at({ MxA: '1 kip ft', MxMax: '200 kip ft' })).toContain('transverse-load');
  });
  it('is not where the largest moment is an end moment, or there is no axial force', () => {
    expect(at({ MxA: '-200 kip ft', MxMax: '200 kip ft' })).not.toContain('transverse-load');
    expect(at({ P: '0 kip', MxMax: '200 kip ft' })).not.toContain('transverse-load');
  });
});

describe('the equation of the compressive strength', () => {
  const cited = (Lcz: string) =>
    lineAt(run({ member: { Lcz }, forces: { P: '10 kip' } }), 'E3/Pn')?.clause;
  it('is E4-1 where torsional buckling governs', () =>
    expect(cited('60 ft')).toMatchObject({ clause: 'E4', equation: 'E4-1' }));
  it('is E3-1 where it does not apply or does not govern', () => {
    expect(cited('14 ft')).toMatchObject({ clause: 'E3', equation: 'E3-1' });
    // 14.1 ft = 169.2 in: (π²·29 000·7330/169.2² + 11 200·3.84)/(662 + 216) = 132.4 ksi, and
    // Fey = π²·29 000/(168/3.05)² = 94.3 ksi is lower.
    expect(cited('14.1 ft')).toMatchObject({ clause: 'E3', equation: 'E3-1' });
  });
});

describe('a combination named after the other design method', () => {
  const problems = (design: 'LRFD' | 'ASD', name: string, more = {}) => {
    const parsed = parse({ design, forces: { name, ...more } });
    return parsed.ok ? [] : parsed.problems.map((p) => p.message);
  };
  // Combinations of ASCE/SEI 7-22: 2.4.1 (ASD) and 2.3.1 (LRFD).
  const ASD = [
    'D + L',
    'D + 0.75L + 0.75S',
    'D + 0.6W',
    '0.6D + 0.6W',
    'D + 0.75(0.6W)',
    '0.6D - 0.7Ev',
  ];
  const LRFD = [
    '1.4D',
    '1.2D + 1.6L + 0.5Lr',
    '1.2D + 1.0W + L + 0.5S',
    '0.9D + 1.0W',
    '0.9D - Ev + Eh',
  ];
  for (const name of ASD)
    it(`${name}: refused in LRFD, where its forces would be too low; taken in ASD`, () => {
      expect(problems('LRFD', name).join()).toMatch(
        /is an ASD combination in a calculation by LRFD/,
      );
      expect(problems('ASD', name)).toEqual([]);
    });
  for (const name of LRFD)
    it(`${name}: taken in LRFD`, () => expect(problems('LRFD', name)).toEqual([]));
  it('what states its level is taken by that', () =>
    expect(problems('LRFD', 'D + L', { design: 'LRFD' })).toEqual([]));
});

it('a yield stress above 100 ksi, such as 345 ksi for 345 MPa, is cautioned', () => {
  const at = (Fy: string) =>
    codes(
      run({
        member: { material: { name: 'own', Fy, source: { kind: 'typed' } } },
        forces: { P: '10 kip' },
      }),
    );
  expect(at('345 ksi')).toContain('yield-stress-above-listed');
  for (const Fy of ['100 ksi', '690 MPa', '345 MPa'])
    expect(at(Fy)).not.toContain('yield-stress-above-listed');
});

it('P-δ in the analysis is of no account where the moments are not from one', () => {
  const of = (includesMemberEffect: boolean) =>
    run({ analysis: { includesMemberEffect }, forces: { P: '10 kip' } }).analysis;
  expect(of(true)).toEqual(of(false));
});
