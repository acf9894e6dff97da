import type { DimensionName } from './dimension.ts';
import { type Unit, unitNamed } from './unit.ts';

export type UnitSetName = 'us' | 'si';

/**
 * One working unit per dimension, in which substitutions print (a coherent set), and, where the
 * trade reads another unit, a display unit beside it.
 */
export interface UnitSet {
  readonly name: UnitSetName;
  readonly title: string;
  readonly working: Readonly<Record<DimensionName, Unit>>;
  readonly display: Readonly<Partial<Record<DimensionName, Unit>>>;
}

const units = <K extends string>(names: Record<K, string>): Record<K, Unit> =>
  Object.fromEntries(
    Object.entries<string>(names).map(([k, name]) => [k, unitNamed(name)]),
  ) as Record<K, Unit>;

export const UNIT_SETS: Readonly<Record<UnitSetName, UnitSet>> = {
  us: {
    name: 'us',
    title: 'US customary',
    working: units({
      none: '',
      angle: 'rad',
      length: 'in',
      area: 'in²',
      modulus: 'in³',
      inertia: 'in⁴',
      warping: 'in⁶',
      perLength: '1/in',
      force: 'kip',
      stress: 'ksi',
      moment: 'kip in',
      rigidity: 'kip in²',
      lineLoad: 'kip/in',
      loadSlope: 'kip/in²',
      rotationalStiffness: 'kip in/rad',
      deflection: 'in',
    }),
    display: units({
      length: 'ft',
      moment: 'kip ft',
      lineLoad: 'kip/ft',
      rotationalStiffness: 'kip ft/rad',
    }),
  },
  si: {
    name: 'si',
    title: 'SI',
    working: units({
      none: '',
      angle: 'rad',
      length: 'mm',
      area: 'mm²',
      modulus: 'mm³',
      inertia: 'mm⁴',
      warping: 'mm⁶',
      perLength: '1/mm',
      force: 'N',
      stress: 'MPa',
      moment: 'N mm',
      rigidity: 'N mm²',
      lineLoad: 'N/mm',
      loadSlope: 'N/mm²',
      rotationalStiffness: 'N mm/rad',
      deflection: 'mm',
    }),
    display: units({
      length: 'm',
      force: 'kN',
      moment: 'kN m',
      rigidity: 'kN m²',
      lineLoad: 'kN/m',
      rotationalStiffness: 'kN m/rad',
    }),
  },
};
