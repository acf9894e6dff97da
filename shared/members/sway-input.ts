import { z } from 'zod';
import { quantitySchema } from '../calc/quantity-input.ts';

/**
 * Sway of one direction for App. 8.1.3: moments from lateral translation at the ends, and the
 * story's axial load with Pe,story itself or what A-8-7 needs of it.
 */
const directionSchema = z.strictObject({
  MA: quantitySchema.optional(),
  MB: quantitySchema.optional(),
  Pstory: quantitySchema,
  PeStory: quantitySchema.optional(),
  /** Story shear, story height and first-order drift of A-8-7. */
  H: quantitySchema.optional(),
  height: quantitySchema.optional(),
  drift: quantitySchema.optional(),
  /** Load on moment-frame columns of the story (A-8-8), or what RM is without it. */
  Pmf: quantitySchema.optional(),
  RM: z.enum(['braced', 'lower bound'], 'must be "braced" or "lower bound"').optional(),
});

export const swayInputSchema = z.strictObject({
  /** Axial force from lateral translation, compression positive. */
  P: quantitySchema.optional(),
  x: directionSchema.optional(),
  y: directionSchema.optional(),
});
export type SwayDirectionInput = z.infer<typeof directionSchema>;
