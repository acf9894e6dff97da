import { queryOptions } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { keys } from '#client/lib/keys.ts';

/** The server's record of a calculation, with its hashes. */
export const recordQuery = (calculationId: string) =>
  queryOptions({
    queryKey: keys.record(calculationId),
    queryFn: ({ signal }) => call('showRecord', { params: { calculationId }, signal }),
  });
