import { queryOptions } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { keys } from '#client/lib/keys.ts';

export const calculationQuery = (calculationId: string) =>
  queryOptions({
    queryKey: keys.calculation(calculationId),
    queryFn: ({ signal }) => call('showCalculation', { params: { calculationId }, signal }),
  });
