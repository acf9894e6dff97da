import { loadForRun } from '#server/features/calculations/load-for-run.ts';
import { AppError } from '#server/http/app-error.ts';
import type { Handler } from '#server/http/handler.ts';
import { orderedBy } from '#server/http/ordered-by.ts';
import type { reports } from '#shared/contracts/reports.ts';
import { documentDataOf } from './document-data.ts';

/** The calculation's report as it stands, as the document tree that its PDF is rendered from. */
export const showReport: Handler<typeof reports.showReport> = async (context) => {
  const { deps, viewer, scope } = context;
  await deps.limits.spend('record', viewer.userId);
  const found = await loadForRun(deps.db, viewer, scope.calculationId);
  const { basis, members } = found;
  const given = { drafts: { basis, members }, document: documentDataOf(found, deps.now()) };
  const made = await deps.runs.document(given, orderedBy(context));
  if ('problems' in made) throw new AppError('invalid-input', made);
  return made;
};
