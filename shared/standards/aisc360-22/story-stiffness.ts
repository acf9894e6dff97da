import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// Commentary to Appendix 7.2: effective length factor from the stiffness of the story.
const PLACE = { clause: 'Commentary App. 7.2', equation: 'C-A-7-5' } as const;
const DRIFT = { PeL: 'force', DeltaH: 'deflection', Lstory: 'length' } as const;

export const storyStiffnessFormulas = {
  columnLoad: formula({
    id: 'C-A-7-5-Pe',
    clause: PLACE.clause,
    title: 'Elastic critical load of the column, pinned ends',
    symbol: 'PeL',
    dimension: 'force',
    expression: 'pi^2*E*I/L^2',
    operands: { E: 'stress', I: 'inertia', L: 'length' },
  }),
  K2: formula({
    ...PLACE,
    id: 'C-A-7-5',
    title: 'Effective length factor before its lower limit',
    symbol: 'K2trial',
    dimension: 'none',
    expression: 'sqrt(Pstory/(RM*Pr)*PeL*(DeltaH/(Hstory*Lstory)))',
    operands: { Pstory: 'force', RM: 'none', Pr: 'force', Hstory: 'force', ...DRIFT },
  }),
  K2least: formula({
    ...PLACE,
    id: 'C-A-7-5-least',
    title: 'Least effective length factor',
    symbol: 'K2least',
    dimension: 'none',
    expression: 'sqrt(PeL*(DeltaH/(1.7*Hcol*Lstory)))',
    operands: { Hcol: 'force', ...DRIFT },
  }),
};

export interface SwayColumn {
  readonly E: Quantity;
  readonly I: Quantity;
  /** Height of the story and length of the column. */
  readonly L: Quantity;
  /** Compression in the column, at the same load level as `Pstory`, above zero. */
  readonly Pr: Quantity;
  readonly Pstory: Quantity;
  readonly RM: Quantity;
  /** Story shear, the column's share of it, and the first-order drift it makes: one analysis, sizes. */
  readonly H: Quantity;
  readonly Hcol: Quantity;
  readonly DeltaH: Quantity;
}

/** C-A-7-5: K2 of a column that holds a story against sidesway, leaning columns included, under `at`. */
export function storyStiffnessK(r: Recorder, at: string, c: SwayColumn): Quantity {
  const PeL = r.formula(storyStiffnessFormulas.columnLoad, `${at}/Pe`, { E: c.E, I: c.I, L: c.L });
  const drift = { PeL, DeltaH: c.DeltaH, Lstory: c.L };
  const trial = r.formula(storyStiffnessFormulas.K2, `${at}/K2/trial`, {
    ...{ Pstory: c.Pstory, RM: c.RM, Pr: c.Pr, Hstory: c.H },
    ...drift,
  });
  const least = r.formula(storyStiffnessFormulas.K2least, `${at}/K2/least`, {
    Hcol: c.Hcol,
    ...drift,
  });
  return r.governing(`${at}/K2`, 'max', [trial, least], {
    title: 'Effective length factor from the stiffness of the story',
    clause: clause(PLACE.clause, PLACE.equation),
    symbol: 'K2',
  });
}
