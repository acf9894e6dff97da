import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

/*
 * End moments: their sense, their sizes, their ratio.
 * Joint sense: both moments turn the member's ends the same way around, so equal signs mean reverse
 * curvature; the bending sense is MA, −MB. Common practice, no source.
 */
export const endMomentFormulas = {
  bendingSense: formula({
    id: 'sense',
    clause: '0',
    title: 'Moment at end B in the bending sense',
    symbol: 'MB',
    dimension: 'moment',
    expression: '-MBjoint',
    operands: { MBjoint: 'moment' },
    prints: 'display',
  }),
  size: formula({
    id: 'size',
    clause: '0',
    title: 'Size of the moment',
    symbol: 'Mabs',
    dimension: 'moment',
    expression: 'abs(M)',
    operands: { M: 'moment' },
    prints: 'display',
  }),
  ratio: formula({
    id: 'psi',
    clause: '1',
    title: 'Ratio of end moments, positive in single curvature',
    symbol: 'psi',
    dimension: 'none',
    expression: 'M1/M2',
    operands: { M1: 'moment', M2: 'moment' },
    prints: 'display',
  }),
};

export interface EndMoments {
  /** Bending sense. */
  readonly MA: Quantity;
  readonly MB: Quantity;
  readonly absA: Quantity;
  readonly absB: Quantity;
  /** Which end carries the larger one; A when equal. */
  readonly largerEnd: 'A' | 'B';
  /** Size of the larger one. */
  readonly M2: Quantity;
  /** Smaller over larger in the bending sense; null when both are zero. */
  readonly psi: Quantity | null;
}

/** Brings the end moments of one plane to the bending sense and orders them. */
export function endMoments(
  r: Recorder,
  at: string,
  axis: 'x' | 'y',
  given: { readonly MA: Quantity; readonly MB: Quantity; readonly sense: 'bending' | 'joint' },
): EndMoments {
  const { MA } = given;
  const MB =
    given.sense === 'joint'
      ? r.formula(
          endMomentFormulas.bendingSense,
          `${at}/MB`,
          { MBjoint: given.MB },
          { symbol: `M${axis}Bb` },
        )
      : given.MB;
  const absA = r.formula(
    endMomentFormulas.size,
    `${at}/absA`,
    { M: MA },
    { title: 'Size of the moment at end A', symbol: `absM${axis}A` },
  );
  const absB = r.formula(
    endMomentFormulas.size,
    `${at}/absB`,
    { M: MB },
    { title: 'Size of the moment at end B', symbol: `absM${axis}B` },
  );
  const atA =
    r.choice(
      `${at}/larger`,
      [{ left: absA, relation: '>=', right: absB, outcome: 'end A carries the larger moment' }],
      'end B carries the larger moment',
      { title: 'The larger end moment', clause: clause('1') },
    ) === 0;
  const M2 = atA ? absA : absB;
  if (M2.value === 0) return { MA, MB, absA, absB, largerEnd: 'A', M2, psi: null };
  const psi = r.formula(
    endMomentFormulas.ratio,
    `${at}/psi`,
    atA ? { M1: MB, M2: MA } : { M1: MA, M2: MB },
  );
  r.choice(
    `${at}/curvature`,
    [
      { left: psi, relation: '>', right: 0, outcome: 'single curvature' },
      { left: psi, relation: '<', right: 0, outcome: 'reverse curvature' },
    ],
    'one end without moment',
    { title: 'Curvature', clause: clause('1') },
  );
  return { MA, MB, absA, absB, largerEnd: atA ? 'A' : 'B', M2, psi };
}
