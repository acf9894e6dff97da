import type { LineOf } from '../../calc/line.ts';
import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause, formula } from './writer.ts';

// H2 unsymmetric and other members: stresses with their signs at points of the section. w is the
// major principal axis, z the minor. Terms that are zero are left out; the equation number stays.
const stress = (
  id: string,
  title: string,
  symbol: string,
  expression: string,
  operands: Readonly<Record<string, 'force' | 'area' | 'moment' | 'modulus'>>,
) => formula({ id, clause: 'H2', title, symbol, dimension: 'stress', expression, operands });

const AXIAL = { fra: 'stress', Fca: 'stress' } as const;
const MAJOR = { frbw: 'stress', Fcbw: 'stress' } as const;
const MINOR = { frbz: 'stress', Fcbz: 'stress' } as const;

const sum = (id: string, expression: string, operands: Readonly<Record<string, 'stress'>>) =>
  formula({
    ...{ id, clause: 'H2', equation: 'H2-1', title: 'Interaction of stresses', symbol: 'ratio' },
    ...{ dimension: 'none', expression: `abs(${expression})`, operands },
  });

export const h2Formulas = {
  fra: stress('H2-fra', 'Required axial stress', 'fra', 'Pr/Ag', { Pr: 'force', Ag: 'area' }),
  Fca: stress('H2-Fca', 'Available axial stress', 'Fca', 'Pc/Ag', { Pc: 'force', Ag: 'area' }),
  frbw: stress('H2-frbw', 'Required flexural stress, major axis', 'frbw', 'Mrx/Sx', {
    ...{ Mrx: 'moment', Sx: 'modulus' },
  }),
  Fcbw: stress('H2-Fcbw', 'Available flexural stress, major axis', 'Fcbw', 'Mcx/abs(Sx)', {
    ...{ Mcx: 'moment', Sx: 'modulus' },
  }),
  frbz: stress('H2-frbz', 'Required flexural stress, minor axis', 'frbz', 'Mry/Sy', {
    ...{ Mry: 'moment', Sy: 'modulus' },
  }),
  Fcbz: stress('H2-Fcbz', 'Available flexural stress, minor axis', 'Fcbz', 'Mcy/abs(Sy)', {
    ...{ Mcy: 'moment', Sy: 'modulus' },
  }),
  all: sum('H2-1', 'fra/Fca+frbw/Fcbw+frbz/Fcbz', { ...AXIAL, ...MAJOR, ...MINOR }),
  axialMajor: sum('H2-1-w', 'fra/Fca+frbw/Fcbw', { ...AXIAL, ...MAJOR }),
  axialMinor: sum('H2-1-z', 'fra/Fca+frbz/Fcbz', { ...AXIAL, ...MINOR }),
  biaxial: sum('H2-1-M', 'frbw/Fcbw+frbz/Fcbz', { ...MAJOR, ...MINOR }),
};

/** A signed moment (positive compresses the face that a positive modulus names) at a point. */
export interface FlexureAtPoint {
  readonly Mr: Quantity;
  /** Elastic modulus at the point; negative where a positive moment brings tension. */
  readonly S: Quantity;
  /** Available moment for the sense of stress at the point, positive (Chapter F). */
  readonly Mc: Quantity;
}

export interface StressPoint {
  /** Part of the keys: `top-left`. */
  readonly name: string;
  /** For the titles: `tip of the top flange, left`. */
  readonly title: string;
  readonly x: FlexureAtPoint | null;
  readonly y: FlexureAtPoint | null;
}

export interface StressAxial {
  /** Required axial force, compression positive. */
  readonly Pr: Quantity;
  /** Available strength for its sense (Chapter E or D), positive. */
  readonly Pc: Quantity;
  readonly Ag: Quantity;
}

/**
 * H2-1 at each point, the largest against 1. Compression is positive; for a doubly symmetric section
 * one point with all magnitudes positive is the worst corner. Empty where a point has fewer than two
 * of axial force and moments: the separate checks then say all.
 */
export function stressInteractionChecks(
  r: Recorder,
  axial: StressAxial | null,
  points: readonly StressPoint[],
): LineOf<'check'>[] {
  const stresses = axial && {
    fra: r.formula(h2Formulas.fra, 'H2/fra', { Pr: axial.Pr, Ag: axial.Ag }),
    Fca: r.formula(h2Formulas.Fca, 'H2/Fca', { Pc: axial.Pc, Ag: axial.Ag }),
  };
  const ratios = points.flatMap((point) => stressRatio(r, stresses, point) ?? []);
  if (ratios.length === 0) return [];
  const ratio = r.governing('H2/ratio', 'max', ratios, {
    title: 'Largest interaction of stresses',
    symbol: 'ratio',
    clause: clause('H2', 'H2-1'),
  });
  return [
    r.check('H2/check', ratio, 1, {
      title: 'Interaction of stresses',
      clause: clause('H2', 'H2-1'),
    }),
  ];
}

function stressRatio(
  r: Recorder,
  axial: { readonly fra: Quantity; readonly Fca: Quantity } | null,
  { name, title, x, y }: StressPoint,
): Quantity | null {
  const used =
    x && y
      ? axial
        ? h2Formulas.all
        : h2Formulas.biaxial
      : axial && x
        ? h2Formulas.axialMajor
        : axial && y
          ? h2Formulas.axialMinor
          : null;
  if (!used) return null;
  const at = (symbol: string) => `H2/${name}/${symbol}`;
  return r.formula(
    used,
    at('ratio'),
    {
      ...axial,
      ...(x && {
        frbw: r.formula(h2Formulas.frbw, at('frbw'), { Mrx: x.Mr, Sx: x.S }),
        Fcbw: r.formula(h2Formulas.Fcbw, at('Fcbw'), { Mcx: x.Mc, Sx: x.S }),
      }),
      ...(y && {
        frbz: r.formula(h2Formulas.frbz, at('frbz'), { Mry: y.Mr, Sy: y.S }),
        Fcbz: r.formula(h2Formulas.Fcbz, at('Fcbz'), { Mcy: y.Mc, Sy: y.S }),
      }),
    },
    { title: `Interaction of stresses, ${title}` },
  );
}
