import { loadForRun } from '#server/features/calculations/load-for-run.ts';
import { AppError } from '#server/http/app-error.ts';
import type { Handler } from '#server/http/handler.ts';
import { orderedBy } from '#server/http/ordered-by.ts';
import type { reports } from '#shared/contracts/reports.ts';
import { documentDataOf } from './document-data.ts';

/** The calculation as it stands, as a PDF that is marked preliminary and carries its record. */
export const downloadReport: Handler<typeof reports.downloadReport> = async (context) => {
  const { deps, viewer, scope } = context;
  await deps.limits.spend('report', viewer.userId);
  const found = await loadForRun(deps.db, viewer, scope.calculationId);
  const date = deps.now();
  const { basis, members } = found;
  const document = documentDataOf(found, date);
  const given = { drafts: { basis, members }, document, date };
  const made = await deps.runs.report(given, orderedBy(context));
  if ('problems' in made) throw new AppError('invalid-input', made);
  return { content: made.pdf, filename: `${found.number} rev ${found.revision} draft.pdf` };
};
