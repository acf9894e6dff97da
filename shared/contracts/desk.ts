import { z } from 'zod';
import { calculationRow } from './calculations.ts';
import { contract, signedIn } from './contract.ts';
import { id, noParams } from './fields.ts';
import { projectRow } from './projects.ts';

/** Why something waits for a person. */
export const waitingReasons = [
  'failed',
  'over-limit',
  'not-checked',
  'invalid',
  'unconfirmed',
] as const;

export const waitingItem = z.object({
  reason: z.enum(waitingReasons),
  calculation: z.object({ id, number: z.string(), title: z.string() }),
  member: z.object({ id, mark: z.string(), section: z.string() }),
  ratioText: z.string().nullable(),
  /** How many inputs are not confirmed, or not valid. */
  count: z.int(),
});
export type WaitingItem = z.infer<typeof waitingItem>;

export const desk = {
  showDesk: contract({
    method: 'GET',
    path: '/api/desk',
    access: signedIn,
    params: noParams,
    body: null,
    answer: z.object({
      projects: z.array(projectRow),
      calculations: z.array(calculationRow),
      /** Of calculations where the person is engineer, worst first. */
      waiting: z.array(waitingItem),
      canCreateProject: z.boolean(),
    }),
  }),
};
