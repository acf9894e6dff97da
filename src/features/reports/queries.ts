import { queryOptions } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { keys } from '#client/lib/keys.ts';

/** The server's report of a calculation as a document tree, with the hashes of its record. */
export const reportQuery = (calculationId: string) =>
  queryOptions({
    queryKey: keys.report(calculationId),
    queryFn: ({ signal }) => call('showReport', { params: { calculationId }, signal }),
  });
