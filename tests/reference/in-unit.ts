// 1 in = 25.4 mm and 1 lbf = 4.4482216152605 N exactly (NIST SP 811, 2008 edition, appendix B).
const IN = 25.4;
const KIP = 4448.2216152605;

/** Size of a unit in N and mm, written out here so that published values don't pass through the code they test. */
export const UNIT_SIZES: Readonly<Record<string, number>> = {
  '': 1,
  rad: 1,
  in: IN,
  ft: 12 * IN,
  'in²': IN ** 2,
  'in³': IN ** 3,
  'in⁴': IN ** 4,
  'in⁶': IN ** 6,
  kip: KIP,
  ksi: KIP / IN ** 2,
  'kip in': KIP * IN,
  'kip ft': KIP * 12 * IN,
  'kip in²': KIP * IN ** 2,
  mm: 1,
  MPa: 1,
  kN: 1000,
  'kN m': 1e6,
};

/** A base value (N, mm) in a unit. */
export function inUnit(value: number, unit: string): number {
  const size = UNIT_SIZES[unit];
  if (size === undefined) throw new Error(`no unit ${unit}`);
  return value / size;
}
