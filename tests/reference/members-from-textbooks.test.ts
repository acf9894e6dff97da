import { describe, expect, it } from 'vitest';
import { expectValue, runOne } from './by-hand/one-member.ts';
import { inUnit } from './in-unit.ts';
import { roundsTo } from './printed-digits.ts';
import { valueAt } from './run-input.ts';

/*
 * Examples of two textbooks, from memory, with page numbers not at hand; both amplify with the full
 * stiffness. `hand` is the chain from the inputs with Python's floats (Manual Table 1-1 properties);
 * `printed` is what the book prints where its chain is the same. Both books take strengths from
 * the Manual's tables to three digits, which moves the interaction in the third.
 */
interface Row {
  readonly line: string;
  readonly unit: string;
  readonly hand: number;
  readonly printed?: string;
}
const compare = (m: ReturnType<typeof runOne>, rows: readonly Row[]) => {
  for (const { line, unit, hand, printed } of rows) {
    expectValue(m, line, unit, hand);
    if (!printed) continue;
    const value = inUnit(valueAt(m, line), unit);
    expect(roundsTo(value, printed), `${line}: ${value}, printed ${printed}`).toBe(true);
  }
};
const analysis = { method: 'effective-length' };
const braced = { restraints: [], Cb: 'auto', endMomentSign: 'bending' };

/*
 * W. T. Segui, Steel Design, 5th ed., Examples 6.1 and 6.2. W8×58, A992, 17 ft, pinned; Pu = 200.4
 * kips, 25.2 kips at midspan. Fe = π²·29 000/(204/2.10)², φPn = 385.967; M = 25.2·17/4 = 107.1 kip ft;
 * Cb = 12.5/9.5 = 1.32, Mn = Mp; Pe1 = π²·29 000·228/204² = 1568, B1 = 1.15, 123 kip ft.
 * The book: not adequate once the moment is amplified.
 */
describe('Segui, W8×58 with a load at midspan', () => {
  const m = runOne({
    analysis,
    member: { section: 'W8X58', length: '17 ft', ...braced },
    forces: {
      P: '200.4 kip',
      loads: [{ kind: 'point', bends: 'x', W: '25.2 kip', at: '8.5 ft', height: 'centre' }],
    },
  });
  it('agrees', () =>
    compare(m, [
      { line: 'E1/Pc', unit: 'kip', hand: 385.9673089820376 },
      { line: 'c1:theory/x/first/Mmax', unit: 'kip ft', hand: 107.1, printed: '107.1' },
      { line: 'c1:App8/x/Pe1', unit: 'kip', hand: 1568.0945862169076, printed: '1568' },
      { line: 'c1:App8/x/B1/trial', unit: '', hand: 1.1465239403734964, printed: '1.15' },
      { line: 'c1:App8/x/Mr', unit: 'kip ft', hand: 122.79271401400145, printed: '123' },
      { line: 'c1:F1/Cb', unit: '', hand: 12.5 / 9.5, printed: '1.32' },
      { line: 'c1:F1/x/Mc', unit: 'kip ft', hand: (0.9 * 2990) / 12, printed: '224' },
      { line: 'c1:H1/ratio', unit: '', hand: 1.0059444075090036 },
    ]));
  it('is not adequate', () => expect(m.summary.verdict).toBe('NOT OK'));
});

/*
 * The same, Example 6.4. W12×65, 15 ft, 300 kips, 70 and 82 kip ft in single curvature.
 * Cm = 0.6 + 0.4·70/82 = 0.9415, Pe1 = π²·29 000·533/180² = 4708, B1 = 1.006, 82.45 kip ft;
 * Cb = 12.5·82/(205 + 219 + 304 + 237) = 1.06; the noncompact flange limits φMn to 356 kip ft.
 */
describe('Segui, W12×65 with end moments', () => {
  const m = runOne({
    analysis,
    member: { section: 'W12X65', length: '15 ft', ...braced },
    forces: { P: '300 kip', MxA: '70 kip ft', MxB: '82 kip ft' },
  });
  it('agrees', () =>
    compare(m, [
      { line: 'E1/Pc', unit: 'kip', hand: 662.8863082057819 },
      { line: 'c1:H1/PrPc', unit: '', hand: 300 / 662.8863082057819, printed: '0.453' },
      { line: 'c1:App8/x/Cm', unit: '', hand: 0.6 + (0.4 * 70) / 82, printed: '0.9415' },
      { line: 'c1:App8/x/Pe1', unit: 'kip', hand: 4708.471457643154, printed: '4708' },
      { line: 'c1:App8/x/B1/trial', unit: '', hand: 1.0055307511483857, printed: '1.006' },
      { line: 'c1:F1/Cb', unit: '', hand: 1025 / 965, printed: '1.06' },
      { line: 'c1:F1/x/Mc', unit: 'kip ft', hand: 356.1936906699835, printed: '356' },
      { line: 'c1:H1/ratio', unit: '', hand: 0.6583308013348006 },
    ]));
});

/*
 * J. C. McCormac and S. F. Csernak, Structural Steel Design, 5th ed., Example 11-3. W12×96, 50 ksi,
 * 12 ft, equal end moments in single curvature: 690 kips and 168 kip ft (LRFD), 475 kips and
 * 120 kip ft (ASD). Cm = 1, Pe1 = π²·29 000·833/144² = 11 498. The book's 0.931 and 0.975 take
 * 1080 and 720 kips and its tables' 544.6 and 362.7 kip ft.
 */
describe('McCormac and Csernak, W12×96 with equal end moments', () => {
  const run = (design: 'LRFD' | 'ASD', P: string, M: string) =>
    runOne({
      ...{ design, analysis },
      member: { section: 'W12X96', length: '12 ft', ...braced },
      forces: { P, MxA: M, MxB: M },
    });
  it('LRFD', () =>
    compare(run('LRFD', '690 kip', '168 kip ft'), [
      { line: 'E1/Pc', unit: 'kip', hand: 1082.6778005903693, printed: '1080' },
      { line: 'c1:App8/x/Pe1', unit: 'kip', hand: 11497.879702792998, printed: '11498' },
      { line: 'c1:App8/x/B1/trial', unit: '', hand: 1.06384230940521, printed: '1.064' },
      { line: 'c1:App8/x/Mr', unit: 'kip ft', hand: 178.7255079800753, printed: '178.7' },
      { line: 'c1:F1/x/Mc', unit: 'kip ft', hand: 544.9531197502275 },
      { line: 'c1:H1/ratio', unit: '', hand: 0.9288330930196269 },
    ]));
  it('ASD', () =>
    compare(run('ASD', '475 kip', '120 kip ft'), [
      { line: 'E1/Pc', unit: 'kip', hand: 720.3445113708378, printed: '720' },
      { line: 'c1:App8/x/B1/trial', unit: '', hand: 1.0707774738622113, printed: '1.071' },
      { line: 'c1:App8/x/Mr', unit: 'kip ft', hand: 128.49329686346536, printed: '128.5' },
      { line: 'c1:F1/x/Mc', unit: 'kip ft', hand: 362.57692598152204 },
      { line: 'c1:H1/ratio', unit: '', hand: 0.9744192039700916 },
    ]));
});
