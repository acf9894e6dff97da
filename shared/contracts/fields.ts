import { z } from 'zod';

/** Control characters (line break and tab apart) and half surrogate pairs: no one types these. */
const unprintable = /\p{Cs}|(?![\n\t])\p{Cc}/u;

/** Text as typed, of at most `max` characters, empty allowed. */
export const text = (max: number) =>
  z
    .string()
    .max(max, `at most ${max} characters`)
    .refine((value) => !unprintable.test(value), 'holds a character that cannot be printed');

/** One line of text as typed, of at most `max` characters, empty allowed. */
export const line = (max: number) =>
  text(max).refine((value) => !/[\n\t]/.test(value), 'is one line of text');

/** A name that must be there: trimmed, 1 to `max` characters on one line. */
export const name = (max: number) => line(max).trim().min(1, 'must not be empty');

export const id = z.uuid();
export const noParams = z.object({});
/** Version of a row, raised by every change; a change of an older version is a conflict. */
export const version = z.int().min(1);
export const timestamp = z.iso.datetime();
