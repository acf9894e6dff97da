import { z } from 'zod';
import {
  labelSchema,
  plainSchema,
  quantitySchema,
  statedSchema,
  textSchema,
  wordSchema,
} from '../calc/quantity-input.ts';
import { sectionSizesSchema } from '../sections/sizes.ts';
import { loadInputSchema, supportInputSchema } from './load-input.ts';
import {
  chartInputSchema,
  netSectionInputSchema,
  restraintInputSchema,
  springsInputSchema,
} from './restraint-input.ts';
import { swayInputSchema } from './sway-input.ts';

/**
 * INPUT.json, format 1: a calculation as its engineer gives it. Each quantity is a text with its
 * unit (`14 ft`), or an object that adds its source and whether it is confirmed. Units may be of
 * either set. Compression is positive; x is the major axis, y the minor.
 */
export const SWAYS = ['none', 'B2'] as const;

/** H1.3 and H2 beside H1.1, Cb in tension by H1.2, τb = 1 with additional notional loads (C2.3(c)). */
export const PROVISIONS = ['H1.3', 'H2', 'H1.2-Cb', 'C2.3-taub'] as const;
export type Provision = (typeof PROVISIONS)[number];

export const ENDS = ['held', 'free', 'sway', 'springs'] as const;

export const combinationInputSchema = z.strictObject({
  id: z
    .string()
    .regex(/^[a-z0-9-]{1,40}$/)
    .optional(),
  name: labelSchema(80),
  /** Load level of the forces; it must be the calculation's. */
  design: z.enum(['LRFD', 'ASD'], 'must be "LRFD" or "ASD"').optional(),
  /** Section that the analysis behind these forces had; another one leaves them unconfirmed. */
  analysedWith: textSchema(160).optional(),
  P: quantitySchema,
  MxA: quantitySchema.optional(),
  MxB: quantitySchema.optional(),
  MyA: quantitySchema.optional(),
  MyB: quantitySchema.optional(),
  MxMax: quantitySchema.optional(),
  MyMax: quantitySchema.optional(),
  /** Moments over the points held between the ends. */
  supports: z.array(supportInputSchema).max(30, 'holds more than 30 points').optional(),
  loads: z.array(loadInputSchema).max(30, 'holds more than 30 loads').optional(),
  /** Largest shear forces from the analysis, where the loads are not given: x bends the major axis. */
  Vx: quantitySchema.optional(),
  Vy: quantitySchema.optional(),
  sway: swayInputSchema.optional(),
});

const ownSteelSchema = statedSchema.extend({
  name: labelSchema(60),
  Fy: quantitySchema,
  Fu: quantitySchema.optional(),
});

export const memberInputSchema = z.strictObject({
  id: z
    .string()
    .regex(/^[a-z0-9-]{1,40}$/)
    .optional(),
  mark: labelSchema(40),
  /** A designation of the tables, or sizes. */
  section: z.union([wordSchema, sectionSizesSchema], {
    error: ({ input }) =>
      typeof input === 'object'
        ? undefined
        : 'must be a designation such as "W12X79", or sizes with their shape',
  }),
  material: z.union([textSchema(40), ownSteelSchema]),
  length: quantitySchema,
  ends: z.union(
    [
      z.enum(ENDS, `must be one of ${ENDS.join(', ')}`),
      statedSchema.extend({ value: z.enum(ENDS) }),
    ],
    `must be one of ${ENDS.join(', ')}`,
  ),
  Lcx: quantitySchema.optional(),
  Lcy: quantitySchema.optional(),
  Lcz: quantitySchema.optional(),
  Lb: quantitySchema.optional(),
  Cb: plainSchema.optional(),
  /** What is held between the ends; bays, buckling lengths and segments follow from it. */
  restraints: z.array(restraintInputSchema).max(30, 'holds more than 30 restraints').optional(),
  springs: springsInputSchema.optional(),
  charts: z
    .strictObject({ x: chartInputSchema.optional(), y: chartInputSchema.optional() })
    .optional(),
  netSection: netSectionInputSchema.optional(),
  /** Distance between transverse stiffeners of the web. */
  stiffeners: quantitySchema.optional(),
  endMomentSign: z
    .enum(
      ['bending', 'joint'],
      'must be "bending" (equal signs: single curvature) or "joint" (equal signs: reverse curvature)',
    )
    .optional(),
  combinations: z
    .array(combinationInputSchema)
    .min(1, 'needs at least one combination')
    .max(200, 'holds more than 200 combinations'),
});

export const analysisSchema = z.strictObject({
  method: z.enum(
    ['direct', 'effective-length', 'first-order'],
    'must be "direct", "effective-length" or "first-order"',
  ),
  secondOrder: z.enum(
    ['from-analysis', 'amplified', 'exact'],
    'must be "from-analysis", "amplified" or "exact"',
  ),
  includesMemberEffect: z.boolean('must be true or false').optional(),
  /** Stated with its source where it can be: that the ends do not translate is an input. */
  sway: z.union(
    [z.enum(SWAYS), statedSchema.extend({ value: z.enum(SWAYS) })],
    'must be "none", or "B2" where the stories sway',
  ),
  /** Second-order over first-order drift of the structure, where it is known. */
  driftRatio: plainSchema.optional(),
  /** Optional provisions that the basis of design chooses. */
  provisions: z.array(z.enum(PROVISIONS)).optional(),
});

export const inputSchema = z.strictObject({
  format: z.literal(1, 'must be 1'),
  standard: z.literal('aisc360-22', 'must be "aisc360-22"'),
  design: z.enum(['LRFD', 'ASD'], 'must be "LRFD" or "ASD"'),
  units: z.enum(['us', 'si'], 'must be "us" or "si"'),
  /** Which published set of material constants; by default that of the units. */
  constants: z.enum(['us', 'si'], 'must be "us" or "si"').optional(),
  analysis: analysisSchema,
  members: z
    .array(memberInputSchema)
    .min(1, 'needs at least one member')
    .max(500, 'holds more than 500 members'),
});

export type CalculationInput = z.infer<typeof inputSchema>;
export type MemberInput = z.infer<typeof memberInputSchema>;
export type CombinationInput = z.infer<typeof combinationInputSchema>;
export type AnalysisInput = z.infer<typeof analysisSchema>;
export type Ends = (typeof ENDS)[number];

/** JSON Schema of INPUT.json, for editors and other programs. */
export const inputJsonSchema = (): unknown => z.toJSONSchema(inputSchema, { io: 'input' });
