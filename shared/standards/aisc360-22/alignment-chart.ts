import type { Formula } from '../../calc/formula.ts';
import type { Clause } from '../../calc/line.ts';
import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { Sidesway } from './joint-ratio.ts';
import { clause, formula } from './writer.ts';

// Commentary to Appendix 7.2: effective length factors of the alignment charts, as their equations.
const COMMENTARY = 'Commentary App. 7.2';
const K = { clause: COMMENTARY, symbol: 'K', dimension: 'none' } as const;
const X = { clause: COMMENTARY, symbol: 'x', dimension: 'none' } as const;
const ROOT = 'π/K of the alignment chart, sidesway';

export const alignmentChartFormulas = {
  // The equations with x for π/K, so that the unknown is no divisor.
  inhibited: formula({
    ...{ ...X, id: 'C-A-7-1', equation: 'C-A-7-1', title: `${ROOT} inhibited` },
    expression: 'GA*GB/4*x^2+(GA+GB)/2*(1-x/tan(x))+2*tan(x/2)/x-1',
    operands: { GA: 'none', GB: 'none', x: 'none' },
  }),
  inhibitedOnePinned: formula({
    ...{ ...X, id: 'C-A-7-1-pinned', equation: 'C-A-7-1' },
    title: `${ROOT} inhibited, one end pinned`,
    expression: 'GA/2*x^2+1-x/tan(x)',
    operands: { GA: 'none', x: 'none' },
  }),
  uninhibited: formula({
    ...{ ...X, id: 'C-A-7-2', equation: 'C-A-7-2', title: `${ROOT} uninhibited` },
    expression: '(GA*GB*x^2-36)/(6*(GA+GB))-x/tan(x)',
    operands: { GA: 'none', GB: 'none', x: 'none' },
  }),
  uninhibitedOnePinned: formula({
    ...{ ...X, id: 'C-A-7-2-pinned', equation: 'C-A-7-2' },
    title: `${ROOT} uninhibited, one end pinned`,
    expression: 'GA/6*x^2-x/tan(x)',
    operands: { GA: 'none', x: 'none' },
  }),
  K: formula({
    ...{ ...K, id: 'C-A-7-K', title: 'Effective length factor' },
    ...{ expression: 'pi/x', operands: { x: 'none' } },
  }),
  inhibitedBothPinned: formula({
    ...{ ...K, id: 'C-A-7-1-both-pinned', equation: 'C-A-7-1' },
    title: 'Effective length factor, sidesway inhibited, both ends pinned',
    ...{ expression: '1', operands: {} },
  }),
  inhibitedRigid: formula({
    ...{ ...K, id: 'C-A-7-1-rigid', equation: 'C-A-7-1' },
    title: 'Effective length factor, sidesway inhibited, both ends rigid',
    ...{ expression: '0.5', operands: {} },
  }),
  uninhibitedRigid: formula({
    ...{ ...K, id: 'C-A-7-2-rigid', equation: 'C-A-7-2' },
    title: 'Effective length factor, sidesway uninhibited, both ends rigid',
    ...{ expression: '1', operands: {} },
  }),
  length: formula({
    ...{ id: 'App.7-KL', clause: 'App. 7.2', title: 'Buckling length', symbol: 'Lc' },
    ...{ dimension: 'length', expression: 'K*L', operands: { K: 'none', L: 'length' } },
    prints: 'display',
  }),
};

// π/K from K = 0.5 to 1, and from 1 to 3000. The equations have poles at π and 2π, where no bracket
// may end.
const OFF_POLE = 1e-12;
const BRACKETS = {
  inhibited: [Math.PI * (1 + OFF_POLE), 2 * Math.PI * (1 - OFF_POLE)],
  uninhibited: [1e-3, Math.PI * (1 - OFF_POLE)],
} as const;

// Ends up to this ratio are rigid: the factor is then within a millionth of theirs, and its root too
// close to the pole.
const RIGID = 1e-6;

/**
 * K of a column by C-A-7-1 or C-A-7-2 under `at` (`K/x`). An end is its stiffness ratio G ≥ 0 or
 * 'pinned' (G without bound). null, with a failed notice, for a column that sways on two pins.
 */
export function alignmentK(
  r: Recorder,
  at: string,
  kind: Sidesway,
  endA: Quantity | 'pinned',
  endB: Quantity | 'pinned',
): Quantity | null {
  const key = `${at}/K`;
  const place = clause(COMMENTARY, kind === 'inhibited' ? 'C-A-7-1' : 'C-A-7-2');
  const [GA, GB] = endA === 'pinned' ? [endB, endA] : [endA, endB];
  const formulas = alignmentChartFormulas;
  if (GA === 'pinned') {
    if (kind === 'inhibited') return r.formula(formulas.inhibitedBothPinned, key, {});
    r.notice(
      `${key}/failed`,
      'failed',
      'column-sways-on-pins',
      'A column pinned at both ends has no stiffness against sidesway: no effective length factor exists. Something else has to hold it.',
      { title: 'Effective length factor, sidesway uninhibited', clause: place },
    );
    return null;
  }
  if (GA.value < 0 || (GB !== 'pinned' && GB.value < 0)) throw new Error(`${at}: G below zero`);
  sayAssumptions(r, at, kind, place);
  const solved = (equation: Formula, operands: Record<string, Quantity>): Quantity => {
    const unknown = { symbol: 'x', dimension: 'none', bracket: BRACKETS[kind] } as const;
    return r.formula(formulas.K, key, { x: r.root(equation, `${key}/x`, unknown, operands) });
  };
  const inhibited = kind === 'inhibited';
  if (GB === 'pinned')
    return solved(inhibited ? formulas.inhibitedOnePinned : formulas.uninhibitedOnePinned, { GA });
  const soft = 'the equation of the chart has a root';
  const taken = r.choice(
    `${key}/ends`,
    [GA, GB].map((left) => ({ left, relation: '>', right: RIGID, outcome: soft }) as const),
    'both ends are rigid',
    { title: 'Ends of the column', clause: place },
  );
  return taken < 0
    ? r.formula(inhibited ? formulas.inhibitedRigid : formulas.uninhibitedRigid, key, {})
    : solved(inhibited ? formulas.inhibited : formulas.uninhibited, { GA, GB });
}

function sayAssumptions(r: Recorder, at: string, kind: Sidesway, place: Clause): void {
  const title = 'Assumptions of the alignment chart';
  const common =
    'The chart is for elastic columns of one section, rigid joints, girders without much axial force, and columns of the story that buckle together.';
  if (kind === 'inhibited') {
    r.notice(`${at}/chart`, 'note', 'alignment-chart', common, { title, clause: place });
    return;
  }
  r.notice(
    `${at}/chart`,
    'caution',
    'alignment-chart-sidesway',
    `${common} Columns that lean on this frame are not in it: where the story has any, the factor is too small and has to follow from the stiffness of the story.`,
    { title, clause: place },
  );
}

/** Lc = K L under `at`; L between the column's joints. */
export const bucklingLength = (r: Recorder, at: string, K: Quantity, L: Quantity): Quantity =>
  r.formula(alignmentChartFormulas.length, `${at}/Lc`, { K, L });
