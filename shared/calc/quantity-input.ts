import { z } from 'zod';
import { sourceSchema } from './line.ts';

/* How inputs write a quantity: a text with its unit, or an object that adds source and state. */

export const textSchema = (most: number) =>
  z.string().trim().min(1, 'is empty').max(most, `is longer than ${most} characters`);

/** Letters, digits and the signs that marks and names on drawings use. */
export const labelSchema = (most: number) =>
  textSchema(most).regex(
    /^[\p{L}\p{N} .,:;_\-–/()+#&'°=×*]+$/u,
    "may hold letters, digits, spaces and . , : ; _ - / ( ) + # & ' only",
  );

export const statedSchema = z.strictObject({
  source: sourceSchema.optional(),
  confirmed: z.boolean().optional(),
});

const amount = z
  .string('must be a text with its unit, such as "14 ft"')
  .max(60, 'is longer than 60 characters');

export const quantitySchema = z.union(
  [amount, statedSchema.extend({ value: amount })],
  'must be a text with its unit, such as "14 ft", or an object with value, source and confirmed',
);
export type QuantityInput = z.infer<typeof quantitySchema>;

/** A plain number may also be a JSON number. */
export const plainSchema = z.union([
  z.number(),
  amount,
  statedSchema.extend({ value: z.union([z.number(), amount]) }),
]);

export const wordSchema = z.union([textSchema(40), statedSchema.extend({ value: textSchema(40) })]);
