import type { HandlersOf } from '#server/http/handler.ts';
import type { reports } from '#shared/contracts/reports.ts';
import { downloadReport } from './download-report.ts';
import { showRecord } from './show-record.ts';
import { showReport } from './show-report.ts';

export const reportHandlers: HandlersOf<typeof reports> = {
  showRecord,
  showReport,
  downloadReport,
};
