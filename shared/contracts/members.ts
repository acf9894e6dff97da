import { z } from 'zod';
import { summarySchema } from '#shared/calc/record.ts';
import { contract, permitted } from './contract.ts';
import {
  draftChart,
  draftLoad,
  draftNetSection,
  draftRestraint,
  draftSizes,
  draftSprings,
  draftSupport,
  draftSway,
} from './draft-parts.ts';
import { type DraftQuantity, draftQuantity, draftSource, notGiven } from './draft-quantity.ts';
import { id, line, timestamp, version } from './fields.ts';
import { problemPlace } from './problems.ts';

/** A steel of the user's own; its source is needed. */
export const draftSteel = z.object({
  name: line(60),
  Fy: line(60),
  Fu: line(60),
  source: draftSource.optional(),
  confirmed: z.boolean(),
});
export type DraftSteel = z.infer<typeof draftSteel>;

/** Member forces of a combination; the shears, largest along the member, are given by few. */
export const actionNames = ['P', 'MxA', 'MxB', 'MyA', 'MyB', 'MxMax', 'MyMax', 'Vx', 'Vy'] as const;
export type ActionName = (typeof actionNames)[number];

/** One row of member forces. `id` is made by the client and stays with the row; `name` is a label. */
export const draftCombination = z.object({
  id: line(40).min(1),
  name: line(120),
  /** The load level that the forces say they are of; empty where they do not say. */
  design: z.enum(['LRFD', 'ASD', '']).optional(),
  /** The section that the member had when the forces came: forces belong to it. */
  analysedWith: line(160).optional(),
  P: draftQuantity,
  MxA: draftQuantity,
  MxB: draftQuantity,
  MyA: draftQuantity,
  MyB: draftQuantity,
  MxMax: draftQuantity,
  MyMax: draftQuantity,
  /** From here on what is absent is not part of the combination; stored drafts may lack it. */
  Vx: draftQuantity.optional(),
  Vy: draftQuantity.optional(),
  loads: z.array(draftLoad).max(60, 'at most 60 loads').optional(),
  supports: z.array(draftSupport).max(60, 'at most 60 supports').optional(),
  sway: draftSway.optional(),
});
export type DraftCombination = z.infer<typeof draftCombination>;

/** A force of a combination, empty where it is not part of it. */
export const actionOf = (row: DraftCombination, action: ActionName): DraftQuantity =>
  row[action] ?? notGiven;

export const lengthNames = ['length', 'Lcx', 'Lcy', 'Lcz', 'Lb'] as const;
export type LengthName = (typeof lengthNames)[number];

/**
 * A member as its form holds it: text as typed, valid or not, so that nothing typed is ever lost.
 * What is valid is decided by the input schema of `shared/members`.
 */
export const memberDraft = z.object({
  mark: line(40),
  /** Where it stands, such as `grid 4/B`; a label. */
  place: line(120),
  /** A designation such as `W12X79`, with where it is from. */
  section: draftQuantity,
  /** A grade such as `A992`; not used where the steel is the user's own. */
  material: line(60),
  ownSteel: draftSteel.nullable(),
  /** How the ends are held: `held`; anything else is outside the book's scope. */
  ends: draftQuantity,
  length: draftQuantity,
  Lcx: draftQuantity,
  Lcy: draftQuantity,
  Lcz: draftQuantity,
  Lb: draftQuantity,
  /** A number, `auto`, or empty for 1. */
  Cb: draftQuantity,
  /** Which sense the end moments' signs follow; empty until chosen. */
  endMomentSign: z.enum(['bending', 'joint', '']),
  /** From here on what is absent is not part of the member; stored drafts may lack it. */
  /** In place of the designation, which is kept. */
  sizes: draftSizes.optional(),
  restraints: z.array(draftRestraint).max(60, 'at most 60 restraints').optional(),
  springs: draftSprings.optional(),
  charts: z.object({ x: draftChart.optional(), y: draftChart.optional() }).optional(),
  netSection: draftNetSection.optional(),
  stiffeners: draftQuantity.optional(),
  combinations: z.array(draftCombination).max(500, 'at most 500 combinations'),
});
export type MemberDraft = z.infer<typeof memberDraft>;

/** Whether the ends turn against springs; the stiffnesses are kept and not sent where not. */
export const inSprings = ({ ends }: MemberDraft): boolean => ends.text.trim() === 'springs';

/** What a list shows of a member: the summary of the server's run of its stored draft. */
export const memberSummary = summarySchema.extend({
  unconfirmed: z.int(),
  /** Why the draft is not a valid input; the verdict is then NOT CHECKED. */
  problems: z.array(problemPlace),
});
export type MemberSummary = z.infer<typeof memberSummary>;

export const member = z.object({
  id,
  version,
  draft: memberDraft,
  summary: memberSummary,
  changedBy: z.string(),
  changedAt: timestamp,
});
export type Member = z.infer<typeof member>;

export const memberRow = z.object({
  id,
  version,
  mark: z.string(),
  place: z.string(),
  section: z.string(),
  material: z.string(),
  length: z.string(),
  combinations: z.int(),
  summary: memberSummary,
});
export type MemberRow = z.infer<typeof memberRow>;

export const deletedMemberRow = z.object({
  id,
  mark: z.string(),
  section: z.string(),
  deletedBy: z.string(),
  deletedAt: timestamp,
});

const ofCalculation = z.object({ calculationId: id });
const ofMember = z.object({ calculationId: id, memberId: id });
const edit = permitted('member.edit');

export const members = {
  createMember: contract({
    method: 'POST',
    path: '/api/calculations/:calculationId/members',
    access: edit,
    params: ofCalculation,
    body: z.object({ draft: memberDraft }),
    answer: member,
  }),
  showMember: contract({
    method: 'GET',
    path: '/api/calculations/:calculationId/members/:memberId',
    access: permitted('calculation.view'),
    params: ofMember,
    body: null,
    answer: member,
  }),
  /** A conflict's `theirs` is a `member`. */
  updateMember: contract({
    method: 'PUT',
    path: '/api/calculations/:calculationId/members/:memberId',
    access: edit,
    params: ofMember,
    body: z.object({ version, draft: memberDraft }),
    answer: member,
  }),
  duplicateMember: contract({
    method: 'POST',
    path: '/api/calculations/:calculationId/members/:memberId/duplicate',
    access: edit,
    params: ofMember,
    body: z.object({}),
    answer: member,
  }),
  deleteMember: contract({
    method: 'DELETE',
    path: '/api/calculations/:calculationId/members/:memberId',
    access: edit,
    params: ofMember,
    body: null,
    answer: deletedMemberRow,
  }),
  restoreMember: contract({
    method: 'POST',
    path: '/api/calculations/:calculationId/members/:memberId/restore',
    access: edit,
    params: ofMember,
    body: z.object({}),
    answer: member,
  }),
  /** All present members' ids in their new order; a conflict if a member came or went. */
  reorderMembers: contract({
    method: 'PUT',
    path: '/api/calculations/:calculationId/member-order',
    access: edit,
    params: ofCalculation,
    body: z.object({ memberIds: z.array(id).max(1000) }),
    answer: z.object({ memberIds: z.array(id) }),
  }),
};
