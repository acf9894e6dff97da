import { queryOptions } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { recordSchema } from '#shared/calc/record.ts';

export const recordKey = (calculationId: string) => ['record', calculationId] as const;

/** The server's record of a calculation, with its hashes. */
export const recordQuery = (calculationId: string) =>
  queryOptions({
    queryKey: recordKey(calculationId),
    queryFn: async ({ signal }) =>
      recordSchema.parse(await call('showRecord', { params: { calculationId }, signal })),
  });
