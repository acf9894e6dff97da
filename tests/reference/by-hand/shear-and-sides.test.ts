import { describe, expect, it } from 'vitest';
import { linesOf } from '../run-input.ts';
import { expectValue, outcomeAt, runOne } from './one-member.ts';

/*
 * By hand. W18×50, 24 ft, held in and out of its plane at 10 ft = 120 in with −50 kip ft over it; a load
 * that varies from 0.6 kip/ft at 4 ft to 1.8 kip/ft at 18 ft. At 120 in it is 0.6 + 1.2·72/168 =
 * 1.114285714 kip/ft = 0.09285714286 kip/in.
 *   Bay 1, 120 in: 72·(0.05 + 0.09285714)/2 = 5.142857143 kip at 48 + 72·(0.05 + 2·0.09285714)/(3·0.14285714) =
 *   87.6 in; VA = −600/120 + 5.142857143·32.4/120 = −3.611428571, VB = −8.754285714 kip
 *   Bay 2, 168 in: 96·(0.09285714 + 0.15)/2 = 11.65714286 kip at 96·0.39285714/(3·0.24285714) = 51.76470588 in;
 *   VA = 600/168 + 11.65714286·116.2352941/168 = 11.63673469, VB = −0.02040816 kip
 * The longest bay, 168 in, is the buckling length in all directions.
 */
describe('a varying load over two bays', () => {
  const m = runOne({
    member: {
      ...{ section: 'W18X50', length: '24 ft', Cb: 'auto', endMomentSign: 'bending' },
      restraints: [{ at: '10 ft', holds: ['in-plane', 'centre', 'twist'] }],
    },
    forces: {
      P: '30 kip',
      supports: [{ at: '10 ft', Mx: '-50 kip ft' }],
      loads: [
        {
          ...{ kind: 'linear', bends: 'x', from: '4 ft', to: '18 ft' },
          ...{ wFrom: '0.6 kip/ft', wTo: '1.8 kip/ft', height: 'centre' },
        },
      ],
    },
  });
  it('the bays cut the load where they meet', () => {
    const kipPerFoot = 4448.2216152605 / 304.8;
    const wcut = 1.1142857142857143 * kipPerFoot;
    expectValue(m, 'c1:bay1/given/x/load1/wb', '', wcut);
    expectValue(m, 'c1:bay2/given/x/load1/wa', '', wcut);
  });
  it('the largest shear of all bays is the required one', () => {
    expectValue(m, 'c1:bay1/theory/x/first/VA', 'kip', -3.611428571428571);
    expectValue(m, 'c1:bay1/G/x/Vmax', 'kip', 8.754285714285714);
    expectValue(m, 'c1:bay2/G/x/Vmax', 'kip', 11.636734693877552);
    expectValue(m, 'c1:G/x/Vr', 'kip', 11.636734693877552);
  });
  it('the longest bay buckles', () => {
    for (const axis of ['x', 'y', 'z']) expectValue(m, `E2/Lc${axis}`, 'in', 168);
  });
  it('deflections stand in the middle of each bay', () => {
    expectValue(m, 'c1:bay1/L/x/z', 'in', 60);
    expectValue(m, 'c1:bay2/L/x/z', 'in', 84);
  });
});

const W18 = { section: 'W18X50', length: '24 ft', Cb: 'auto', endMomentSign: 'bending' };

/*
 * A shear force from the analysis counts by its size: 40 kip. W18×50, G2.1(a): 45.2 ≤ 2.24·24.083 = 53.95,
 * φVn = 1.00·0.6·50·18.0·0.355 = 191.7 kip: 40/191.7 = 0.2086593636. That of the end moments, 10 kip ft over
 * 24 ft, is 0.4167 kip. There is no axial force.
 */
it('a shear force from the analysis', () => {
  const m = runOne({
    member: { ...W18, restraints: [] },
    forces: { P: '0 kip', MxA: '10 kip ft', MxB: '0 kip ft', Vx: '-40 kip' },
  });
  expectValue(m, 'c1:G/x/Vmax', 'kip', 10 / 24);
  expectValue(m, 'c1:G/x/given', 'kip', 40);
  expectValue(m, 'c1:G/x/Vr', 'kip', 40);
  expectValue(m, 'c1:G/x/check', '', 40 / 191.7);
  expect(outcomeAt(m, 'c1:given/sense')).toContain('there is no axial force');
  expect([...linesOf(m).keys()].filter((key) => key.startsWith('D2'))).toEqual([]);
  expect(outcomeAt(m, 'c1:theory/x/curvature')).toBe('one end without moment');
});

/*
 * F1: a brace holds the flange in compression. Midway between 100 and −100 kip ft the moment is zero,
 * neither flange is compressed, and no segment ends. Cb = 12.5/5.5 (Commentary to F1: 2.27).
 */
describe('a restraint at one flange where the moment changes its sign', () => {
  for (const flange of ['top', 'bottom'])
    it(`${flange}: ends no segment`, () => {
      const m = runOne({
        member: { ...W18, restraints: [{ at: '12 ft', holds: [flange] }] },
        forces: { P: '0 kip', MxA: '100 kip ft', MxB: '-100 kip ft' },
      });
      expect(outcomeAt(m, 'c1:F1/r1/holds')).toContain('no segment ends');
      expectValue(m, 'c1:F1/Cb', '', 12.5 / 5.5);
    });
});

// F4: a load on a simply supported member compresses one flange; at its ends the moment is zero.
describe('the compressed flange of a singly symmetric I-shape under load alone', () => {
  for (const [w, flange] of [
    ['2 kip/ft', 'top'],
    ['-2 kip/ft', 'bottom'],
  ] as const)
    it(`${w}: the ${flange} flange only`, () => {
      const m = runOne({
        member: {
          section: {
            ...{ shape: 'mono-i', d: '18 in', tw: '0.5 in' },
            ...{ bfTop: '12 in', tfTop: '0.75 in', bfBottom: '8 in', tfBottom: '0.75 in' },
          },
          ...{ material: 'A572 Gr. 50', length: '24 ft', restraints: [], Cb: 'auto' },
          endMomentSign: 'bending',
        },
        forces: { P: '0 kip', loads: [{ kind: 'uniform', bends: 'x', w, height: 'centre' }] },
      });
      expect(outcomeAt(m, 'c1:F4/side/1')).toBe(`moments compress the ${flange} flange only`);
    });
});

// One moment all along has no shear: nothing of G is checked.
it('a uniform moment has no shear', () => {
  const m = runOne({
    member: { ...W18, restraints: [] },
    forces: { P: '0 kip', MxA: '100 kip ft', MxB: '100 kip ft' },
  });
  expectValue(m, 'c1:G/x/Vmax', 'kip', 0);
  expect(linesOf(m).has('c1:G/x/check')).toBe(false);
});

/*
 * A-8-6: a story with 5000 of its 4000 kip is unstable, and nothing after it is computed. Which of Chapters
 * D and E would have been asked is told by the sign of the axial force.
 */
describe('an unstable story', () => {
  const [none, open] = ['not applicable', 'not reached'];
  for (const [P, compression, tension] of [
    ['100 kip', open, none],
    ['-100 kip', none, open],
    ['0 kip', none, none],
  ] as const)
    it(`with ${P}`, () => {
      const m = runOne({
        analysis: { sway: 'B2' },
        member: { ...W18, restraints: [] },
        forces: {
          ...{ P, MxA: '40 kip ft', MxB: '-50 kip ft' },
          sway: {
            x: { MA: '10 kip ft', MB: '10 kip ft', Pstory: '5000 kip', PeStory: '4000 kip' },
          },
        },
      });
      const state = (id: string) => m.completeness.find((row) => row.id === id)?.cells[0]?.state;
      expect(m.summary.verdict).toBe('FAILED');
      expect([state('compression/check'), state('tension/check')]).toEqual([compression, tension]);
      // There are moments about the major axis, and none about the minor one.
      for (const id of ['second-order', 'shear']) {
        expect(state(`${id}/x`)).toBe(open);
        expect(state(`${id}/y`)).toBe(none);
      }
      expect(state('flexure-major/check')).toBe(open);
      expect(state('flexure-minor/check')).toBe(none);
      expect(state('interaction')).toBe(P === '0 kip' ? none : open);
    });
});
