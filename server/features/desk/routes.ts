import { calculationRows, visibleCalculations } from '#server/features/calculations/queries.ts';
import { mayCreateProject, projectRows } from '#server/features/projects/queries.ts';
import type { HandlersOf } from '#server/http/handler.ts';
import type { desk } from '#shared/contracts/desk.ts';
import { waitingOf } from './waiting.ts';

export const deskHandlers: HandlersOf<typeof desk> = {
  showDesk: async ({ deps, viewer }) => ({
    projects: await projectRows(deps.db, viewer),
    calculations: await calculationRows(deps.db, viewer),
    waiting: waitingOf(await visibleCalculations(deps.db, viewer, {})),
    canCreateProject: mayCreateProject(viewer),
  }),
};
