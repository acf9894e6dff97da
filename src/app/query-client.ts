import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { keys } from '#client/lib/keys.ts';
import { isProblem } from '#client/lib/problem.ts';

/** A session that ended elsewhere: the gate then asks to sign in again, where the person was. */
const noticeSignOut = (error: unknown) => {
  if (isProblem(error, 'signed-out'))
    void queryClient.invalidateQueries({ queryKey: keys.session });
};

export const queryClient: QueryClient = new QueryClient({
  queryCache: new QueryCache({ onError: noticeSignOut }),
  mutationCache: new MutationCache({ onError: noticeSignOut }),
  defaultOptions: {
    // Without a connection a call fails and says so; it doesn't wait in silence for one.
    mutations: { networkMode: 'always' },
    queries: {
      networkMode: 'always',
      staleTime: 15_000,
      retry: (count, error) => count < 2 && isProblem(error, 'unreachable'),
    },
  },
});
