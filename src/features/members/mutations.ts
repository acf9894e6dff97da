import { useMutation, useQueryClient } from '@tanstack/react-query';
import { calculationKey } from '#client/features/calculations/queries.ts';
import { deskKey } from '#client/features/desk/queries.ts';
import { recordKey } from '#client/features/reports/queries.ts';
import { call } from '#client/lib/api.ts';
import type { Calculation } from '#shared/contracts/calculations.ts';
import type { Member, MemberDraft } from '#shared/contracts/members.ts';
import { memberKey } from './queries.ts';

/** A change of a calculation's members: its lists and its record are fetched again. */
function useMemberChange<V, R>(calculationId: string, change: (values: V) => Promise<R>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: change,
    onSettled: () => {
      void client.invalidateQueries({ queryKey: recordKey(calculationId) });
      void client.invalidateQueries({ queryKey: deskKey });
      return client.invalidateQueries({ queryKey: calculationKey(calculationId) });
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
      client.setQueryData(memberKey(memberId), member);
      for (const key of [recordKey(calculationId), deskKey, calculationKey(calculationId)]) {
        void client.invalidateQueries({ queryKey: key });
      }
    },
  });
}

/** Puts the members in another order, shown at once and taken back if it is refused. */
export function useReorderMembers(calculationId: string) {
  const client = useQueryClient();
  const key = calculationKey(calculationId);
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
      void client.invalidateQueries({ queryKey: recordKey(calculationId) });
      return client.invalidateQueries({ queryKey: key });
    },
  });
}

const inOrder = <T extends { id: string }>(rows: readonly T[], ids: readonly string[]): T[] =>
  ids.flatMap((id) => rows.filter((row) => row.id === id));
