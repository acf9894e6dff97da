import { z } from 'zod';
import { sourceSchema } from '../calc/line.ts';

/**
 * INPUT.json, format 1: a calculation as its engineer gives it. Each quantity is a text with its
 * unit (`14 ft`), or an object that adds its source and whether it is confirmed. Units may be of
 * either set. Compression is positive; x is the major axis, y the minor.
 */
const text = (most: number) =>
  z.string().trim().min(1, 'is empty').max(most, `is longer than ${most} characters`);

/** Letters, digits and the signs that marks and names on drawings use. */
const label = (most: number) =>
  text(most).regex(
    /^[\p{L}\p{N} .,:;_\-–/()+#&'°=×*]+$/u,
    "may hold letters, digits, spaces and . , : ; _ - / ( ) + # & ' only",
  );

const stated = z.strictObject({
  source: sourceSchema.optional(),
  confirmed: z.boolean().optional(),
});

const amount = z
  .string('must be a text with its unit, such as "14 ft"')
  .max(60, 'is longer than 60 characters');
export const quantitySchema = z.union(
  [amount, stated.extend({ value: amount })],
  'must be a text with its unit, such as "14 ft", or an object with value, source and confirmed',
);
export type QuantityInput = z.infer<typeof quantitySchema>;

/** A plain number may also be a JSON number. */
const plainSchema = z.union([
  z.number(),
  amount,
  stated.extend({ value: z.union([z.number(), amount]) }),
]);

const wordSchema = z.union([text(40), stated.extend({ value: text(40) })]);

export const ENDS = ['held', 'free', 'sway', 'springs'] as const;

export const combinationInputSchema = z.strictObject({
  id: z
    .string()
    .regex(/^[a-z0-9-]{1,40}$/)
    .optional(),
  name: label(80),
  /** Load level of the forces; it must be the calculation's. */
  design: z.enum(['LRFD', 'ASD'], 'must be "LRFD" or "ASD"').optional(),
  /** Section that the analysis behind these forces had; another one leaves them unconfirmed. */
  analysedWith: text(40).optional(),
  P: quantitySchema,
  MxA: quantitySchema.optional(),
  MxB: quantitySchema.optional(),
  MyA: quantitySchema.optional(),
  MyB: quantitySchema.optional(),
  MxMax: quantitySchema.optional(),
  MyMax: quantitySchema.optional(),
});

const ownSteelSchema = stated.extend({
  name: label(60),
  Fy: quantitySchema,
  Fu: quantitySchema.optional(),
});

export const memberInputSchema = z.strictObject({
  id: z
    .string()
    .regex(/^[a-z0-9-]{1,40}$/)
    .optional(),
  mark: label(40),
  section: wordSchema,
  material: z.union([text(40), ownSteelSchema]),
  length: quantitySchema,
  ends: z.union(
    [z.enum(ENDS, `must be one of ${ENDS.join(', ')}`), stated.extend({ value: z.enum(ENDS) })],
    `must be one of ${ENDS.join(', ')}`,
  ),
  Lcx: quantitySchema.optional(),
  Lcy: quantitySchema.optional(),
  Lcz: quantitySchema.optional(),
  Lb: quantitySchema.optional(),
  Cb: plainSchema.optional(),
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
    [z.literal('none'), stated.extend({ value: z.literal('none') })],
    'must be "none": sway is outside the scope of this version',
  ),
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
