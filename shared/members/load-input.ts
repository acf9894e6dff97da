import { z } from 'zod';
import { quantitySchema } from '../calc/quantity-input.ts';

export const HEIGHTS = ['top', 'centre', 'bottom'] as const;
export type LoadHeight = (typeof HEIGHTS)[number];

const common = {
  /** Axis that the load bends the member about. */
  bends: z.enum(['x', 'y'], 'must be "x" or "y"'),
  /** Where it acts on the section; needed for loads that bend the major axis. */
  height: z.enum(HEIGHTS, 'must be "top", "centre" or "bottom"').optional(),
};
const reach = { from: quantitySchema.optional(), to: quantitySchema.optional() };

/**
 * A load between the ends. Positive loads give positive moments in a member on two supports:
 * compression in the top flange. Places are distances from end A.
 */
export const loadInputSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('uniform'), ...common, ...reach, w: quantitySchema }),
  z.strictObject({
    kind: z.literal('linear'),
    ...common,
    ...reach,
    wFrom: quantitySchema,
    wTo: quantitySchema,
  }),
  z.strictObject({
    kind: z.literal('point'),
    ...common,
    W: quantitySchema,
    at: quantitySchema,
  }),
]);
export type LoadInput = z.infer<typeof loadInputSchema>;

/** Moments where the member runs over a point held between its ends, bending sense. */
export const supportInputSchema = z.strictObject({
  at: quantitySchema,
  Mx: quantitySchema.optional(),
  My: quantitySchema.optional(),
});
