import { z } from 'zod';
import type { GivenValue } from '../calc/quantity.ts';
import { quantitySchema, statedSchema } from '../calc/quantity-input.ts';

/*
 * Sections by their sizes: welded from plates, or tubes. INPUT.json takes one of these in place of a
 * designation. Source and state beside the sizes hold for each size that has none of its own. Welds
 * and fillets are left out of the properties.
 */
const wall = z.enum(
  ['nominal', 'design'],
  'must be "nominal" (B4.2 then takes 0.93 of it, or all of it for A1085) or "design" (used as it is)',
);

export const sectionSizesSchema = z.discriminatedUnion(
  'shape',
  [
    /** Three plates, both flanges the same: overall depth, flange width, thicknesses. */
    statedSchema.extend({
      shape: z.literal('i'),
      d: quantitySchema,
      bf: quantitySchema,
      tf: quantitySchema,
      tw: quantitySchema,
    }),
    /** Three plates with two different flanges; the top one is compressed by a positive Mx. */
    statedSchema.extend({
      shape: z.literal('mono-i'),
      d: quantitySchema,
      bfTop: quantitySchema,
      tfTop: quantitySchema,
      bfBottom: quantitySchema,
      tfBottom: quantitySchema,
      tw: quantitySchema,
    }),
    /** Four welded plates, outside width and depth, no plate beyond the outside of another. */
    statedSchema.extend({
      shape: z.literal('box'),
      B: quantitySchema,
      d: quantitySchema,
      tf: quantitySchema,
      tw: quantitySchema,
    }),
    /** Rectangular or square tube, outside sizes; outside corner radius 2 t where not given. */
    statedSchema.extend({
      shape: z.literal('tube'),
      B: quantitySchema,
      Ht: quantitySchema,
      t: quantitySchema,
      wall,
      Ro: quantitySchema.optional(),
    }),
    statedSchema.extend({
      shape: z.literal('round'),
      D: quantitySchema,
      t: quantitySchema,
      wall,
    }),
  ],
  'must be "i", "mono-i", "box", "tube" or "round"',
);
export type SectionSizesInput = z.infer<typeof sectionSizesSchema>;

/** The sizes read; lengths in mm. */
export type SectionSizes =
  | ({ readonly shape: 'i' } & Sizes<'d' | 'bf' | 'tf' | 'tw'>)
  | ({ readonly shape: 'mono-i' } & Sizes<'d' | 'bfTop' | 'tfTop' | 'bfBottom' | 'tfBottom' | 'tw'>)
  | ({ readonly shape: 'box' } & Sizes<'B' | 'd' | 'tf' | 'tw'>)
  | ({
      readonly shape: 'tube';
      readonly wall: Wall;
      readonly Ro: GivenValue | null;
    } & Sizes<'B' | 'Ht' | 't'>)
  | ({ readonly shape: 'round'; readonly wall: Wall } & Sizes<'D' | 't'>);

export type Wall = 'nominal' | 'design';
type Sizes<N extends string> = Readonly<Record<N, GivenValue>>;

const by = (...sizes: readonly GivenValue[]): string => sizes.map(({ text }) => text).join(' × ');

/** `Built-up I 20 in × 10 in × 1 in × 0.5 in`: the sizes as typed, depth and width first. */
export function sizesName(s: SectionSizes): string {
  switch (s.shape) {
    case 'i':
      return `Built-up I ${by(s.d, s.bf, s.tf, s.tw)}`;
    case 'mono-i':
      return `Built-up I ${by(s.d, s.tw)}, top ${by(s.bfTop, s.tfTop)}, bottom ${by(s.bfBottom, s.tfBottom)}`;
    case 'box':
      return `Box ${by(s.d, s.B, s.tf, s.tw)}`;
    case 'tube':
      return `Tube ${by(s.Ht, s.B, s.t)}`;
    case 'round':
      return `Round tube ${by(s.D, s.t)}`;
  }
}
