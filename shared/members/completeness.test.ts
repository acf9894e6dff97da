import { describe, expect, it } from 'vitest';
import type { MemberRecord } from '../calc/record.ts';
import { parseInput } from './parse-input.ts';
import { runCalculation } from './run.ts';

/* What the completeness table says is held against the clauses of ANSI/AISC 360-22, by hand. */
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

function run(
  member: Record<string, unknown>,
  forces: Record<string, unknown>,
  analysis: Record<string, unknown> = {},
): MemberRecord {
  const parsed = parseInput({
    format: 1,
    standard: 'aisc360-22',
    design: 'LRFD',
    units: 'us',
    analysis: { method: 'direct', secondOrder: 'amplified', sway: 'none', ...analysis },
    members: [{ ...HELD, ...member, combinations: [{ name: 'any', P: '0 kip', ...forces }] }],
  });
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  const [found] = runCalculation(parsed.input).members;
  if (!found) throw new Error('no member');
  return found;
}

const told = (m: MemberRecord, id: string) => m.completeness.find((r) => r.id === id)?.cells[0];
const state = (m: MemberRecord, id: string) => told(m, id)?.state;
const all = { P: '10 kip', MxA: '10 kip ft', MyA: '5 kip ft' };

/** No cell of a member with all three forces may say that one of them is missing. */
function expectNoForceDenied(m: MemberRecord): void {
  for (const { id, cells } of m.completeness)
    for (const { because } of cells)
      expect(because, id).not.toMatch(/no moment about|only one of|no compression/);
}

// b/t = 3.95/0.625 = 6.32 (AISC Shapes Database v15.0); Chapter F has channels with compact elements only.
describe('a channel that is not compact: MC18×42.7, b/t = 6.32 > 0.38·√(29 000/150) = 5.28', () => {
  const strong = {
    section: 'MC18X42.7',
    material: { name: 'strong', Fy: '150 ksi', source: { kind: 'typed' } },
  };
  const m = run(strong, all);
  it('says outside scope of every major-axis state and of the interaction', () => {
    expectNoForceDenied(m);
    for (const id of ['yielding', 'ltb', 'flb', 'check'])
      expect(told(m, `flexure-major/${id}`)).toMatchObject({
        state: 'outside scope',
        address: 'c1:H1/x/lacking',
      });
    expect(state(m, 'interaction')).toBe('outside scope');
  });
  it('still checks the minor axis alone, and says NOT OK where that is exceeded', () => {
    expect(m.summary.verdict).toBe('NOT CHECKED');
    expect(told(m, 'flexure-minor/check')?.ratio).toBeGreaterThan(0);
    // 1.6·150·Sy = 1.6·150·4.64 = 1114 kip in = 92.8 kip ft is more than Mny can be.
    const worse = run(strong, { ...all, MyA: '500 kip ft' });
    expect(worse.summary).toMatchObject({
      verdict: 'NOT OK',
      governing: { address: 'c1:H1/y' },
    });
  });
});

describe('no second-order moment: W12×79, 60 ft, Pe1y = 0.8·π²·29 000·216/720² = 95.4 kip', () => {
  const lengths = { length: '60 ft', Lcx: '60 ft', Lcy: '60 ft', Lcz: '60 ft', Lb: '60 ft' };
  for (const Cb of ['1', 'auto']) {
    const m = run({ ...lengths, Cb }, { ...all, P: '96 kip' });
    it(`Cb ${Cb}: FAILED, with no reason that the forces deny`, () => {
      expect(m.summary.verdict).toBe('FAILED');
      expectNoForceDenied(m);
      expect(state(m, 'second-order/y')).toBe('governs');
      expect(state(m, 'flexure-minor/check')).toBe('not reached');
      expect(state(m, 'interaction')).toBe('not reached');
      expect(told(m, 'compression/check')).toMatchObject({
        state: 'does not govern',
        because: 'the combination is FAILED',
      });
    });
  }
  it('x fails, Cb from the diagram: its strength is not reached, not "less elsewhere"', () => {
    const m = run({ Cb: 'auto' }, { P: '5000 kip', MxA: '10 kip ft' });
    expect(m.summary.verdict).toBe('FAILED');
    for (const id of ['yielding', 'ltb', 'check'])
      expect(state(m, `flexure-major/${id}`)).toBe('not reached');
    expect(told(m, 'flexure-major/flb')).toMatchObject({ because: 'the flange is compact' });
  });
});

it('held within a plane that bends: outside scope, and the other axis stands by itself', () => {
  const m = run({ Lcy: '7 ft' }, all);
  expectNoForceDenied(m);
  expect(state(m, 'flexure-minor/check')).toBe('outside scope');
  expect(state(m, 'interaction')).toBe('outside scope');
  expect(told(m, 'flexure-major/check')?.ratio).toBeGreaterThan(0);
});

describe('lateral-torsional buckling', () => {
  it('limited by the plastic moment: yielding governs (F2-2 ≤ Mp)', () => {
    // Lb is just above Lp = 10.8 ft; Cb = 2.27 lifts F2-2 over Mp.
    const m = run({ Cb: '2.27' }, { MxA: '10 kip ft' });
    expect(state(m, 'flexure-major/yielding')).toBe('governs');
    expect(told(m, 'flexure-major/ltb')).toMatchObject({
      state: 'does not govern',
      because: 'limited by the plastic moment',
    });
  });
  it('with Cb = 1 it governs', () => {
    const m = run({}, { MxA: '10 kip ft' });
    expect(state(m, 'flexure-major/yielding')).toBe('does not govern');
    expect(state(m, 'flexure-major/ltb')).toBe('governs');
  });
  it('Lb = 0: held continuously, which is not the same as Lb ≤ Lp', () => {
    expect(told(run({ Lb: '0 ft' }, { MxA: '10 kip ft' }), 'flexure-major/ltb')?.because).toMatch(
      /continuously/,
    );
    expect(told(run({ Lb: '5 ft' }, { MxA: '10 kip ft' }), 'flexure-major/ltb')?.because).toMatch(
      /Lp/,
    );
  });
});

describe('slender elements in compression: W16×26, h/tw = 56.8 > 1.49·√(29 000/50) = 35.9', () => {
  const at = (length: string) =>
    run({ section: 'W16X26', length, Lcx: length, Lcy: length, Lcz: length }, { P: '1 kip' });
  it('partly effective in a short member', () =>
    expect(state(at('5 ft'), 'compression/slender')).toBe('governs'));
  it('fully effective at a low stress: 35.9·√(50/Fn) > 56.8 from Fn < 20.0 ksi', () => {
    // 30 ft: Fe = π²·29 000/(360/1.12)² = 2.77 ksi.
    expect(told(at('30 ft'), 'compression/slender')).toMatchObject({
      state: 'does not govern',
      because: 'slender elements are fully effective at this stress',
    });
  });
});

it('without forces says that there are none', () =>
  expect(told(run({}, {}), 'interaction')?.because).toBe('there are no forces'));
