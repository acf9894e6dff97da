import { queryOptions } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { keys } from '#client/lib/keys.ts';

export const deskQuery = queryOptions({
  queryKey: keys.desk,
  queryFn: ({ signal }) => call('showDesk', { signal }),
});
