import { useMutation, useQueryClient } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { keys } from '#client/lib/keys.ts';
import type { Calculation } from '#shared/contracts/calculations.ts';
import type { Member, MemberDraft } from '#shared/contracts/members.ts';

/** A change of a calculation's members: its lists and its record are fetched again. */
function useMemberChange<V, R>(calculationId: string, change: (values: V) => Promise<R>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: change,
    onSettled: () => {
      void client.invalidateQueries({ queryKey: keys.report(calculationId) });
      void client.invalidateQueries({ queryKey: keys.desk });
      return client.invalidateQueries({ queryKey: keys.calculation(calculationId) });
    },
  });
}

export const useCreateMember = (calculationId: string) =>
  useMemberChange(calculationId, (draft: MemberDraft) =>
    call('createMember', { params: { calculationId }, body: { draft } }),
  );

export const useDuplicateMember = (calculationId: string) =>
  useMemberChange(calculationId, (memberId: string) =>
    call('duplicateMember', { params: { calculationId, memberId }, body: {} }),
  );

export const useDeleteMember = (calculationId: string) =>
  useMemberChange(calculationId, (memberId: string) =>
    call('deleteMember', { params: { calculationId, memberId } }),
  );

export const useRestoreMember = (calculationId: string) =>
  useMemberChange(calculationId, (memberId: string) =>
    call('restoreMember', { params: { calculationId, memberId }, body: {} }),
  );

export function useUpdateMember(calculationId: string, memberId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { version: number; draft: MemberDraft }) =>
      call('updateMember', { params: { calculationId, memberId }, body }),
    onSuccess: (member: Member) => {
      client.setQueryData(keys.member(memberId), member);
      for (const queryKey of [
        keys.report(calculationId),
        keys.desk,
        keys.calculation(calculationId),
      ]) {
        void client.invalidateQueries({ queryKey });
      }
    },
  });
}

/** Puts the members in another order, shown at once and taken back if it is refused. */
export function useReorderMembers(calculationId: string) {
  const client = useQueryClient();
  const key = keys.calculation(calculationId);
  return useMutation({
    mutationFn: (memberIds: string[]) =>
      call('reorderMembers', { params: { calculationId }, body: { memberIds } }),
    onMutate: async (memberIds) => {
      await client.cancelQueries({ queryKey: key });
      client.setQueryData<Calculation>(
        key,
        (was) => was && { ...was, memberRows: inOrder(was.memberRows, memberIds) },
      );
    },
    onSettled: () => {
      void client.invalidateQueries({ queryKey: keys.report(calculationId) });
      return client.invalidateQueries({ queryKey: key });
    },
  });
}

const inOrder = <T extends { id: string }>(rows: readonly T[], ids: readonly string[]): T[] =>
  ids.flatMap((id) => rows.filter((row) => row.id === id));
