import { z } from 'zod';
import { verdictSchema } from '#shared/calc/line.ts';
import { PROVISIONS, SWAYS } from '#shared/members/input.ts';
import { roles } from '#shared/policy/permissions.ts';
import { contract, permitted } from './contract.ts';
import { id, line, name, text, timestamp, version } from './fields.ts';
import { deletedMemberRow, memberRow } from './members.ts';
import { problemPlace } from './problems.ts';

/** A calculation's basis of design, as its form holds it. */
export const basisDraft = z.object({
  standard: z.literal('aisc360-22'),
  design: z.enum(['LRFD', 'ASD']),
  units: z.enum(['us', 'si']),
  /** Which published set of material constants is pinned (E = 29 000 ksi or 200 000 MPa). */
  constants: z.enum(['us', 'si']),
  analysis: z.object({
    method: z.enum(['direct', 'effective-length', 'first-order']),
    secondOrder: z.enum(['from-analysis', 'amplified', 'exact']),
    /** P-δ is in the analysis; asked only where moments come from a second-order analysis. */
    includesMemberEffect: z.boolean().nullable(),
    sway: z.enum(SWAYS),
    /** Where it is known from whether the stories sway. */
    swaySource: text(400),
    /** Second-order over first-order drift, and where it is known from; stored drafts may lack both. */
    driftRatio: line(60).optional(),
    driftSource: text(400).optional(),
    /** Optional provisions that this calculation uses. */
    provisions: z.array(z.enum(PROVISIONS)).optional(),
    notionalLoads: text(400),
    program: line(120),
    file: line(200),
  }),
  buildingCode: z.object({ name: line(120), year: line(20), amendments: text(400) }),
  /** The edition of the standard that the building code adopts, such as `360-22`. */
  adoptedEdition: line(40),
  loadStandard: line(120),
  assumptions: text(4000),
});
export type BasisDraft = z.infer<typeof basisDraft>;

export const calculationRow = z.object({
  id,
  number: z.string(),
  title: z.string(),
  project: z.object({ id, number: z.string(), title: z.string() }),
  revision: z.string(),
  state: z.literal('draft'),
  design: basisDraft.shape.design,
  units: basisDraft.shape.units,
  /** The worst verdict of its members; null without members. */
  verdict: verdictSchema.nullable(),
  /** The largest ratio of members that have one. */
  ratio: z.number().nullable(),
  ratioText: z.string().nullable(),
  members: z.int(),
  unconfirmed: z.int(),
  roles: z.array(z.enum(roles)),
  changedBy: z.string(),
  changedAt: timestamp,
});
export type CalculationRow = z.infer<typeof calculationRow>;

export const calculation = calculationRow.extend({
  version,
  basis: basisDraft,
  /** Whether the person may open the project too, or was let into this calculation only. */
  projectVisible: z.boolean(),
  can: z.object({ edit: z.boolean() }),
  memberRows: z.array(memberRow),
  /** Why there is no record of the whole yet, by member (`members[C-07].mark`). */
  problems: z.array(problemPlace),
  deletedMembers: z.array(deletedMemberRow),
});
export type Calculation = z.infer<typeof calculation>;

const ofCalculation = z.object({ calculationId: id });
const view = permitted('calculation.view');

export const calculations = {
  createCalculation: contract({
    method: 'POST',
    path: '/api/projects/:projectId/calculations',
    access: permitted('calculation.create'),
    params: z.object({ projectId: id }),
    body: z.object({ number: name(40), title: name(160), basis: basisDraft }),
    answer: calculation,
  }),
  showCalculation: contract({
    method: 'GET',
    path: '/api/calculations/:calculationId',
    access: view,
    params: ofCalculation,
    body: null,
    answer: calculation,
  }),
  /** A conflict's `theirs` is a `calculation`. */
  updateCalculation: contract({
    method: 'PUT',
    path: '/api/calculations/:calculationId',
    access: permitted('calculation.edit'),
    params: ofCalculation,
    body: z.object({ version, number: name(40), title: name(160), basis: basisDraft }),
    answer: calculation,
  }),
  /** INPUT.json of the command line, drafts as typed; always downloadable, valid or not. */
  downloadInput: contract({
    method: 'GET',
    path: '/api/calculations/:calculationId/input.json',
    access: view,
    params: ofCalculation,
    body: null,
    answer: { file: 'application/json' },
  }),
};
