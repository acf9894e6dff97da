import { z } from 'zod';
import { DIMENSION_NAMES } from '../units/dimension.ts';

/*
 * A line is one typed step of a member's sheet. Values are plain numbers in base units (N, mm).
 *
 * Addresses. A member line is addressed by its key (`E3/Fn`), a combination line by
 * `combination:key` (`c1:H1/ratio`). Inside lines a reference to a line of the same combination
 * starts with a colon (`:H1/ratio`), so that a combination's lines do not carry its id.
 */

/** `key` for a member line, `:key` for a line of the same combination. */
export const refSchema = z.string().min(1).max(120);

export const clauseSchema = z.object({
  book: z.string(),
  clause: z.string(),
  equation: z.string().nullable(),
});

/** Significant digits or decimals, fixed once per record by the closure. */
const digitsSchema = z.union([
  z.object({ sig: z.number().int() }),
  z.object({ dec: z.number().int() }),
]);

/** The forms a value prints in; null where that form is not printed. */
const printSchema = z.object({
  working: digitsSchema.nullable(),
  display: digitsSchema.nullable(),
});

export const sourceSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('typed'), note: z.string().max(400).optional() }),
  z.object({
    kind: z.literal('file'),
    file: z.string().min(1).max(200),
    row: z.number().int().positive().optional(),
    sha256: z
      .string()
      .regex(/^[0-9a-f]{64}$/)
      .optional(),
  }),
  z.object({
    kind: z.literal('drawing'),
    number: z.string().min(1).max(60),
    revision: z.string().min(1).max(20),
    detail: z.string().max(120).optional(),
  }),
  z.object({ kind: z.literal('assumption'), basis: z.string().min(1).max(400) }),
]);
export type Source = z.infer<typeof sourceSchema>;

const head = {
  /** `[segment/]clause/quantity`; stable: renaming one is a change of results. */
  key: z.string().min(1).max(120),
  title: z.string(),
  clause: clauseSchema.nullable(),
};

const valued = {
  /** Name of the quantity in the book's table of symbols. */
  symbol: z.string(),
  value: z.number(),
  dimension: z.enum(DIMENSION_NAMES),
  print: printSchema,
};

const givenSchema = z.object({
  kind: z.literal('given'),
  ...head,
  ...valued,
  /** As typed: `14 ft`. */
  typed: z.string(),
  source: sourceSchema,
  confirmed: z.boolean(),
});

/** A statement given in words (`held`, `direct`), not a number. */
const statementSchema = z.object({
  kind: z.literal('statement'),
  ...head,
  statement: z.string(),
  source: sourceSchema,
  confirmed: z.boolean(),
});

const lookupSchema = z.object({
  kind: z.literal('lookup'),
  ...head,
  ...valued,
  /** As published: `662 in⁴`. */
  published: z.string(),
  table: z.string(),
  row: z.string(),
  column: z.string(),
  /** Title and edition of the publication the table is from. */
  tableSource: z.string(),
});

const operandSchema = z.object({
  ref: refSchema,
  /** Symbol to print in place of the formula's own (`Lcx` for `Lc`). */
  symbol: z.string(),
});

const formulaSchema = z.object({
  kind: z.literal('formula'),
  ...head,
  ...valued,
  /** Id of the formula in its book: `aisc360-22/E3-2`. */
  formula: z.string(),
  expression: z.string(),
  operands: z.record(z.string(), operandSchema),
  /** The unit form the substitution prints in. */
  prints: z.enum(['working', 'display']),
});

/** One side of a comparison: a line, a constant of the clause, or words. */
const sideSchema = z.union([
  z.object({ ref: refSchema }),
  z.object({ constant: z.number() }),
  z.object({ words: z.string() }),
]);
export type Side = z.infer<typeof sideSchema>;

export const RELATIONS = ['<', '<=', '>', '>=', '=', 'is'] as const;

const conditionSchema = z.object({
  left: sideSchema,
  relation: z.enum(RELATIONS),
  right: sideSchema,
  holds: z.boolean(),
  /** The branch taken when it holds, as words that can follow "so". */
  outcome: z.string(),
});

/** Conditions tried in order; the first that holds decides, else `otherwise`. */
const choiceSchema = z.object({
  kind: z.literal('choice'),
  ...head,
  tried: z.array(conditionSchema).min(1),
  otherwise: z.string(),
  outcome: z.string(),
  /** A sentence of words on why the rule is so, or empty. */
  because: z.string(),
});

const governingSchema = z.object({
  kind: z.literal('governing'),
  ...head,
  ...valued,
  sense: z.enum(['min', 'max']),
  candidates: z.array(refSchema).min(1),
  governs: refSchema,
});

export const VERDICTS = ['OK', 'NOT CHECKED', 'NOT OK', 'FAILED'] as const;
export const verdictSchema = z.enum(VERDICTS);
/** In rank order, the worst last. */
export type Verdict = z.infer<typeof verdictSchema>;

const checkSchema = z.object({
  kind: z.literal('check'),
  ...head,
  demand: refSchema,
  /** A line, or 1 for an interaction ratio. */
  capacity: z.union([refSchema, z.literal(1)]),
  /** demand / capacity, unrounded. */
  ratio: z.number(),
  print: printSchema,
  verdict: z.enum(['OK', 'NOT OK']),
});

/** The same quantity by another route; it never changes a verdict. */
const comparisonSchema = z.object({
  kind: z.literal('comparison'),
  ...head,
  /** What the sheet uses. */
  used: refSchema,
  /** The other route. */
  other: refSchema,
  /** used / other − 1, unrounded. */
  difference: z.number(),
  print: printSchema,
  /** Plain words that the difference is put into: "{used} … {other} …". */
  words: z.string(),
});

const rootSchema = z.object({
  kind: z.literal('root'),
  ...head,
  ...valued,
  formula: z.string(),
  /** The expression that is zero at the root, with the unknown among its symbols. */
  expression: z.string(),
  unknown: z.string(),
  operands: z.record(z.string(), operandSchema),
  bracket: z.tuple([z.number(), z.number()]),
  residual: z.number(),
});

export const SEVERITIES = ['note', 'caution', 'outside scope', 'failed'] as const;

const noticeSchema = z.object({
  kind: z.literal('notice'),
  ...head,
  severity: z.enum(SEVERITIES),
  code: z.string(),
  text: z.string(),
});

const sectionSchema = z.object({ kind: z.literal('section'), ...head });

export const lineSchema = z.discriminatedUnion('kind', [
  givenSchema,
  statementSchema,
  lookupSchema,
  formulaSchema,
  choiceSchema,
  governingSchema,
  checkSchema,
  comparisonSchema,
  rootSchema,
  noticeSchema,
  sectionSchema,
]);

export type Line = z.infer<typeof lineSchema>;
export type LineKind = Line['kind'];
export type LineOf<K extends LineKind> = Extract<Line, { kind: K }>;
/** A line that carries a number other lines may use. */
export type ValuedLine = LineOf<'given' | 'lookup' | 'formula' | 'governing' | 'root'>;
export type Clause = z.infer<typeof clauseSchema>;
export type Print = z.infer<typeof printSchema>;
export type Condition = z.infer<typeof conditionSchema>;
export type Severity = (typeof SEVERITIES)[number];

export const isValued = (line: Line): line is ValuedLine => 'value' in line;
