import type { Line } from '#shared/calc/line.ts';
import type { Quantity } from '#shared/calc/quantity.ts';
import { createRecorder, type Recorder } from '#shared/calc/recorder.ts';
import { type CompressionStrength, compressionStrength } from '#shared/members/compression.ts';
import type { SectionQuantities, SteelQuantities } from '#shared/members/section-quantities.ts';
import { methodConstant } from '#shared/standards/aisc360-22/parameters.ts';
import type { DimensionName } from '#shared/units/dimension.ts';
import { inUnit, UNIT_SIZES } from './in-unit.ts';

export type Texts = Readonly<Record<string, string>>;
export type Method = 'LRFD' | 'ASD';

export interface CompressionCase {
  /** Yield stress; E and G are 29 000 and 11 200 ksi. */
  readonly Fy: string;
  /** Kind, made, and the quantities that the steps use. */
  readonly section: Texts;
  readonly lengths: { readonly Lcx: string; readonly Lcy: string; readonly Lcz: string };
  readonly offset?: { readonly axis: 'x' | 'y'; readonly distance: string };
}

const SIZES: Readonly<Record<string, number>> = { ...UNIT_SIZES, 'in⁶': 25.4 ** 6 };
const DIMENSION_OF: Readonly<Record<string, DimensionName>> = {
  '': 'none',
  in: 'length',
  ft: 'length',
  'in²': 'area',
  'in⁴': 'inertia',
  'in⁶': 'warping',
  kip: 'force',
  ksi: 'stress',
};

/** `19.75 in²` in N and mm, without the program's own reading of units. */
export function sizeOf(text: string): {
  readonly value: number;
  readonly dimension: DimensionName;
} {
  const [number, unit = ''] = text.split(' ');
  const [size, dimension] = [SIZES[unit], DIMENSION_OF[unit]];
  if (size === undefined || dimension === undefined) throw new Error(`no unit ${unit}`);
  return { value: Number(number) * size, dimension };
}

/** A given line `given/<name>` of such a text, with the symbol of that name. */
export function givenText(r: Recorder, name: string, text: string): Quantity {
  const { value, dimension } = sizeOf(text);
  const given = { value, text, source: { kind: 'typed' }, confirmed: true } as const;
  return r.given(`given/${name}`, name, dimension, given, { title: name });
}

const givenTexts = (r: Recorder, texts: Texts): Record<string, Quantity> =>
  Object.fromEntries(Object.entries(texts).map(([name, text]) => [name, givenText(r, name, text)]));

/** A section with the quantities that a case gives; the steps of Chapter E ask for no others. */
export function sectionOf(r: Recorder, { kind, made, square, ...texts }: Texts): SectionQuantities {
  const quantities = givenTexts(r, texts);
  return { kind, made, square: square === 'yes', ...quantities } as unknown as SectionQuantities;
}

export interface Computed {
  readonly strength: CompressionStrength | null;
  readonly lines: readonly Line[];
  /** Value of a line in a unit. */
  readonly at: (key: string, unit?: string) => number;
  /** Outcome of a choice line. */
  readonly outcome: (key: string) => string;
  readonly codes: readonly string[];
}

/** Chapter E with Pns over a case. */
export function compressionOf(
  c: CompressionCase,
  design: Method = 'LRFD',
  made?: (r: Recorder) => SectionQuantities,
): Computed {
  const r = createRecorder('');
  const steel = givenTexts(r, { E: '29000 ksi', G: '11200 ksi', Fy: c.Fy });
  const section = made ? made(r) : sectionOf(r, c.section);
  const { Lcx, Lcy, Lcz } = givenTexts(r, c.lengths) as Record<'Lcx' | 'Lcy' | 'Lcz', Quantity>;
  const offset = c.offset && {
    axis: c.offset.axis,
    distance: givenText(r, c.offset.axis === 'y' ? 'ya' : 'xa', c.offset.distance),
  };
  const strength = compressionStrength(
    r,
    design,
    steel as unknown as SteelQuantities,
    section,
    { Lcx, Lcy, Lcz, offset: offset ?? null },
    methodConstant(r, 'compression', design),
    true,
  );
  return {
    strength,
    lines: r.lines,
    at: (key, unit = '') => {
      const line = r.lines.find((l) => l.key === key);
      if (!line || !('value' in line)) throw new Error(`no value at ${key}`);
      return inUnit(line.value, unit);
    },
    outcome: (key) => {
      const line = r.lines.find((l) => l.key === key);
      if (line?.kind !== 'choice') throw new Error(`no choice at ${key}`);
      return line.outcome;
    },
    codes: r.lines.flatMap((l) => (l.kind === 'notice' ? [l.code] : [])),
  };
}
