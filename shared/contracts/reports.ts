import { z } from 'zod';
import { recordSchema } from '#shared/calc/record.ts';
import type { DocumentTree } from '#shared/report/tree.ts';
import { contract, permitted } from './contract.ts';
import { id } from './fields.ts';

/** A record that is made to be kept: with its hashes. */
export const keptRecord = recordSchema.extend({
  resultHash: z.string(),
  snapshotHash: z.string(),
});

/** A document tree as `shared/report` types it; its renderers are typed over all its kinds. */
const documentTree = z.custom<DocumentTree>(
  (tree) => typeof tree === 'object' && tree !== null && 'blocks' in tree && 'frame' in tree,
);

const params = z.object({ calculationId: id });
const access = permitted('calculation.view');

/** All answer `invalid-input` with the places (`members[C-07].Lb`) while a draft is not valid. */
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
  /** The report as its document tree: what the PDF is rendered from. */
  showReport: contract({
    method: 'GET',
    path: '/api/calculations/:calculationId/report',
    access,
    params,
    body: null,
    answer: z.object({ tree: documentTree, resultHash: z.string(), snapshotHash: z.string() }),
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
