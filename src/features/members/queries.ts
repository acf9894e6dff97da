import { queryOptions } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { keys } from '#client/lib/keys.ts';

export const memberQuery = (calculationId: string, memberId: string) =>
  queryOptions({
    queryKey: keys.member(memberId),
    queryFn: ({ signal }) => call('showMember', { params: { calculationId, memberId }, signal }),
  });
