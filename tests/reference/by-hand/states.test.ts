import { describe, expect, it } from 'vitest';
import type { MemberRecord } from '#shared/calc/record.ts';
import { linesOf } from '../run-input.ts';
import { expectValue, runOne } from './one-member.ts';

/*
 * What can't be computed is a verdict and a line with its clause, never a number. The limits are by
 * hand; the clauses are those of ANSI/AISC 360-22.
 */
const member = {
  section: 'W8X31',
  length: '30 ft',
  Lcx: '30 ft',
  Lcy: '30 ft',
  Lcz: '30 ft',
  Lb: '30 ft',
  endMomentSign: 'bending',
};
const bent = { MxA: '1 kip ft', MxB: '1 kip ft' };

function expectState(
  m: MemberRecord,
  verdict: 'FAILED' | 'NOT CHECKED',
  clause: string,
  code: string,
): void {
  expect(m.summary).toMatchObject({ verdict, ratio: null, ratioText: null });
  expect(m.combinations[0]?.summary).toMatchObject({ verdict, ratio: null, ratioText: null });
  expect(m.summary.governing?.clause.clause).toBe(clause);
  const line = linesOf(m).get(m.summary.governing?.address ?? '');
  expect(line).toMatchObject({ kind: 'notice', code });
  expect(line?.kind === 'notice' && line.text.length).toBeGreaterThan(40);
}

describe('tension', () => {
  // D2: without the net section rupture cannot be told; yielding alone never makes it OK.
  it('without its net section is NOT CHECKED by D2', () => {
    const m = runOne({ member, forces: { P: '-10 kip', ...bent } });
    expectState(m, 'NOT CHECKED', 'D2', 'tension');
    expect(linesOf(m).has('D2/rupture/Pc')).toBe(false);
  });
  it('does not hide a worse combination, nor is hidden by a better one', () => {
    const m = runOne({ member, forces: { P: '-10 kip' } });
    expect(m.summary.verdict).toBe('NOT CHECKED');
  });
});

/*
 * W8×31, 30 ft, effective length method: Pe1x = π²·29 000·110/360² = 242.932392280 kip.
 * In ASD the limit is Pe1/1.6 = 151.832745175 kip.
 */
describe('the critical load in a plane that bends', () => {
  const analysis = { method: 'effective-length' };
  const at = (design: 'LRFD' | 'ASD', P: string, secondOrder = 'amplified') =>
    runOne({ design, analysis: { ...analysis, secondOrder }, member, forces: { P, ...bent } });
  for (const secondOrder of ['amplified', 'exact']) {
    it(`LRFD, ${secondOrder}: FAILED from 242.9324 kip`, () => {
      expectState(
        at('LRFD', '242.93240 kip', secondOrder),
        'FAILED',
        'App. 8.1.2',
        'at-critical-load',
      );
      expectState(at('LRFD', '500 kip', secondOrder), 'FAILED', 'App. 8.1.2', 'at-critical-load');
      expect(at('LRFD', '242.93238 kip', secondOrder).summary.verdict).toBe('NOT OK');
    });
    it(`ASD, ${secondOrder}: FAILED from 242.9324/1.6 = 151.8327 kip`, () => {
      expectState(
        at('ASD', '151.83275 kip', secondOrder),
        'FAILED',
        'App. 8.1.2',
        'at-critical-load',
      );
      expect(at('ASD', '151.83274 kip', secondOrder).summary.verdict).toBe('NOT OK');
    });
  }
  it('direct analysis: FAILED from 0.8·242.9324 = 194.3459 kip', () => {
    const direct = (P: string) => runOne({ member, forces: { P, ...bent } });
    expectState(direct('194.34592 kip'), 'FAILED', 'App. 8.1.2', 'at-critical-load');
    expect(direct('194.34590 kip').summary.verdict).toBe('NOT OK');
  });
  it('the minor axis has its own: 29 000·37.1·π²/360² = 81.93447 kip', () => {
    const minor = (P: string) =>
      runOne({ analysis, member, forces: { P, MyA: '1 kip ft', MyB: '1 kip ft' } });
    expectState(minor('81.93448 kip'), 'FAILED', 'App. 8.1.2', 'at-critical-load');
    expect(minor('81.93446 kip').summary.verdict).toBe('NOT OK');
  });
  it('a plane without moment does not fail: only compression speaks', () => {
    const m = runOne({ analysis, member, forces: { P: '500 kip' } });
    expect(m.summary.verdict).toBe('NOT OK');
    // 500/64.93941 = 7.69949
    expect(m.summary.ratio).toBeCloseTo(7.69949, 4);
  });
  it('above nine tenths a caution: 0.9·242.9324 = 218.639 kip', () => {
    const codes = (P: string) =>
      [...linesOf(at('LRFD', P)).values()].flatMap((l) => (l.kind === 'notice' ? [l.code] : []));
    expect(codes('218.65 kip')).toContain('near-critical-load');
    expect(codes('218.63 kip')).not.toContain('near-critical-load');
  });
  it('moments of a complete second-order analysis may stand beyond it, with a caution', () => {
    const m = runOne({
      analysis: { ...analysis, secondOrder: 'from-analysis', includesMemberEffect: true },
      member,
      forces: { P: '250 kip', ...bent },
    });
    expect(m.summary.verdict).toBe('NOT OK');
    expect(
      [...linesOf(m).values()].some(
        (l) => l.kind === 'notice' && l.code === 'beyond-pin-ended-critical-load',
      ),
    ).toBe(true);
  });
});

describe('ends that are not held', () => {
  for (const [ends, clause] of [
    ['free', 'App. 7.2'],
    ['sway', 'App. 8.1.3'],
    ['springs', 'App. 7.2'],
  ] as const)
    it(`${ends}: NOT CHECKED by ${clause}`, () =>
      expectState(
        runOne({ member: { ...member, ends }, forces: { P: '10 kip', ...bent } }),
        'NOT CHECKED',
        clause,
        `ends-${ends}`,
      ));
});

describe('a plane held between the ends', () => {
  it('that bends: NOT CHECKED by App. 8.1.2', () => {
    expectState(
      runOne({ member: { ...member, Lcx: '15 ft' }, forces: { P: '10 kip', ...bent } }),
      'NOT CHECKED',
      'App. 8.1.2',
      'held-within-bending-plane',
    );
    expectState(
      runOne({ member: { ...member, Lcy: '15 ft' }, forces: { P: '10 kip', MyA: '1 kip ft' } }),
      'NOT CHECKED',
      'App. 8.1.2',
      'held-within-bending-plane',
    );
  });
  it('that does not bend: checked', () => {
    const m = runOne({ member: { ...member, Lcy: '15 ft' }, forces: { P: '10 kip', ...bent } });
    expect(m.summary.verdict).toBe('OK');
    // Lcy/ry = 180/2.02
    expectValue(m, 'E2/y/slenderness', '', 89.10891, 1e-6);
  });
});

describe('other shapes and webs', () => {
  for (const section of ['WT8X50', 'L4X4X1/2', '2L4X4X1/2', 'MT6X5.9'])
    it(`${section}: NOT CHECKED`, () =>
      expectState(
        runOne({ member: { ...member, section }, forces: { P: '10 kip', ...bent } }),
        'NOT CHECKED',
        'B4',
        'other-shape',
      ));
  /*
   * W30×90, h/tw = 57.5. Fy = 150 ksi: 3.76·√(29 000/150) = 52.28 < 57.5 < 5.70·√(29 000/150) = 79.25:
   * noncompact, F4. Fy = 300 ksi: 57.5 > 5.70·√(29 000/300) = 56.04: slender, F5, but beyond F13-4,
   * 0.40·29 000/300 = 38.7.
   */
  for (const [Fy, clause] of [
    ['150 ksi', 'F4'],
    ['300 ksi', 'F5'],
  ] as const) {
    const strong = {
      ...member,
      section: 'W30X90',
      material: { name: 'strong', Fy, source: { kind: 'typed' } },
    };
    it(`a web that is not compact at ${Fy}, major axis: ${clause}`, () => {
      const m = runOne({ member: strong, forces: { P: '0 kip', MxA: '1 kip ft' } });
      expect(linesOf(m).has('F2/Mn')).toBe(false);
      expect(m.summary.verdict).toBe(clause === 'F4' ? 'OK' : 'NOT CHECKED');
      if (clause === 'F4') expect(linesOf(m).has('F4/Mn')).toBe(true);
    });
    it(`the same at ${Fy}, minor axis only: checked`, () =>
      expect(
        runOne({ member: strong, forces: { P: '0 kip', MyA: '1 kip ft' } }).summary.verdict,
      ).toBe('OK'));
  }
});

describe('a load between the ends', () => {
  it('with amplified moments: NOT CHECKED by App. 8.1.2', () =>
    expectState(
      runOne({ member, forces: { P: '10 kip', ...bent, MxMax: '5 kip ft' } }),
      'NOT CHECKED',
      'App. 8.1.2',
      'transverse-load',
    ));
});

describe('no forces at all', () => {
  it('is NOT CHECKED, and says so', () => {
    const m = runOne({ member, forces: { P: '0 kip', MxA: '0 kip ft', MxB: '0 kip ft' } });
    expect(m.summary).toMatchObject({ verdict: 'NOT CHECKED', ratio: null, ratioText: null });
    expect(
      [...linesOf(m).values()].some((l) => l.kind === 'notice' && l.code === 'no-forces'),
    ).toBe(true);
  });
});

describe('the squash load', () => {
  // Pns = 50·9.13 = 456.5 kip: no stiffness is left for a second-order moment in the direct analysis.
  it('is FAILED by C2.3', () => {
    const m = runOne({
      member: { ...member, length: '1 ft', Lcx: '1 ft', Lcy: '1 ft', Lcz: '1 ft', Lb: '1 ft' },
      forces: { P: '456.5 kip', ...bent },
    });
    expectState(m, 'FAILED', 'C2.3', 'cross-section-strength-reached');
  });
});
