import type { GivenValue, Quantity } from '#shared/calc/quantity.ts';
import type { Recorder } from '#shared/calc/recorder.ts';
import type { SectionQuantities, SteelQuantities } from '#shared/members/section-quantities.ts';
import type { DimensionName } from '#shared/units/dimension.ts';
import { UNIT_SIZES } from './in-unit.ts';

/** Names of quantities with their values as texts: `{ d: '23.7 in' }`. */
export type Texts = Readonly<Record<string, string>>;

const DIMENSION_OF: Readonly<Record<string, DimensionName>> = {
  '': 'none',
  in: 'length',
  ft: 'length',
  'in²': 'area',
  'in³': 'modulus',
  'in⁴': 'inertia',
  'in⁶': 'warping',
  kip: 'force',
  ksi: 'stress',
  'kip ft': 'moment',
};

/** `5.27 in` in N and mm, without the program's own reading of units. */
export function base(text: string): { readonly value: number; readonly dimension: DimensionName } {
  const [number, ...rest] = text.split(' ');
  const unit = rest.join(' ');
  const [size, dimension] = [UNIT_SIZES[unit], DIMENSION_OF[unit]];
  if (size === undefined || dimension === undefined) throw new Error(`no unit ${unit}`);
  return { value: Number(number) * size, dimension };
}

/** One given line under its name. */
export function quantity(r: Recorder, name: string, text: string): Quantity {
  const { value, dimension } = base(text);
  const given: GivenValue = { value, text, source: { kind: 'typed' }, confirmed: false };
  return r.given(`given/${name}`, name, dimension, given, { title: name });
}

/** A given line of each, except the words. */
export const quantities = <N extends string>(
  r: Recorder,
  texts: Readonly<Record<N, string>>,
): Record<N, Quantity> =>
  Object.fromEntries(
    Object.entries<string>(texts).map(([name, text]) => [name, quantity(r, name, text)]),
  ) as Record<N, Quantity>;

/** A section with the quantities that are given; the others are undefined. */
export function sectionOf(r: Recorder, { kind, made, ...texts }: Texts): SectionQuantities {
  return { kind, made, ...quantities(r, texts) } as unknown as SectionQuantities;
}

/** A steel with the quantities that are given; Fu is null unless it is. */
export const steelOf = (r: Recorder, texts: Texts): SteelQuantities =>
  ({ Fu: null, ...quantities(r, texts) }) as unknown as SteelQuantities;
