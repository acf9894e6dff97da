import { z } from 'zod';
import { quantitySchema, statedSchema } from '../calc/quantity-input.ts';

/**
 * What a restraint between the ends may hold. `in-plane`: movement in the plane of major-axis
 * bending. `top`, `bottom`, `centre`: lateral movement at that flange or at the shear centre.
 * `twist`: rotation about the member's axis. The top flange is the one that a positive moment about
 * x compresses.
 */
export const HOLDS = ['in-plane', 'top', 'bottom', 'centre', 'twist'] as const;
export type Hold = (typeof HOLDS)[number];

export const restraintInputSchema = statedSchema.extend({
  /** Distance from end A. */
  at: quantitySchema,
  holds: z
    .array(z.enum(HOLDS, `must be of ${HOLDS.join(', ')}`))
    .min(1, 'needs at least one of in-plane, top, bottom, centre, twist'),
});

/** Joints of a column for its buckling length by alignment chart (Commentary to App. 7). */
export const chartInputSchema = z.strictObject({
  sidesway: z.enum(['inhibited', 'uninhibited'], 'must be "inhibited" or "uninhibited"'),
  /** Stiffness ratios at the ends: 10 for a pin, 1 for a fixed base in practice. */
  GA: z.union([z.number(), quantitySchema]),
  GB: z.union([z.number(), quantitySchema]),
});

/** Rotational springs at the ends, each left out is a pin. */
export const springsInputSchema = z.strictObject({
  xA: quantitySchema.optional(),
  xB: quantitySchema.optional(),
  yA: quantitySchema.optional(),
  yB: quantitySchema.optional(),
});

/** Net section for rupture in tension (D2, D3): Ae, or An with U. */
export const netSectionInputSchema = z.union(
  [
    z.strictObject({ Ae: quantitySchema }),
    z.strictObject({ An: quantitySchema, U: z.union([z.number(), quantitySchema]) }),
  ],
  'must hold Ae, or An and U',
);
