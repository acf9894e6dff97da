import { z } from 'zod';
import { clauseSchema, lineSchema, verdictSchema } from './line.ts';

/**
 * The record: what a run of a book over a calculation's inputs yields. Every view (sheet, PDF,
 * trace, completeness, verification) is made from it and computes nothing.
 */

export const governingSchema = z.object({
  /** Address within the member: `c1:H1/ratio`. */
  address: z.string(),
  clause: clauseSchema,
  /** The combination's id and name. */
  combination: z.string().nullable(),
  combinationName: z.string().nullable(),
  /** Plain title of what governs: "Flexure and compression". */
  title: z.string(),
});
export type Governing = z.infer<typeof governingSchema>;

export const summarySchema = z.object({
  verdict: verdictSchema,
  /** null for FAILED and NOT CHECKED. */
  ratio: z.number().nullable(),
  /** Text of the ratio as printed, the same everywhere: "0.898". */
  ratioText: z.string().nullable(),
  governing: governingSchema.nullable(),
});
export type Summary = z.infer<typeof summarySchema>;

export const COVERAGE = [
  'governs',
  'does not govern',
  'not applicable',
  'outside scope',
  'not reached',
] as const;

/** One cell of the completeness table: a limit state under one combination. */
const coverageCellSchema = z.object({
  combination: z.string(),
  /** The segment it is for; null or absent: the whole member. */
  segment: z.string().nullable().optional(),
  state: z.enum(COVERAGE),
  because: z.string(),
  /** Address of the line that says so, or null. */
  address: z.string().nullable(),
  ratio: z.number().nullable(),
  ratioText: z.string().nullable(),
});

export const coverageRowSchema = z.object({
  id: z.string(),
  title: z.string(),
  clause: clauseSchema,
  cells: z.array(coverageCellSchema),
});
export type CoverageRow = z.infer<typeof coverageRowSchema>;

export const combinationRecordSchema = z.object({
  id: z.string(),
  name: z.string(),
  lines: z.array(lineSchema),
  summary: summarySchema,
});
export type CombinationRecord = z.infer<typeof combinationRecordSchema>;

export const memberRecordSchema = z.object({
  id: z.string(),
  mark: z.string(),
  /** Designation as the table writes it, or as typed when unknown there. */
  section: z.string(),
  material: z.string(),
  lines: z.array(lineSchema),
  combinations: z.array(combinationRecordSchema),
  completeness: z.array(coverageRowSchema),
  summary: summarySchema,
  /** Count of given values and statements not confirmed. */
  unconfirmed: z.number().int(),
});
export type MemberRecord = z.infer<typeof memberRecordSchema>;

export const recordSchema = z.object({
  format: z.literal(1),
  program: z.object({ name: z.literal('Stanchion'), engine: z.string() }),
  standard: z.string(),
  design: z.enum(['LRFD', 'ASD']),
  units: z.enum(['us', 'si']),
  analysis: z.object({
    method: z.enum(['direct', 'effective-length', 'first-order']),
    secondOrder: z.enum(['from-analysis', 'amplified', 'exact']),
    includesMemberEffect: z.boolean(),
    sway: z.enum(['none', 'B2']),
  }),
  members: z.array(memberRecordSchema),
  summary: summarySchema.extend({ member: z.string().nullable(), unconfirmed: z.number().int() }),
  /** The input file this was computed from, as given, so that anyone can run it again. */
  input: z.unknown(),
  /** Absent in a preview made in the browser. */
  resultHash: z.string().nullable(),
  snapshotHash: z.string().nullable(),
});
export type CalculationRecord = z.infer<typeof recordSchema>;
