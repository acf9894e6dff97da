import { z } from 'zod';
import { line } from './fields.ts';

/**
 * Where a given value comes from, as the form holds it: the fields of `shared/calc`'s source, each
 * of which may still be empty while typing.
 */
export const draftSource = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('typed'), note: line(200).optional() }),
  z.object({
    kind: z.literal('file'),
    file: line(200),
    row: line(12).optional(),
    sha256: line(64).optional(),
  }),
  z.object({
    kind: z.literal('drawing'),
    number: line(60),
    revision: line(20),
    detail: line(120).optional(),
  }),
  z.object({ kind: z.literal('assumption'), basis: line(400) }),
]);
export type DraftSource = z.infer<typeof draftSource>;

/** A quantity or word as typed, such as `22 ft` or `held`; empty while it is not given. */
export const draftQuantity = z.object({
  text: line(60),
  source: draftSource.optional(),
  confirmed: z.boolean(),
});
export type DraftQuantity = z.infer<typeof draftQuantity>;

/** A quantity nobody has given yet. */
export const notGiven: DraftQuantity = { text: '', confirmed: false };
