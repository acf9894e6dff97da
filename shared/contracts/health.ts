import { z } from 'zod';
import { anyone, contract } from './contract.ts';
import { noParams } from './fields.ts';

export const health = {
  showHealth: contract({
    method: 'GET',
    path: '/api/health',
    access: anyone,
    params: noParams,
    body: null,
    answer: z.object({ ok: z.literal(true) }),
  }),
};
