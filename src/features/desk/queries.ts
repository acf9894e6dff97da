import { queryOptions } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';

export const deskKey = ['desk'] as const;

export const deskQuery = queryOptions({
  queryKey: deskKey,
  queryFn: ({ signal }) => call('showDesk', { signal }),
});
