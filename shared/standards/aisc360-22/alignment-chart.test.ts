import { describe, expect, it } from 'vitest';
import type { Quantity } from '../../calc/quantity.ts';
import { createRecorder, type Recorder } from '../../calc/recorder.ts';
import type { DimensionName } from '../../units/dimension.ts';
import { alignmentK, bucklingLength } from './alignment-chart.ts';
import { barStiffness, girderStiffness, jointRatio } from './joint-ratio.ts';

const given = (r: Recorder, symbol: string, dimension: DimensionName, value: number): Quantity =>
  r.given(
    `given/${symbol}/${r.lines.length}`,
    symbol,
    dimension,
    { value, text: String(value), source: { kind: 'typed' }, confirmed: false },
    { title: symbol },
  );
const bar = (r: Recorder, E: number, I: number, L: number) => ({
  E: given(r, 'E', 'stress', E),
  I: given(r, 'I', 'inertia', I),
  L: given(r, 'L', 'length', L),
});
const solve = (
  kind: 'inhibited' | 'uninhibited',
  A: number | 'pinned',
  B: number | 'pinned',
): { K: number | undefined; r: Recorder } => {
  const r = createRecorder('');
  const end = (name: 'GA' | 'GB', G: number | 'pinned') =>
    G === 'pinned' ? G : given(r, name, 'none', G);
  const K = alignmentK(r, 'K/x', kind, end('GA', A), end('GB', B));
  return { K: K?.value, r };
};

describe('ends that the equation of the chart does not reach', () => {
  // Column of Euler's cases: rigid ends 0.5, swaying 1; pinned ends 1; one pinned and one rigid
  // 0.6991556596 (tan x = x at 4.4934094579), swaying 2.
  for (const [kind, A, B, K] of [
    ['inhibited', 0, 0, 0.5],
    ['uninhibited', 0, 0, 1],
    ['inhibited', 'pinned', 'pinned', 1],
    ['inhibited', 0, 'pinned', 0.6991556596],
    ['inhibited', 'pinned', 0, 0.6991556596],
    ['uninhibited', 0, 'pinned', 2],
  ] as const)
    it(`${kind}, ${A} and ${B}: ${K}`, () => expect(solve(kind, A, B).K).toBeCloseTo(K, 9));
  it('a column that sways on two pins has no factor', () => {
    const { K, r } = solve('uninhibited', 'pinned', 'pinned');
    expect(K).toBeUndefined();
    expect(r.lines).toMatchObject([{ kind: 'notice', severity: 'failed' }]);
  });
  it('a stiffness ratio below zero is a mistake of the program', () => {
    expect(() => solve('inhibited', -1, 1)).toThrow(/below zero/);
    expect(() => solve('inhibited', 1, -1)).toThrow(/below zero/);
  });
  // From both sides: ends a trifle off a limit lie a trifle off its factor.
  for (const [kind, A, B, K] of [
    ['inhibited', 1e-9, 1e-6, 0.5],
    ['inhibited', 1.1e-6, 0, 0.5],
    ['inhibited', 1e6, 1e6, 1],
    ['inhibited', 1e6, 'pinned', 1],
    ['uninhibited', 1e-9, 1e-6, 1],
    ['uninhibited', 0, 1.1e-6, 1],
    ['uninhibited', 0, 1e6, 2],
  ] as const)
    it(`${kind}, ${A} and ${B}: close to ${K}`, () =>
      expect(solve(kind, A, B).K).toBeCloseTo(K, 5));
});

describe('the assumptions of the charts', () => {
  it('are a note without sway and a caution with it', () => {
    for (const [kind, severity] of [
      ['inhibited', 'note'],
      ['uninhibited', 'caution'],
    ] as const)
      expect(solve(kind, 1, 2).r.lines.find((l) => l.kind === 'notice')).toMatchObject({
        severity,
      });
  });
});

/*
 * By hand, E = 200 000 throughout: columns 1e8/4000 and 1e8/5000 give 5e9 + 4e9 = 9e9; girders
 * 2e8/8000 = 5e9 and 3e8/6000 = 1e10 give 1.5e10; a third of 3e9 gives 1.8e10.
 */
describe('the stiffness ratio at a joint', () => {
  const columns = (r: Recorder) => [
    barStiffness(r, 'above', bar(r, 2e5, 1e8, 4000)),
    barStiffness(r, 'below', bar(r, 2e5, 1e8, 5000)),
  ];
  const girders = (r: Recorder) => [
    barStiffness(r, 'left', bar(r, 2e5, 2e8, 8000)),
    barStiffness(r, 'right', bar(r, 2e5, 3e8, 6000)),
  ];
  it('is 9/15 = 0.6', () => {
    const r = createRecorder('');
    const G = jointRatio(r, 'K/x', 'B', null, columns(r), girders(r));
    expect(G).toMatchObject({ ref: 'K/x/GB', symbol: 'GB' });
    expect(G.value).toBeCloseTo(0.6, 14);
  });
  it('is 0.8·9/18 = 0.4 with a third girder and reduced columns', () => {
    const r = createRecorder('');
    const third = barStiffness(r, 'third', bar(r, 2e5, 1.5e8, 1e4));
    const taub = given(r, 'taub', 'none', 0.8);
    expect(jointRatio(r, 'K/x', 'A', taub, columns(r), [...girders(r), third]).value).toBeCloseTo(
      0.4,
      14,
    );
  });
  it('takes one column and one girder without a sum: 5/5 = 1', () => {
    const r = createRecorder('');
    const [column] = columns(r) as [Quantity, Quantity];
    const [girder] = girders(r) as [Quantity, Quantity];
    expect(jointRatio(r, 'K/x', 'A', null, [column], [girder]).value).toBe(1);
  });
  // Near-end stiffness over that of the chart's girder, 2EI/L or 6EI/L: 4/2, 3/2, 4/6, 3/6.
  for (const [kind, far, factor] of [
    ['inhibited', 'fixed', 2],
    ['inhibited', 'pinned', 1.5],
    ['uninhibited', 'fixed', 2 / 3],
    ['uninhibited', 'pinned', 0.5],
  ] as const)
    it(`a girder with its far end ${far}, sidesway ${kind}, counts ${factor}`, () => {
      const r = createRecorder('');
      const EIL = girderStiffness(r, 'far', bar(r, 2e5, 1e8, 1e4), kind, far);
      expect(EIL.value / 2e9).toBeCloseTo(factor, 14);
    });
});

it('a buckling length is K times the length', () => {
  const r = createRecorder('');
  const L = bucklingLength(r, 'K/x', given(r, 'K', 'none', 1.4), given(r, 'L', 'length', 4000));
  expect(L).toMatchObject({ ref: 'K/x/Lc', value: 5600, dimension: 'length' });
});
