import { loadForRun } from '#server/features/calculations/load-for-run.ts';
import { AppError } from '#server/http/app-error.ts';
import type { Handler } from '#server/http/handler.ts';
import { orderedBy } from '#server/http/ordered-by.ts';
import type { reports } from '#shared/contracts/reports.ts';

export const showRecord: Handler<typeof reports.showRecord> = async (context) => {
  const { deps, viewer, scope } = context;
  await deps.limits.spend('record', viewer.userId);
  const { basis, members } = await loadForRun(deps.db, viewer, scope.calculationId);
  const made = await deps.runs.record({ basis, members }, orderedBy(context));
  if ('problems' in made) throw new AppError('invalid-input', made);
  const { resultHash, snapshotHash } = made.record;
  if (resultHash === null || snapshotHash === null) throw new Error('the record is not sealed');
  return { ...made.record, resultHash, snapshotHash };
};
