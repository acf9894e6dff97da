import type { HandlersOf } from '#server/http/handler.ts';
import type { reports } from '#shared/contracts/reports.ts';
import { downloadReport } from './download-report.ts';
import { showRecord } from './show-record.ts';

export const reportHandlers: HandlersOf<typeof reports> = { showRecord, downloadReport };
