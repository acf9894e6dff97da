import { z } from 'zod';
import { contract, signedIn } from './contract.ts';
import { id, line } from './fields.ts';

/** Lines of one formula in a member's sheet. */
const useOfFormula = z.object({
  /** `aisc360-22/E3-2`. */
  formula: z.string(),
  /** Address of the first of the lines within the member. */
  address: z.string(),
  lines: z.int(),
  /** Combinations that have such a line; 0 where only member lines are. */
  combinations: z.int(),
});

/** A member whose sheet uses formulas of a clause. */
export const memberUse = z.object({
  project: z.object({ number: z.string(), title: z.string() }),
  calculation: z.object({ id, number: z.string(), title: z.string() }),
  member: z.object({ id, mark: z.string(), section: z.string() }),
  uses: z.array(useOfFormula),
});
export type MemberUse = z.infer<typeof memberUse>;

/** How many members an answer names at most. */
export const mostMemberUses = 200;

export const library = {
  /** Members of calculations that the person may see, in the order of the calculations. */
  listClauseUses: contract({
    method: 'GET',
    path: '/api/library/:book/:clause/uses',
    access: signedIn,
    params: z.object({ book: line(60), clause: line(60) }),
    body: null,
    answer: z.object({
      members: z.array(memberUse).max(mostMemberUses),
      /** How many there are in all. */
      total: z.int(),
    }),
  }),
};
