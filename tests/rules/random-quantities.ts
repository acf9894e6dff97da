import type { DimensionName } from '#shared/units/dimension.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import type { Random } from './random.ts';

export const MM_PER_FT = 304.8;
export const N_PER_KIP = 4448.2216152605;
export const MPA_PER_KSI = N_PER_KIP / 25.4 ** 2;
const NMM_PER_KIPFT = N_PER_KIP * MM_PER_FT;

/** A number as somebody types it: two to seven significant digits, sometimes as computed by a spreadsheet. */
export const typed = (random: Random, value: number): string => {
  const text = String(Number(value.toPrecision(random.pick([2, 3, 3, 4, 6, 7]))));
  return random.chance(0.05) ? String(value) : text;
};

/** Value of a text in N and mm. */
export function baseValue(text: string, dimension: DimensionName): number {
  const parsed = parseQuantity(text, dimension);
  if (!parsed.ok) throw new Error(`${text}: ${parsed.reason}`);
  return parsed.quantity.value;
}

/* Texts of quantities given in N and mm, in units of either set. */

export const lengthText = (random: Random, mm: number): string => {
  const ft = mm / MM_PER_FT;
  const whole = Math.floor(ft);
  return random.pick([
    () => `${typed(random, ft)} ft`,
    () => `${typed(random, ft * 12)} in`,
    () => `${typed(random, mm / 1000)} m`,
    () => `${typed(random, mm)} mm`,
    () => `${whole} ft ${typed(random, Math.max(0.25, (ft - whole) * 12))} in`,
  ])();
};

/** A place on the member, with enough digits to stay in its order among others. */
export const placeText = (random: Random, mm: number): string => {
  const text = (value: number) => random.pick([value.toPrecision(9), String(value)]);
  return random.chance(0.5) ? `${text(mm)} mm` : `${text(mm / MM_PER_FT)} ft`;
};

/** A moment as a program writes it: all its digits, in a unit of either set. */
export const computedMomentText = (random: Random, Nmm: number): string =>
  random.chance(0.5) ? `${Nmm / NMM_PER_KIPFT} kip ft` : `${Nmm / 1e6} kN m`;

const either =
  (us: number, usUnit: string, si: number, siUnit: string) =>
  (random: Random, value: number): string =>
    random.chance(0.5)
      ? `${typed(random, value / us)} ${usUnit}`
      : `${typed(random, value / si)} ${siUnit}`;

export const forceText = either(N_PER_KIP, 'kip', 1000, 'kN');
export const momentText = either(NMM_PER_KIPFT, 'kip ft', 1e6, 'kN m');
export const lineLoadText = either(N_PER_KIP / MM_PER_FT, 'kip/ft', 1, 'kN/m');
export const stiffnessText = either(NMM_PER_KIPFT, 'kip ft/rad', 1e6, 'kN m/rad');
export const areaText = either(25.4 ** 2, 'in²', 1, 'mm²');
export const stressText = either(MPA_PER_KSI, 'ksi', 1, 'MPa');
