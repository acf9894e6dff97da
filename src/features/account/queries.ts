import { queryOptions, useQuery } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { keys } from '#client/lib/keys.ts';
import type { Person } from '#shared/contracts/account.ts';

export const sessionQuery = queryOptions({
  queryKey: keys.session,
  queryFn: ({ signal }) => call('showSession', { signal }),
  staleTime: 5 * 60_000,
  refetchOnWindowFocus: true,
});

export const welcomeQuery = (token: string) =>
  queryOptions({
    queryKey: ['welcome', token],
    queryFn: ({ signal }) => call('showWelcome', { params: { token }, signal }),
    staleTime: Number.POSITIVE_INFINITY,
  });

/** The person at the screen; only below the session gate. */
export function usePerson(): Person {
  const { data } = useQuery(sessionQuery);
  if (!data?.user) throw new Error('no one is signed in');
  return data.user;
}
