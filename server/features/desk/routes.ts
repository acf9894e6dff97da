import { rowOf } from '#server/features/calculations/calculation-row.ts';
import { visibleCalculations } from '#server/features/calculations/visible-calculations.ts';
import { mayCreateProject, projectRows } from '#server/features/projects/queries.ts';
import type { HandlersOf } from '#server/http/handler.ts';
import type { desk } from '#shared/contracts/desk.ts';
import { waitingOf } from './waiting.ts';

export const deskHandlers: HandlersOf<typeof desk> = {
  showDesk: async ({ deps, viewer }) => {
    const calculations = await visibleCalculations(deps.db, viewer, {});
    return {
      projects: await projectRows(deps.db, viewer),
      calculations: calculations.map(rowOf),
      waiting: waitingOf(calculations),
      canCreateProject: mayCreateProject(viewer),
    };
  },
};
