import { loadForRun } from '#server/features/calculations/load-for-run.ts';
import { AppError } from '#server/http/app-error.ts';
import type { Handler } from '#server/http/handler.ts';
import type { reports } from '#shared/contracts/reports.ts';
import { keptRecord } from '#shared/contracts/reports.ts';

export const showRecord: Handler<typeof reports.showRecord> = async ({ deps, viewer, scope }) => {
  await deps.limits.spend('record', viewer.userId);
  const { basis, members } = await loadForRun(deps.db, viewer, scope.calculationId);
  const made = await deps.runs.record({ basis, members });
  if ('problems' in made) throw new AppError('invalid-input', made);
  return keptRecord.parse(made.record);
};
