import { queryOptions } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';

export const calculationKey = (calculationId: string) => ['calculation', calculationId] as const;

export const calculationQuery = (calculationId: string) =>
  queryOptions({
    queryKey: calculationKey(calculationId),
    queryFn: ({ signal }) => call('showCalculation', { params: { calculationId }, signal }),
  });
