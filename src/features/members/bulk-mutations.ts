import { useMutation, useQueryClient } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { keys } from '#client/lib/keys.ts';
import type { MemberPatch } from '#shared/contracts/several-members.ts';

/** Changes several members, all or none. */
export function useChangeMembers(calculationId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (changes: MemberPatch[]) =>
      call('changeMembers', { params: { calculationId }, body: { changes } }),
    // After a refusal too: what is there now is not what was seen.
    onSettled: (_answer, _error, changes) =>
      Promise.all(
        [
          ...changes.map(({ memberId }) => keys.member(memberId)),
          ...[keys.report(calculationId), keys.desk, keys.calculation(calculationId)],
        ].map((queryKey) => client.invalidateQueries({ queryKey })),
      ),
  });
}
