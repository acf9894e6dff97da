import { DIMENSIONS, type DimensionName } from './dimension.ts';

/** A unit with its factor to the base (N, mm). */
export interface Unit {
  readonly name: string;
  readonly dimension: DimensionName;
  readonly factor: number;
}

// 1 in = 25.4 mm and 1 lbf = 4.4482216152605 N exactly (NIST SP 811, 2008 edition, appendix B).
const MM_PER_IN = 25.4;
const MM_PER_FT = 304.8;
const N_PER_LBF = 4.4482216152605;
const N_PER_KIP = 4448.2216152605;

const unit = (name: string, dimension: DimensionName, force: number, length: number): Unit => {
  const { force: f, length: l } = DIMENSIONS[dimension];
  return Object.freeze({ name, dimension, factor: force ** f * length ** l });
};

const ALL: readonly Unit[] = [
  unit('', 'none', 1, 1),
  unit('rad', 'angle', 1, 1),
  unit('mm', 'length', 1, 1),
  unit('cm', 'length', 1, 10),
  unit('m', 'length', 1, 1000),
  unit('in', 'length', 1, MM_PER_IN),
  unit('ft', 'length', 1, MM_PER_FT),
  unit('mm²', 'area', 1, 1),
  unit('in²', 'area', 1, MM_PER_IN),
  unit('mm³', 'modulus', 1, 1),
  unit('in³', 'modulus', 1, MM_PER_IN),
  unit('mm⁴', 'inertia', 1, 1),
  unit('in⁴', 'inertia', 1, MM_PER_IN),
  unit('mm⁶', 'warping', 1, 1),
  unit('in⁶', 'warping', 1, MM_PER_IN),
  unit('1/mm', 'perLength', 1, 1),
  unit('1/in', 'perLength', 1, MM_PER_IN),
  unit('N', 'force', 1, 1),
  unit('kN', 'force', 1000, 1),
  unit('MN', 'force', 1e6, 1),
  unit('lbf', 'force', N_PER_LBF, 1),
  unit('kip', 'force', N_PER_KIP, 1),
  unit('MPa', 'stress', 1, 1),
  unit('GPa', 'stress', 1000, 1),
  unit('ksi', 'stress', N_PER_KIP, MM_PER_IN),
  unit('psi', 'stress', N_PER_LBF, MM_PER_IN),
  unit('N mm', 'moment', 1, 1),
  unit('N m', 'moment', 1, 1000),
  unit('kN m', 'moment', 1000, 1000),
  unit('kip in', 'moment', N_PER_KIP, MM_PER_IN),
  unit('kip ft', 'moment', N_PER_KIP, MM_PER_FT),
  unit('lbf ft', 'moment', N_PER_LBF, MM_PER_FT),
  unit('N mm²', 'rigidity', 1, 1),
  unit('kN m²', 'rigidity', 1000, 1000),
  unit('kip in²', 'rigidity', N_PER_KIP, MM_PER_IN),
  unit('N/mm', 'lineLoad', 1, 1),
  unit('kN/m', 'lineLoad', 1000, 1000),
  unit('kip/in', 'lineLoad', N_PER_KIP, MM_PER_IN),
  unit('kip/ft', 'lineLoad', N_PER_KIP, MM_PER_FT),
  unit('lbf/ft', 'lineLoad', N_PER_LBF, MM_PER_FT),
  unit('N/mm²', 'loadSlope', 1, 1),
  unit('kip/in²', 'loadSlope', N_PER_KIP, MM_PER_IN),
  unit('N mm/rad', 'rotationalStiffness', 1, 1),
  unit('kN m/rad', 'rotationalStiffness', 1000, 1000),
  unit('kip in/rad', 'rotationalStiffness', N_PER_KIP, MM_PER_IN),
  unit('kip ft/rad', 'rotationalStiffness', N_PER_KIP, MM_PER_FT),
];

export const UNITS: ReadonlyMap<string, Unit> = new Map(ALL.map((u) => [u.name, u]));

/** The unit of that exact name; throws on an unknown name (a mistake in the code, not in an input). */
export function unitNamed(name: string): Unit {
  const found = UNITS.get(name);
  if (!found) throw new Error(`no unit named "${name}"`);
  return found;
}

export const toBase = (value: number, u: Unit): number => value * u.factor;
export const fromBase = (value: number, u: Unit): number => value / u.factor;
