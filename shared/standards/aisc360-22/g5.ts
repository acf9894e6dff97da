import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// G5 round HSS and pipe.
export const g5Formulas = {
  byLength: formula({
    id: 'G5-2a',
    clause: 'G5',
    equation: 'G5-2a',
    title: 'Critical stress in shear, with the length in shear',
    symbol: 'Fcra',
    dimension: 'stress',
    expression: '1.60*E/(sqrt(Lv/D)*lambda^(5/4))',
    operands: { E: 'stress', Lv: 'length', D: 'length', lambda: 'none' },
  }),
  byWall: formula({
    id: 'G5-2b',
    clause: 'G5',
    equation: 'G5-2b',
    title: 'Critical stress in shear, of the wall alone',
    symbol: 'Fcrb',
    dimension: 'stress',
    expression: '0.78*E/lambda^(3/2)',
    operands: { E: 'stress', lambda: 'none' },
  }),
  yield: formula({
    id: 'G5-0.6Fy',
    clause: 'G5',
    title: 'Yield stress in shear',
    symbol: 'Fyv',
    dimension: 'stress',
    expression: '0.6*Fy',
    operands: { Fy: 'stress' },
  }),
  strength: formula({
    id: 'G5-1',
    clause: 'G5',
    equation: 'G5-1',
    title: 'Nominal shear strength',
    symbol: 'Vn',
    dimension: 'force',
    expression: 'Fcr*Ag/2',
    operands: { Fcr: 'stress', Ag: 'area' },
  }),
};

export interface RoundShear {
  readonly E: Quantity;
  readonly Fy: Quantity;
  readonly Ag: Quantity;
  readonly D: Quantity;
  /** D/t. */
  readonly lambda: Quantity;
  /** Distance between the largest and zero shear force; null where it isn't known. */
  readonly Lv: Quantity | null;
}

/** G5-1. Without Lv the critical stress is G5-2b alone, which is never more than the larger of both. */
export function roundShearStrength(r: Recorder, at: string, q: RoundShear): Quantity {
  const { E, Fy, Ag, D, lambda, Lv } = q;
  const byWall = r.formula(g5Formulas.byWall, `${at}/Fcrb`, { E, lambda });
  if (!Lv)
    r.notice(
      `${at}/length`,
      'note',
      'length-in-shear-not-given',
      'The distance between the largest and zero shear force is not given: G5-2a, which could only raise the critical stress, is left out.',
      { title: 'Length in shear', clause: clause('G5', 'G5-2a') },
    );
  const larger = Lv
    ? r.governing(
        `${at}/larger`,
        'max',
        [r.formula(g5Formulas.byLength, `${at}/Fcra`, { E, Lv, D, lambda }), byWall],
        { title: 'Larger critical stress', symbol: 'Fcrtrial', clause: clause('G5') },
      )
    : byWall;
  const yielding = r.formula(g5Formulas.yield, `${at}/yield`, { Fy });
  const Fcr = r.governing(`${at}/Fcr`, 'min', [larger, yielding], {
    title: 'Critical stress in shear, not more than yielding',
    symbol: 'Fcr',
    clause: clause('G5'),
  });
  return r.formula(g5Formulas.strength, `${at}/Vn`, { Fcr, Ag });
}
