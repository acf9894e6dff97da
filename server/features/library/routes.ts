import type { HandlersOf } from '#server/http/handler.ts';
import type { library } from '#shared/contracts/library.ts';
import { clauseUses } from './clause-uses.ts';

export const libraryHandlers: HandlersOf<typeof library> = {
  listClauseUses: ({ deps, viewer, params }) => clauseUses(deps.db, viewer, params),
};
