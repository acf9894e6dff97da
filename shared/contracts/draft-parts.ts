import { z } from 'zod';
import { HEIGHTS } from '#shared/members/load-input.ts';
import { HOLDS } from '#shared/members/restraint-input.ts';
import { draftQuantity, draftSource } from './draft-quantity.ts';
import { line } from './fields.ts';

/*
 * What not every member has, as its form holds it: text as typed, valid or not. Rows carry an id
 * made by the client, which stays with the row. A row's source stands for all its texts together.
 */

const row = { id: line(40).min(1), source: draftSource.optional(), confirmed: z.boolean() };
const text = line(60);

export const sizedShapes = ['i', 'mono-i', 'box', 'tube', 'round'] as const;

/** A section by its sizes; those that its shape has no use for are kept, not sent. */
export const draftSizes = z.object({
  shape: z.enum(sizedShapes),
  /** What the thickness of a tube is; empty until chosen. */
  wall: z.enum(['nominal', 'design', '']),
  d: text,
  bf: text,
  tf: text,
  tw: text,
  bfTop: text,
  tfTop: text,
  bfBottom: text,
  tfBottom: text,
  B: text,
  Ht: text,
  t: text,
  Ro: text,
  D: text,
  source: draftSource.optional(),
  confirmed: z.boolean(),
});
export type DraftSizes = z.infer<typeof draftSizes>;
export type SizeName = Exclude<keyof DraftSizes, 'shape' | 'wall' | 'source' | 'confirmed'>;

/** What is held between the ends, at a distance from end A. */
export const draftRestraint = z.object({ ...row, at: text, holds: z.array(z.enum(HOLDS)).max(5) });
export type DraftRestraint = z.infer<typeof draftRestraint>;

/** `part` is a uniform load over a part of the member, `varying` one that changes linearly. */
export const loadKinds = ['whole', 'part', 'varying', 'point'] as const;

/** A load between the ends. Texts that its kind has no use for are kept, not sent. */
export const draftLoad = z.object({
  ...row,
  kind: z.enum(loadKinds),
  bends: z.enum(['x', 'y']),
  height: z.enum([...HEIGHTS, '']),
  w: text,
  wFrom: text,
  wTo: text,
  W: text,
  at: text,
  from: text,
  to: text,
});
export type DraftLoad = z.infer<typeof draftLoad>;

/** Moments where the member runs over one of its restraints, by the restraint's id. */
export const draftSupport = z.object({
  restraint: line(40),
  Mx: draftQuantity,
  My: draftQuantity,
});
export type DraftSupport = z.infer<typeof draftSupport>;

export const swayNames = ['MA', 'MB', 'Pstory', 'PeStory', 'H', 'height', 'drift', 'Pmf'] as const;
export type SwayName = (typeof swayNames)[number];

/** What is known of the moment frames of a story, for R_M: Pmf, that there are none, or nothing. */
export const frameShares = ['share', 'braced', 'lower bound'] as const;

/** Sway that bends the member about one axis; `by` says how the story's stiffness is given. */
export const draftSwayDirection = z.object({
  by: z.enum(['drift', 'critical']),
  MA: draftQuantity,
  MB: draftQuantity,
  Pstory: draftQuantity,
  PeStory: draftQuantity,
  H: draftQuantity,
  height: draftQuantity,
  drift: draftQuantity,
  Pmf: draftQuantity,
  frames: z.enum([...frameShares, '']),
});
export type DraftSwayDirection = z.infer<typeof draftSwayDirection>;

export const draftSway = z.object({
  P: draftQuantity,
  x: draftSwayDirection.optional(),
  y: draftSwayDirection.optional(),
});
export type DraftSway = z.infer<typeof draftSway>;

export const springNames = ['xA', 'xB', 'yA', 'yB'] as const;
export type SpringName = (typeof springNames)[number];

export const draftSprings = z.object({
  xA: draftQuantity,
  xB: draftQuantity,
  yA: draftQuantity,
  yB: draftQuantity,
});
export type DraftSprings = z.infer<typeof draftSprings>;

/** Joints of a column for the alignment chart; `sidesway` is empty until chosen. */
export const draftChart = z.object({
  sidesway: z.enum(['inhibited', 'uninhibited', '']),
  GA: draftQuantity,
  GB: draftQuantity,
});
export type DraftChart = z.infer<typeof draftChart>;

/** Net section for rupture: Ae itself, or An with U. */
export const draftNetSection = z.object({
  by: z.enum(['Ae', 'An']),
  Ae: draftQuantity,
  An: draftQuantity,
  U: draftQuantity,
});
export type DraftNetSection = z.infer<typeof draftNetSection>;
