import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { DimensionName } from '../../units/dimension.ts';
import type { Bay, BayAxial, BayResult } from './bay.ts';
import { placeIn } from './loaded-bay.ts';
import type { AxialOrder, SolvedStretch } from './solve-stretches.ts';
import { numbered } from './stretches.ts';
import { byShape, type LoadShape } from './transfer.ts';
import { formula } from './writer.ts';

/*
 * Deflection y from the chord, EI y″ = −M: first from the tangent at end A, from stretch to stretch,
 * then turned so that end B lies on the chord. M is integrated term by term, with
 * Φₙ(x) = 1/n! − x/(n + 2)! + x²/(n + 4)! − …, so that nothing cancels for small axial force, as
 * (M − M₀)/P does. By hand.
 */
type Axial = 'compression' | 'tension';
const byAxial = <T>(make: (order: Axial) => T): Readonly<Record<Axial, T>> => ({
  compression: make('compression'),
  tension: make('tension'),
});

const LOADS: Readonly<Record<LoadShape, Readonly<Record<string, DimensionName>>>> = {
  none: {},
  uniform: { wi: 'lineLoad' },
  linear: { wi: 'lineLoad', wj: 'lineLoad', li: 'length' },
};
const STATE = {
  Mi: 'moment',
  Vi: 'force',
  xi: 'length',
  kxi: 'angle',
  EIstar: 'rigidity',
} as const;

/** −∫∫ M/EI and −∫ M/EI over the stretch up to ξ. */
const bending = byAxial((order) => {
  const x = order === 'compression' ? 'kxi^2' : '-kxi^2';
  const sine = order === 'compression' ? 'sin(kxi)/kxi' : 'sinh(kxi)/kxi';
  return byShape((shape) => ({
    slope: formula({
      id: `bending-slope-${order}-${shape}`,
      clause: '2.2',
      title: 'Change of slope',
      symbol: 'dth',
      dimension: 'angle',
      expression: `-(Mi*xi*${sine}+Vi*xi^2*Phi2(${x})${
        shape === 'none' ? '' : `-wi*xi^3*Phi3(${x})`
      }${shape === 'linear' ? `-(wj-wi)*xi^4*Phi4(${x})/li` : ''})/EIstar`,
      operands: { ...STATE, ...LOADS[shape] },
    }),
    deflection: formula({
      id: `bending-y-${order}-${shape}`,
      clause: '2.2',
      title: 'Deflection from the tangent at its start',
      symbol: 'dy',
      dimension: 'deflection',
      expression: `-(Mi*xi^2*Phi2(${x})+Vi*xi^3*Phi3(${x})${
        shape === 'none' ? '' : `-wi*xi^4*Phi4(${x})`
      }${shape === 'linear' ? `-(wj-wi)*xi^5*Phi5(${x})/li` : ''})/EIstar`,
      operands: { ...STATE, ...LOADS[shape] },
    }),
  }));
});

const joined = {
  slope: formula({
    id: 'slope',
    clause: '2.2',
    title: 'Slope from the tangent at end A',
    symbol: 'thi',
    dimension: 'angle',
    expression: 'thi+dth',
    operands: { thi: 'angle', dth: 'angle' },
  }),
  deflection: formula({
    id: 'y',
    clause: '2.2',
    title: 'Deflection from the tangent at end A',
    symbol: 'yi',
    dimension: 'deflection',
    expression: 'yi+thi*xi+dy',
    operands: { yi: 'deflection', thi: 'angle', xi: 'length', dy: 'deflection' },
  }),
  slopeA: formula({
    id: 'slope-A',
    clause: '2.2',
    title: 'Slope at end A from the chord',
    symbol: 'thA',
    dimension: 'angle',
    expression: '-yi/L1',
    operands: { yi: 'deflection', L1: 'length' },
  }),
  chord: formula({
    id: 'y-chord',
    clause: '2.2',
    title: 'Deflection from the chord, with the stiffness of the second-order moments',
    symbol: 'yz',
    dimension: 'deflection',
    expression: 'yi+thA*zi',
    operands: { yi: 'deflection', thA: 'angle', zi: 'length' },
  }),
};

export const deflectionFormulas = [
  ...Object.values(bending).flatMap((shapes) =>
    Object.values(shapes).flatMap((f) => [f.slope, f.deflection]),
  ),
  ...Object.values(joined),
];

/** Slope and deflection from the tangent at end A; null at end A itself. */
type State = { readonly thi: Quantity; readonly yi: Quantity } | null;

/** Answers the deflection at a place, 0 < z ≤ L1; the lines along the whole bay are written once. */
export function deflectionOf(
  at: string,
  bay: Bay,
  { EIstar }: BayAxial,
  solution: AxialOrder,
  solved: readonly SolvedStretch[],
): NonNullable<BayResult['deflection']> {
  const { L1 } = bay;
  let along: { thA: Quantity; states: State[] } | null = null;

  const deflect = (
    r: Recorder,
    key: string,
    s: SolvedStretch,
    state: State,
    operands: Record<string, Quantity>,
    symbol: string,
  ): Quantity => {
    const formulaOf = bending[solution.order][s.stretch.load.shape].deflection;
    const known: Record<string, Quantity> = { ...operands, EIstar };
    if (!state) return r.formula(formulaOf, key, known, { symbol });
    const dy = r.formula(formulaOf, `${key}/bending`, known);
    return r.formula(
      joined.deflection,
      key,
      { ...state, xi: known.xi as Quantity, dy },
      { symbol },
    );
  };
  const walk = (r: Recorder): NonNullable<typeof along> => {
    const states: State[] = [null];
    for (const s of solved) {
      const { index, load } = s.stretch;
      const key = `${at}/y${index}`;
      const state = states.at(-1) as State;
      const yi = deflect(r, key, s, state, s.atEnd, numbered('y', index));
      if (index === solved.length)
        return { thA: r.formula(joined.slopeA, `${at}/thA`, { yi, L1 }), states };
      const symbol = numbered('th', index);
      const known = { ...s.atEnd, EIstar };
      const slope = bending[solution.order][load.shape].slope;
      const thi = state
        ? r.formula(
            joined.slope,
            `${key}/slope`,
            { thi: state.thi, dth: r.formula(slope, `${key}/slope/bending`, known) },
            { symbol },
          )
        : r.formula(slope, `${key}/slope`, known, { symbol });
      states.push({ thi, yi });
    }
    throw new Error('a bay has a stretch');
  };

  return (r, key, z) => {
    along ??= walk(r);
    const i = solved.findIndex(({ stretch }) => z.value <= stretch.to.value);
    const s = solved[i];
    if (!s || z.value <= 0) throw new Error(`${z.value} is no place of a bay of ${L1.value}`);
    const operands = placeIn(r, key, bay, solution, s, z);
    const yi = deflect(r, `${key}/tangent`, s, along.states[i] ?? null, operands, 'yi');
    return r.formula(joined.chord, key, { yi, thA: along.thA, zi: z });
  };
}
