import { z } from 'zod';
import { contract, permitted } from './contract.ts';
import { id } from './fields.ts';

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
    answer: z.looseObject({ format: z.literal(1), resultHash: z.string() }),
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
