import { queryOptions } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { keys } from '#client/lib/keys.ts';
import { isProblem } from '#client/lib/problem.ts';
import type { Member } from '#shared/contracts/members.ts';

/** Several members as they are now, in the order of the ids, without those deleted; fetched anew after each change of one. */
export const severalMembersQuery = (calculationId: string, memberIds: readonly string[]) =>
  queryOptions({
    queryKey: [...keys.calculation(calculationId), 'members', ...memberIds],
    queryFn: async ({ signal }): Promise<Member[]> => {
      const found = await Promise.all(
        memberIds.map((memberId) =>
          call('showMember', { params: { calculationId, memberId }, signal }).catch(
            (error: unknown) => {
              if (isProblem(error, 'not-found')) return null;
              throw error;
            },
          ),
        ),
      );
      return found.filter((member) => member !== null);
    },
    staleTime: 0,
    gcTime: 0,
  });
