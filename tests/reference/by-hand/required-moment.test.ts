import { describe, expect, it } from 'vitest';
import { inUnit } from '../in-unit.ts';
import { linesOf } from '../run-input.ts';
import { demandOf, expectValue, runOne } from './one-member.ts';

/*
 * By hand, on the member of end-moments.test.ts (W8×31, 30 ft, P = 170 kip, MA = 100, MB = −50 kip ft,
 * effective length method): the exact moment is 125.311656 kip ft, B1 times the larger end moment
 * 133.237035 kip ft. The moment that the checks take, by where the second-order moments are from:
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
const forces = { P: '170 kip', MxA: '100 kip ft', MxB: '-50 kip ft' };
const run = (analysis: Record<string, unknown>, more: Record<string, unknown> = {}) =>
  runOne({
    analysis: { method: 'effective-length', ...analysis },
    member,
    forces: { ...forces, ...more },
  });
const required = (analysis: Record<string, unknown>, more: Record<string, unknown> = {}) => {
  const m = run(analysis, more);
  return { m, Mr: inUnit(demandOf(m, 'c1:H1/x'), 'kip ft') };
};
const codes = (m: ReturnType<typeof runOne>) =>
  [...linesOf(m).values()].flatMap((l) => (l.kind === 'notice' ? [l.code] : []));

describe('where the required moment comes from', () => {
  it('amplified: B1 times the larger end moment', () =>
    expect(required({ secondOrder: 'amplified' }).Mr).toBeCloseTo(133.23703484, 6));
  it('exact: the largest moment of the elastic solution', () =>
    expect(required({ secondOrder: 'exact' }).Mr).toBeCloseTo(125.311656365, 6));
  it('from an analysis with P-δ: the largest given, an end moment; the exact one cautions', () => {
    const { m, Mr } = required({ secondOrder: 'from-analysis', includesMemberEffect: true });
    expect(Mr).toBeCloseTo(100, 9);
    // The exact moment is 25 % above the largest given one.
    expect(codes(m)).toContain('analysis-moment-lower');
    expectValue(m, 'c1:theory/x/Mmax', 'kip ft', 125.311656365);
  });
  it('from an analysis with P-δ: the largest given, in the span', () => {
    const { m, Mr } = required(
      { secondOrder: 'from-analysis', includesMemberEffect: true },
      { MxMax: '-125 kip ft' },
    );
    expect(Mr).toBeCloseTo(125, 9);
    expect(codes(m)).not.toContain('analysis-moment-lower');
  });
  it('from an analysis without P-δ: the exact moment between the end moments', () => {
    expect(required({ secondOrder: 'from-analysis', includesMemberEffect: false }).Mr).toBeCloseTo(
      125.311656365,
      6,
    );
  });
  // The span carries load: without P-δ in the analysis its moment is not amplified by anything.
  it('from an analysis without P-δ, largest moment in the span: not checked', () => {
    const m = run(
      { secondOrder: 'from-analysis', includesMemberEffect: false },
      { MxMax: '130 kip ft' },
    );
    expect(codes(m)).toContain('transverse-load');
    // Compression alone is checked, and is over its limit here; the moment is in no check.
    expect([...linesOf(m).keys()]).not.toContain('c1:H1/x');
    expect([...linesOf(m).keys()]).not.toContain('c1:H1/ratio');
  });
});

/*
 * The standard's moment below the exact one. Equal end moments (ψ = 1) at αPr/Pe1 = 0.5:
 * B1 = 1/(1 − 0.5) = 2, exact sec(π/2·√0.5) = 2.25217190 (theory sheet, table of sec): 11.2 % lower.
 * Effective length method, P = 0.5·242.93239228 = 121.46619614 kip.
 */
describe('the standard below the exact moment', () => {
  const m = runOne({
    analysis: { method: 'effective-length' },
    member,
    forces: { P: '121.46619614 kip', MxA: '10 kip ft', MxB: '10 kip ft' },
  });
  it('uses the standard, and cautions with the exact interaction beside it', () => {
    expectValue(m, 'c1:App8/x/Mr', 'kip ft', 20, 1e-9);
    expectValue(m, 'c1:theory/x/Mmax', 'kip ft', 22.521719028, 1e-9);
    expect(inUnit(demandOf(m, 'c1:H1/x'), 'kip ft')).toBeCloseTo(20, 6);
    expect(codes(m)).toContain('code-moment-lower');
    // φPn = 64.939413, φMn = 57.440956 kip ft: 121.466196/64.939413 + 8/9·M/57.440956.
    expectValue(m, 'c1:H1/ratio', '', 1.8704542 + (8 / 9) * (20 / 57.440956), 1e-6);
    expectValue(m, 'c1:theory/H1/ratio', '', 1.8704542 + (8 / 9) * (22.521719 / 57.440956), 1e-6);
  });
});
