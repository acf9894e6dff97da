import { z } from 'zod';
import { recordSchema } from '#shared/calc/record.ts';
import { contract, permitted } from './contract.ts';
import { id } from './fields.ts';

/** A record that is made to be kept: with its hashes. */
export const keptRecord = recordSchema.extend({
  resultHash: z.string(),
  snapshotHash: z.string(),
});

const params = z.object({ calculationId: id });
const access = permitted('calculation.view');

/** Both answer `invalid-input` with the places (`members[C-07].Lb`) while a draft is not valid. */
export const reports = {
  /** The server-made record with its hashes, as `shared/calc` defines it. */
  showRecord: contract({
    method: 'GET',
    path: '/api/calculations/:calculationId/record',
    access,
    params,
    body: null,
    answer: keptRecord,
  }),
  downloadReport: contract({
    method: 'GET',
    path: '/api/calculations/:calculationId/report.pdf',
    access,
    params,
    body: null,
    answer: { file: 'application/pdf' },
  }),
};
