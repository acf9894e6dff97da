import { z } from 'zod';
import { roles } from '#shared/policy/permissions.ts';
import { calculationRow } from './calculations.ts';
import { contract, permitted, signedIn } from './contract.ts';
import { id, line, name, noParams, timestamp, version } from './fields.ts';

const projectFields = z.object({
  number: name(40),
  title: name(160),
  client: line(160),
  place: line(160),
});

export const projectRow = z.object({
  id,
  number: z.string(),
  title: z.string(),
  client: z.string(),
  place: z.string(),
  firm: z.string(),
  calculations: z.int(),
  roles: z.array(z.enum(roles)),
});
export type ProjectRow = z.infer<typeof projectRow>;

export const drawingStatuses = [
  'preliminary',
  'for information',
  'for approval',
  'for construction',
  'as built',
  'superseded',
] as const;

const drawingFields = z.object({
  number: name(80),
  title: line(200),
  revision: line(20),
  status: z.enum(drawingStatuses),
});

export const drawing = z.object({
  id,
  version,
  number: z.string(),
  title: z.string(),
  revision: z.string(),
  status: z.enum(drawingStatuses),
  changedBy: z.string(),
  changedAt: timestamp,
});
export type Drawing = z.infer<typeof drawing>;

export const deletedDrawing = z.object({
  id,
  number: z.string(),
  title: z.string(),
  deletedBy: z.string(),
  deletedAt: timestamp,
});

export const project = projectRow.extend({
  version,
  can: z.object({ edit: z.boolean(), editDrawings: z.boolean(), createCalculation: z.boolean() }),
  team: z.array(z.object({ name: z.string(), roles: z.array(z.enum(roles)) })),
  calculationRows: z.array(calculationRow),
  drawings: z.array(drawing),
  deletedDrawings: z.array(deletedDrawing),
});
export type Project = z.infer<typeof project>;

const ofProject = z.object({ projectId: id });
const ofDrawing = z.object({ projectId: id, drawingId: id });
const editDrawings = permitted('drawing.edit');

export const projects = {
  listProjects: contract({
    method: 'GET',
    path: '/api/projects',
    access: signedIn,
    params: noParams,
    body: null,
    answer: z.object({ projects: z.array(projectRow), canCreate: z.boolean() }),
  }),
  /** The person becomes the project's engineer. */
  createProject: contract({
    method: 'POST',
    path: '/api/projects',
    access: permitted('project.create'),
    params: noParams,
    body: projectFields,
    answer: project,
  }),
  showProject: contract({
    method: 'GET',
    path: '/api/projects/:projectId',
    access: permitted('project.view'),
    params: ofProject,
    body: null,
    answer: project,
  }),
  /** A conflict's `theirs` is a `project`. */
  updateProject: contract({
    method: 'PUT',
    path: '/api/projects/:projectId',
    access: permitted('project.edit'),
    params: ofProject,
    body: projectFields.extend({ version }),
    answer: project,
  }),
  createDrawing: contract({
    method: 'POST',
    path: '/api/projects/:projectId/drawings',
    access: editDrawings,
    params: ofProject,
    body: drawingFields,
    answer: drawing,
  }),
  /** A conflict's `theirs` is a `drawing`. */
  updateDrawing: contract({
    method: 'PUT',
    path: '/api/projects/:projectId/drawings/:drawingId',
    access: editDrawings,
    params: ofDrawing,
    body: drawingFields.extend({ version }),
    answer: drawing,
  }),
  deleteDrawing: contract({
    method: 'DELETE',
    path: '/api/projects/:projectId/drawings/:drawingId',
    access: editDrawings,
    params: ofDrawing,
    body: null,
    answer: deletedDrawing,
  }),
  restoreDrawing: contract({
    method: 'POST',
    path: '/api/projects/:projectId/drawings/:drawingId/restore',
    access: editDrawings,
    params: ofDrawing,
    body: z.object({}),
    answer: drawing,
  }),
};
