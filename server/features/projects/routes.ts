import type { HandlersOf } from '#server/http/handler.ts';
import type { projects } from '#shared/contracts/projects.ts';
import { createDrawing } from './create-drawing.ts';
import { createProject } from './create-project.ts';
import { deleteDrawing } from './delete-drawing.ts';
import { loadProject, mayCreateProject, projectRows } from './queries.ts';
import { restoreDrawing } from './restore-drawing.ts';
import { updateDrawing } from './update-drawing.ts';
import { updateProject } from './update-project.ts';

export const projectHandlers: HandlersOf<typeof projects> = {
  listProjects: async ({ deps, viewer }) => ({
    projects: await projectRows(deps.db, viewer),
    canCreate: mayCreateProject(viewer),
  }),
  createProject,
  showProject: ({ deps, viewer, scope }) => loadProject(deps.db, viewer, scope.projectId),
  updateProject,
  createDrawing,
  updateDrawing,
  deleteDrawing,
  restoreDrawing,
};
