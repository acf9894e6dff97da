import { queryOptions } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';

export const memberKey = (memberId: string) => ['member', memberId] as const;

export const memberQuery = (calculationId: string, memberId: string) =>
  queryOptions({
    queryKey: memberKey(memberId),
    queryFn: ({ signal }) => call('showMember', { params: { calculationId, memberId }, signal }),
  });
